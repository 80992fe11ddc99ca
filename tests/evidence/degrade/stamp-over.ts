import { createCanvas } from '@napi-rs/canvas';
import type { Raster } from './raster';

const COLOURS = ['#b3202c', '#23409a', '#1d6b3a'];

/** Stamps words in a double frame over the page, a little askew, with ink that lets the text shine through. */
export function stampOver(page: Raster, words: string, random: () => number): Raster {
  const canvas = createCanvas(page.width, page.height);
  const context = canvas.getContext('2d');
  const image = context.createImageData(page.width, page.height);
  image.data.set(page.data);
  context.putImageData(image, 0, 0);

  const em = page.dpi / 4;
  context.translate(page.width * (0.3 + 0.4 * random()), page.height * (0.3 + 0.4 * random()));
  context.rotate((random() - 0.5) * 0.5);
  context.globalCompositeOperation = 'multiply';
  context.globalAlpha = 0.6;
  const colour = COLOURS[Math.floor(random() * COLOURS.length)] ?? '#b3202c';
  context.strokeStyle = colour;
  context.fillStyle = colour;
  context.font = `bold ${em}px "DejaVu Sans"`;
  const half = context.measureText(words).width / 2 + em / 2;
  context.lineWidth = em / 10;
  context.strokeRect(-half, -em, 2 * half, 2 * em);
  context.strokeRect(-half + em / 6, -em + em / 6, 2 * half - em / 3, 2 * em - em / 3);
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(words, 0, 0);
  const { data } = context.getImageData(0, 0, page.width, page.height);
  return { ...page, data: new Uint8ClampedArray(data) };
}
