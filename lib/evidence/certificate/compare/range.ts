import type { Range } from './say';

/** Far below any printed step, far above what converting leaves. */
const SLACK = 1e-6;

/** Where a value lies beside a range whose ends belong to it; `allowance` widens both for rounding. */
export function sideOf(value: number, { min, max }: Range, allowance = 0): 'below' | 'within' | 'above' {
  if (min != null && value < min - allowance - SLACK) return 'below';
  if (max != null && value > max + allowance + SLACK) return 'above';
  return 'within';
}

/** Half of the last printed place: a value printed 17.4 may have been anything from 17.35 to 17.45. */
export function halfOfLastPlace(printed: number): number {
  const decimals = /\.(\d+)$/.exec(String(printed))?.[1]?.length ?? 0;
  return 0.5 * 10 ** -decimals;
}
