import { project, type Projection } from '@/lib/evidence/open/picture/projection';

import { blank, type Raster } from './raster';

/**
 * Takes each pixel of a `width` × `height` picture from where `toSource` puts it, between its four neighbours.
 * What lies beyond the source gets the ground's colour.
 */
export function warp(
  source: Raster,
  toSource: Projection,
  {
    width,
    height,
    ground,
  }: { width: number; height: number; ground: (x: number, y: number) => readonly number[] },
): Raster {
  const out = blank(width, height, source.dpi);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const [sx, sy] = project(toSource, x, y);
      const at = (y * width + x) * 4;
      if (sx < 0 || sy < 0 || sx >= source.width - 1 || sy >= source.height - 1) {
        const colour = ground(x, y);
        for (let k = 0; k < 3; k++) out.data[at + k] = colour[k] ?? 0;
        continue;
      }
      const [x0, y0] = [Math.floor(sx), Math.floor(sy)];
      const [fx, fy] = [sx - x0, sy - y0];
      const from = (y0 * source.width + x0) * 4;
      const below = from + source.width * 4;
      for (let k = 0; k < 3; k++) {
        const top = (source.data[from + k] ?? 0) * (1 - fx) + (source.data[from + 4 + k] ?? 0) * fx;
        const bottom = (source.data[below + k] ?? 0) * (1 - fx) + (source.data[below + 4 + k] ?? 0) * fx;
        out.data[at + k] = top * (1 - fy) + bottom * fy;
      }
    }
  }
  return out;
}

/** Turns by whole quarters, clockwise. */
export function turn(source: Raster, degrees: 0 | 90 | 180 | 270): Raster {
  if (degrees === 0) return source;
  const upended = degrees !== 180;
  const [width, height] = upended ? [source.height, source.width] : [source.width, source.height];
  const out = blank(width, height, source.dpi);
  const from = new Uint32Array(source.data.buffer, source.data.byteOffset, source.width * source.height);
  const to = new Uint32Array(out.data.buffer);
  for (let y = 0; y < source.height; y++) {
    for (let x = 0; x < source.width; x++) {
      let at = (source.height - 1 - y) * width + (source.width - 1 - x);
      if (degrees === 90) at = x * width + (source.height - 1 - y);
      if (degrees === 270) at = (source.width - 1 - x) * width + y;
      to[at] = from[y * source.width + x] ?? 0;
    }
  }
  return out;
}
