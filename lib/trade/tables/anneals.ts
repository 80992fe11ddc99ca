import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface AnnealRow {
  readonly alloys: readonly Alloy[];
  readonly holdF: number;
  readonly hours: readonly [number, number];
  readonly coolFPerHour: number;
  readonly coolToF: number;
}

const PRODUCER: Source = {
  document: 'aluminium producer heat-treat data page (alloys 6013/6061)',
  confidence: 'read',
  certainty: 'high',
  address: 'https://it.scribd.com/document/396525084/Tratamientos-termicos-aluminio',
};

/** Full anneal: hold, cool slowly so far, then in air. */
export const ANNEALS: Table<AnnealRow> = {
  id: 'anneals',
  title: 'Full anneal of heat-treated aluminium',
  edition: 'Producer data page',
  rows: [
    { alloys: ['6013', '6061'], holdF: 775, hours: [2, 3], coolFPerHour: 50, coolToF: 500, source: PRODUCER },
  ],
};
