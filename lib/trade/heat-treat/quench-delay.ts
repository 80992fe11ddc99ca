import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { QuenchDelayRow } from '../tables/quench-delays';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';
import { isBelow, printedInches } from './thickness-row';

export interface QuenchDelay {
  readonly maxDelayS: number;
  /** A later quench is good while every part of the load is still above it; null where the table allows none. */
  readonly lateAboveC: number | null;
}

/**
 * The longest time that a load may take from the furnace into the quench. The thinnest section governs, and a thickness
 * between two rows takes the thinner one, which cools faster.
 *
 * @param section thinnest section of the load in mm, more than 0.
 * @example quenchDelay(QUENCH_DELAYS, {alloy: '2024', thinnestMm: 1.6}) is 10 s, longer while above 412.8 °C
 */
export function quenchDelay(
  table: Table<QuenchDelayRow>,
  section: { readonly alloy: Alloy; readonly thinnestMm: number },
): Verdict<QuenchDelay, 'thickness_not_positive' | 'thinner_than_table'> {
  const inches = printedInches(section.thinnestMm);
  if (inches === null) return { ok: false, reason: 'thickness_not_positive' };
  const row = table.rows.findLast(({ fromIn }) => !isBelow(inches, fromIn));
  if (!row) return { ok: false, reason: 'thinner_than_table' };
  const lateAboveF = row.lateAboveByAlloyF?.[section.alloy] ?? row.lateAboveF;
  return {
    ok: true,
    maxDelayS: row.maxS,
    lateAboveC: lateAboveF === undefined ? null : celsiusFromFahrenheit(lateAboveF),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
