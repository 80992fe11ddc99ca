import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  pgEnum,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { VERDICTS } from '@/lib/certificates/verdict';

import { batches, batchLines, requirements } from './batches';
import { createdColumn, idColumn, moment, ownShopOnly, portalReadsBatch, shopColumn } from './columns';
import { files } from './files';

export const verdict = pgEnum('verdict', VERDICTS);

/** A file from the processor that states what was done. Number and date are the inspector's reading. */
export const certificates = pgTable(
  'certificates',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    fileId: uuid('file_id').notNull(),
    /** Which of the certificates in its file, from 0, where a person said so; null: the one that speaks of its batch. */
    place: integer('place'),
    number: text('number'),
    datedOn: date('dated_on'),
    sentBy: text('sent_by').notNull(),
    /** Set aside by the inspector: a second copy, or replaced by a corrected one. */
    setAsideAt: moment('set_aside_at'),
    setAsideReason: text('set_aside_reason'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    check('place_from_0', sql`${t.place} >= 0`),
    unique('certificates_shop').on(t.shopId, t.id),
    unique('certificates_file').on(t.fileId),
    index('certificates_batch').on(t.batchId),
    index('certificates_number_search').on(t.shopId, t.number.op('text_pattern_ops')),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** A furnace or bath recorder file. What was read in it lies in its reading. */
export const charts = pgTable(
  'charts',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    fileId: uuid('file_id').notNull(),
    sentBy: text('sent_by').notNull(),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('charts_file').on(t.fileId),
    index('charts_batch').on(t.batchId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** What one certificate states of one requirement and how the inspector decided. A later decision replaces an earlier one until it is signed. */
export const decisions = pgTable(
  'decisions',
  {
    id: idColumn(),
    shopId: shopColumn(),
    certificateId: uuid('certificate_id').notNull(),
    requirementId: uuid('requirement_id').notNull(),
    stated: text('stated').notNull().default(''),
    verdict: verdict('verdict').notNull(),
    /** Why it is accepted against its verdict. */
    overrideReason: text('override_reason'),
    note: text('note'),
    decidedBy: text('decided_by').notNull(),
    decidedAt: moment('decided_at').notNull(),
    version: integer('version').notNull().default(1),
  },
  (t) => [
    unique('decisions_once').on(t.certificateId, t.requirementId),
    foreignKey({
      columns: [t.shopId, t.certificateId],
      foreignColumns: [certificates.shopId, certificates.id],
    }),
    foreignKey({
      columns: [t.shopId, t.requirementId],
      foreignColumns: [requirements.shopId, requirements.id],
    }),
    ownShopOnly(),
  ],
);

/** A signature: this person accepted this file for these pieces. Sealed over the file's hash and every decision. Never changed. */
export const signatures = pgTable(
  'signatures',
  {
    id: idColumn(),
    shopId: shopColumn(),
    certificateId: uuid('certificate_id').notNull(),
    batchId: uuid('batch_id').notNull(),
    sentence: text('sentence').notNull(),
    fileSha256: text('file_sha256').notNull(),
    /** The sealed content as canonical JSON, and its SHA-256. */
    sealed: text('sealed').notNull(),
    seal: text('seal').notNull(),
    signedBy: uuid('signed_by').notNull(),
    signerName: text('signer_name').notNull(),
    signedAt: moment('signed_at').notNull(),
    /** How long the paper lay open before the person until it was signed, where the screen could tell. */
    reviewSeconds: integer('review_seconds'),
  },
  (t) => [
    unique('signatures_shop').on(t.shopId, t.id),
    index('signatures_batch').on(t.batchId),
    foreignKey({
      columns: [t.shopId, t.certificateId],
      foreignColumns: [certificates.shopId, certificates.id],
    }),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
  ],
);

/** For which line and how many pieces a certificate was accepted. */
export const coverage = pgTable(
  'coverage',
  {
    id: idColumn(),
    shopId: shopColumn(),
    signatureId: uuid('signature_id').notNull(),
    certificateId: uuid('certificate_id').notNull(),
    lineId: uuid('line_id').notNull(),
    pieces: integer('pieces').notNull(),
  },
  (t) => [
    check('pieces_positive', sql`${t.pieces} > 0`),
    index('coverage_line').on(t.lineId),
    foreignKey({ columns: [t.shopId, t.signatureId], foreignColumns: [signatures.shopId, signatures.id] }),
    foreignKey({
      columns: [t.shopId, t.certificateId],
      foreignColumns: [certificates.shopId, certificates.id],
    }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    ownShopOnly(),
  ],
);
