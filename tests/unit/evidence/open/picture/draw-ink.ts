import { seeded } from '@/tests/evidence/degrade/random';
import type { Grey, Ink, PixelBox } from '@/lib/evidence/open/picture/grey';

export const paper = (width: number, height: number, value = 255): Grey => ({
  width,
  height,
  data: new Uint8Array(width * height).fill(value),
});

/** Fills a box of a grey picture. */
export function fill(picture: Grey, [left, top, right, bottom]: PixelBox, value: number): void {
  for (let y = top; y < bottom; y++)
    picture.data.fill(value, y * picture.width + left, y * picture.width + right);
}

export const inkOf = ({ width, height, data }: Grey): Ink => ({
  width,
  height,
  data: data.map((value) => (value < 128 ? 1 : 0)),
});

/** Lines of small boxes, as letters look from afar: `lines` lines of words on a page. */
export function drawText(picture: Grey, { lines, size }: { lines: number; size: number }): void {
  const random = seeded(7);
  for (let line = 0; line < lines; line++) {
    const top = 2 * size + line * size * 2;
    for (let x = 3 * size; x < picture.width - 4 * size;) {
      const wide = Math.round(size * (0.4 + 0.4 * random()));
      const tall = random() < 0.3 ? Math.round(size * 0.35) : 0;
      fill(picture, [x, top - tall, x + wide, top + Math.round(size * 0.7)], 20);
      x += wide + Math.round(size * (random() < 0.2 ? 0.8 : 0.2));
    }
  }
}
