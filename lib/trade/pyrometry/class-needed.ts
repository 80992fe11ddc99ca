import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import type { FurnaceClass } from './furnace-class';

/** Work for which the process specifications name a furnace class. */
export const HEATED_WORK = [
  'aluminium_solution',
  'aluminium_age',
  'steel_austenitize',
  'steel_temper',
  'ph_steel_age',
] as const;
export type HeatedWork = (typeof HEATED_WORK)[number];

export interface ClassNeededRow {
  readonly work: HeatedWork;
  /** The loosest class that any of its specifications allows; the specification itself may ask for a tighter one. */
  readonly loosest: FurnaceClass;
  /** The tightest it may ask for. */
  readonly tightest: FurnaceClass;
}

/**
 * The furnace class that a kind of work usually asks for, where the order or its specification says nothing else.
 *
 * @returns a range of classes, from memory; refused as `work_not_in_table`.
 * @example solution treatment of aluminium: class 2. Tempering of steel: class 2 or 3 by its specification.
 */
export function classNeeded(
  table: Table<ClassNeededRow>,
  work: HeatedWork,
): Verdict<{ loosest: FurnaceClass; tightest: FurnaceClass }, 'work_not_in_table'> {
  const row = table.rows.find((one) => one.work === work);
  if (!row) return { ok: false, reason: 'work_not_in_table' };
  const { loosest, tightest, source } = row;
  return { ok: true, loosest, tightest, source, readFrom: referenceTo(table) };
}
