import type { Verdict } from '../verdict';

import { COUNTED, hypergeometricAtMost } from './distributions';
import { LOT_TOLERANCE_POINT, qualityAt } from './operating-characteristic';
import type { LotSample } from './sample-for-lot';

/**
 * Nonconforming pieces in a lot of a rejectable quality: whole pieces, rounded down but never none, because fewer bad
 * pieces are harder to find and so never make the sample smaller than it must be.
 *
 * @example 25 % of 15 pieces are 3; 1 % of 15 is 1.
 */
export const nonconformingIn = (lotSize: number, rejectablePct: number): number =>
  // Not 14.999… where the percentage has no exact form.
  Math.max(1, Math.floor((lotSize * rejectablePct) / 100 + 1e-9));

/**
 * The smallest sample that, passed only without any nonconforming piece, lets through a lot with so many bad pieces at
 * no more than the given risk. Counted exactly, without replacement; no table is involved.
 *
 * @param lotSize pieces, whole, from 1.
 * @param nonconforming bad pieces in the lot that must not get through, 1 to `lotSize`.
 * @param riskPct chance of missing them, in percent, over 0 and under 100 (10 means 90 % confidence).
 * @returns the sample size and the exact chance that such a lot passes.
 * @example 90 pieces of which 9 bad, 10 % risk: 20 pieces, and such a lot passes with a chance of 0.0921.
 */
export function zeroAcceptanceSample({
  lotSize,
  nonconforming,
  riskPct,
}: {
  lotSize: number;
  nonconforming: number;
  riskPct: number;
}): Verdict<
  { sampleSize: number; passes: number },
  'lot_not_whole' | 'nonconforming_not_in_lot' | 'risk_not_a_percentage'
> {
  if (!Number.isSafeInteger(lotSize) || lotSize < 1) return { ok: false, reason: 'lot_not_whole' };
  if (!Number.isSafeInteger(nonconforming) || nonconforming < 1 || nonconforming > lotSize)
    return { ok: false, reason: 'nonconforming_not_in_lot' };
  if (!(riskPct > 0 && riskPct < 100)) return { ok: false, reason: 'risk_not_a_percentage' };
  let below = 0;
  let enough = lotSize - nonconforming + 1;
  const passes = (sampleSize: number) => hypergeometricAtMost({ lotSize, nonconforming, sampleSize }, 0);
  while (enough - below > 1) {
    const middle = Math.floor((below + enough) / 2);
    if (passes(middle) <= riskPct / 100 + ROUNDING) enough = middle;
    else below = middle;
  }
  return { ok: true, sampleSize: enough, passes: passes(enough), source: COUNTED };
}

/** A chance of exactly one in ten is not above ten percent because of the last bit of a sum of logarithms. */
const ROUNDING = 1e-12;

/**
 * The zero-acceptance sample that protects the buyer as a plan of the tables does: a lot as bad as the plan's lot
 * tolerance (passed with 10 %) passes this one no more often. Where the plan looks at the whole lot, so does this.
 *
 * @param plan the sample of `sampleForLot` for the same lot.
 * @returns sample size, bad pieces of the lot that is guarded against (to the nearest whole), chance that it passes.
 * @example 150 pieces at AQL 4.0, letter F with 20 pieces and accept 2: 8 pieces, accept 0.
 */
export function zeroAcceptanceInstead(
  plan: LotSample,
  lotSize: number,
): Verdict<
  { sampleSize: number; passes: number; nonconforming: number },
  'lot_not_whole' | 'nonconforming_not_in_lot' | 'risk_not_a_percentage' | 'not_a_plan' | 'not_a_probability'
> {
  const tolerated = qualityAt(plan, LOT_TOLERANCE_POINT);
  if (!tolerated.ok) return tolerated;
  const nonconforming = Math.max(1, Math.round((lotSize * tolerated.nonconformingPct) / 100));
  if (plan.wholeLot) return { ok: true, sampleSize: lotSize, passes: 0, nonconforming, source: COUNTED };
  const sample = zeroAcceptanceSample({ lotSize, nonconforming, riskPct: 100 * LOT_TOLERANCE_POINT });
  return sample.ok ? { ...sample, nonconforming } : sample;
}
