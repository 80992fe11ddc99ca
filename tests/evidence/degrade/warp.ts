import { blank, type Raster } from './raster';

/** Nine numbers, row by row: a pixel of the result comes from (x', y') / w' of the source. */
export type Projection = readonly [number, number, number, number, number, number, number, number, number];

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
  const [a, b, c, d, e, f, g, h, i] = toSource;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const w = g * x + h * y + i;
      const sx = (a * x + b * y + c) / w;
      const sy = (d * x + e * y + f) / w;
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

type Point = readonly [number, number];

/** The projection that carries the corners (0,0), (1,0), (1,1), (0,1) of a unit square to four points. */
export function squareTo([p0, p1, p2, p3]: readonly [Point, Point, Point, Point]): Projection {
  const dx = p0[0] - p1[0] + p2[0] - p3[0];
  const dy = p0[1] - p1[1] + p2[1] - p3[1];
  const [dx1, dx2, dy1, dy2] = [p1[0] - p2[0], p3[0] - p2[0], p1[1] - p2[1], p3[1] - p2[1]];
  const det = dx1 * dy2 - dx2 * dy1;
  const g = (dx * dy2 - dx2 * dy) / det;
  const h = (dx1 * dy - dx * dy1) / det;
  return [
    p1[0] - p0[0] + g * p1[0],
    p3[0] - p0[0] + h * p3[0],
    p0[0],
    p1[1] - p0[1] + g * p1[1],
    p3[1] - p0[1] + h * p3[1],
    p0[1],
    g,
    h,
    1,
  ];
}

export function invert([a, b, c, d, e, f, g, h, i]: Projection): Projection {
  return [
    e * i - f * h,
    c * h - b * i,
    b * f - c * e,
    f * g - d * i,
    a * i - c * g,
    c * d - a * f,
    d * h - e * g,
    b * g - a * h,
    a * e - b * d,
  ];
}

/** `after` is done after `first`. */
export function multiply(after: Projection, first: Projection): Projection {
  const at = (row: number, column: number) =>
    [0, 1, 2].reduce((sum, k) => sum + (after[row * 3 + k] ?? 0) * (first[k * 3 + column] ?? 0), 0);
  return [at(0, 0), at(0, 1), at(0, 2), at(1, 0), at(1, 1), at(1, 2), at(2, 0), at(2, 1), at(2, 2)];
}
