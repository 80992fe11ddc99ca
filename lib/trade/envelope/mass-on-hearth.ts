import type { Source } from '../source';
import type { Verdict } from '../verdict';

const ADDED: Source = { document: 'Masses added up', confidence: 'computed', certainty: 'high' };

/**
 * The mass of a load against what the hearth, hoist or tank carries.
 *
 * @param lines kilograms of one piece, and whole pieces; fixtures and baskets are lines like any other.
 * @param limitKg what the equipment carries, over 0.
 * @returns the total, what is left (negative where too much), and whether it is within; refused as
 *   `mass_not_positive`, `pieces_not_whole` or `limit_not_positive`.
 * @example 40 pieces of 2.5 kg and a basket of 30 kg on 150 kg: 130 kg, 20 kg left.
 */
export function massOnHearth(
  lines: readonly { massKg: number; pieces: number }[],
  limitKg: number,
): Verdict<
  { totalKg: number; leftKg: number; within: boolean },
  'mass_not_positive' | 'pieces_not_whole' | 'limit_not_positive'
> {
  if (!(limitKg > 0)) return { ok: false, reason: 'limit_not_positive' };
  if (lines.some(({ massKg }) => !(massKg > 0 && massKg < Infinity)))
    return { ok: false, reason: 'mass_not_positive' };
  if (lines.some(({ pieces }) => !Number.isSafeInteger(pieces) || pieces < 0))
    return { ok: false, reason: 'pieces_not_whole' };
  const totalKg = lines.reduce((sum, { massKg, pieces }) => sum + massKg * pieces, 0);
  return { ok: true, totalKg, leftKg: limitKg - totalKg, within: totalKg <= limitKg, source: ADDED };
}
