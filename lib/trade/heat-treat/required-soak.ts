import { referenceTo, type Table } from '../table';
import type { FurnaceMedium, SoakRow } from '../tables/soak-times';
import type { Verdict } from '../verdict';
import { isUpTo, printedInches } from './thickness-row';

export type ThicknessRefusal = 'thickness_not_positive' | 'thicker_than_table';

/**
 * How long a section soaks for solution treatment, counted from the coldest metal reaching the lowest temperature.
 *
 * The thickest section of a load governs. A thickness between two rows takes the thicker one: a short soak leaves metal
 * untreated. Clad metal also has a longest time, after which the core has spread through the cladding; it is null where
 * the table has none, and for bare metal.
 *
 * @param section thickness in mm, more than 0.
 * @example requiredSoak(SOAK_TIMES, {thicknessMm: 1.6, medium: 'air', clad: true}) is 30 min, at most 40 min
 */
export function requiredSoak(
  table: Table<SoakRow>,
  section: { readonly thicknessMm: number; readonly medium: FurnaceMedium; readonly clad: boolean },
): Verdict<{ readonly soakMin: number; readonly longestMin: number | null }, ThicknessRefusal> {
  const inches = printedInches(section.thicknessMm);
  if (inches === null) return { ok: false, reason: 'thickness_not_positive' };
  const row = table.rows.find(({ upToIn }) => upToIn === null || isUpTo(inches, upToIn));
  if (!row) {
    const last = table.rows.at(-1);
    return { ok: false, reason: 'thicker_than_table', ...(last && { source: last.source }) };
  }
  const { minMin, maxCladMin } = row[section.medium];
  return {
    ok: true,
    soakMin: minMin,
    longestMin: section.clad ? (maxCladMin ?? null) : null,
    source: row.source,
    readFrom: referenceTo(table),
  };
}
