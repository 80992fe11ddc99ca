import type { ConversionReason } from '@/lib/trade/hardness/convert-hardness';
import type { HardnessScale } from '@/lib/trade/hardness/hardness-table';

export const SCALES: Record<HardnessScale, string> = {
  HRC: 'HRC',
  HRB: 'HRB',
  HRE: 'HRE',
  HRA: 'HRA',
  HR15N: 'HR15N',
  HV: 'HV',
  HBW: 'HBW, 3000 kgf',
  HB500: 'HB, 500 kgf',
};

export const MATERIALS = {
  non_austenitic_steel: 'steel, not austenitic',
  wrought_aluminium: 'wrought aluminium',
  other: 'stainless, titanium, other',
} as const;

const REFUSALS: Record<ConversionReason, string> = {
  no_table_for_material:
    'No conversion is published for this metal. Test in the scale that the drawing names.',
  scale_means_nothing_on_aluminium: 'Rockwell C says nothing about aluminium. Use HRB, HRE or Brinell.',
  value_not_a_number: 'Enter a hardness.',
  scale_not_in_table: 'The tables at hand do not have both scales together.',
  below_table: 'Softer than the table begins. Nothing is read outside it.',
  above_table: 'Harder than the table goes. Nothing is read outside it.',
  not_printed_in_list: 'The list was not read whole; between its rows nothing can be said.',
  row_out_of_order: 'The row here looks misprinted in the reprint, so it is not read.',
};

export const conversionRefusal = (reason: ConversionReason): string => REFUSALS[reason];

/** Of several refusals the one that says most: a value outside a table before a scale that is not in it. */
export function tellingRefusal(reasons: readonly ConversionReason[]): string {
  const telling = reasons.find(
    (reason) => reason !== 'scale_not_in_table' && reason !== 'no_table_for_material',
  );
  return conversionRefusal(telling ?? reasons.at(-1) ?? 'scale_not_in_table');
}
