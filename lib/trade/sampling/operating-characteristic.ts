import type { Verdict } from '../verdict';

import { COUNTED, INDEPENDENT, binomialAtMost, hypergeometricAtMost } from './distributions';

/** A plan as far as its curve goes. */
export interface AcceptancePlan {
  readonly sampleSize: number;
  readonly accept: number;
}

export interface CurvePoint {
  readonly nonconformingPct: number;
  /** Chance that the plan passes such a lot, 0 to 1. */
  readonly accepted: number;
}

/**
 * Points of the operating-characteristic curve for a steady stream of lots (binomial, type B).
 *
 * @param nonconformingPct the qualities to compute, each 0 to 100 percent.
 * @returns one point for each, in the order given; refused as `not_a_plan` or `not_a_percentage`.
 * @example 20 pieces, accept 0, at 0.65 %: passed with a chance of 0.8777.
 */
export function operatingCharacteristic(
  plan: AcceptancePlan,
  nonconformingPct: readonly number[],
): Verdict<{ points: CurvePoint[] }, 'not_a_plan' | 'not_a_percentage'> {
  if (!isPlan(plan)) return { ok: false, reason: 'not_a_plan' };
  if (nonconformingPct.some((pct) => !(pct >= 0 && pct <= 100)))
    return { ok: false, reason: 'not_a_percentage' };
  const points = nonconformingPct.map((pct) => ({
    nonconformingPct: pct,
    accepted: binomialAtMost(plan.sampleSize, pct / 100, plan.accept),
  }));
  return { ok: true, points, source: INDEPENDENT };
}

/**
 * The curve for one lot of so many pieces (hypergeometric, type A): a point for every whole number of bad pieces up to
 * the given one.
 *
 * @param mostNonconforming the last point, 0 to `lotSize`.
 * @example 15 pieces, 10 looked at, accept 0: with 2 bad pieces passed with a chance of 0.0952.
 */
export function operatingCharacteristicOfLot(
  plan: AcceptancePlan,
  lotSize: number,
  mostNonconforming: number,
): Verdict<{ points: CurvePoint[] }, 'not_a_plan' | 'sample_larger_than_lot' | 'nonconforming_not_in_lot'> {
  if (!isPlan(plan)) return { ok: false, reason: 'not_a_plan' };
  if (!Number.isSafeInteger(lotSize) || plan.sampleSize > lotSize)
    return { ok: false, reason: 'sample_larger_than_lot' };
  if (!Number.isSafeInteger(mostNonconforming) || mostNonconforming < 0 || mostNonconforming > lotSize)
    return { ok: false, reason: 'nonconforming_not_in_lot' };
  const points = Array.from({ length: mostNonconforming + 1 }, (_, nonconforming) => ({
    nonconformingPct: (100 * nonconforming) / lotSize,
    accepted: hypergeometricAtMost({ lotSize, nonconforming, sampleSize: plan.sampleSize }, plan.accept),
  }));
  return { ok: true, points, source: COUNTED };
}

/** The usual points: what the producer can rely on (95 % pass), and what the buyer is protected from (10 % pass). */
export const PRODUCER_POINT = 0.95;
export const LOT_TOLERANCE_POINT = 0.1;

/**
 * The quality that a plan passes with a given chance, for a steady stream of lots.
 *
 * @param accepted the chance, over 0 and under 1: `PRODUCER_POINT`, `LOT_TOLERANCE_POINT` or any other.
 * @returns percent nonconforming; refused as `not_a_plan` or `not_a_probability`.
 * @example 20 pieces, accept 0: the producer's point lies at 0.256 %, the lot tolerance at 10.875 %.
 */
export function qualityAt(
  plan: AcceptancePlan,
  accepted: number,
): Verdict<{ nonconformingPct: number }, 'not_a_plan' | 'not_a_probability'> {
  if (!isPlan(plan) || plan.accept >= plan.sampleSize) return { ok: false, reason: 'not_a_plan' };
  if (!(accepted > 0 && accepted < 1)) return { ok: false, reason: 'not_a_probability' };
  let [better, worse] = [0, 1];
  // The curve only falls, so halving finds the point to the last digit a double holds.
  for (let halving = 0; halving < 60; halving++) {
    const middle = (better + worse) / 2;
    if (binomialAtMost(plan.sampleSize, middle, plan.accept) > accepted) better = middle;
    else worse = middle;
  }
  return { ok: true, nonconformingPct: 100 * worse, source: INDEPENDENT };
}

const isPlan = ({ sampleSize, accept }: AcceptancePlan): boolean =>
  Number.isSafeInteger(sampleSize) && sampleSize > 0 && Number.isSafeInteger(accept) && accept >= 0;
