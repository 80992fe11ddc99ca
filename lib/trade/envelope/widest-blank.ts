import type { Verdict } from '../verdict';

import { fitsInPlan, RECTANGLE_IN_RECTANGLE, sides, type Rectangle } from './fits-in-plan';

/**
 * How wide a blank of a given length may be and still lie in a space, straight or diagonally.
 *
 * @param lengthMm of the blank, over 0.
 * @returns the greatest width up to the blank's length, and how it lies; refused as `size_not_positive`, or as
 *   `longer_than_diagonal` where not even a wire of this length lies in the space.
 * @example 147 in long on a sheet of 144 × 48 in: diagonally, while it is at most 8.897 in wide.
 */
export function widestBlank(
  lengthMm: number,
  space: Rectangle,
): Verdict<
  { widthMm: number; lies: 'straight' | 'diagonally' },
  'size_not_positive' | 'longer_than_diagonal'
> {
  if (![lengthMm, space.lengthMm, space.widthMm].every((size) => size > 0 && size < Infinity))
    return { ok: false, reason: 'size_not_positive' };
  const [a, b] = sides(space);
  if (lengthMm <= a)
    return { ok: true, widthMm: Math.min(lengthMm, b), lies: 'straight', source: RECTANGLE_IN_RECTANGLE };
  let [fits, tooWide] = [0, Math.min(lengthMm, b)];
  // Narrower always fits where wider does, so halving finds the limit to the last digit a double holds.
  for (let halving = 0; halving < 60; halving++) {
    const widthMm = (fits + tooWide) / 2;
    const laid = fitsInPlan({ lengthMm, widthMm }, space);
    if (laid.ok && laid.fits) fits = widthMm;
    else tooWide = widthMm;
  }
  return fits > NO_WIDTH_MM
    ? { ok: true, widthMm: fits, lies: 'diagonally', source: RECTANGLE_IN_RECTANGLE }
    : { ok: false, reason: 'longer_than_diagonal', source: RECTANGLE_IN_RECTANGLE };
}

/** What is left when halving has found nothing. */
const NO_WIDTH_MM = 1e-6;
