import { referenceTo } from '../table';
import { ksiFromMpa, mpaFromKsi } from '../units/stress';
import type { Verdict } from '../verdict';
import type { ConversionReason, ConvertedHardness } from './convert-hardness';
import type { ConvertibleMaterial, HardnessScale, HardnessTable } from './hardness-table';
import { readBetween } from './read-between';

/**
 * Approximate tensile strength in MPa of a hardness, read from one published table.
 *
 * Lists differ by up to 20 ksi at HRC 50; ask each of them (`conversionsByEachList`) before leaning on one.
 * Worked example: HRC 40 in non-austenitic steel is 182 ksi, 1254.8 MPa (ASTM A370).
 */
export function tensileFromHardness(
  table: HardnessTable,
  asked: {
    readonly material: ConvertibleMaterial | 'other';
    readonly from: HardnessScale;
    readonly value: number;
  },
): Verdict<Omit<ConvertedHardness, 'value'> & { readonly tensileMpa: number }, ConversionReason> {
  if (asked.material !== table.material) return { ok: false, reason: 'no_table_for_material' };
  const reading = readBetween(table, asked.from, asked.value, 'tensileKsi');
  if (!reading.ok) return reading;
  const { value, ...rest } = reading;
  return { ...rest, tensileMpa: mpaFromKsi(value), isApproximate: true, readFrom: referenceTo(table) };
}

/**
 * The hardness that goes with a tensile strength in MPa, approximate, read from one published table.
 *
 * Worked example: 182 ksi, 1254.8 MPa, in non-austenitic steel is HRC 40.
 */
export function hardnessFromTensile(
  table: HardnessTable,
  asked: {
    readonly material: ConvertibleMaterial | 'other';
    readonly tensileMpa: number;
    readonly to: HardnessScale;
  },
): Verdict<ConvertedHardness, ConversionReason> {
  if (asked.material !== table.material) return { ok: false, reason: 'no_table_for_material' };
  const reading = readBetween(table, 'tensileKsi', ksiFromMpa(asked.tensileMpa), asked.to);
  return reading.ok ? { ...reading, isApproximate: true, readFrom: referenceTo(table) } : reading;
}
