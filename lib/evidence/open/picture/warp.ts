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
  const out = new Uint8Array(width * height).fill(PAPER);
  const [a, b, c, d, e, f, g, h, i] = toSource;
  for (let y = 0; y < height; y++) {
    // The middle of a pixel is half a step from its corner.
    const v = y + 0.5;
    const start = { x: b * v + c + a * 0.5, y: e * v + f + d * 0.5, w: h * v + i + g * 0.5 };
    if (g === 0 && h === 0)
      drawFlatRow(source, out.subarray(y * width, (y + 1) * width), [start.x / i, start.y / i, a / i, d / i]);
    else drawRow(source, out.subarray(y * width, (y + 1) * width), [start.x, start.y, start.w, a, d, g]);
  }
  return { width, height, data: out };
}

/** A row whose places in the source lie evenly: nothing is divided. */
function drawFlatRow(
  source: Grey,
  row: Uint8Array,
  [x0, y0, dx, dy]: readonly [number, number, number, number],
): void {
  const { data, width: stride } = source;
  const [right, bottom] = [source.width - 1, source.height - 1];
  for (let k = 0; k < row.length; k++) {
    const x = x0 + k * dx - 0.5;
    const y = y0 + k * dy - 0.5;
    if (x >= 0 && y >= 0 && x < right && y < bottom) {
      const left = x | 0;
      const top = y | 0;
      const p = top * stride + left;
      const fx = x - left;
      const fy = y - top;
      const upper = (data[p] as number) + fx * ((data[p + 1] as number) - (data[p] as number));
      const q = p + stride;
      const lower = (data[q] as number) + fx * ((data[q + 1] as number) - (data[q] as number));
      row[k] = upper + fy * (lower - upper) + 0.5;
    } else {
      row[k] = atRim(source, x, y);
    }
  }
}

function drawRow(
  source: Grey,
  row: Uint8Array,
  [x0, y0, w0, dx, dy, dw]: readonly [number, number, number, number, number, number],
): void {
  const { data, width: stride } = source;
  const [right, bottom] = [source.width - 1, source.height - 1];
  for (let k = 0; k < row.length; k++) {
    const w = 1 / (w0 + k * dw);
    const x = (x0 + k * dx) * w - 0.5;
    const y = (y0 + k * dy) * w - 0.5;
    if (x >= 0 && y >= 0 && x < right && y < bottom) {
      const left = x | 0;
      const top = y | 0;
      const p = top * stride + left;
      const fx = x - left;
      const fy = y - top;
      const upper = (data[p] as number) + fx * ((data[p + 1] as number) - (data[p] as number));
      const q = p + stride;
      const lower = (data[q] as number) + fx * ((data[q + 1] as number) - (data[q] as number));
      row[k] = upper + fy * (lower - upper) + 0.5;
    } else {
      row[k] = atRim(source, x, y);
    }
  }
}

/** Half a pixel along its rim the source is still seen. */
function atRim({ width, height, data }: Grey, x: number, y: number): number {
  if (!(x > -1 && y > -1 && x < width && y < height)) return PAPER;
  const left = Math.min(width - 1, Math.max(0, Math.round(x)));
  const top = Math.min(height - 1, Math.max(0, Math.round(y)));
  return data[top * width + left] as number;
}
