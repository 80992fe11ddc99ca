import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';

import { batches, batchLines } from './batches';
import { idColumn, moment, ownShopOnly, portalReadsBatch, shopColumn } from './columns';
import { files } from './files';

export const receipts = pgTable(
  'receipts',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    receivedAt: moment('received_at').notNull(),
    receivedBy: text('received_by').notNull(),
    note: text('note'),
  },
  (t) => [
    unique('receipts_shop').on(t.shopId, t.id),
    index('receipts_batch').on(t.batchId, t.receivedAt),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** The count of one line in one receipt. `over` pieces are not the shop's and do not enter the ledger. */
export const receiptLines = pgTable(
  'receipt_lines',
  {
    id: idColumn(),
    shopId: shopColumn(),
    receiptId: uuid('receipt_id').notNull(),
    lineId: uuid('line_id').notNull(),
    good: integer('good').notNull().default(0),
    damaged: integer('damaged').notNull().default(0),
    short: integer('short').notNull().default(0),
    over: integer('over').notNull().default(0),
    note: text('note'),
  },
  (t) => [
    unique('receipt_lines_once').on(t.receiptId, t.lineId),
    check(
      'counts_not_negative',
      sql`${t.good} >= 0 and ${t.damaged} >= 0 and ${t.short} >= 0 and ${t.over} >= 0`,
    ),
    index('receipt_lines_line').on(t.lineId),
    foreignKey({ columns: [t.shopId, t.receiptId], foreignColumns: [receipts.shopId, receipts.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    ownShopOnly(),
  ],
);

export const receiptPhotos = pgTable(
  'receipt_photos',
  {
    id: idColumn(),
    shopId: shopColumn(),
    receiptId: uuid('receipt_id').notNull(),
    lineId: uuid('line_id'),
    fileId: uuid('file_id').notNull(),
  },
  (t) => [
    index('receipt_photos_receipt').on(t.receiptId),
    foreignKey({ columns: [t.shopId, t.receiptId], foreignColumns: [receipts.shopId, receipts.id] }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);
