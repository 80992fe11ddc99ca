import type { Source } from '../source';
import type { Table } from '../table';

const E1417: Source = { document: 'ASTM E1417/E1417M', confidence: 'memory', certainty: 'high' };
const E1444: Source = { document: 'ASTM E1444/E1444M', confidence: 'memory', certainty: 'medium' };

/** What a word on the order chooses, and what has to be chosen. */
export interface NdtDesignationRow {
  readonly method: 'penetrant' | 'magnetic_particle';
  readonly key: 'type' | 'method' | 'level' | 'medium';
  readonly value: string;
  readonly says: string;
}

export const NDT_DESIGNATIONS: Table<NdtDesignationRow> = {
  id: 'ndt-designations',
  title: 'Types, methods, sensitivity and media',
  edition: 'ASTM E1417 and ASTM E1444',
  rows: [
    { method: 'penetrant', key: 'type', value: 'I', says: 'fluorescent', source: E1417 },
    { method: 'penetrant', key: 'type', value: 'II', says: 'visible', source: E1417 },
    { method: 'penetrant', key: 'method', value: 'A', says: 'water washable', source: E1417 },
    { method: 'penetrant', key: 'method', value: 'B', says: 'post-emulsifiable, lipophilic', source: E1417 },
    { method: 'penetrant', key: 'method', value: 'C', says: 'solvent removable', source: E1417 },
    { method: 'penetrant', key: 'method', value: 'D', says: 'post-emulsifiable, hydrophilic', source: E1417 },
    { method: 'penetrant', key: 'level', value: '1/2', says: 'very low', source: E1417 },
    { method: 'penetrant', key: 'level', value: '1', says: 'low', source: E1417 },
    { method: 'penetrant', key: 'level', value: '2', says: 'medium', source: E1417 },
    { method: 'penetrant', key: 'level', value: '3', says: 'high', source: E1417 },
    { method: 'penetrant', key: 'level', value: '4', says: 'ultra-high', source: E1417 },
    {
      method: 'magnetic_particle',
      key: 'medium',
      value: 'WET FLUORESCENT',
      says: 'wet fluorescent',
      source: E1444,
    },
    { method: 'magnetic_particle', key: 'medium', value: 'WET VISIBLE', says: 'wet visible', source: E1444 },
    { method: 'magnetic_particle', key: 'medium', value: 'DRY', says: 'dry powder', source: E1444 },
  ],
};
