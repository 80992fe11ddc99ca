import type { Grey } from './grey';

/** A picture in colour: red, green, blue for each pixel, row by row. */
export interface Coloured {
  readonly width: number;
  readonly height: number;
  readonly data: Uint8Array;
}

/** The brightness an eye sees. */
export function toGrey({ width, height, data }: Coloured): Grey {
  const out = new Uint8Array(width * height);
  for (let i = 0, at = 0; i < out.length; i++, at += 3) {
    out[i] =
      ((data[at] as number) * 77 + (data[at + 1] as number) * 150 + (data[at + 2] as number) * 29) >> 8;
  }
  return { width, height, data: out };
}
