import type { Source } from '../source';
import type { Table } from '../table';

const NAS_410: Source = { document: 'NAS 410', confidence: 'memory', certainty: 'medium' };
const MIL_STD_410: Source = {
  document: 'MIL-STD-410E 5.1.5',
  confidence: 'read',
  certainty: 'high',
  address: 'https://nondestructivetestinginspection.emilspec.com/MIL-STD-410/page12.html',
};

export const NDT_LEVELS = ['trainee', '1_limited', '1', '2', '3', 'instructor', 'auditor'] as const;
export type NdtLevel = (typeof NDT_LEVELS)[number];

export type NdtPersonnelRow =
  | { readonly rule: 'levels'; readonly levels: readonly NdtLevel[] }
  | { readonly rule: 'approves_procedures'; readonly levels: readonly NdtLevel[] }
  /** Level 1, and level 2 on top of it. */
  | {
      readonly rule: 'training';
      readonly method: 'PT' | 'MT' | 'ET' | 'UT' | 'RT';
      readonly hours: readonly [number, number];
    }
  | { readonly rule: 'renewal'; readonly recertifyYears: number; readonly nearVisionYears: number };

export const NDT_PERSONNEL: Table<NdtPersonnelRow> = {
  id: 'ndt-personnel',
  title: 'Qualification of inspectors',
  edition: 'NAS 410 / EN 4179; MIL-STD-410E',
  rows: [
    { rule: 'levels', levels: NDT_LEVELS, source: NAS_410 },
    { rule: 'approves_procedures', levels: ['3'], source: MIL_STD_410 },
    { rule: 'training', method: 'PT', hours: [16, 16], source: NAS_410 },
    { rule: 'training', method: 'MT', hours: [16, 16], source: NAS_410 },
    { rule: 'training', method: 'ET', hours: [40, 40], source: NAS_410 },
    { rule: 'training', method: 'UT', hours: [40, 40], source: NAS_410 },
    { rule: 'training', method: 'RT', hours: [40, 40], source: NAS_410 },
    { rule: 'renewal', recertifyYears: 5, nearVisionYears: 1, source: NAS_410 },
  ],
};
