import type { QuenchDelay } from './quench-delay';

/** The moments between which the delay runs; others, such as the door standing open, are not asked for. */
export type QuenchMoments = { readonly lastPartUnderAt: Date } & (
  | { readonly medium: 'air'; readonly doorBeginsToOpenAt: Date }
  | { readonly medium: 'salt'; readonly firstPartLeavesSaltAt: Date }
);

export type QuenchStanding = 'in_time' | 'late_but_hot_enough' | 'late' | 'moments_out_of_order';

/**
 * Whether a load was quenched in time. The delay runs from the furnace door beginning to open, or from the first part
 * leaving the salt, until the last part of the load is under; it may be exceeded while the load is still hot enough.
 *
 * @param limit what `quenchDelay` answered.
 * @param coldestC coldest metal of the load as it was quenched, °C, where it was measured.
 * @example checkQuench({maxDelayS: 10, …}, {medium: 'air', doorBeginsToOpenAt: 0 s, lastPartUnderAt: 11 s}) is late
 */
export function checkQuench(
  limit: QuenchDelay,
  moments: QuenchMoments,
  coldestC: number | null,
): { readonly standing: QuenchStanding; readonly delayS: number } {
  const began = moments.medium === 'air' ? moments.doorBeginsToOpenAt : moments.firstPartLeavesSaltAt;
  const delayS = (moments.lastPartUnderAt.getTime() - began.getTime()) / 1000;
  return { standing: standingOf(limit, delayS, coldestC), delayS };
}

function standingOf(
  { maxDelayS, lateAboveC }: QuenchDelay,
  delayS: number,
  coldestC: number | null,
): QuenchStanding {
  if (!(delayS >= 0)) return 'moments_out_of_order';
  if (delayS <= maxDelayS) return 'in_time';
  return coldestC !== null && lateAboveC !== null && coldestC > lateAboveC ? 'late_but_hot_enough' : 'late';
}
