import type { HardnessTable } from '../hardness/hardness-table';
import type { Source } from '../source';

const RECALLED: Source = {
  document: 'ASTM E140 Table 2; tensile ASTM A370 Table 3',
  confidence: 'memory',
  certainty: 'medium',
};

export const HARDNESS_STEEL_HRB: HardnessTable = {
  id: 'hardness-steel-hrb',
  title: 'Hardness and approximate tensile strength of softer non-austenitic steel, HRB 70 to 100',
  edition: 'ASTM E140 Table 2; tensile ASTM A370 Table 3',
  material: 'non_austenitic_steel',
  readsBetweenRows: true,
  rows: [
    { HRB: 100, HV: 240, HBW: 240, tensileKsi: 116, source: RECALLED },
    { HRB: 99, HV: 234, HBW: 234, tensileKsi: 114, source: RECALLED },
    { HRB: 98, HV: 228, HBW: 228, tensileKsi: 109, source: RECALLED },
    { HRB: 97, HV: 222, HBW: 222, tensileKsi: 104, source: RECALLED },
    { HRB: 96, HV: 216, HBW: 216, tensileKsi: 102, source: RECALLED },
    { HRB: 95, HV: 210, HBW: 210, tensileKsi: 100, source: RECALLED },
    { HRB: 94, HV: 205, HBW: 205, tensileKsi: 98, source: RECALLED },
    { HRB: 93, HV: 200, HBW: 200, tensileKsi: 94, source: RECALLED },
    { HRB: 92, HV: 195, HBW: 195, tensileKsi: 92, source: RECALLED },
    { HRB: 91, HV: 190, HBW: 190, tensileKsi: 90, source: RECALLED },
    { HRB: 90, HV: 185, HBW: 185, tensileKsi: 89, source: RECALLED },
    { HRB: 89, HV: 180, HBW: 180, tensileKsi: 88, source: RECALLED },
    { HRB: 88, HV: 176, HBW: 176, tensileKsi: 86, source: RECALLED },
    { HRB: 87, HV: 172, HBW: 172, tensileKsi: 84, source: RECALLED },
    { HRB: 86, HV: 169, HBW: 169, tensileKsi: 83, source: RECALLED },
    { HRB: 85, HV: 165, HBW: 165, tensileKsi: 82, source: RECALLED },
    { HRB: 84, HV: 162, HBW: 162, tensileKsi: 81, source: RECALLED },
    { HRB: 83, HV: 159, HBW: 159, tensileKsi: 80, source: RECALLED },
    { HRB: 82, HV: 156, HBW: 156, tensileKsi: 77, source: RECALLED },
    { HRB: 81, HV: 153, HBW: 153, tensileKsi: 73, source: RECALLED },
    { HRB: 80, HV: 150, HBW: 150, tensileKsi: 72, source: RECALLED },
    { HRB: 79, HV: 147, HBW: 147, tensileKsi: 70, source: RECALLED },
    { HRB: 78, HV: 144, HBW: 144, tensileKsi: 69, source: RECALLED },
    { HRB: 77, HV: 141, HBW: 141, tensileKsi: 68, source: RECALLED },
    { HRB: 76, HV: 139, HBW: 139, tensileKsi: 67, source: RECALLED },
    { HRB: 75, HV: 137, HBW: 137, tensileKsi: 66, source: RECALLED },
    { HRB: 74, HV: 135, HBW: 135, tensileKsi: 65, source: RECALLED },
    { HRB: 73, HV: 132, HBW: 132, tensileKsi: 64, source: RECALLED },
    { HRB: 72, HV: 130, HBW: 130, tensileKsi: 63, source: RECALLED },
    { HRB: 71, HV: 127, HBW: 127, tensileKsi: 62, source: RECALLED },
    { HRB: 70, HV: 125, HBW: 125, tensileKsi: 61, source: RECALLED },
  ],
};
