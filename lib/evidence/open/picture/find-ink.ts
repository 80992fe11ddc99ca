import type { Grey, Ink } from './grey';

/** On levelled paper ink is never lighter than this, nor is a threshold below this of use. */
const LIGHTEST_INK = 175;
const DARKEST_THRESHOLD = 90;

/** The grey that parts ink from paper best: the classes on both sides differ the most (Otsu). */
export function inkThreshold({ data }: Grey): number {
  const counts = new Float64Array(256);
  for (let i = 0; i < data.length; i += 3) {
    const value = data[i] as number;
    counts[value] = (counts[value] as number) + 1;
  }
  let [total, sum] = [0, 0];
  counts.forEach((count, value) => {
    total += count;
    sum += count * value;
  });
  let [dark, darkSum, best, threshold] = [0, 0, -1, 128];
  for (let value = 0; value < 255; value++) {
    dark += counts[value] as number;
    darkSum += value * (counts[value] as number);
    const light = total - dark;
    if (dark === 0 || light === 0) continue;
    const apart = darkSum / dark - (sum - darkSum) / light;
    const between = dark * light * apart * apart;
    if (between > best) {
      best = between;
      threshold = value + 1;
    }
  }
  return Math.min(LIGHTEST_INK, Math.max(DARKEST_THRESHOLD, threshold));
}

/** Marks what is darker than `threshold`. */
export function findInk({ width, height, data }: Grey, threshold: number): Ink {
  const ink = new Uint8Array(data.length);
  for (let i = 0; i < data.length; i++) ink[i] = (data[i] as number) < threshold ? 1 : 0;
  return { width, height, data: ink };
}
