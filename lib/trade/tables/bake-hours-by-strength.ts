import type { Source } from '../source';
import type { Table } from '../table';

const B850: Source = {
  document: 'ASTM B850-98 (reapproved 2009) table as posted by a plater',
  confidence: 'read',
  certainty: 'high',
  address: 'http://sonicplatinginc.com/services/baking-process/bake-chart/',
};

/** Least bake by tensile strength; HRC and ksi stand beside it as approximations. */
export interface BakeHoursRow {
  readonly mpa: readonly [number, number];
  readonly ksi: readonly [number, number];
  readonly hrc: readonly [number, number];
  readonly hours: number;
}

export const BAKE_HOURS_BY_STRENGTH: Table<BakeHoursRow> = {
  id: 'bake-hours-by-strength',
  title: 'Least hours of the relief bake by tensile strength',
  edition: 'ASTM B850-98 (reapproved 2009)',
  rows: [
    { mpa: [1001, 1100], ksi: [145, 160], hrc: [31, 33], hours: 8, source: B850 },
    { mpa: [1101, 1200], ksi: [160, 174], hrc: [33, 36], hours: 10, source: B850 },
    { mpa: [1201, 1300], ksi: [174, 189], hrc: [36, 39], hours: 12, source: B850 },
    { mpa: [1301, 1400], ksi: [189, 203], hrc: [39, 43], hours: 14, source: B850 },
    { mpa: [1401, 1500], ksi: [203, 218], hrc: [43, 45], hours: 16, source: B850 },
    { mpa: [1501, 1600], ksi: [218, 232], hrc: [45, 47], hours: 18, source: B850 },
    { mpa: [1601, 1700], ksi: [232, 247], hrc: [47, 49], hours: 20, source: B850 },
    { mpa: [1701, 1800], ksi: [247, 261], hrc: [49, 51], hours: 22, source: B850 },
  ],
};
