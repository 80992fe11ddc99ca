import { referenceTo, type Table } from '../table';
import type { DoorRow, RecoveryRow } from '../tables/furnace-interruptions';
import type { Verdict } from '../verdict';
import { isBelow, printedInches } from './thickness-row';

/**
 * How long the furnace may take to recover its temperature with Alclad in it, by thickness in mm.
 *
 * @example cladRecovery(CLAD_RECOVERY, 1.6) is 30 min
 */
export function cladRecovery(
  table: Table<RecoveryRow>,
  thicknessMm: number,
): Verdict<{ readonly maxRecoveryMin: number }, 'thickness_not_positive' | 'not_in_table'> {
  const inches = printedInches(thicknessMm);
  if (inches === null) return { ok: false, reason: 'thickness_not_positive' };
  const row = table.rows.find(({ belowIn }) => belowIn === null || isBelow(inches, belowIn));
  if (!row) return { ok: false, reason: 'not_in_table' };
  const { maxRecoveryMin, source } = row;
  return { ok: true, maxRecoveryMin, source, readFrom: referenceTo(table) };
}

/**
 * Whether an ageing furnace was opened no more often and no longer than allowed.
 *
 * @param openingsMin minutes of each opening.
 * @example checkAgeingDoor(AGEING_DOOR, [1, 2, 1.5]) is within
 */
export function checkAgeingDoor(
  table: Table<DoorRow>,
  openingsMin: readonly number[],
): Verdict<{ readonly standing: 'within' | 'too_often' | 'too_long' }, 'not_in_table'> {
  const row = table.rows[0];
  if (!row) return { ok: false, reason: 'not_in_table' };
  const grounds = { source: row.source, readFrom: referenceTo(table) };
  if (openingsMin.length > row.maxOpenings) return { ok: true, standing: 'too_often', ...grounds };
  const tooLong = openingsMin.some((min) => !(min <= row.maxOpenMin));
  return { ok: true, standing: tooLong ? 'too_long' : 'within', ...grounds };
}
