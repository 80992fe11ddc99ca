import type { Table } from '../table';

/** HBW is with 3000 kgf, HB500 with 500 kgf, both with the ball of 10 mm. */
export const HARDNESS_SCALES = ['HRC', 'HRB', 'HRE', 'HRA', 'HR15N', 'HV', 'HBW', 'HB500'] as const;
export type HardnessScale = (typeof HARDNESS_SCALES)[number];

/** Published conversions hold for one family of material only (ASTM E140, scope). */
export type ConvertibleMaterial = 'non_austenitic_steel' | 'wrought_aluminium';

/** One line of a conversion table: the same metal by each scale. What is not printed is not there. */
export interface HardnessRow extends Readonly<Partial<Record<HardnessScale, number>>> {
  /** Approximate tensile strength, as printed. */
  readonly tensileKsi?: number;
  /** Printed in brackets: outside what the scale's own standard allows. */
  readonly inBrackets?: readonly HardnessScale[];
}

export interface HardnessTable extends Table<HardnessRow> {
  readonly material: ConvertibleMaterial;
  /** False for single values out of a list that was not read whole: nothing can be said between them. */
  readonly readsBetweenRows: boolean;
}
