import { referenceTo, type Table } from '../table';
import type { ExposureItem, ExposureLimitRow } from '../tables/exposure-limits';
import { celsiusDifferenceFromFahrenheit, celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

export interface ExposureLimit {
  readonly temperatureCMax: number;
  readonly because: ExposureLimitRow['because'];
}

export type ExposureReason = 'item_not_in_table' | 'tempering_not_stated' | 'ageing_not_stated';

/**
 * The highest temperature in °C that a finished or treated part may see afterwards.
 *
 * Where the limit hangs on what the part was tempered or aged at, that temperature is needed, in °C.
 * Worked examples: an unpainted conversion coating, 140 °F, 60 °C; steel tempered at 425 °F, 375 °F, 190.6 °C.
 */
export function exposureLimit(
  table: Table<ExposureLimitRow>,
  asked: {
    readonly item: ExposureItem;
    readonly temperedAtC?: number | undefined;
    readonly agedAtC?: number | undefined;
  },
): Verdict<ExposureLimit, ExposureReason> {
  const row = table.rows.find(({ item }) => item === asked.item);
  if (!row) return { ok: false, reason: 'item_not_in_table' };
  const grounds = { because: row.because, source: row.source, readFrom: referenceTo(table) };
  if (row.limit === 'below_its_ageing')
    return asked.agedAtC === undefined
      ? { ok: false, reason: 'ageing_not_stated', source: row.source }
      : { ok: true, temperatureCMax: asked.agedAtC, ...grounds };
  if ('mostF' in row.limit)
    return { ok: true, temperatureCMax: celsiusFromFahrenheit(row.limit.mostF), ...grounds };
  if (asked.temperedAtC === undefined)
    return { ok: false, reason: 'tempering_not_stated', source: row.source };
  const temperatureCMax = asked.temperedAtC - celsiusDifferenceFromFahrenheit(row.limit.belowTemperF);
  return { ok: true, temperatureCMax, ...grounds };
}
