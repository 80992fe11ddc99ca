import sharp from 'sharp';
import { bell, seeded } from './random';
import type { Raster } from './raster';
import { stampOver } from './stamp-over';
import { turn, warp } from './warp';

export interface ScanSettings {
  readonly seed: number;
  readonly dpi: 150 | 200 | 300;
  readonly colour: 'colour' | 'grey' | 'black_and_white';
  /** Degrees clockwise, −5 to 5. */
  readonly skew: number;
  readonly turned: 0 | 90 | 180 | 270;
  /** 0 is a clean glass, 1 a worn copier. */
  readonly noise: number;
  /** What a customer stamped over the text; null for no stamp. */
  readonly stamp: string | null;
}

export const CLEAN_SCAN: ScanSettings = {
  seed: 1,
  dpi: 300,
  colour: 'grey',
  skew: 0,
  turned: 0,
  noise: 0.15,
  stamp: null,
};

/** Makes of a rendered page what a scanner would have made of its print. The same settings give the same pixels. */
export async function scanPage(page: Raster, settings: ScanSettings): Promise<Raster> {
  const random = seeded(settings.seed);
  const stamped = settings.stamp === null ? page : stampOver(page, settings.stamp, random);
  const small = await resample(stamped, settings.dpi);
  const skewed = settings.skew === 0 ? small : skew(small, settings.skew);
  roughen(skewed, settings, random);
  return turn(skewed, settings.turned);
}

async function resample(page: Raster, dpi: number): Promise<Raster> {
  const width = Math.round((page.width * dpi) / page.dpi);
  const height = Math.round((page.height * dpi) / page.dpi);
  const data = await sharp(page.data, { raw: { width: page.width, height: page.height, channels: 4 } })
    .resize(width, height, { fit: 'fill' })
    .blur(0.5)
    .raw()
    .toBuffer();
  return { width, height, dpi, data: new Uint8ClampedArray(data) };
}

function skew(page: Raster, degrees: number): Raster {
  const angle = (degrees * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const [mx, my] = [page.width / 2, page.height / 2];
  return warp(page, [cos, sin, mx - cos * mx - sin * my, -sin, cos, my + sin * mx - cos * my, 0, 0, 1], {
    width: page.width,
    height: page.height,
    ground: () => [250, 250, 250],
  });
}

function roughen(page: Raster, { colour, noise }: ScanSettings, random: () => number): void {
  const { data } = page;
  const grain = 26 * noise;
  const paper = 255 - 14 * noise;
  for (let at = 0; at < data.length; at += 4) {
    const shift = bell(random) * grain;
    const [r, g, b] = [data[at] ?? 0, data[at + 1] ?? 0, data[at + 2] ?? 0];
    const grey = 0.299 * r + 0.587 * g + 0.114 * b;
    for (let k = 0; k < 3; k++) {
      const value = ((colour === 'colour' ? (data[at + k] ?? 0) : grey) * paper) / 255 + shift;
      data[at + k] = colour === 'black_and_white' ? 255 * Number(value > 150) : value;
    }
  }
  speckle(page, Math.round(page.width * page.height * 0.00006 * noise), random);
}

/** Dust: dots of one to three pixels. */
function speckle(page: Raster, count: number, random: () => number): void {
  for (let i = 0; i < count; i++) {
    const size = 1 + Math.floor(random() * 3);
    const x = Math.floor(random() * (page.width - size));
    const y = Math.floor(random() * (page.height - size));
    const value = random() < 0.7 ? 40 : 250;
    for (let dy = 0; dy < size; dy++) {
      page.data.fill(value, ((y + dy) * page.width + x) * 4, ((y + dy) * page.width + x + size) * 4);
    }
  }
  for (let at = 3; at < page.data.length; at += 4) page.data[at] = 255;
}
