import sharp from 'sharp';

import { chainProjections, inverseOf, scaling, squareOnto } from '@/lib/evidence/open/picture/projection';

import { bell, seeded } from './random';
import type { Raster } from './raster';
import { turn, warp } from './warp';

export interface PhotographSettings {
  readonly seed: number;
  /** Longer side of the photograph in pixels. */
  readonly longerSide: number;
  /** 0 is taken straight from above, 1 as slanted as anyone would send. */
  readonly perspective: number;
  /** 0 is even light, 1 a lamp at one corner and the photographer's shadow. */
  readonly unevenLight: number;
  /** Radius in pixels. */
  readonly blur: number;
  readonly turned: 0 | 90 | 180 | 270;
  readonly desk: 'dark' | 'wood' | 'light';
}

export const EASY_PHOTOGRAPH: PhotographSettings = {
  seed: 1,
  longerSide: 3200,
  perspective: 0.4,
  unevenLight: 0.5,
  blur: 0.5,
  turned: 0,
  desk: 'dark',
};

const DESKS = { dark: [46, 44, 42], wood: [128, 92, 58], light: [176, 174, 170] } as const;

/** Makes of a rendered page what a telephone would have made of its print. The same settings give the same pixels. */
export async function photographPage(page: Raster, settings: PhotographSettings): Promise<Raster> {
  const random = seeded(settings.seed);
  const scale = settings.longerSide / Math.max(page.width, page.height);
  const width = Math.round(page.width * scale);
  const height = Math.round(page.height * scale);
  const [pw, ph] = [Math.round(width * 0.9), Math.round(height * 0.9)];
  const small = await sharp(page.data, { raw: { width: page.width, height: page.height, channels: 4 } })
    .resize(pw, ph, { fit: 'fill' })
    .raw()
    .toBuffer();
  const sheet: Raster = { width: pw, height: ph, dpi: page.dpi, data: new Uint8ClampedArray(small) };

  const corner = (x: number, y: number): [number, number] => [
    width * (x + (x < 0.5 ? 1 : -1) * (0.03 + 0.07 * settings.perspective * random())),
    height * (y + (y < 0.5 ? 1 : -1) * (0.03 + 0.05 * settings.perspective * random())),
  ];
  const onPhotograph = squareOnto([corner(0, 0), corner(1, 0), corner(1, 1), corner(0, 1)]);
  const toSheet = chainProjections(inverseOf(onPhotograph), scaling(pw, ph));
  const desk = DESKS[settings.desk];
  const ground = (x: number, y: number) => {
    const grain = settings.desk === 'wood' ? 14 * Math.sin(y / 9 + 3 * Math.sin(x / 160)) : 0;
    return desk.map((channel) => channel + grain);
  };
  const taken = warp(sheet, toSheet, { width, height, ground });
  light(taken, settings, random);
  return turn(await soften(taken, settings.blur), settings.turned);
}

/** A lamp from one corner, a soft shadow across, warm light, and the sensor's grain. */
function light(photograph: Raster, { unevenLight }: PhotographSettings, random: () => number): void {
  const { width, height, data } = photograph;
  const angle = random() * 2 * Math.PI;
  const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
  const shadow = random() * 1.2 - 0.6;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const along = ((x / width - 0.5) * ux + (y / height - 0.5) * uy) * 2;
      const edge = 1 / (1 + Math.exp(-(along - shadow) * 9));
      const bright = 0.94 - unevenLight * (0.18 * (along + 1) * 0.5 + 0.26 * edge);
      const grain = bell(random) * 4;
      const at = (y * width + x) * 4;
      data[at] = (data[at] ?? 0) * bright + grain;
      data[at + 1] = (data[at + 1] ?? 0) * bright * 0.985 + grain;
      data[at + 2] = (data[at + 2] ?? 0) * bright * 0.94 + grain;
    }
  }
}

async function soften(photograph: Raster, radius: number): Promise<Raster> {
  if (radius < 0.3) return photograph;
  const { width, height, data } = photograph;
  const soft = await sharp(data, { raw: { width, height, channels: 4 } })
    .blur(radius)
    .raw()
    .toBuffer();
  return { ...photograph, data: new Uint8ClampedArray(soft) };
}
