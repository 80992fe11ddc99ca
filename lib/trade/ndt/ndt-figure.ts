import { referenceTo, type Table } from '../table';
import type { NdtFigureRow, NdtItem, NdtMethod, NdtUnit } from '../tables/ndt-figures';
import { mmFromInches } from '../units/length';
import { mpaFromKsi } from '../units/stress';
import { celsiusFromFahrenheit } from '../units/temperature';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';

export interface NdtFigure {
  readonly min?: number;
  readonly max?: number;
  readonly unit: 'min' | 's' | '°C' | 'lux' | 'µW/cm²' | 'ml/100 ml' | 'mT' | '%' | 'mm' | 'MPa' | 'count';
  readonly isAbout: boolean;
}

/** From the printed unit to the one that is answered in. */
const ANSWERED: Readonly<
  Record<NdtUnit, { readonly unit: NdtFigure['unit']; readonly from: (printed: number) => number }>
> = {
  min: { unit: 'min', from: (printed) => printed },
  h: { unit: 'min', from: minFromHours },
  s: { unit: 's', from: (printed) => printed },
  F: { unit: '°C', from: celsiusFromFahrenheit },
  lux: { unit: 'lux', from: (printed) => printed },
  'uW/cm2': { unit: 'µW/cm²', from: (printed) => printed },
  'ml/100 ml': { unit: 'ml/100 ml', from: (printed) => printed },
  // A gauss is exactly a tenth of a millitesla.
  gauss: { unit: 'mT', from: (printed) => printed / 10 },
  '%': { unit: '%', from: (printed) => printed },
  in: { unit: 'mm', from: mmFromInches },
  ksi: { unit: 'MPa', from: mpaFromKsi },
  count: { unit: 'count', from: (printed) => printed },
};

/**
 * One figure of a test method: least and most, with its unit.
 *
 * Worked example: drying before penetrant, at most 160 °F, 71.1 °C.
 */
export function ndtFigure(
  table: Table<NdtFigureRow>,
  asked: { readonly method: NdtMethod; readonly item: NdtItem },
): Verdict<NdtFigure, 'figure_not_in_table'> {
  const row = table.rows.find(({ method, item }) => method === asked.method && item === asked.item);
  if (!row) return { ok: false, reason: 'figure_not_in_table' };
  const { unit, from } = ANSWERED[row.unit];
  return {
    ok: true,
    ...(row.min !== undefined && { min: from(row.min) }),
    ...(row.max !== undefined && { max: from(row.max) }),
    unit,
    isAbout: row.isAbout ?? false,
    source: row.source,
    readFrom: referenceTo(table),
  };
}
