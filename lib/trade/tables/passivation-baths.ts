import type { Source } from '../source';
import type { Table } from '../table';

const A967: Source = { document: 'ASTM A967 treatments', confidence: 'memory', certainty: 'high' };

/** One bath of ASTM A967. */
export interface PassivationBathRow {
  readonly acid: 'nitric' | 'citric';
  readonly number: number;
  readonly percent: readonly [number, number];
  readonly dichromatePercent?: number;
  readonly rangeF: readonly [number, number];
  readonly leastMin: number;
  readonly saltSprayHours: number;
}

/** Practice C, where it is asked for. */
const TESTED = { saltSprayHours: 2, source: A967 } as const;

export const PASSIVATION_BATHS: Table<PassivationBathRow> = {
  id: 'passivation-baths',
  title: 'Passivation baths of stainless steel',
  edition: 'ASTM A967',
  rows: [
    {
      acid: 'nitric',
      number: 1,
      percent: [20, 25],
      dichromatePercent: 2.5,
      rangeF: [120, 130],
      leastMin: 20,
      ...TESTED,
    },
    { acid: 'nitric', number: 2, percent: [20, 45], rangeF: [70, 90], leastMin: 30, ...TESTED },
    { acid: 'nitric', number: 3, percent: [20, 25], rangeF: [120, 140], leastMin: 20, ...TESTED },
    { acid: 'nitric', number: 4, percent: [45, 55], rangeF: [120, 130], leastMin: 30, ...TESTED },
    { acid: 'citric', number: 1, percent: [4, 10], rangeF: [140, 160], leastMin: 4, ...TESTED },
    { acid: 'citric', number: 2, percent: [4, 10], rangeF: [120, 140], leastMin: 10, ...TESTED },
    { acid: 'citric', number: 3, percent: [4, 10], rangeF: [70, 120], leastMin: 20, ...TESTED },
  ],
};
