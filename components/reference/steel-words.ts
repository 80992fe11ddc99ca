import type { SteelWindowReason } from '@/lib/trade/steel/steel-window';
import type { TemperWindowReason } from '@/lib/trade/steel/temper-window';
import type { SteelOperation, SteelWindowRow } from '@/lib/trade/tables/steel-windows';

export const OPERATIONS: Record<SteelOperation, string> = {
  normalize: 'normalize',
  anneal: 'anneal',
  austenitize: 'harden from',
  solution: 'solution treat',
};

export const QUENCHES: Record<NonNullable<SteelWindowRow['quench']>, string> = {
  oil: 'quench in oil',
  water_or_oil: 'quench in water or oil',
  oil_or_water_by_section: 'quench in oil, or water by section',
  air_or_oil: 'cool in air or oil',
};

const REFUSALS: Record<SteelWindowReason | TemperWindowReason, string> = {
  steel_not_in_table: 'The tables have no tempering of this steel.',
  operation_not_in_table: 'Not in the tables.',
  sources_have_no_overlap: 'The documents differ so far that no temperature suits them all.',
  range_upside_down: 'The least strength is over the most. Enter them the other way round.',
  weaker_than_table: 'Weaker than the table goes. Nothing is read outside it.',
  stronger_than_table: 'Stronger than the table goes. Nothing is read outside it.',
  strength_between_tables: 'The tables have no line through this range of strength.',
};

export const steelRefusal = (reason: SteelWindowReason | TemperWindowReason): string => REFUSALS[reason];
