import type { Grey } from './grey';
import type { Projection } from './projection';

const PAPER = 255;

/**
 * Draws a `width` × `height` picture, each pixel from where `toSource` puts it, between its four neighbours.
 * Beyond the source lies white paper.
 */
export function warp(
  source: Grey,
  toSource: Projection,
  { width, height }: { width: number; height: number },
): Grey {
  const data = new Uint8Array(width * height);
  const [a, b, c, d, e, f, g, h, i] = toSource;
  const flat = g === 0 && h === 0;
  const from = source.data;
  const stride = source.width;
  const [right, bottom] = [source.width - 1, source.height - 1];
  for (let y = 0, at = 0; y < height; y++) {
    // The middle of a pixel is half a step from its corner.
    const v = y + 0.5;
    for (let x = 0; x < width; x++, at++) {
      const u = x + 0.5;
      const w = flat ? 1 / i : 1 / (g * u + h * v + i);
      const sx = (a * u + b * v + c) * w - 0.5;
      const sy = (d * u + e * v + f) * w - 0.5;
      if (!(sx > -1 && sy > -1 && sx < right + 1 && sy < bottom + 1)) {
        data[at] = PAPER;
        continue;
      }
      const x0 = Math.max(0, Math.min(right - 1, sx)) | 0;
      const y0 = Math.max(0, Math.min(bottom - 1, sy)) | 0;
      const fx = Math.min(1, Math.max(0, sx - x0));
      const fy = Math.min(1, Math.max(0, sy - y0));
      const p = y0 * stride + x0;
      const q = bottom > 0 ? p + stride : p;
      const step = right > 0 ? 1 : 0;
      const top = (from[p] as number) * (1 - fx) + (from[p + step] as number) * fx;
      const low = (from[q] as number) * (1 - fx) + (from[q + step] as number) * fx;
      data[at] = top * (1 - fy) + low * fy + 0.5;
    }
  }
  return { width, height, data };
}
