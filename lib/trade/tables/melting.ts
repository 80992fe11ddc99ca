import type { Alloy } from '../alloys/alloy';
import type { Source } from '../source';
import type { Table } from '../table';

export interface MeltingRow {
  readonly alloy: Alloy;
  /** Lower end of the melting range, where the eutectic melts. */
  readonly meltsFromF: number;
  /** How far homogenising raises it; nothing where it does not. */
  readonly homogenisingRaisesF?: readonly [number, number];
}

const DOCUMENT = 'Aluminum Association, typical melting ranges';
const PAGE: Source = {
  document: DOCUMENT,
  confidence: 'read',
  certainty: 'high',
  address: 'https://tubingchina.com/Physical-Properties-of-Aluminium-Alloys.htm',
};
const PAGE_7178: Source = {
  document: 'Material data page, onset of melting of 7178; the rise from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://www.makeitfrom.com/material-properties/7178-T76-Aluminum',
};
const MEMORY: Source = { document: DOCUMENT, confidence: 'memory', certainty: 'medium' };
const ZINC_RISE = [20, 40] as const;

/** Where wrought alloys begin to melt: what is heated further is burnt, and no treatment brings it back. */
export const MELTING: Table<MeltingRow> = {
  id: 'melting',
  title: 'Beginning of melting of wrought aluminium',
  edition: DOCUMENT,
  rows: [
    { alloy: '2014', meltsFromF: 945, source: MEMORY },
    { alloy: '2017', meltsFromF: 955, source: MEMORY },
    { alloy: '2024', meltsFromF: 935, source: PAGE },
    { alloy: '2117', meltsFromF: 1030, source: MEMORY },
    { alloy: '2219', meltsFromF: 1010, source: MEMORY },
    { alloy: '6013', meltsFromF: 1075, source: { ...MEMORY, certainty: 'low' } },
    { alloy: '6061', meltsFromF: 1080, source: PAGE },
    { alloy: '6063', meltsFromF: 1140, source: MEMORY },
    { alloy: '7050', meltsFromF: 910, homogenisingRaisesF: ZINC_RISE, source: MEMORY },
    { alloy: '7075', meltsFromF: 890, homogenisingRaisesF: ZINC_RISE, source: MEMORY },
    { alloy: '7178', meltsFromF: 890, homogenisingRaisesF: ZINC_RISE, source: PAGE_7178 },
  ],
};
