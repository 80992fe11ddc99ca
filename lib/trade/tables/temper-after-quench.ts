import type { Source } from '../source';
import type { Table } from '../table';

const PRACTICE: Source = { document: 'AMS 2759 practice', confidence: 'memory', certainty: 'medium' };
const FURNACE_PAGE: Source = {
  document: 'AMS 2759-type practice as restated on a furnace page',
  confidence: 'read',
  certainty: 'medium',
  address:
    'https://www.therelek.com/applications/heat-treatment-furnace-applications/tempering-furnace-applications/',
};

/** How soon after the quench tempering starts, and how long it holds. */
export interface TemperAfterQuenchRow {
  readonly startWithinHours: readonly [preferred: number, most: number];
  readonly soak?: { readonly hours: number; readonly upToIn: number; readonly hoursPerInchOver: number };
}

export const TEMPER_AFTER_QUENCH: Table<TemperAfterQuenchRow> = {
  id: 'temper-after-quench',
  title: 'Start and hold of tempering after the quench',
  edition: 'AMS 2759 practice',
  rows: [
    { startWithinHours: [4, 4], soak: { hours: 2, upToIn: 1, hoursPerInchOver: 1 }, source: FURNACE_PAGE },
    { startWithinHours: [2, 4], source: PRACTICE },
  ],
};
