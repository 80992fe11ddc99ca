import type { HardnessTable } from '../hardness/hardness-table';
import type { Source } from '../source';

const RECALLED: Source = {
  document: 'ASTM E140 wrought-aluminium table',
  confidence: 'memory',
  certainty: 'low',
};

export const HARDNESS_ALUMINIUM: HardnessTable = {
  id: 'hardness-aluminium',
  title: 'Hardness of wrought aluminium',
  edition: 'ASTM E140, table for wrought aluminium',
  material: 'wrought_aluminium',
  readsBetweenRows: true,
  rows: [
    { HB500: 160, HV: 189, HRB: 91, source: RECALLED },
    { HB500: 155, HV: 183, HRB: 90, source: RECALLED },
    { HB500: 150, HV: 177, HRB: 89, source: RECALLED },
    { HB500: 145, HV: 171, HRB: 87, source: RECALLED },
    { HB500: 140, HV: 165, HRB: 86, source: RECALLED },
    { HB500: 135, HV: 159, HRB: 84, source: RECALLED },
    { HB500: 130, HV: 153, HRB: 81, source: RECALLED },
    { HB500: 125, HV: 147, HRB: 79, source: RECALLED },
    { HB500: 120, HV: 141, HRB: 76, HRE: 101, source: RECALLED },
    { HB500: 115, HV: 135, HRB: 72, HRE: 100, source: RECALLED },
    { HB500: 110, HV: 129, HRB: 69, HRE: 99, source: RECALLED },
    { HB500: 105, HV: 123, HRB: 65, HRE: 98, source: RECALLED },
    { HB500: 100, HV: 117, HRB: 60, source: RECALLED },
    { HB500: 95, HV: 111, HRB: 56, HRE: 96, source: RECALLED },
    { HB500: 90, HV: 105, HRB: 51, HRE: 94, source: RECALLED },
    { HB500: 85, HV: 98, HRB: 46, HRE: 91, source: RECALLED },
    { HB500: 80, HV: 92, HRB: 40, HRE: 88, source: RECALLED },
    { HB500: 75, HV: 86, HRB: 34, HRE: 84, source: RECALLED },
    { HB500: 70, HV: 80, HRB: 28, HRE: 80, source: RECALLED },
    { HB500: 65, HV: 74, HRE: 75, source: RECALLED },
    { HB500: 60, HV: 68, HRE: 70, source: RECALLED },
    { HB500: 55, HV: 62, HRE: 65, source: RECALLED },
    { HB500: 50, HV: 56, HRE: 59, source: RECALLED },
    { HB500: 45, HV: 50, HRE: 53, source: RECALLED },
    { HB500: 40, HV: 44, HRE: 46, source: RECALLED },
  ],
};
