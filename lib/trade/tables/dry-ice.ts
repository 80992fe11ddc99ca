import type { Source } from '../source';
import type { Table } from '../table';

export interface DryIceRow {
  readonly surfaceC: number;
  /** Lost in a day from a well insulated box. */
  readonly lossLbPerDay: readonly [number, number];
  readonly unNumber: string;
  readonly packingInstruction: string;
  readonly mustVent: true;
  readonly maxKgByAir: number;
  readonly maxLbByUsAirMail: number;
}

const FACT_SHEETS: Source = {
  document: 'Dry ice transport fact sheets of carriers; packing instruction 954',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://paperzz.com/doc/7403505/dry-ice-shipping-fact-sheet',
};

/** Quenched parts on the road: how much ice, and what carriers ask. Ground rules are lighter and differ by country. */
export const DRY_ICE: Table<DryIceRow> = {
  id: 'dry-ice',
  title: 'Dry ice with parts in transit',
  edition: 'Carriers’ fact sheets',
  rows: [
    {
      surfaceC: -78,
      lossLbPerDay: [5, 10],
      unNumber: 'UN1845',
      packingInstruction: '954',
      mustVent: true,
      maxKgByAir: 200,
      maxLbByUsAirMail: 5,
      source: FACT_SHEETS,
    },
  ],
};
