import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { SteelOperation, SteelWindowRow } from '../tables/steel-windows';
import { celsiusFromFahrenheit } from '../units/temperature';
import { ksiFromMpa } from '../units/stress';
import type { Verdict } from '../verdict';
import { KSI_TOLERANCE } from './ksi-tolerance';

export interface SteelWindow {
  readonly temperatureCMin: number;
  readonly temperatureCMax: number;
  readonly quench?: SteelWindowRow['quench'];
  /** Before ageing the part is cooled below this. */
  readonly coolBelowC?: number;
  /** Each document's own range; the answer is what satisfies all of them. */
  readonly bySource: readonly {
    readonly temperatureCMin: number;
    readonly temperatureCMax: number;
    readonly source: Source;
  }[];
}

export type SteelWindowReason = 'steel_not_in_table' | 'operation_not_in_table' | 'sources_have_no_overlap';

/**
 * The furnace range in °C for one operation on a steel.
 *
 * Where documents print different ranges the answer is their overlap, because it satisfies each of them. With the
 * highest tensile strength asked for, in MPa, rows for that strength are read instead of the general ones.
 * Worked example: 4130 is austenitized at 1525 to 1625 °F, 829.4 to 885.0 °C.
 */
export function steelWindow(
  table: Table<SteelWindowRow>,
  asked: { readonly steel: string; readonly operation: SteelOperation; readonly tensileMpaMax?: number },
): Verdict<SteelWindow, SteelWindowReason> {
  const ofSteel = table.rows.filter(({ steel }) => steel === asked.steel);
  if (ofSteel.length === 0) return { ok: false, reason: 'steel_not_in_table' };
  const ofOperation = ofSteel.filter(({ operation }) => operation === asked.operation);
  const special = ofOperation.filter((row) => row.forKsi && isWithin(row.forKsi, asked.tensileMpaMax));
  const rows = special.length > 0 ? special : ofOperation.filter((row) => !row.forKsi);
  const [first] = rows;
  if (!first) return { ok: false, reason: 'operation_not_in_table' };

  const lowF = Math.max(...rows.map(({ rangeF }) => rangeF[0]));
  const highF = Math.min(...rows.map(({ rangeF }) => rangeF[1]));
  if (lowF > highF) return { ok: false, reason: 'sources_have_no_overlap', source: first.source };
  return {
    ok: true,
    temperatureCMin: celsiusFromFahrenheit(lowF),
    temperatureCMax: celsiusFromFahrenheit(highF),
    ...(first.quench && { quench: first.quench }),
    ...(first.coolBelowF !== undefined && { coolBelowC: celsiusFromFahrenheit(first.coolBelowF) }),
    bySource: rows.map(({ rangeF, source }) => ({
      temperatureCMin: celsiusFromFahrenheit(rangeF[0]),
      temperatureCMax: celsiusFromFahrenheit(rangeF[1]),
      source,
    })),
    source: first.source,
    readFrom: referenceTo(table),
  };
}

const isWithin = ([low, high]: readonly [number, number], mpa: number | undefined): boolean =>
  mpa !== undefined && ksiFromMpa(mpa) >= low - KSI_TOLERANCE && ksiFromMpa(mpa) <= high + KSI_TOLERANCE;
