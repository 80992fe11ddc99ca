import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, pgEnum, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';

import { DISPOSITIONS } from '@/lib/nonconformances/disposition';

import { batches, batchLines, requirements } from './batches';
import { idColumn, moment, ownShopOnly, shopColumn } from './columns';
import { certificates } from './evidence';
import { files } from './files';
import { lots } from './lots';

export const disposition = pgEnum('disposition', DISPOSITIONS);

export const nonconformanceKind = pgEnum('nonconformance_kind', [
  'damaged',
  'short',
  'over',
  'requirement',
  'papers',
]);

/** Pieces that do not meet a requirement, or cannot be proved to. Open until every piece is dispositioned. */
export const nonconformances = pgTable(
  'nonconformances',
  {
    id: idColumn(),
    shopId: shopColumn(),
    number: text('number').notNull(),
    batchId: uuid('batch_id').notNull(),
    lineId: uuid('line_id').notNull(),
    lotId: uuid('lot_id').notNull(),
    kind: nonconformanceKind('kind').notNull(),
    pieces: integer('pieces').notNull(),
    /** How many of these pieces a signed certificate already covered; a hold takes that proof away. */
    coveredPieces: integer('covered_pieces').notNull().default(0),
    requirementId: uuid('requirement_id'),
    certificateId: uuid('certificate_id'),
    what: text('what').notNull(),
    openedBy: text('opened_by').notNull(),
    openedAt: moment('opened_at').notNull(),
    closedAt: moment('closed_at'),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    unique('nonconformances_shop').on(t.shopId, t.id),
    unique('nonconformances_number').on(t.shopId, t.number),
    check('pieces_positive', sql`${t.pieces} > 0`),
    index('nonconformances_batch').on(t.batchId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    foreignKey({
      columns: [t.shopId, t.requirementId],
      foreignColumns: [requirements.shopId, requirements.id],
    }),
    foreignKey({
      columns: [t.shopId, t.certificateId],
      foreignColumns: [certificates.shopId, certificates.id],
    }),
    ownShopOnly(),
  ],
);

export const dispositions = pgTable(
  'dispositions',
  {
    id: idColumn(),
    shopId: shopColumn(),
    nonconformanceId: uuid('nonconformance_id').notNull(),
    disposition: disposition('disposition').notNull(),
    pieces: integer('pieces').notNull(),
    reason: text('reason').notNull(),
    /** Who may allow it: the engineer or the customer, by name and paper. */
    authority: text('authority'),
    fileId: uuid('file_id'),
    decidedBy: text('decided_by').notNull(),
    decidedAt: moment('decided_at').notNull(),
  },
  (t) => [
    check('pieces_positive', sql`${t.pieces} > 0`),
    index('dispositions_nonconformance').on(t.nonconformanceId),
    foreignKey({
      columns: [t.shopId, t.nonconformanceId],
      foreignColumns: [nonconformances.shopId, nonconformances.id],
    }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
  ],
);
