import type { Source } from '../source';
import type { Table } from '../table';

const HANDBOOK: Source = {
  document: 'FAA-H-8083-30, heat-treatment procedures for steels',
  confidence: 'memory',
  certainty: 'medium',
};
const HANDBOOK_UNSURE: Source = { ...HANDBOOK, certainty: 'low' };
const MIL_TABLES: Source = {
  document: 'MIL-H-6875H / AMS-H-6875, tables for steel classes B and C',
  confidence: 'memory',
  certainty: 'medium',
};
const SHEET_2: Source = { document: 'MIL-H-6875 / AMS 2759/2', confidence: 'memory', certainty: 'medium' };
const PH_PAGE: Source = {
  document: 'AMS 5643 type data page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.rockwellind.com/17-4ph-var-bar-ams-5622/',
};
const PH_SHEET: Source = { document: 'AMS 5659 / AMS 2759/3', confidence: 'memory', certainty: 'high' };

export type SteelOperation = 'normalize' | 'anneal' | 'austenitize' | 'solution';

/** The furnace range for one operation on one steel. */
export interface SteelWindowRow {
  readonly steel: string;
  readonly operation: SteelOperation;
  readonly rangeF: readonly [number, number];
  readonly quench?: 'oil' | 'water_or_oil' | 'oil_or_water_by_section' | 'air_or_oil';
  /** Only for this strength; without it for any. */
  readonly forKsi?: readonly [number, number];
  /** Cooled below this before ageing. */
  readonly coolBelowF?: number;
}

/** A single printed temperature stands as a range without width: its tolerance is the furnace's. */
export const STEEL_WINDOWS: Table<SteelWindowRow> = {
  id: 'steel-windows',
  title: 'Furnace ranges of steels',
  edition: 'Older mechanics’ handbooks, MIL-H-6875H and data pages',
  rows: [
    { steel: '4130', operation: 'normalize', rangeF: [1600, 1700], source: HANDBOOK },
    { steel: '4130', operation: 'anneal', rangeF: [1525, 1575], source: HANDBOOK },
    {
      steel: '4130',
      operation: 'austenitize',
      rangeF: [1525, 1625],
      quench: 'oil_or_water_by_section',
      source: HANDBOOK,
    },
    { steel: '4140', operation: 'normalize', rangeF: [1600, 1650], source: HANDBOOK },
    { steel: '4140', operation: 'anneal', rangeF: [1525, 1575], source: HANDBOOK },
    { steel: '4140', operation: 'austenitize', rangeF: [1525, 1575], quench: 'oil', source: HANDBOOK },
    { steel: '4340', operation: 'normalize', rangeF: [1550, 1625], source: HANDBOOK },
    { steel: '4340', operation: 'normalize', rangeF: [1600, 1700], source: MIL_TABLES },
    { steel: '4340', operation: 'anneal', rangeF: [1525, 1575], source: HANDBOOK },
    { steel: '4340', operation: 'austenitize', rangeF: [1475, 1550], quench: 'oil', source: HANDBOOK },
    {
      steel: '4340',
      operation: 'austenitize',
      rangeF: [1500, 1500],
      quench: 'oil',
      forKsi: [260, 280],
      source: MIL_TABLES,
    },
    { steel: '300M', operation: 'normalize', rangeF: [1675, 1725], source: SHEET_2 },
    { steel: '300M', operation: 'austenitize', rangeF: [1575, 1625], quench: 'oil', source: SHEET_2 },
    { steel: '8630', operation: 'normalize', rangeF: [1600, 1650], source: HANDBOOK_UNSURE },
    { steel: '8630', operation: 'anneal', rangeF: [1525, 1575], source: HANDBOOK_UNSURE },
    {
      steel: '8630',
      operation: 'austenitize',
      rangeF: [1525, 1600],
      quench: 'water_or_oil',
      source: HANDBOOK_UNSURE,
    },
    {
      steel: '17-4PH',
      operation: 'solution',
      rangeF: [1875, 1925],
      quench: 'air_or_oil',
      coolBelowF: 90,
      source: PH_PAGE,
    },
    { steel: '15-5PH', operation: 'solution', rangeF: [1875, 1925], quench: 'air_or_oil', source: PH_SHEET },
  ],
};
