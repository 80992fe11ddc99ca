import type { Grey } from './grey';

/** A picture at a whole part of its size; each pixel is the mean of `factor` × `factor`. */
export function shrink({ width, height, data }: Grey, factor: number): Grey {
  if (factor <= 1) return { width, height, data };
  const [w, h] = [Math.max(1, Math.floor(width / factor)), Math.max(1, Math.floor(height / factor))];
  const out = new Uint8Array(w * h);
  const sums = new Uint32Array(w);
  for (let y = 0; y < h; y++) {
    sums.fill(0);
    for (let k = 0; k < factor; k++) {
      const line = (y * factor + k) * width;
      for (let x = 0, at = line; x < w; x++) {
        let sum = 0;
        for (let j = 0; j < factor && at < data.length; j++) sum += data[at++] as number;
        sums[x] = (sums[x] as number) + sum;
      }
    }
    for (let x = 0; x < w; x++) out[y * w + x] = (sums[x] as number) / (factor * factor);
  }
  return { width: w, height: h, data: out };
}
