import { sql } from 'drizzle-orm';
import {
  check,
  foreignKey,
  index,
  integer,
  pgPolicy,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { batches, batchLines } from './batches';
import { appDoor, createdColumn, idColumn, moment, ownShopOnly, shopColumn } from './columns';
import { files } from './files';
import { lots } from './lots';

/** Pieces passed the gate, with what the gate saw. */
export const releases = pgTable(
  'releases',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    lineId: uuid('line_id').notNull(),
    lotId: uuid('lot_id').notNull(),
    pieces: integer('pieces').notNull(),
    /** Null where the pieces go on to their next outside step. */
    locationId: uuid('location_id'),
    releasedBy: text('released_by').notNull(),
    releasedAt: moment('released_at').notNull(),
  },
  (t) => [
    check('pieces_positive', sql`${t.pieces} > 0`),
    index('releases_line').on(t.lineId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    ownShopOnly(),
  ],
);

/** A read-only link to a lot's dossier for people outside, with an end. */
export const dossierLinks = pgTable(
  'dossier_links',
  {
    id: idColumn(),
    shopId: shopColumn(),
    lotId: uuid('lot_id').notNull(),
    tokenHash: text('token_hash').notNull(),
    forWhom: text('for_whom').notNull(),
    expiresAt: moment('expires_at').notNull(),
    withdrawnAt: moment('withdrawn_at'),
    createdBy: text('created_by').notNull(),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('dossier_links_token').on(t.tokenHash),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    ownShopOnly(),
    pgPolicy('door', { for: 'select', to: appDoor, using: sql`(select at_the_door())` }),
  ],
);

/** A dossier that was asked for: one document and one archive of every original. */
export const dossiers = pgTable(
  'dossiers',
  {
    id: idColumn(),
    shopId: shopColumn(),
    lotId: uuid('lot_id').notNull(),
    statedAt: moment('stated_at').notNull(),
    documentFileId: uuid('document_file_id'),
    archiveFileId: uuid('archive_file_id'),
    requestedBy: text('requested_by').notNull(),
    finishedAt: moment('finished_at'),
    failure: text('failure'),
  },
  (t) => [
    index('dossiers_lot').on(t.shopId, t.lotId),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    foreignKey({ columns: [t.shopId, t.documentFileId], foreignColumns: [files.shopId, files.id] }),
    foreignKey({ columns: [t.shopId, t.archiveFileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);
