import type { Source } from '../source';
import type { Table } from '../table';

export interface RecoveryRow {
  /** Row for thinner than this; the last row has none. */
  readonly belowIn: number | null;
  readonly maxRecoveryMin: number;
}

export interface DoorRow {
  readonly maxOpenings: number;
  readonly maxOpenMin: number;
}

const AMS2770R: Source = {
  document: 'AMS2770R extract',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://sae.freestandardsdocuments.com/?p=14',
};

/** How long a furnace may take to come back to temperature with Alclad in it. */
export const CLAD_RECOVERY: Table<RecoveryRow> = {
  id: 'clad-recovery',
  title: 'Furnace recovery with Alclad',
  edition: 'AMS2770R',
  rows: [
    { belowIn: 0.125, maxRecoveryMin: 30, source: AMS2770R },
    { belowIn: null, maxRecoveryMin: 60, source: AMS2770R },
  ],
};

/** How often and how long the door may be opened while ageing; a solution soak may not be interrupted at all. */
export const AGEING_DOOR: Table<DoorRow> = {
  id: 'ageing-door',
  title: 'Door openings while ageing',
  edition: 'AMS2770R',
  rows: [{ maxOpenings: 4, maxOpenMin: 2, source: AMS2770R }],
};
