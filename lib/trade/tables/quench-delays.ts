import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface QuenchDelayRow {
  /** Thinnest section of the row: between two rows the shorter time is the safe one. */
  readonly fromIn: number;
  readonly maxS: number;
  /** A late quench is good while the load is still hotter; with the alloys that have a figure of their own. */
  readonly lateAboveF?: number;
  readonly lateAboveByAlloyF?: Readonly<Partial<Record<Alloy, number>>>;
}

const DOCUMENT = 'MIL-H-6088G table of maximum quench delay; T.O. 1-1A-9 Table 3-10 with its note';
const source: Source = {
  document: `${DOCUMENT} (the note was read, the seconds and the figure for 2219 are from memory)`,
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_166.htm',
};
const late = { lateAboveF: 775, lateAboveByAlloyF: { '2219': 900 } } as const;

/** Longest time between furnace and quench, by the thinnest section of the load. */
export const QUENCH_DELAYS: Table<QuenchDelayRow> = {
  id: 'quench-delays',
  title: 'Maximum quench delay of wrought aluminium',
  edition: DOCUMENT,
  rows: [
    { fromIn: 0, maxS: 5, ...late, source },
    { fromIn: 0.017, maxS: 7, ...late, source },
    { fromIn: 0.032, maxS: 10, ...late, source },
    { fromIn: 0.091, maxS: 15, ...late, source },
  ],
};
