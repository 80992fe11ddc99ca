import { referenceTo, type Table } from '../table';
import type { TemperAfterQuenchRow } from '../tables/temper-after-quench';
import { inchesFromMm } from '../units/length';
import { minFromHours } from '../units/time';
import type { Verdict } from '../verdict';

export interface TemperAfterQuench {
  /** Tempering starts this soon after the quench: preferred, and at most. */
  readonly startWithinHoursPreferred: number;
  readonly startWithinHours: number;
  readonly soakMin: number;
}

/**
 * How soon after the quench a low-alloy steel is tempered, and for how long at least, by its thickness in mm.
 *
 * Where documents differ the shortest wait counts, because a part left as quenched can crack.
 * Worked example: 2 in, 50.8 mm: start within 4 h, better 2 h; hold 3 h, 180 min.
 */
export function temperAfterQuench(
  table: Table<TemperAfterQuenchRow>,
  thicknessMm: number,
): Verdict<TemperAfterQuench, 'thickness_not_positive' | 'no_soak_in_table'> {
  if (!(thicknessMm > 0)) return { ok: false, reason: 'thickness_not_positive' };
  const row = table.rows.find(({ soak }) => soak !== undefined);
  if (!row?.soak) return { ok: false, reason: 'no_soak_in_table' };
  const overIn = Math.max(0, inchesFromMm(thicknessMm) - row.soak.upToIn);
  return {
    ok: true,
    startWithinHoursPreferred: Math.min(...table.rows.map(({ startWithinHours }) => startWithinHours[0])),
    startWithinHours: Math.min(...table.rows.map(({ startWithinHours }) => startWithinHours[1])),
    soakMin: minFromHours(row.soak.hours + overIn * row.soak.hoursPerInchOver),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
