import type { Table } from '../table';

export type MetalSurface = 'machined' | 'ground' | 'smeared' | 'as_forged' | 'as_cast' | 'as_rolled';

/** Surfaces on which metal may have been smeared over a crack. */
export interface EtchBeforePenetrantRow {
  readonly surfaces: readonly MetalSurface[];
}

export const ETCH_BEFORE_PENETRANT: Table<EtchBeforePenetrantRow> = {
  id: 'etch-before-penetrant',
  title: 'Etch before penetrant',
  edition: 'ASTM E1417',
  rows: [
    {
      surfaces: ['machined', 'ground', 'smeared'],
      source: { document: 'ASTM E1417/E1417M', confidence: 'memory', certainty: 'high' },
    },
  ],
};
