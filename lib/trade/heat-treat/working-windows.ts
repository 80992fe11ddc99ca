import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { ReworkWindowRow, RivetRow } from '../tables/holding-limits';
import type { Verdict } from '../verdict';

/**
 * How long after quench an alloy is formed or straightened at room temperature, in minutes: the shorter figure is safe.
 *
 * @returns refused as `no_figure` where the trade says no more than "several hours", as of 6061.
 * @example reworkWindow(REWORK_WINDOWS, {alloy: '7075', work: 'form'}) is 120 min
 */
export function reworkWindow(
  table: Table<ReworkWindowRow>,
  asked: { readonly alloy: Alloy; readonly work: ReworkWindowRow['work'] },
): Verdict<{ readonly withinMin: readonly [number, number] }, 'no_figure'> {
  const row = table.rows.find(
    ({ alloys, work }) => work === asked.work && (alloys === 'any' || alloys.includes(asked.alloy)),
  );
  if (!row) return { ok: false, reason: 'no_figure' };
  return { ok: true, withinMin: row.withinMin, source: row.source, readFrom: referenceTo(table) };
}

/**
 * How rivets of an alloy are kept soft: minutes from quench into the cold, days there, minutes from there to driven.
 * An alloy with a row and no figures is driven as it is received.
 *
 * @example rivetHolding(RIVET_HOLDING, '2024') is 5 min, 14 days, 10 to 20 min
 */
export function rivetHolding(
  table: Table<RivetRow>,
  alloy: Alloy,
): Verdict<Omit<RivetRow, 'alloy'> & { readonly asReceived: boolean }, 'alloy_not_in_table'> {
  const row = table.rows.find((rivet) => rivet.alloy === alloy);
  if (!row) return { ok: false, reason: 'alloy_not_in_table' };
  const { alloy: _alloy, source, ...figures } = row;
  const asReceived = figures.driveWithinMin === undefined;
  return { ok: true, ...figures, asReceived, source, readFrom: referenceTo(table) };
}
