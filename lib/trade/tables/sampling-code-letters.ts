import type { CodeLetterRow } from '../sampling/code-letter';
import type { Source } from '../source';
import type { Table } from '../table';

const TABLE_I: Source = {
  document: 'MIL-STD-105E Table I',
  confidence: 'read+memory',
  certainty: 'high',
  address: 'http://www.nibs.org/FMOC/DPW_AC/AC-TABLE.ASC',
};

/** Lot size and inspection level to the code letter of the sample. */
export const CODE_LETTERS: Table<CodeLetterRow> = {
  id: 'sampling-code-letters',
  title: 'Sample size code letters',
  edition: 'MIL-STD-105E (10 May 1989) Table I',
  rows: [
    {
      lotFrom: 2,
      lotTo: 8,
      letters: { S1: 'A', S2: 'A', S3: 'A', S4: 'A', I: 'A', II: 'A', III: 'B' },
      source: TABLE_I,
    },
    {
      lotFrom: 9,
      lotTo: 15,
      letters: { S1: 'A', S2: 'A', S3: 'A', S4: 'A', I: 'A', II: 'B', III: 'C' },
      source: TABLE_I,
    },
    {
      lotFrom: 16,
      lotTo: 25,
      letters: { S1: 'A', S2: 'A', S3: 'B', S4: 'B', I: 'B', II: 'C', III: 'D' },
      source: TABLE_I,
    },
    {
      lotFrom: 26,
      lotTo: 50,
      letters: { S1: 'A', S2: 'B', S3: 'B', S4: 'C', I: 'C', II: 'D', III: 'E' },
      source: TABLE_I,
    },
    {
      lotFrom: 51,
      lotTo: 90,
      letters: { S1: 'B', S2: 'B', S3: 'C', S4: 'C', I: 'C', II: 'E', III: 'F' },
      source: TABLE_I,
    },
    {
      lotFrom: 91,
      lotTo: 150,
      letters: { S1: 'B', S2: 'B', S3: 'C', S4: 'D', I: 'D', II: 'F', III: 'G' },
      source: TABLE_I,
    },
    {
      lotFrom: 151,
      lotTo: 280,
      letters: { S1: 'B', S2: 'C', S3: 'D', S4: 'E', I: 'E', II: 'G', III: 'H' },
      source: TABLE_I,
    },
    {
      lotFrom: 281,
      lotTo: 500,
      letters: { S1: 'B', S2: 'C', S3: 'D', S4: 'E', I: 'F', II: 'H', III: 'J' },
      source: TABLE_I,
    },
    {
      lotFrom: 501,
      lotTo: 1200,
      letters: { S1: 'C', S2: 'C', S3: 'E', S4: 'F', I: 'G', II: 'J', III: 'K' },
      source: TABLE_I,
    },
    {
      lotFrom: 1201,
      lotTo: 3200,
      letters: { S1: 'C', S2: 'D', S3: 'E', S4: 'G', I: 'H', II: 'K', III: 'L' },
      source: TABLE_I,
    },
    {
      lotFrom: 3201,
      lotTo: 10000,
      letters: { S1: 'C', S2: 'D', S3: 'F', S4: 'G', I: 'J', II: 'L', III: 'M' },
      source: TABLE_I,
    },
    {
      lotFrom: 10001,
      lotTo: 35000,
      letters: { S1: 'C', S2: 'D', S3: 'F', S4: 'H', I: 'K', II: 'M', III: 'N' },
      source: TABLE_I,
    },
    {
      lotFrom: 35001,
      lotTo: 150000,
      letters: { S1: 'D', S2: 'E', S3: 'G', S4: 'J', I: 'L', II: 'N', III: 'P' },
      source: TABLE_I,
    },
    {
      lotFrom: 150001,
      lotTo: 500000,
      letters: { S1: 'D', S2: 'E', S3: 'G', S4: 'J', I: 'M', II: 'P', III: 'Q' },
      source: TABLE_I,
    },
    {
      lotFrom: 500001,
      lotTo: null,
      letters: { S1: 'D', S2: 'E', S3: 'H', S4: 'K', I: 'N', II: 'Q', III: 'R' },
      source: TABLE_I,
    },
  ],
};
