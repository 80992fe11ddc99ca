import { sql } from 'drizzle-orm';
import { check, index, jsonb, pgTable, text, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core';

import { createdColumn, idColumn, moment, ownShopOnly, shopColumn } from './columns';

/**
 * A shop's own editions of published tables. The newest that was not withdrawn is in force; earlier ones stay, because
 * what was frozen names them. Rows never change: a correction is a new entry.
 */
export const referenceTables = pgTable(
  'reference_tables',
  {
    id: idColumn(),
    shopId: shopColumn(),
    /** Of the published table that it stands in for. */
    tableId: text('table_id').notNull(),
    /** The specification, its edition, and where in it the table stands: as printed on the shop's copy. */
    title: text('title').notNull(),
    edition: text('edition').notNull(),
    clause: text('clause').notNull(),
    /** As the table's schema in lib/reference has them; validated when they were entered. */
    rows: jsonb('rows').$type<readonly unknown[]>().notNull(),
    enteredBy: uuid('entered_by').notNull(),
    /** As they were called then. */
    enteredByName: text('entered_by_name').notNull(),
    supersededAt: moment('superseded_at'),
    withdrawnAt: moment('withdrawn_at'),
    withdrawnBy: uuid('withdrawn_by'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('reference_tables_shop').on(t.shopId, t.id),
    uniqueIndex('reference_tables_in_force')
      .on(t.shopId, t.tableId)
      .where(sql`superseded_at is null and withdrawn_at is null`),
    index('reference_tables_history').on(t.shopId, t.tableId, t.createdAt),
    check('rows_are_there', sql`jsonb_typeof(${t.rows}) = 'array' and jsonb_array_length(${t.rows}) > 0`),
    check('withdrawn_by_somebody', sql`(${t.withdrawnAt} is null) = (${t.withdrawnBy} is null)`),
    ownShopOnly(),
  ],
);
