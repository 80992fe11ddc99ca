import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

export const FURNACE_CLASSES = [1, 2, 3, 4, 5, 6] as const;
export type FurnaceClass = (typeof FURNACE_CLASSES)[number];

/** Uniformity of a furnace class, plus and minus, in both scales as printed: they are no exact conversions. */
export interface FurnaceClassRow {
  readonly class: FurnaceClass;
  readonly toleranceF: number;
  readonly toleranceC: number;
}

/**
 * The uniformity that a furnace class stands for.
 *
 * @returns plus and minus degrees, as printed in each scale; refused as `class_not_in_table`.
 * @example class 2 is ±6 °C, printed ±10 °F.
 */
export function furnaceClass(
  table: Table<FurnaceClassRow>,
  asked: FurnaceClass,
): Verdict<{ toleranceC: number; toleranceF: number }, 'class_not_in_table'> {
  const row = table.rows.find((one) => one.class === asked);
  if (!row) return { ok: false, reason: 'class_not_in_table' };
  const { toleranceC, toleranceF, source } = row;
  return { ok: true, toleranceC, toleranceF, source, readFrom: referenceTo(table) };
}

/**
 * The loosest class that is as uniform as asked. The limit is compared in the scale in which it was given, since the
 * two printed columns are rounded apart: ±10 °F is class 2, although 6 °C is a little more than 10 °F.
 *
 * @param asked plus and minus so many degrees, over 0.
 * @returns the class; refused as `tolerance_not_positive`, or as `tighter_than_table` where no class is uniform enough.
 * @example ±10 °F is class 2, ±8 °C class 3.
 */
export function loosestClassWithin(
  table: Table<FurnaceClassRow>,
  asked: { tolerance: number; scale: 'F' | 'C' },
): Verdict<{ class: FurnaceClass }, 'tolerance_not_positive' | 'tighter_than_table'> {
  if (!(asked.tolerance > 0)) return { ok: false, reason: 'tolerance_not_positive' };
  const toleranceOf = (row: FurnaceClassRow) => (asked.scale === 'F' ? row.toleranceF : row.toleranceC);
  const within = table.rows.filter((row) => toleranceOf(row) <= asked.tolerance + SAME_DEGREE);
  const [loosest] = within.toSorted((one, other) => toleranceOf(other) - toleranceOf(one));
  if (!loosest) return { ok: false, reason: 'tighter_than_table' };
  return { ok: true, class: loosest.class, source: loosest.source, readFrom: referenceTo(table) };
}

/** ±10 °F that was kept as a difference in °C and comes back a last bit below 10. */
const SAME_DEGREE = 1e-9;
