import { referenceTo, type Table } from '../table';
import { mmFromInches } from '../units/length';
import { celsiusDifferenceFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

/** How many places an older survey asks for in an air furnace, by its working volume. */
export interface SurveyLocationRow {
  readonly atLeast: number;
  readonly onePerFt3: number;
  /** Furnace and load are to be controllable so near to the range asked for, in °F as printed. */
  readonly controlWithinF: number;
}

const M3_PER_FT3 = (mmFromInches(12) / 1000) ** 3;

/**
 * Places to measure in a uniformity survey of an air furnace, by the older rule: the corners and the centre, and one
 * more for each so many cubic feet. A part of such a volume counts as a whole one, so that there are never too few. The same rule says how near the furnace must be held to the range asked for.
 *
 * @param volumeM3 working volume, over 0.
 * @returns refused as `volume_not_positive` or `table_empty`.
 * @example 1 m³ is 35.3 ft³: 9 places and 2 more; held within 2.8 °C (5 °F) of the range.
 */
export function surveyLocations(
  table: Table<SurveyLocationRow>,
  volumeM3: number,
): Verdict<{ locations: number; controlWithinC: number }, 'volume_not_positive' | 'table_empty'> {
  const [row] = table.rows;
  if (!row) return { ok: false, reason: 'table_empty' };
  if (!(volumeM3 > 0 && volumeM3 < Infinity))
    return { ok: false, reason: 'volume_not_positive', source: row.source };
  const more = Math.ceil(volumeM3 / M3_PER_FT3 / row.onePerFt3 - 1e-9);
  return {
    ok: true,
    locations: row.atLeast + more,
    controlWithinC: celsiusDifferenceFromFahrenheit(row.controlWithinF),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
