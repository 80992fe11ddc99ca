import { sql } from 'drizzle-orm';
import {
  check,
  date,
  foreignKey,
  index,
  integer,
  pgEnum,
  pgPolicy,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import { VERDICTS } from '@/lib/certificates/verdict';
import { DISPOSITIONS } from '@/lib/nonconformances/disposition';

import { batches, batchLines, requirements } from './batches';
import {
  appDoor,
  createdColumn,
  idColumn,
  moment,
  ownShopOnly,
  portalReadsBatch,
  shopColumn,
} from './columns';
import { files } from './files';
import { lots } from './lots';

export const verdict = pgEnum('verdict', VERDICTS);
export const disposition = pgEnum('disposition', DISPOSITIONS);
export const nonconformanceKind = pgEnum('nonconformance_kind', [
  'damaged',
  'short',
  'over',
  'requirement',
  'papers',
]);

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

/** A file from the processor that states what was done. Number and date are the inspector's reading. */
export const certificates = pgTable(
  'certificates',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    fileId: uuid('file_id').notNull(),
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

/** A furnace or bath recorder file. Reading it comes with its own issue; here it is kept and shown. */
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
