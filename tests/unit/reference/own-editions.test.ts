import fc from 'fast-check';
import Papa from 'papaparse';
import { expect, test } from 'vitest';

import { PUBLISHED } from '@/lib/evidence/certificate/compare/tables';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';
import { inForce } from '@/lib/reference/in-force';
import type { Replaceable } from '@/lib/reference/replaceable';
import { REPLACEABLE } from '@/lib/reference/replaceable-tables';
import { readOwnRows } from '@/lib/reference/read-own-rows';
import { cellsOfRow, rowFromCells } from '@/lib/reference/rows-in-cells';
import type { Table } from '@/lib/trade/table';

const withoutSource = (row: object): object =>
  Object.fromEntries(Object.entries(row).filter(([key]) => key !== 'source'));
const registered = [...REPLACEABLE.values()].map((one) => [one.published.id, one] as const);

/** Every table in a group, however deep. */
function tablesIn(group: unknown): Table<unknown>[] {
  if (typeof group !== 'object' || group === null) return [];
  if ('rows' in group && 'edition' in group) return [group as Table<unknown>];
  return Object.values(group).flatMap(tablesIn);
}

test.each(registered)('%s: saved as CSV and read back, every row is the same', (_, one) => {
  const { columns, published } = one;
  const saved = Papa.unparse({
    fields: columns.map(({ head }) => head),
    data: published.rows.map((row) => cellsOfRow(columns, row)),
  });
  const [heads = [], ...cells] = Papa.parse<string[]>(saved, { skipEmptyLines: 'greedy' }).data;
  const read = readOwnRows(one, { heads, cells });
  expect(read).toMatchObject({ fault: null, ignored: [] });
  expect(read.problems.flat()).toEqual([]);
  expect(read.rows).toEqual(published.rows.map(withoutSource));
});

const table = (id: string): Replaceable => {
  const found = REPLACEABLE.get(id);
  if (!found) throw new Error(`no table ${id}`);
  return found;
};

test.each([
  ['a word for a figure', 'soak-times', { 'up to (in)': 'thin' }, /figure from 0 to 40 in/],
  ['a decimal comma', 'soak-times', { 'up to (in)': '0,5' }, /0,5 is not what stands here/],
  ['a range the wrong way round', 'anneals', { 'hours (h)': '3 to 2' }, /below the first/],
  [
    'an alloy that no table knows',
    'anneals',
    { alloys: '6061; 9999' },
    /^9999 is not what stands here.*2024, 2117/,
  ],
  ['an empty cell', 'anneals', { 'hold (°F)': '' }, /Is empty/],
  [
    'a cell of another kind of row',
    'ageing-cycles',
    { 'cycle kind': 'natural' },
    /does not belong|Is empty/i,
  ],
  ['no kind of row', 'old-names', { kind: '' }, /Is empty/],
])('%s is said at its column', (_, id, wrong, says) => {
  const { columns, row, published } = table(id);
  const cells = cellsOfRow(columns, published.rows.at(-1));
  const heads = columns.map(({ head }) => head);
  for (const [head, text] of Object.entries(wrong)) cells[heads.indexOf(head)] = text;
  const found = rowFromCells(columns, row, cells);
  expect(found.ok).toBe(false);
  const [problem] = found.ok ? [] : found.problems;
  expect(problem?.message).toMatch(says);
  expect(heads).toContain(problem?.column);
});

test.each(registered)('%s: each column has a name of its own', (_, { columns }) => {
  const heads = columns.map(({ head }) => head);
  expect(new Set(heads).size).toBe(heads.length);
});

test('a shop may replace every table that parts, batches and certificates are answered from', () => {
  const used = tablesIn([BATCH_TABLES, PUBLISHED]).map(({ id }) => id);
  expect([...REPLACEABLE.keys()].toSorted()).toEqual([...new Set(used)].toSorted());
});

const someIds = fc.subarray([...REPLACEABLE.keys()]);

test('exactly the tables that a shop entered are its own; each row names the table and edition it stands in', () =>
  fc.assert(
    fc.property(someIds, (ids) => {
      const own = new Map(
        ids.map((id) => {
          const { rows = [] } = REPLACEABLE.get(id)?.published ?? {};
          return [id, { edition: `own ${id}`, entry: 'entered', rows: rows.slice(0, 1) }];
        }),
      );
      for (const table of tablesIn(inForce([BATCH_TABLES, PUBLISHED], own))) {
        const published = REPLACEABLE.get(table.id)?.published;
        const isOwn = ids.includes(table.id);
        expect(table.edition).toBe(isOwn ? `own ${table.id}` : published?.edition);
        expect(table.rows).toHaveLength(isOwn ? 1 : (published?.rows.length ?? 0));
        expect(table.rows[0]?.source.readFrom).toEqual({
          table: table.id,
          edition: table.edition,
          ...(isOwn && { entry: 'entered' }),
        });
      }
    }),
    { numRuns: 20 },
  ));
