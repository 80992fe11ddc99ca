import { referenceTo, type Table } from '../table';
import type { BakeHoursRow } from '../tables/bake-hours-by-strength';
import type { Verdict } from '../verdict';

/** The highest that the part may have. */
export interface Strength {
  readonly tensileMpa?: number | undefined;
  readonly hrc?: number | undefined;
}

/**
 * Least hours of the relief bake by strength, by tensile strength in MPa where it is known, else by HRC.
 *
 * Rows are printed from 1001 to 1100 MPa and so on: what lies between two takes the stronger row, and 1000 MPa, from
 * which the practice holds, takes the first. A hardness that two rows share takes the longer bake. Above 1800 MPa and
 * HRC 51 there is no answer.
 * Worked example: 1350 MPa needs 14 h at least; HRC 45 needs 18 h.
 */
export function bakeHoursByStrength(
  table: Table<BakeHoursRow>,
  { tensileMpa, hrc }: Strength,
): Verdict<{ readonly hours: number }, 'strength_not_stated' | 'weaker_than_table' | 'stronger_than_table'> {
  const measure = tensileMpa === undefined ? 'hrc' : 'mpa';
  const value = tensileMpa ?? hrc;
  const weakestFirst = [...table.rows].sort((a, b) => a[measure][0] - b[measure][0]);
  const [weakest] = weakestFirst;
  if (value === undefined || !Number.isFinite(value) || !weakest)
    return { ok: false, reason: 'strength_not_stated' };
  const least = measure === 'mpa' ? weakest.mpa[0] - PRINTED_GAP_MPA : weakest.hrc[0];
  if (value < least - TOLERANCE) return { ok: false, reason: 'weaker_than_table', source: weakest.source };
  const row =
    measure === 'mpa'
      ? weakestFirst.find(({ mpa }) => value <= mpa[1] + TOLERANCE)
      : weakestFirst.findLast(
          (candidate) => value >= candidate.hrc[0] - TOLERANCE && value <= candidate.hrc[1] + TOLERANCE,
        );
  if (!row) return { ok: false, reason: 'stronger_than_table', source: weakest.source };
  return { ok: true, hours: row.hours, source: row.source, readFrom: referenceTo(table) };
}

const PRINTED_GAP_MPA = 1;
/** Far below the printed steps, far above what converting leaves. */
const TOLERANCE = 1e-6;
