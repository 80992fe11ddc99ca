import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

export interface BritishMaterialRow {
  /** As `recogniseSpecification` writes it, without the issue. */
  readonly number: string;
  /** Null where it could not be found out what it is. */
  readonly material: string | null;
  readonly clad: boolean | null;
  readonly condition: string | null;
  readonly supersededBy: readonly string[];
  /** The nearest of today, in words; never an equivalent. */
  readonly nearest: string | null;
}

/**
 * What a British material number of the past stands for, and what is nearest to it today.
 *
 * Every answer needs an engineering approval: alloys and conditions differ, and a stronger sheet of today may not form
 * as the old one did.
 *
 * @param number `BS L72`, `DTD 390`, as `recogniseSpecification` writes it.
 * @returns refused as `not_known`, or as `not_resolved` where a number is known to exist and no more.
 * @example BS L72: clad Al-Cu-Mg-Si-Mn sheet, superseded by BS L163 and BS L164, nearest clad 2014A-T3 or T4.
 */
export function britishMaterial(
  table: Table<BritishMaterialRow>,
  number: string,
): Verdict<
  Omit<BritishMaterialRow, 'number' | 'material'> & { material: string; needsEngineeringApproval: true },
  'not_known' | 'not_resolved'
> {
  const row = table.rows.find((one) => one.number === number);
  if (!row) return { ok: false, reason: 'not_known' };
  const { material, clad, condition, supersededBy, nearest, source } = row;
  if (material === null) return { ok: false, reason: 'not_resolved', source };
  return {
    ok: true,
    material,
    clad,
    condition,
    supersededBy,
    nearest,
    needsEngineeringApproval: true,
    source,
    readFrom: referenceTo(table),
  };
}
