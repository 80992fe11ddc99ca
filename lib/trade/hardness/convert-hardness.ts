import { referenceTo } from '../table';
import type { Verdict } from '../verdict';
import type { ConvertibleMaterial, HardnessScale, HardnessTable } from './hardness-table';
import { readBetween, type ReadReason } from './read-between';

export interface HardnessQuestion {
  readonly material: ConvertibleMaterial | 'other';
  readonly from: HardnessScale;
  readonly value: number;
  readonly to: HardnessScale;
}

export interface ConvertedHardness {
  readonly value: number;
  /** Read on the line between two printed rows. */
  readonly isBetweenRows: boolean;
  /** One of the numbers stands in brackets in the table: outside what its own standard allows. */
  readonly isInBrackets: boolean;
  /** Always: a converted number never proves a limit that the drawing gives in another scale. */
  readonly isApproximate: true;
}

export type ConversionReason = ReadReason | 'no_table_for_material' | 'scale_means_nothing_on_aluminium';

/**
 * A hardness by one scale as a hardness by another, read from one published table (ASTM E140 and the like).
 *
 * Conversions hold for one family of material. Nothing is read for precipitation-hardening or austenitic stainless
 * steel or titanium, and Rockwell C says nothing about aluminium (T.O. 1-1A-9 para 3-225).
 * Worked example: HRC 40 in non-austenitic steel is HV 392, HBW 371.
 */
export function convertHardness(
  table: HardnessTable,
  { material, from, value, to }: HardnessQuestion,
): Verdict<ConvertedHardness, ConversionReason> {
  if (material === 'wrought_aluminium' && (from === 'HRC' || to === 'HRC'))
    return { ok: false, reason: 'scale_means_nothing_on_aluminium' };
  if (material !== table.material) return { ok: false, reason: 'no_table_for_material' };
  const reading = readBetween(table, from, value, to);
  return reading.ok ? { ...reading, isApproximate: true, readFrom: referenceTo(table) } : reading;
}
