import type { z } from 'zod';

import type { Table } from '@/lib/trade/table';

import { columnsOf, type Column } from './row-columns';

/** A published table that a shop may replace by its own edition: what its rows are, and the columns they have in a file. */
export interface Replaceable {
  readonly published: Table<unknown>;
  readonly row: z.ZodType;
  readonly columns: readonly Column[];
  /** The field by which rows are looked up from the top: it rises from row to row, and the last may have none. */
  readonly rising?: string;
}

/** Registers a table. The schema has to give exactly the table's rows: the compiler holds the one against the other. */
export function replaceable<Row>(
  published: Table<Row>,
  row: z.ZodType<Row>,
  { rising }: { rising?: keyof Row & string } = {},
): Replaceable {
  return { published, row, columns: columnsOf(row), ...(rising !== undefined && { rising }) };
}
