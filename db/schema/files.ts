import { sql } from 'drizzle-orm';
import {
  bigint,
  foreignKey,
  index,
  pgEnum,
  pgPolicy,
  pgTable,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { FILE_PURPOSES, FILE_STATES } from '@/lib/files/purpose';

import { appPortal, createdColumn, idColumn, moment, ownShopOnly, shopColumn } from './columns';
import { shops } from './organisations';

export const filePurpose = pgEnum('file_purpose', FILE_PURPOSES);
export const fileState = pgEnum('file_state', FILE_STATES);

/**
 * One file as received. Its bytes lie in object storage under `storageKey` and never change once verified. A file that
 * holds papers of several batches has a row in each; all but the first say of which they are copies.
 */
export const files = pgTable(
  'files',
  {
    id: idColumn(),
    shopId: shopColumn().references(() => shops.id),
    /** The batch it belongs to, where it does; decides what a processor sees. */
    batchId: uuid('batch_id'),
    /** The processor that sent it, where one did. */
    processorId: uuid('processor_id'),
    purpose: filePurpose('purpose').notNull(),
    name: text('name').notNull(),
    mediaType: text('media_type').notNull(),
    size: bigint('size', { mode: 'number' }).notNull(),
    sha256: text('sha256'),
    storageKey: text('storage_key').notNull(),
    copyOf: uuid('copy_of'),
    state: fileState('state').notNull().default('awaited'),
    refusal: text('refusal'),
    uploadedBy: text('uploaded_by').notNull(),
    createdAt: createdColumn(),
    verifiedAt: moment('verified_at'),
  },
  (t) => [
    unique('files_shop').on(t.shopId, t.id),
    uniqueIndex('files_storage_key')
      .on(t.storageKey)
      .where(sql`copy_of is null`),
    foreignKey({ columns: [t.shopId, t.copyOf], foreignColumns: [t.shopId, t.id] }),
    index('files_batch').on(t.batchId),
    index('files_hash').on(t.shopId, t.sha256),
    ownShopOnly(),
    pgPolicy('portal_reads_its_files', {
      for: 'select',
      to: appPortal,
      using: sql`batch_id in (select id from batches) and (processor_id = (select current_processor()) or purpose in ('traveller', 'purchase_order'))`,
    }),
  ],
);
