import type { Source } from '../source';
import type { Table } from '../table';

const E1444: Source = {
  document: 'ASTM E1444 as restated by a test house',
  confidence: 'read',
  certainty: 'high',
  address: 'https://americantestingservices.com/surface-preparation-inspection-techniques/',
};

/** When a plated part is inspected by magnetic particle, by the finished plating thickness. */
export interface MagneticParticlePlatingRow {
  /** At least this thick. */
  readonly fromIn: number;
  readonly inspect: 'before_and_after' | 'before' | 'before_or_after';
}

export const MAGNETIC_PARTICLE_PLATING: Table<MagneticParticlePlatingRow> = {
  id: 'magnetic-particle-plating',
  title: 'Magnetic particle inspection of plated parts by plating thickness',
  edition: 'ASTM E1444',
  rows: [
    {
      fromIn: 0,
      inspect: 'before_or_after',
      source: { ...E1444, document: 'ASTM E1444, below 0.0008 in from memory', confidence: 'read+memory' },
    },
    { fromIn: 0.0008, inspect: 'before_and_after', source: E1444 },
    { fromIn: 0.005, inspect: 'before', source: E1444 },
  ],
};
