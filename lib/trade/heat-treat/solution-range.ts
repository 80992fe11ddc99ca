import type { Alloy } from '../alloys/alloy';
import { referenceTo, type Table } from '../table';
import type { HeatTreatForm, SolutionRow } from '../tables/solution-temperatures';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

type Span = readonly [number, number];

export interface SolutionRange {
  /** The range as printed; absent where the source gives a set point alone. */
  readonly rangeC?: Span;
  readonly setPointC?: Span;
  /** Above it the printed range holds for thin sheet alone, and metal that is not homogeneous begins to melt. */
  readonly meltingRiskAboveC?: number;
  readonly cladHighC?: number;
  /** A difference: how far the metal may be from the set point. */
  readonly holdWithinC?: number;
  readonly soakMin?: Span;
}

/**
 * The temperatures between which a wrought aluminium alloy is solution treated, in °C.
 *
 * @returns refused as `alloy_not_in_table`, or as `form_not_in_table` where the alloy stands there in other forms only.
 * @example solutionRange(SOLUTION_TEMPERATURES, {alloy: '2024', form: 'sheet'}) is 910 to 930 °F: 487.8 to 498.9 °C
 */
export function solutionRange(
  table: Table<SolutionRow>,
  material: { readonly alloy: Alloy; readonly form: HeatTreatForm },
): Verdict<SolutionRange, 'alloy_not_in_table' | 'form_not_in_table'> {
  const rows = table.rows.filter(({ alloys }) => alloys === 'any' || alloys.includes(material.alloy));
  const row = rows.find(({ forms }) => forms === 'any' || forms.includes(material.form));
  if (!row) {
    const other = rows[0];
    return other
      ? { ok: false, reason: 'form_not_in_table', source: other.source }
      : { ok: false, reason: 'alloy_not_in_table' };
  }
  return {
    ok: true,
    ...(row.rangeF && { rangeC: inCelsius(row.rangeF) }),
    ...(row.setPointF && { setPointC: inCelsius(row.setPointF) }),
    ...(row.meltingRiskAboveF && { meltingRiskAboveC: celsiusFromFahrenheit(row.meltingRiskAboveF) }),
    ...(row.cladHighF && { cladHighC: celsiusFromFahrenheit(row.cladHighF) }),
    ...(row.holdWithinF && { holdWithinC: celsiusDifferenceFromFahrenheit(row.holdWithinF) }),
    ...(row.soakMin && { soakMin: row.soakMin }),
    source: row.source,
    readFrom: referenceTo(table),
  };
}

const inCelsius = ([low, high]: Span): Span => [celsiusFromFahrenheit(low), celsiusFromFahrenheit(high)];
