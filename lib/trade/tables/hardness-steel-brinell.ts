import type { HardnessTable } from '../hardness/hardness-table';
import type { Source } from '../source';

const POSTED: Source = {
  document: 'SAE J417-type table as posted',
  confidence: 'read',
  certainty: 'high',
  address: 'https://cardmet.com/hardness-conversion-table/',
};

/** Not the same as ASTM E140: kept beside it. */
export const HARDNESS_STEEL_BRINELL: HardnessTable = {
  id: 'hardness-steel-brinell',
  title: 'Hardness and approximate tensile strength of steel by Brinell number, HBW 241 to 555',
  edition: 'SAE J417-type table as posted',
  material: 'non_austenitic_steel',
  readsBetweenRows: true,
  rows: [
    { HBW: 555, HRC: 54.7, tensileKsi: 298, source: POSTED },
    { HBW: 534, HRC: 53.5, tensileKsi: 288, source: POSTED },
    { HBW: 514, HRC: 52.1, tensileKsi: 274, source: POSTED },
    { HBW: 495, HRC: 51, tensileKsi: 264, source: POSTED },
    { HBW: 477, HRC: 49.6, tensileKsi: 252, source: POSTED },
    { HBW: 461, HRC: 48.5, tensileKsi: 242, source: POSTED },
    { HBW: 444, HRC: 47.1, tensileKsi: 230, source: POSTED },
    { HBW: 429, HRC: 45.7, tensileKsi: 219, source: POSTED },
    { HBW: 415, HRC: 44.5, tensileKsi: 212, source: POSTED },
    { HBW: 401, HRC: 43.1, tensileKsi: 202, source: POSTED },
    { HBW: 388, HRC: 41.8, tensileKsi: 193, source: POSTED },
    { HBW: 375, HRC: 40.4, tensileKsi: 184, source: POSTED },
    { HBW: 363, HRC: 39.1, tensileKsi: 177, source: POSTED },
    { HBW: 352, HRC: 37.9, HRB: 110, tensileKsi: 170, inBrackets: ['HRB'], source: POSTED },
    { HBW: 341, HRC: 36.6, HRB: 109, tensileKsi: 163, inBrackets: ['HRB'], source: POSTED },
    { HBW: 331, HRC: 35.5, HRB: 108.5, tensileKsi: 158, inBrackets: ['HRB'], source: POSTED },
    { HBW: 321, HRC: 34.3, HRB: 108, tensileKsi: 152, inBrackets: ['HRB'], source: POSTED },
    { HBW: 311, HRC: 33.1, HRB: 107.5, tensileKsi: 147, inBrackets: ['HRB'], source: POSTED },
    { HBW: 302, HRC: 32.1, HRB: 107, tensileKsi: 143, inBrackets: ['HRB'], source: POSTED },
    { HBW: 293, HRC: 30.9, HRB: 106, tensileKsi: 139, inBrackets: ['HRB'], source: POSTED },
    { HBW: 285, HRC: 29.9, HRB: 105.5, tensileKsi: 135, inBrackets: ['HRB'], source: POSTED },
    { HBW: 277, HRC: 28.8, HRB: 104.5, tensileKsi: 131, inBrackets: ['HRB'], source: POSTED },
    { HBW: 269, HRC: 27.6, HRB: 104, tensileKsi: 128, inBrackets: ['HRB'], source: POSTED },
    { HBW: 262, HRC: 26.6, HRB: 103, tensileKsi: 125, inBrackets: ['HRB'], source: POSTED },
    { HBW: 255, HRC: 25.4, HRB: 102, tensileKsi: 121, inBrackets: ['HRB'], source: POSTED },
    { HBW: 248, HRC: 24.2, HRB: 101, tensileKsi: 118, inBrackets: ['HRB'], source: POSTED },
    { HBW: 241, HRC: 22.8, HRB: 100, tensileKsi: 114, source: POSTED },
  ],
};
