import { expect, test } from 'vitest';
import { linesOf } from '@/lib/evidence/layout/lines';
import type { Word } from '@/lib/evidence/page';

const rows = (left: number, top: number, pitch: number, texts: readonly string[]): Word[] =>
  texts.flatMap((text, row) =>
    text.split(' ').map((word, place, all): Word => {
      const x = left + all.slice(0, place).join(' ').length * 5 + (place > 0 ? 5 : 0);
      return {
        text: word,
        box: [x, top + row * pitch, x + word.length * 5, top + row * pitch + 8],
        confidence: 1,
      };
    }),
  );
const pageOf = (words: readonly Word[]) => ({
  number: 1,
  width: 612,
  height: 792,
  turned: 0 as const,
  origin: 'text_layer' as const,
  words,
  marks: [],
  hidden: [],
});
const textsOf = (words: readonly Word[]) =>
  linesOf(pageOf(words)).map(({ segments }) => segments.map(({ text }) => text).join(' | '));

const BODY = [
  'Cert No 1',
  'Customer PO 2',
  'Batch B-0001',
  'Part 10-200',
  'Qty 12',
  'Lot L1',
  'Signed',
  'Title',
];
const APPROVALS = ['AMS 2750', 'AMS 2759', 'AMS 2770', 'AMS 2700', 'ASTM B633', 'AS9100', 'ISO 9001'];

test('a list down the side of a page is no part of the lines beside it', () => {
  const lines = textsOf([...rows(200, 60, 14, BODY), ...rows(30, 63.5, 15.3, APPROVALS)]);
  expect(lines.slice(0, BODY.length)).toEqual(BODY);
  expect(lines.slice(BODY.length)).toEqual(APPROVALS);
});

test('columns that stand level are one body of lines', () => {
  const lines = textsOf([...rows(200, 60, 14, BODY), ...rows(30, 60, 14, APPROVALS)]);
  expect(lines[0]).toBe('AMS 2750 | Cert No 1');
});
