import type { Source } from '../source';
import type { Verdict } from '../verdict';

import type { Rectangle } from './fits-in-plan';

const COUNTED_IN_ROWS: Source = {
  document: 'Rows and columns, counted',
  confidence: 'computed',
  certainty: 'high',
};

/** Three pieces of 100.0 mm lie in 300.0 mm although a computation in inches ends a last bit above it. */
const SAME_PIECES = 1e-9;

/**
 * How many equal parts lie side by side in one layer, in rows, all turned the same way. Mixed patterns may hold a few
 * more, so the count is safe to promise.
 *
 * @param gapMm between neighbours, 0 or more; none is kept to the walls.
 * @returns pieces (0 where none fits straight), rows across the space and pieces in each; refused as
 *   `size_not_positive` or `gap_negative`.
 * @example 300 × 200 mm parts with 20 mm between them in 1200 × 600 mm: 6, in 2 rows of 3.
 */
export function sideBySide(
  part: Rectangle,
  space: Rectangle,
  gapMm: number,
): Verdict<{ pieces: number; rows: number; inRow: number }, 'size_not_positive' | 'gap_negative'> {
  if (!(gapMm >= 0)) return { ok: false, reason: 'gap_negative' };
  const sizes = [part.lengthMm, part.widthMm, space.lengthMm, space.widthMm];
  if (!sizes.every((size) => size > 0 && size < Infinity)) return { ok: false, reason: 'size_not_positive' };
  const along = (roomMm: number, sizeMm: number) =>
    Math.floor((roomMm + gapMm) / (sizeMm + gapMm) + SAME_PIECES);
  const laid = [
    { inRow: along(space.lengthMm, part.lengthMm), rows: along(space.widthMm, part.widthMm) },
    { inRow: along(space.lengthMm, part.widthMm), rows: along(space.widthMm, part.lengthMm) },
  ].map((one) => ({ ...one, pieces: one.inRow * one.rows }));
  const [first, second] = laid;
  const best = first && second && second.pieces > first.pieces ? second : first;
  return best ? { ok: true, ...best, source: COUNTED_IN_ROWS } : { ok: false, reason: 'size_not_positive' };
}
