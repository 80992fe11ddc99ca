import fc from 'fast-check';
import { expect, test } from 'vitest';

import { BATCH_TABLES } from '@/lib/reference/batch-tables';
import { inForce } from '@/lib/reference/in-force';
import type { Replaceable } from '@/lib/reference/replaceable';
import { REPLACEABLE } from '@/lib/reference/replaceable-tables';
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

const read = ({ columns, row }: Replaceable, cells: readonly string[]) => rowFromCells(columns, row, cells);

test.each(registered)('%s: every row, as cells and back, is the same row', (_, one) => {
  for (const row of one.published.rows)
    expect(read(one, cellsOfRow(one.columns, row))).toEqual({ ok: true, row: withoutSource(row) });
});

test.each(registered)('%s: each column has a name of its own', (_, { columns }) => {
  const heads = columns.map(({ head }) => head);
  expect(new Set(heads).size).toBe(heads.length);
});

test('a shop may replace every table that batches and parts are answered from', () => {
  const used = tablesIn(BATCH_TABLES).map(({ id }) => id);
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
      for (const table of tablesIn(inForce(BATCH_TABLES, own))) {
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
