import type { HardnessTable } from '../hardness/hardness-table';
import type { Source } from '../source';

const POSTED: Source = {
  document: 'Two posted lists, ISO and SAE J417 style',
  confidence: 'read',
  certainty: 'high',
  address: 'https://bmtstrip.com/tools/hardness-converter.html',
};
const SET_AGAINST: Source = {
  document: 'Posted list, ISO and SAE J417 style, set against ASTM E140 Table 1',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'https://bmtstrip.com/tools/hardness-converter.html',
};

/** Where another published list says something else; single values only. */
export const HARDNESS_STEEL_OTHER_LIST: HardnessTable = {
  id: 'hardness-steel-other-list',
  title: 'Hardness of steel, values in which another list differs',
  edition: 'A posted list, ISO and SAE J417 style',
  material: 'non_austenitic_steel',
  readsBetweenRows: false,
  rows: [
    { HRC: 50, tensileKsi: 235, source: POSTED },
    { HRC: 40, tensileKsi: 181, source: POSTED },
    { HRC: 21, HV: 238, source: SET_AGAINST },
    { HRC: 20, HV: 228, source: SET_AGAINST },
  ],
};
