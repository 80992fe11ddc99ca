import { referenceTo, type Table } from '../table';
import type { T73LotRow } from '../tables/t73-lot-rule';
import { mpaFromKsi } from '../units/stress';
import type { Verdict } from '../verdict';

/**
 * Whether a lot of 7075-T73 is accepted by its conductivity in % IACS, with yield strengths in MPa.
 *
 * Between the two limits the yield strength must not be far above its minimum: a lot that is too strong was aged too
 * short to resist stress corrosion.
 * Worked example: 39 % IACS with a yield strength 10 ksi (68.9 MPa) above the minimum is accepted, with 13 ksi not.
 */
export function judgeT73Lot(
  table: Table<T73LotRow>,
  lot: { readonly percentIacs: number; readonly yieldMpa?: number; readonly yieldMpaMin?: number },
): Verdict<
  { readonly isAccepted: boolean },
  'value_not_a_number' | 'yield_not_stated' | 'rule_not_in_table'
> {
  const [rule] = table.rows;
  if (!rule) return { ok: false, reason: 'rule_not_in_table' };
  const grounds = { source: rule.source, readFrom: referenceTo(table) };
  if (!Number.isFinite(lot.percentIacs))
    return { ok: false, reason: 'value_not_a_number', source: rule.source };
  if (lot.percentIacs >= rule.acceptFromIacs - TOLERANCE) return { ok: true, isAccepted: true, ...grounds };
  if (lot.percentIacs < rule.conditionalFromIacs - TOLERANCE)
    return { ok: true, isAccepted: false, ...grounds };
  if (lot.yieldMpa === undefined || lot.yieldMpaMin === undefined)
    return { ok: false, reason: 'yield_not_stated', source: rule.source };
  const over = lot.yieldMpa - lot.yieldMpaMin;
  return { ok: true, isAccepted: over <= mpaFromKsi(rule.yieldOverMinimumKsi) + TOLERANCE, ...grounds };
}

/** Far below the printed steps, far above what converting leaves. */
const TOLERANCE = 1e-6;
