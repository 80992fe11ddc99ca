import type { Strength } from '@/lib/trade/steel/bake-hours-by-strength';
import { mpaFromKsi } from '@/lib/trade/units/stress';

const NUMBER = String.raw`(\d{1,4}(?:\.\d+)?)`;
const RANGE = String.raw`${NUMBER}(?:\s*(?:to|-|–|\/)\s*${NUMBER})?`;
const TENSILE = new RegExp(String.raw`${RANGE}\s*(ksi|MPa)\b`, 'i');
const HARDNESS = new RegExp(String.raw`(?:HRC|RC|Rockwell\s*C)\s*${RANGE}|${RANGE}\s*(?:HRC|RC)\b`, 'i');

/**
 * The highest strength that a condition of steel names: `160 to 180 ksi` is 180 ksi, `HRC 36-40` is HRC 40.
 *
 * A range is asked for because a part may come out at its upper end. A single figure, and `min`, say only the least:
 * then nothing is known of the highest, and the answer is empty.
 */
export function strengthOf(condition: string): Strength {
  const { tensileMpa, hrc } = strengthRangeOf(condition);
  return {
    ...(tensileMpa && { tensileMpa: tensileMpa[1] }),
    ...(hrc && { hrc: hrc[1] }),
  };
}

export interface StrengthRange {
  readonly tensileMpa?: readonly [number, number];
  readonly hrc?: readonly [number, number];
}

/** Both ends of the strength that a condition names: `160 to 180 ksi` in MPa, `HRC 36-40`; a single figure is no range. */
export function strengthRangeOf(condition: string): StrengthRange {
  const [, lowest, highest, unit] = TENSILE.exec(condition) ?? [];
  const [, lowBefore, before, lowBehind, behind] = HARDNESS.exec(condition) ?? [];
  const [soft, hard] = [lowBefore ?? lowBehind, before ?? behind];
  const inMpa = (typed: string) =>
    unit?.toLowerCase() === 'ksi' ? mpaFromKsi(Number(typed)) : Number(typed);
  return {
    ...(lowest !== undefined &&
      highest !== undefined && { tensileMpa: [inMpa(lowest), inMpa(highest)] as const }),
    ...(soft !== undefined && hard !== undefined && { hrc: [Number(soft), Number(hard)] as const }),
  };
}
