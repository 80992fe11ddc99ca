import type { Source } from '../source';
import type { Table } from '../table';

export type FurnaceMedium = 'air' | 'salt';

export interface SoakTime {
  readonly minMin: number;
  /** Clad metal must be out by then. */
  readonly maxCladMin?: number;
}

export interface SoakRow {
  /** Thickest section of the row; the last row of a table that goes on has none. */
  readonly upToIn: number | null;
  readonly salt: SoakTime;
  readonly air: SoakTime;
}

const MIL = 'MIL-H-6088G soaking-time table for wrought alloys; T.O. 1-1A-9 Table 3-8';
const source: Source = { document: MIL, confidence: 'memory', certainty: 'medium' };
const HANDBOOK = 'FAA-H-8083-30 figure of typical soaking times';
const figure: Source = {
  document: `${HANDBOOK} (the figure seen referred to, its numbers from memory)`,
  confidence: 'memory',
  certainty: 'medium',
};

type Pair = readonly [minMin: number, maxCladMin: number];
const row = (upToIn: number, salt: Pair, air: Pair) => ({
  upToIn,
  salt: { minMin: salt[0], maxCladMin: salt[1] },
  air: { minMin: air[0], maxCladMin: air[1] },
  source,
});
const alike = (upToIn: number | null, minMin: number) => ({
  upToIn,
  salt: { minMin },
  air: { minMin },
  source: figure,
});

/** Soak by thickest section and medium, with the time after which clad metal has soaked too long. */
export const SOAK_TIMES: Table<SoakRow> = {
  id: 'soak-times',
  title: 'Soaking times for solution heat treatment of wrought aluminium',
  edition: MIL,
  rows: [
    row(0.016, [10, 15], [20, 25]),
    row(0.02, [10, 20], [20, 30]),
    row(0.032, [15, 25], [25, 35]),
    row(0.063, [20, 30], [30, 40]),
    row(0.09, [25, 35], [35, 45]),
    row(0.125, [30, 40], [40, 50]),
    row(0.25, [35, 45], [55, 65]),
    row(0.5, [45, 55], [65, 75]),
    row(1, [60, 70], [90, 100]),
    row(1.5, [90, 100], [120, 130]),
    row(2, [105, 115], [150, 160]),
    row(2.5, [120, 130], [180, 190]),
    row(3, [150, 160], [210, 220]),
    row(3.5, [165, 175], [240, 250]),
    row(4, [180, 190], [270, 280]),
  ],
};

/** The handbook's coarser table. It has no longest time for clad metal: the specification's is used for planning. */
export const SOAK_TIMES_HANDBOOK: Table<SoakRow> = {
  id: 'soak-times-handbook',
  title: 'Typical soaking times',
  edition: HANDBOOK,
  rows: [alike(0.032, 30), alike(0.125, 30), alike(0.25, 40), alike(null, 60)],
};
