import type { Grey } from './grey';

/** A picture at a whole part of its size; each pixel is the mean of `factor` × `factor`. */
export function shrink({ width, height, data }: Grey, factor: number): Grey {
  if (factor <= 1) return { width, height, data };
  const [w, h] = [Math.max(1, Math.floor(width / factor)), Math.max(1, Math.floor(height / factor))];
  const out = new Uint8Array(w * h);
  const sums = new Uint32Array(w);
  const whole = factor * factor;
  for (let y = 0; y < h; y++) {
    sums.fill(0);
    for (let k = 0; k < factor; k++) {
      let at = (y * factor + k) * width;
      for (let x = 0; x < w; x++) {
        let sum = 0;
        for (let j = 0; j < factor; j++) sum += data[at + j] as number;
        at += factor;
        sums[x] = (sums[x] as number) + sum;
      }
    }
    const line = y * w;
    for (let x = 0; x < w; x++) out[line + x] = (sums[x] as number) / whole;
  }
  return { width: w, height: h, data: out };
}
