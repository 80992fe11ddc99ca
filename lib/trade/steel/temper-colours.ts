import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { TemperColourRow } from '../tables/temper-colours';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '../units/temperature';
import type { Verdict } from '../verdict';

export interface ColourSeen {
  readonly list: TemperColourRow['list'];
  readonly colour: string;
  readonly temperatureC: number;
  readonly source: Source;
}

/**
 * The oxide colour that polished carbon steel has reached after about an hour in air at a temperature in °C: the last
 * one of each list that covers it. Lists end where they end; a longer hold darkens at a lower temperature, and alloy
 * and stainless steel run hotter.
 *
 * Worked example: 460 °F, 237.8 °C, is straw yellow by one list and dark yellow by another.
 */
export function temperColoursAt(
  table: Table<TemperColourRow>,
  temperatureC: number,
): Verdict<
  { readonly byList: readonly ColourSeen[] },
  'colder_than_colours' | 'hotter_than_colours' | 'temperature_not_a_number'
> {
  if (!Number.isFinite(temperatureC)) return { ok: false, reason: 'temperature_not_a_number' };
  const atF = fahrenheitFromCelsius(temperatureC);
  const lists = [...new Set(table.rows.map(({ list }) => list))];
  const byList = lists.flatMap((list) => {
    const rows = table.rows.filter((row) => row.list === list);
    const isCovered = atF <= Math.max(...rows.map((row) => row.temperatureF)) + F_TOLERANCE;
    const reached = rows.filter((row) => row.temperatureF <= atF + F_TOLERANCE);
    const last = reached.reduce<(typeof rows)[number] | undefined>(
      (hottest, row) => (hottest && hottest.temperatureF > row.temperatureF ? hottest : row),
      undefined,
    );
    return isCovered && last ? [seen(last)] : [];
  });
  const [first] = byList;
  if (first) return { ok: true, byList, source: first.source, readFrom: referenceTo(table) };
  const coldest = Math.min(...table.rows.map((row) => row.temperatureF));
  return { ok: false, reason: atF < coldest ? 'colder_than_colours' : 'hotter_than_colours' };
}

/**
 * The temperatures in °C at which the lists show a colour. One name means different temperatures in different lists.
 *
 * Worked example: dark straw is 480 °F, 465 °F or 440 °F by three lists.
 */
export function temperaturesOfColour(
  table: Table<TemperColourRow>,
  colour: string,
): Verdict<{ readonly byList: readonly ColourSeen[] }, 'colour_not_in_table'> {
  const rows = table.rows.filter((row) => row.colour === colour.trim().toLowerCase());
  const [first] = rows;
  if (!first) return { ok: false, reason: 'colour_not_in_table' };
  return { ok: true, byList: rows.map(seen), source: first.source, readFrom: referenceTo(table) };
}

/** Printed steps are 10 °F; converting leaves far less than this. */
const F_TOLERANCE = 1e-6;

const seen = ({
  list,
  colour,
  temperatureF,
  source,
}: Table<TemperColourRow>['rows'][number]): ColourSeen => ({
  list,
  colour,
  temperatureC: celsiusFromFahrenheit(temperatureF),
  source,
});
