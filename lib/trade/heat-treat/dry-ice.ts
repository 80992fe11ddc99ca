import { referenceTo, type Table } from '../table';
import type { DryIceRow } from '../tables/dry-ice';
import { kgFromPounds } from '../units/mass';
import type { Verdict } from '../verdict';

export type DryIceCarriage = 'air_freight' | 'us_air_mail';

/**
 * How much dry ice a box needs to last a journey, and whether one package of it may go so, in kg. The box must vent, and
 * carries its number and net mass; ask the carrier.
 *
 * @param journey hours until it is opened, 0 or more.
 * @returns refused as `too_much_for_one_package` where the greater loss exceeds what the carriage allows.
 * @example dryIceFor(DRY_ICE, {hours: 24, by: 'air_freight'}) is 2.27 to 4.54 kg
 */
export function dryIceFor(
  table: Table<DryIceRow>,
  journey: { readonly hours: number; readonly by: DryIceCarriage },
): Verdict<
  Pick<DryIceRow, 'surfaceC' | 'unNumber' | 'packingInstruction' | 'mustVent'> & {
    readonly needsKg: readonly [number, number];
    readonly maxKg: number;
  },
  'not_in_table' | 'hours_negative' | 'too_much_for_one_package'
> {
  const row = table.rows[0];
  if (!row) return { ok: false, reason: 'not_in_table' };
  if (!(journey.hours >= 0)) return { ok: false, reason: 'hours_negative' };
  const days = journey.hours / 24;
  const needsKg = [
    kgFromPounds(row.lossLbPerDay[0] * days),
    kgFromPounds(row.lossLbPerDay[1] * days),
  ] as const;
  const maxKg = journey.by === 'air_freight' ? row.maxKgByAir : kgFromPounds(row.maxLbByUsAirMail);
  if (needsKg[1] > maxKg) return { ok: false, reason: 'too_much_for_one_package', source: row.source };
  const { surfaceC, unNumber, packingInstruction, mustVent, source } = row;
  return {
    ok: true,
    needsKg,
    maxKg,
    surfaceC,
    unNumber,
    packingInstruction,
    mustVent,
    source,
    readFrom: referenceTo(table),
  };
}
