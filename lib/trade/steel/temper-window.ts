import { referenceTo, type Table } from '../table';
import type { SteelTemperingRow, TemperBandRow } from '../tables/steel-tempering';
import { ksiFromMpa } from '../units/stress';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';
import { KSI_TOLERANCE } from './ksi-tolerance';

export interface TemperWindow {
  readonly temperatureCMin: number;
  readonly temperatureCMax: number;
  readonly times: 1 | 2;
  readonly hoursEach?: number;
  /** At least one end was read on the line between two printed strengths. */
  readonly isBetweenRows: boolean;
  /** The window touches temperatures at which tempering costs toughness. */
  readonly embrittlement?: TemperBandRow['says'];
}

export type TemperWindowReason =
  | 'range_upside_down'
  | 'steel_not_in_table'
  | 'weaker_than_table'
  | 'stronger_than_table'
  | 'strength_between_tables';

/**
 * The tempering window in °C for a tensile range in MPa, of a steel that was austenitized and quenched.
 *
 * A row printed for a strength range answers what lies inside it. Otherwise the weaker end gives the hotter limit and
 * the stronger end the colder one, each on a straight line between printed strengths. It is where to begin: the
 * hardness of the tempered part decides.
 * Worked example: 4130 to 150 to 180 ksi is tempered at 700 to 900 °F, 371.1 to 482.2 °C.
 */
export function temperWindow(
  tables: { readonly tempering: Table<SteelTemperingRow>; readonly bands: Table<TemperBandRow> },
  asked: { readonly steel: string; readonly tensileMpaMin: number; readonly tensileMpaMax: number },
): Verdict<TemperWindow, TemperWindowReason> {
  const lowKsi = ksiFromMpa(asked.tensileMpaMin);
  const highKsi = ksiFromMpa(asked.tensileMpaMax);
  if (!(lowKsi <= highKsi)) return { ok: false, reason: 'range_upside_down' };
  const rows = tables.tempering.rows.filter(({ steel }) => steel === asked.steel);
  const [first] = rows;
  if (!first) return { ok: false, reason: 'steel_not_in_table' };

  const grounds = { source: first.source, readFrom: referenceTo(tables.tempering) };
  const whole = rows.find(({ ksi }) => lowKsi >= ksi[0] - KSI_TOLERANCE && highKsi <= ksi[1] + KSI_TOLERANCE);
  if (whole) return { ok: true, ...windowOf(tables.bands, whole, false), ...grounds, source: whole.source };

  const points = rows.filter(({ ksi, times }) => ksi[0] === ksi[1] && times === 1);
  const cold = temperFor(points, highKsi);
  const hot = temperFor(points, lowKsi);
  if (!cold || !hot) return { ok: false, reason: whyNot(rows, lowKsi, highKsi), source: first.source };
  const row: SteelTemperingRow = { ...first, temperF: [cold.temperF, hot.temperF], times: 1 };
  return { ok: true, ...windowOf(tables.bands, row, cold.isBetweenRows || hot.isBetweenRows), ...grounds };
}

function windowOf(bands: Table<TemperBandRow>, row: SteelTemperingRow, isBetweenRows: boolean): TemperWindow {
  const [low, high] = row.temperF;
  const band = bands.rows.find(
    ({ steel, bandF }) => (steel === undefined || steel === row.steel) && low <= bandF[1] && high >= bandF[0],
  );
  return {
    temperatureCMin: celsiusFromFahrenheit(low),
    temperatureCMax: celsiusFromFahrenheit(high),
    times: row.times,
    ...(row.hoursEach !== undefined && { hoursEach: row.hoursEach }),
    isBetweenRows,
    ...(band && { embrittlement: band.says }),
  };
}

/** Weakest first in the table; stronger is tempered colder. */
function temperFor(
  points: readonly SteelTemperingRow[],
  ksi: number,
): { temperF: number; isBetweenRows: boolean } | null {
  const weaker = points.findLast((point) => point.ksi[0] <= ksi + KSI_TOLERANCE);
  const stronger = points.find((point) => point.ksi[0] >= ksi - KSI_TOLERANCE);
  if (!weaker || !stronger) return null;
  const span = stronger.ksi[0] - weaker.ksi[0];
  const share = span === 0 ? 0 : (ksi - weaker.ksi[0]) / span;
  return {
    temperF: weaker.temperF[0] + share * (stronger.temperF[0] - weaker.temperF[0]),
    isBetweenRows: span !== 0,
  };
}

function whyNot(rows: readonly SteelTemperingRow[], lowKsi: number, highKsi: number): TemperWindowReason {
  if (lowKsi < Math.min(...rows.map(({ ksi }) => ksi[0])) - KSI_TOLERANCE) return 'weaker_than_table';
  if (highKsi > Math.max(...rows.map(({ ksi }) => ksi[1])) + KSI_TOLERANCE) return 'stronger_than_table';
  return 'strength_between_tables';
}
