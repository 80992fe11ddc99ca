import type { Source } from '../source';
import type { Verdict } from '../verdict';

/** Seen from above; which side is the longer does not matter. */
export interface Rectangle {
  readonly lengthMm: number;
  readonly widthMm: number;
}

/** The condition, proved by Carver and again, shorter, by Wetzel. */
export const RECTANGLE_IN_RECTANGLE: Source = {
  document: 'Carver, Amer. Math. Monthly 64 (1957) 114-116; Wetzel, Mathematics Magazine 73 (2000) 204-211',
  confidence: 'computed',
  certainty: 'high',
};

/** A bar of 1200.0 mm fits 1200.0 mm although a computation in inches ends a last bit above it. */
const SAME_MM = 1e-9;

export interface PlanFit {
  readonly fits: boolean;
  /** How it lies; null where it does not fit. */
  readonly lies: 'straight' | 'diagonally' | null;
  /** The width that the part needs of the space at the space's length, however it lies. */
  readonly neededWidthMm: number;
}

/**
 * Whether a rectangle lies in a rectangle, straight or diagonally.
 *
 * With p ≥ q of the part and a ≥ b of the space it fits straight when p ≤ a and q ≤ b; diagonally when p > a, q ≤ b and
 * b ≥ (2pqa + (p² − q²)·√(p² + q² − a²)) / (p² + q²). The width q is tested before the formula: on its own the formula
 * lets a 10 × 10 into an 8 × 8.
 *
 * @param part millimetres, over 0. @param space millimetres, over 0.
 * @returns fits or not, and how; refused as `size_not_positive`.
 * @example 50 × 4 in 48 × 24 needs a width of 22.0062 and fits diagonally; 50 × 8 needs 30.2961 and does not.
 */
export function fitsInPlan(part: Rectangle, space: Rectangle): Verdict<PlanFit, 'size_not_positive'> {
  if (
    ![part.lengthMm, part.widthMm, space.lengthMm, space.widthMm].every((size) => size > 0 && size < Infinity)
  )
    return { ok: false, reason: 'size_not_positive' };
  const [p, q] = sides(part);
  const [a, b] = sides(space);
  const straight = p <= a + SAME_MM;
  const neededWidthMm = straight ? q : neededOnDiagonal(p, q, a);
  const fits = q <= b + SAME_MM && neededWidthMm <= b + SAME_MM;
  const lies = straight ? 'straight' : 'diagonally';
  return { ok: true, fits, lies: fits ? lies : null, neededWidthMm, source: RECTANGLE_IN_RECTANGLE };
}

/** The longer side first. */
export function sides({ lengthMm, widthMm }: Rectangle): [longer: number, shorter: number] {
  return lengthMm >= widthMm ? [lengthMm, widthMm] : [widthMm, lengthMm];
}

/** The width b at which a part p × q longer than a just lies in a × b; never below q, as nothing is narrower than the part. */
function neededOnDiagonal(p: number, q: number, a: number): number {
  const squares = p * p + q * q;
  const formula = (2 * p * q * a + (p * p - q * q) * Math.sqrt(squares - a * a)) / squares;
  return Math.max(q, formula);
}
