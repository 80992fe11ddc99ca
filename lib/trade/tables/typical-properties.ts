import type { Source } from '../source';
import type { Table } from '../table';

const PHYSICAL: Source = {
  document: 'Aluminum Association typical physical properties',
  confidence: 'read',
  certainty: 'high',
  address: 'https://tubingchina.com/Physical-Properties-of-Aluminium-Alloys.htm',
};
const DATA_PAGE: Source = {
  document: 'producer/distributor data page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://btimetals.com/aerospace_metal/aluminium_7075_tubes',
};
const HANDBOOK: Source = {
  document: 'Aluminum and its alloys (Handbook of Materials for Product Design) Table 2.16',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://123docz.net/document/2147497-handbook-of-materials-for-product-design-part-3-potx.htm',
};
const DESIGN_MANUAL: Source = {
  document: 'ASCE/AA design manual Table 4.2 as quoted',
  confidence: 'read',
  certainty: 'high',
  address: 'https://www.scribd.com/document/390430133/Aluminum-Manual-66',
};
const MECHANICAL: Source = {
  document: 'Aluminum Association typical mechanical properties',
  confidence: 'memory',
  certainty: 'high',
};

/** What is usual, never a limit. */
export interface TypicalRow {
  readonly alloy: string;
  readonly condition: string;
  readonly iacs?: number;
  readonly hb500?: number;
}

export const TYPICAL_PROPERTIES: Table<TypicalRow> = {
  id: 'typical-properties',
  title: 'Typical hardness and conductivity of aluminium alloys, no acceptance values',
  edition: 'Aluminum Association and data pages',
  rows: [
    { alloy: '2024', condition: 'O', iacs: 50, source: PHYSICAL },
    { alloy: '2024', condition: 'T3', iacs: 30, source: PHYSICAL },
    { alloy: '2024', condition: 'T4', iacs: 30, source: PHYSICAL },
    { alloy: '2024', condition: 'T6', iacs: 38, source: PHYSICAL },
    { alloy: '6061', condition: 'O', iacs: 47, source: PHYSICAL },
    { alloy: '6061', condition: 'T4', iacs: 40, source: PHYSICAL },
    { alloy: '6061', condition: 'T6', iacs: 43, source: PHYSICAL },
    { alloy: '7075', condition: 'T6', iacs: 33, hb500: 150, source: DATA_PAGE },
    { alloy: '7075', condition: 'T73', iacs: 40, source: DATA_PAGE },
    { alloy: '7075', condition: 'O', hb500: 60, source: DATA_PAGE },
    { alloy: '7178', condition: 'T6', iacs: 31, source: HANDBOOK },
    { alloy: '2014', condition: 'T6', hb500: 135, source: DESIGN_MANUAL },
    { alloy: '6061', condition: 'T6', hb500: 95, source: DESIGN_MANUAL },
    { alloy: '2024', condition: 'O', hb500: 47, source: MECHANICAL },
    { alloy: '2024', condition: 'T3', hb500: 120, source: MECHANICAL },
    { alloy: '2024', condition: 'T4', hb500: 120, source: MECHANICAL },
    { alloy: '2024', condition: 'T361', hb500: 130, source: MECHANICAL },
    { alloy: '6061', condition: 'O', hb500: 30, source: MECHANICAL },
    { alloy: '6061', condition: 'T4', hb500: 65, source: MECHANICAL },
    { alloy: '2117', condition: 'T4', hb500: 70, source: MECHANICAL },
    { alloy: '2017', condition: 'O', hb500: 45, source: MECHANICAL },
    { alloy: '2017', condition: 'T4', hb500: 105, source: MECHANICAL },
    { alloy: '7178', condition: 'O', hb500: 60, source: MECHANICAL },
    { alloy: '7178', condition: 'T6', hb500: 160, source: MECHANICAL },
  ],
};
