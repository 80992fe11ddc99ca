import { expect, test } from 'vitest';

import {
  columnNamed,
  faultOfHeads,
  importTemplate,
  ImportRow,
  piecesIn,
  RawRow,
  serialsIn,
} from '@/lib/lots/import-row';

const row = (cells: object) =>
  ImportRow.safeParse(RawRow.parse({ part: 'FL-1', heat: 'H', pieces: '1', ...cells }));
const fields = (cells: object) => row(cells).error?.issues.map(({ path }) => path[0]) ?? [];

test.each([
  [{}, []],
  [{ pieces: '0' }, ['pieces']],
  [{ pieces: '1,000' }, ['pieces']],
  [{ pieces: '-1' }, ['pieces']],
  [{ pieces: '' }, ['pieces']],
  [{ pieces: '', serials: 'a;b' }, []],
  [{ pieces: '3', serials: 'a;b' }, ['serials']],
  [{ pieces: '2', serials: 'a;a' }, ['serials']],
  [{ part: '  ', heat: '' }, ['part', 'heat']],
  [{ madeOn: '2026-02-30' }, ['madeOn']],
])('%j: %j', (cells, wrong) => expect(fields(cells)).toEqual(wrong));

test('a list of serials is read however it is divided', () =>
  expect(serialsIn('S-1, S-2\nS-3;\t S-4\r\n\n')).toEqual(['S-1', 'S-2', 'S-3', 'S-4']));
test('pieces are counted by name where there is no figure', () =>
  expect([piecesIn({ pieces: '', serials: 'a;b' }), piecesIn({ pieces: '7', serials: '' })]).toEqual([2, 7]));
test.each([
  ['Part', 'part'],
  ['MADE_ON', 'madeOn'],
  [' made on ', 'madeOn'],
  ['Pieces', 'pieces'],
  ['colour', null],
])('the column %j is %s', (head, key) => expect(columnNamed(head)).toBe(key));
test('heads that are missing or doubled are named', () => {
  expect(faultOfHeads(['part', 'heat', 'pieces'])).toBeNull();
  expect(faultOfHeads(['part', 'heat', 'serials'])).toBeNull();
  expect(faultOfHeads(['part', 'pieces'])).toBe('The first line must name the columns. Missing: heat.');
  expect(faultOfHeads(['part', 'Part', 'heat', 'pieces'])).toBe('The column part is there twice.');
});
test('the template can be imported as it is', () => {
  const [heads = '', example = ''] = importTemplate().split('\r\n');
  expect(faultOfHeads(heads.split(','))).toBeNull();
  const cells = Object.fromEntries(
    heads.split(',').map((head, at) => [columnNamed(head), example.split(',')[at]]),
  );
  expect(row(cells).success).toBe(true);
});
