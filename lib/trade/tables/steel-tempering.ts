import type { Source } from '../source';
import type { Table } from '../table';

const HANDBOOK: Source = {
  document: 'FAA-H-8083-30, heat-treatment procedures for steels',
  confidence: 'memory',
  certainty: 'medium',
};
const MIL_TABLES: Source = {
  document: 'MIL-H-6875H / AMS-H-6875, tables for steel classes B and C',
  confidence: 'memory',
  certainty: 'medium',
};
const SHEET_2: Source = { document: 'MIL-H-6875 / AMS 2759/2', confidence: 'memory', certainty: 'medium' };
const PRACTICE: Source = { document: 'Steel practice', confidence: 'memory', certainty: 'medium' };

/** Which tempering gives which tensile strength. */
export interface SteelTemperingRow {
  readonly steel: string;
  /** One strength, or the range that the row is for. */
  readonly ksi: readonly [number, number];
  readonly temperF: readonly [number, number];
  /** How many times, one after the other. */
  readonly times: 1 | 2;
  readonly hoursEach?: number;
}

const point = (steel: string, ksi: number, temperF: number): Omit<SteelTemperingRow, 'hoursEach'> => ({
  steel,
  ksi: [ksi, ksi],
  temperF: [temperF, temperF],
  times: 1,
});

export const STEEL_TEMPERING: Table<SteelTemperingRow> = {
  id: 'steel-tempering',
  title: 'Tempering temperature by tensile strength',
  edition: 'Older mechanics’ handbooks and MIL-H-6875H',
  rows: [
    { ...point('4130', 125, 1050), source: HANDBOOK },
    { ...point('4130', 150, 900), source: HANDBOOK },
    { ...point('4130', 180, 700), source: HANDBOOK },
    { ...point('4130', 200, 575), source: HANDBOOK },
    { ...point('4140', 125, 1100), source: HANDBOOK },
    { ...point('4140', 150, 1025), source: HANDBOOK },
    { ...point('4140', 180, 825), source: HANDBOOK },
    { ...point('4140', 200, 675), source: HANDBOOK },
    { ...point('4340', 125, 1200), source: HANDBOOK },
    { ...point('4340', 150, 1050), source: HANDBOOK },
    { ...point('4340', 180, 950), source: HANDBOOK },
    { ...point('4340', 200, 850), source: HANDBOOK },
    { steel: '4340', ksi: [260, 280], temperF: [400, 500], times: 2, hoursEach: 2, source: MIL_TABLES },
    { steel: '300M', ksi: [280, 280], temperF: [575, 575], times: 2, hoursEach: 2, source: SHEET_2 },
    { ...point('8630', 125, 1000), source: { ...HANDBOOK, certainty: 'low' } },
  ],
};

/** Temperatures between which tempering costs toughness. */
export interface TemperBandRow {
  /** Without it, any hardened low-alloy steel. */
  readonly steel?: string;
  readonly bandF: readonly [number, number];
  readonly says: 'never' | 'avoid';
}

export const TEMPER_BANDS: Table<TemperBandRow> = {
  id: 'temper-bands',
  title: 'Tempering temperatures to keep away from',
  edition: 'AMS 2759/2 and steel practice',
  rows: [
    { steel: '300M', bandF: [600, 800], says: 'never', source: SHEET_2 },
    { bandF: [600, 800], says: 'avoid', source: PRACTICE },
  ],
};
