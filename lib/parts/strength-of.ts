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
  const [, , tensile, unit] = TENSILE.exec(condition) ?? [];
  const [, , before, , behind] = HARDNESS.exec(condition) ?? [];
  const hardness = before ?? behind;
  return {
    ...(tensile !== undefined && {
      tensileMpa: unit?.toLowerCase() === 'ksi' ? mpaFromKsi(Number(tensile)) : Number(tensile),
    }),
    ...(hardness !== undefined && { hrc: Number(hardness) }),
  };
}
