import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { AnnealRow } from '../tables/anneals';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';

export interface AnnealCycle {
  readonly holdC: number;
  readonly holdMin: readonly [number, number];
  /** A difference for each hour. */
  readonly coolCPerHour: number;
  readonly coolToC: number;
}

/**
 * Full anneal of an alloy: hold, cool no faster than so, then in air. °C, minutes.
 *
 * @example annealCycle(ANNEALS, '6061') holds 2 to 3 h at 775 °F and cools 50 °F an hour to 500 °F, in °C and minutes
 */
export function annealCycle(
  table: Table<AnnealRow>,
  alloy: Alloy,
): Verdict<AnnealCycle, 'alloy_not_in_table'> {
  const row = table.rows.find(({ alloys }) => alloys.includes(alloy));
  if (!row) return { ok: false, reason: 'alloy_not_in_table' };
  return {
    ok: true,
    holdC: celsiusFromFahrenheit(row.holdF),
    holdMin: [minFromHours(row.hours[0]), minFromHours(row.hours[1])],
    coolCPerHour: celsiusDifferenceFromFahrenheit(row.coolFPerHour),
    coolToC: celsiusFromFahrenheit(row.coolToF),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
