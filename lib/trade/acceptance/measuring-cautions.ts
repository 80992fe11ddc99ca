import type { Source } from '../source';
import type { Table } from '../table';
import type { MeasuringRuleRow } from '../tables/measuring-rules';
import { inchesFromMm } from '../units/length';

export interface Measurement {
  readonly alloy: string;
  readonly condition: string;
  readonly isClad: boolean;
  readonly thicknessMm?: number;
  /** Paint or anodize under the probe. */
  readonly coatingMm?: number;
  /** Between probe, standards and part. */
  readonly temperatureDifferenceC?: number;
  readonly instrument?: 'indirect' | 'direct';
  readonly isBrinell?: boolean;
}

export interface MeasuringCaution {
  readonly rule: MeasuringRuleRow;
  readonly source: Source;
}

/**
 * What must be minded for one measurement of hardness and conductivity, each with its source. What is not stated
 * raises no caution, except that the pair decides, which always holds.
 *
 * Worked example: bare 7075-T6, 0.040 in thick: stack the sheet, and both readings decide together.
 */
export function measuringCautions(
  table: Table<MeasuringRuleRow>,
  measurement: Measurement,
): MeasuringCaution[] {
  return table.rows
    .filter((row) => concerns(row, measurement))
    .map((row) => ({ rule: row, source: row.source }));
}

function concerns(row: MeasuringRuleRow, made: Measurement): boolean {
  switch (row.rule) {
    case 'pair_decides':
      return true;
    case 'clad_needs_correlation':
      return made.isClad;
    case 'temperature_difference':
      return (made.temperatureDifferenceC ?? 0) > row.mostC + TOLERANCE;
    case 'lift_off_correction':
      return inchesFromMm(made.coatingMm ?? 0) > row.overIn + TOLERANCE;
    case 'stack_thin_sheet':
      return isThinner(made, row);
    case 'operator':
      return made.instrument !== undefined;
    case 'brinell':
      return made.isBrinell ?? false;
    case 'rough_tensile':
      return false;
  }
}

const isThinner = (
  made: Measurement,
  row: Extract<MeasuringRuleRow, { rule: 'stack_thin_sheet' }>,
): boolean =>
  !made.isClad &&
  made.alloy === row.alloy &&
  made.condition === row.condition &&
  made.thicknessMm !== undefined &&
  inchesFromMm(made.thicknessMm) < row.leastIn - TOLERANCE;

/** Far below the printed steps, far above what converting leaves. */
const TOLERANCE = 1e-9;
