/**
 * How often readings that were believed so far were right, measured by `npm run evidence:score` on layouts at first sight,
 * as text, scans and photographs. Grows with the belief; between two rows it is read on the straight line.
 */
const MEASURED: readonly (readonly [belief: number, right: number])[] = [
  [0, 0.05],
  [0.2, 0.25],
  [0.4, 0.5],
  [0.6, 0.8],
  [0.8, 0.92],
  [0.9, 0.95],
  [1, 0.98],
];

/** A belief from 0 to 1 as the share of such readings that are right. */
export function calibrated(belief: number): number {
  const above = MEASURED.findIndex(([at]) => at >= belief);
  const [x1, y1] = MEASURED[above] ?? [1, 0.98];
  const [x0, y0] = MEASURED[above - 1] ?? [x1, y1];
  const right = x1 === x0 ? y1 : y0 + ((belief - x0) / (x1 - x0)) * (y1 - y0);
  return Math.round(right * 1000) / 1000;
}
