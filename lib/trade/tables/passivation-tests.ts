import type { Source } from '../source';
import type { Table } from '../table';

const ADDRESS = 'https://xdocs.net/documents/astm-a-967-passivation-5ccb4c5dcf539';
const A967: Source = { document: 'ASTM A967 1.4', confidence: 'read', certainty: 'high', address: ADDRESS };
const A967_LETTER: Source = {
  document: 'ASTM A967 1.4; the letter of the practice from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: ADDRESS,
};

/** A way to prove a lot of passivated parts; the order names one. Others follow in the document. */
export interface PassivationTestRow {
  readonly practice: 'A' | 'B' | 'C' | 'D';
  readonly says: string;
}

export const PASSIVATION_TESTS: Table<PassivationTestRow> = {
  id: 'passivation-tests',
  title: 'Tests of passivated lots',
  edition: 'ASTM A967',
  rows: [
    { practice: 'A', says: 'water immersion', source: A967 },
    { practice: 'B', says: 'humidity', source: A967 },
    { practice: 'C', says: 'salt spray', source: A967 },
    { practice: 'D', says: 'copper sulfate', source: A967_LETTER },
  ],
};
