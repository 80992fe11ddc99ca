import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { AgeingRow } from '../tables/ageing-cycles';
import type { StrengtheningRow } from '../tables/strengthening';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';

const MS_PER_MIN = 60_000;

/**
 * How long an alloy lies at room temperature before its natural ageing counts as complete and it is tested, and when
 * that is. Metal that was kept cold begins to count when it comes out of the cold for the last time.
 *
 * @param since when it was quenched, or came out of the cold.
 * @returns refused as `not_in_table` for alloys that never become stable: 7075, 7178 and 7050 have no such time.
 * @example naturalAgeing(AGEING_CYCLES, '2024', Monday 9:00) is 5760 min, until Friday 9:00
 */
export function naturalAgeing(
  table: Table<AgeingRow>,
  alloy: Alloy,
  since: Date,
): Verdict<{ readonly naturalMin: number; readonly endsAt: Date }, 'not_in_table'> {
  for (const { alloys, cycle, source } of table.rows)
    if (cycle.kind === 'natural' && alloys.includes(alloy)) {
      const naturalMin = minFromHours(cycle.hours);
      const endsAt = new Date(since.getTime() + naturalMin * MS_PER_MIN);
      return { ok: true, naturalMin, endsAt, source, readFrom: referenceTo(table) };
    }
  return { ok: false, reason: 'not_in_table' };
}

/**
 * Whether an alloy reaches its full strength by lying at room temperature, or only by artificial ageing.
 *
 * @example fullStrengthBy(STRENGTHENING, '7075') is artificial_ageing
 */
export function fullStrengthBy(
  table: Table<StrengtheningRow>,
  alloy: Alloy,
): Verdict<Pick<StrengtheningRow, 'fullStrengthBy'>, 'alloy_not_in_table'> {
  const row = table.rows.find(({ alloys }) => alloys.includes(alloy));
  if (!row) return { ok: false, reason: 'alloy_not_in_table' };
  return { ok: true, fullStrengthBy: row.fullStrengthBy, source: row.source, readFrom: referenceTo(table) };
}
