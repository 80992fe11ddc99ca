import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { MeltingRow } from '../tables/melting';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

export interface OverheatingMargin {
  readonly meltsFromC: number;
  /** How far below the beginning of melting; 0 or less: the metal is burnt, and is scrap. */
  readonly marginC: number;
  /** The same for homogeneous metal, by the smallest rise that is published; equal where none is. */
  readonly homogeneousMarginC: number;
}

/**
 * How far a temperature is below the beginning of eutectic melting, in °C.
 *
 * @example overheatingMargin(MELTING, {alloy: '2024', temperatureC: 498.9}) is 2.8 °C, from 935 °F
 */
export function overheatingMargin(
  table: Table<MeltingRow>,
  metal: { readonly alloy: Alloy; readonly temperatureC: number },
): Verdict<OverheatingMargin, 'alloy_not_in_table'> {
  const row = table.rows.find(({ alloy }) => alloy === metal.alloy);
  if (!row) return { ok: false, reason: 'alloy_not_in_table' };
  const meltsFromC = celsiusFromFahrenheit(row.meltsFromF);
  const marginC = meltsFromC - metal.temperatureC;
  return {
    ok: true,
    meltsFromC,
    marginC,
    homogeneousMarginC: marginC + celsiusDifferenceFromFahrenheit(row.homogenisingRaisesF?.[0] ?? 0),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
