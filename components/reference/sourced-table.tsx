import type { ReactNode } from 'react';

import { Numbers } from '@/components/plots/numbers';
import type { Source } from '@/lib/trade/source';
import type { Table } from '@/lib/trade/table';

import { trustWords } from './source-line';

interface SourcedTableProps<Row> {
  table: Table<Row>;
  heads: readonly string[];
  cells: (row: Row) => readonly ReactNode[];
}

/** The table behind an answer, row by row as printed, each with where it comes from and how sure it is. */
export function SourcedTable<Row>({ table, heads, cells }: SourcedTableProps<Row>) {
  return (
    <Numbers
      label={`The table: ${table.title}`}
      heads={[...heads, 'Where from, and how sure']}
      rows={table.rows.map((row) => [...cells(row), <RowSource key="source" source={row.source} />])}
    />
  );
}

function RowSource({ source }: { source: Source }) {
  return (
    <span className="block min-w-64 font-sans text-source text-quiet">
      {source.document}; {trustWords(source)}
    </span>
  );
}
