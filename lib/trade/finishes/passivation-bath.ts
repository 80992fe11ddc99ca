import { referenceTo, type Table } from '../table';
import type { PassivationBathRow } from '../tables/passivation-baths';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';

export interface PassivationBath {
  readonly percent: readonly [number, number];
  readonly dichromatePercent?: number;
  readonly temperatureCMin: number;
  readonly temperatureCMax: number;
  readonly leastMin: number;
  /** Where practice C is asked for. */
  readonly saltSprayHours: number;
}

/**
 * A bath of ASTM A967: acid in percent, temperature in °C, least time in minutes.
 *
 * Worked example: nitric 2 is 20 to 45 %, 70 to 90 °F, 21.1 to 32.2 °C, 30 min.
 */
export function passivationBath(
  table: Table<PassivationBathRow>,
  asked: { readonly acid: PassivationBathRow['acid']; readonly number: number },
): Verdict<PassivationBath, 'bath_not_in_table'> {
  const row = table.rows.find(({ acid, number }) => acid === asked.acid && number === asked.number);
  if (!row) return { ok: false, reason: 'bath_not_in_table' };
  const { percent, dichromatePercent, rangeF, leastMin, saltSprayHours, source } = row;
  return {
    ok: true,
    percent,
    ...(dichromatePercent !== undefined && { dichromatePercent }),
    temperatureCMin: celsiusFromFahrenheit(rangeF[0]),
    temperatureCMax: celsiusFromFahrenheit(rangeF[1]),
    leastMin,
    saltSprayHours,
    source,
    readFrom: referenceTo(table),
  };
}
