import { sql } from 'drizzle-orm';
import {
  bigint,
  check,
  date,
  foreignKey,
  index,
  integer,
  jsonb,
  pgEnum,
  pgPolicy,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import type { FrozenLine } from '@/lib/batches/frozen-line';
import { STAGES } from '@/lib/batches/stage';
import { REQUIREMENT_SOURCES, type ToProve } from '@/lib/parts/to-prove';
import type { TableReference } from '@/lib/trade/table';

import {
  appDoor,
  appPortal,
  createdColumn,
  doorOnly,
  idColumn,
  moment,
  ownShopOnly,
  portalReadsBatch,
  shopColumn,
} from './columns';
import { files } from './files';
import { lots } from './lots';
import { shopProcessors } from './organisations';
import { process, routeSteps } from './parts';

export const stage = pgEnum('stage', STAGES);
export const requirementSource = pgEnum('requirement_source', REQUIREMENT_SOURCES);
export const documentKind = pgEnum('document_kind', ['traveller', 'purchase_order']);
export const messageKind = pgEnum('message_kind', ['question', 'answer', 'trouble', 'note']);

/** What goes to one processor on one order for one step. */
export const batches = pgTable(
  'batches',
  {
    id: idColumn(),
    shopId: shopColumn(),
    number: text('number').notNull(),
    orderNumber: text('order_number').notNull(),
    processorId: uuid('processor_id').notNull(),
    process: process('process').notNull(),
    specification: text('specification').notNull(),
    specificationRevision: text('specification_revision'),
    classType: text('class_type'),
    note: text('note'),
    /** The day it is meant to leave, and the day the pieces are wanted back. */
    leavesOn: date('leaves_on'),
    wantedBackOn: date('wanted_back_on'),
    currency: text('currency').notNull(),
    lotMinimumMinor: bigint('lot_minimum_minor', { mode: 'number' }).notNull().default(0),
    certificationFeeMinor: bigint('certification_fee_minor', { mode: 'number' }).notNull().default(0),

    putAsideAt: moment('put_aside_at'),
    dispatchedAt: moment('dispatched_at'),
    dispatchedBy: uuid('dispatched_by'),
    cancelledAt: moment('cancelled_at'),
    cancelReason: text('cancel_reason'),
    acknowledgedAt: moment('acknowledged_at'),
    acknowledgedPieces: integer('acknowledged_pieces'),
    markedDoneAt: moment('marked_done_at'),
    shippedAt: moment('shipped_at'),
    shippedNote: text('shipped_note'),
    paymentWaivedAt: moment('payment_waived_at'),
    paymentWaivedReason: text('payment_waived_reason'),

    // Standing: derived, written by `refreshStanding` alone (lib/batches/refresh-standing.ts).
    stage: stage('stage').notNull().default('building'),
    pieces: integer('pieces').notNull().default(0),
    piecesBack: integer('pieces_back').notNull().default(0),
    firstPromisedOn: date('first_promised_on'),
    promisedOn: date('promised_on'),
    lastBackAt: moment('last_back_at'),
    openNonconformances: integer('open_nonconformances').notNull().default(0),
    stockedAt: moment('stocked_at'),

    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('batches_shop').on(t.shopId, t.id),
    unique('batches_number').on(t.shopId, t.number),
    unique('batches_order').on(t.shopId, t.orderNumber),
    index('batches_number_search').on(t.shopId, t.number.op('text_pattern_ops')),
    index('batches_order_search').on(t.shopId, t.orderNumber.op('text_pattern_ops')),
    index('batches_stage').on(t.shopId, t.stage, t.id.desc()),
    index('batches_newest').on(t.shopId, t.id.desc()),
    // By comparisons that row-level security lets an index answer; one of stages it does not.
    index('batches_on_tideline').on(t.shopId, t.stockedAt),
    index('batches_processor').on(t.processorId, t.id.desc()),
    foreignKey({
      columns: [t.shopId, t.processorId],
      foreignColumns: [shopProcessors.shopId, shopProcessors.processorId],
    }),
    ownShopOnly(),
    pgPolicy('portal_reads_dispatched', {
      for: 'select',
      to: appPortal,
      using: sql`processor_id = (select current_processor()) and dispatched_at is not null and ((select current_batch()) is null or id = (select current_batch()))`,
    }),
    pgPolicy('door', { for: 'select', to: appDoor, using: sql`(select at_the_door())` }),
  ],
);

export const batchLines = pgTable(
  'batch_lines',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    lineNo: integer('line_no').notNull(),
    lotId: uuid('lot_id').notNull(),
    stepId: uuid('step_id').notNull(),
    pieces: integer('pieces').notNull(),
    unitPriceMinor: bigint('unit_price_minor', { mode: 'number' }).notNull().default(0),
    /** Furnace load or tank load the line goes in; the lead's choice. */
    loadNo: integer('load_no'),
    /** Part, lot and step as they were when the batch was dispatched. */
    frozen: jsonb('frozen').$type<FrozenLine>(),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('batch_lines_shop').on(t.shopId, t.id),
    unique('batch_lines_no').on(t.batchId, t.lineNo),
    unique('batch_lines_lot').on(t.batchId, t.lotId, t.stepId),
    check('pieces_positive', sql`${t.pieces} > 0`),
    check('price_not_negative', sql`${t.unitPriceMinor} >= 0`),
    index('batch_lines_of_lot').on(t.shopId, t.lotId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.lotId], foreignColumns: [lots.shopId, lots.id] }),
    foreignKey({ columns: [t.shopId, t.stepId], foreignColumns: [routeSteps.shopId, routeSteps.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** One thing that must be proved, for one line or (line null) for the whole batch. Frozen at dispatch. */
export const requirements = pgTable(
  'requirements',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    lineId: uuid('line_id'),
    seq: integer('seq').notNull(),
    characteristic: text('characteristic').notNull(),
    limit: text('limit').notNull().default(''),
    unit: text('unit').notNull().default(''),
    source: requirementSource('source').notNull().default('specification'),
    sourceText: text('source_text').notNull().default(''),
    /** The table and edition that proposed it, with the limit it gave. */
    readFrom: jsonb('read_from').$type<NonNullable<ToProve['readFrom']>>(),
  },
  (t) => [
    unique('requirements_shop').on(t.shopId, t.id),
    index('requirements_batch').on(t.batchId, t.seq),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** A blocker that an admin let pass, with the reason; it prints on the traveller. */
export const overrides = pgTable(
  'overrides',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    check: text('check').notNull(),
    subject: text('subject').notNull().default(''),
    reason: text('reason').notNull(),
    by: uuid('by').notNull(),
    /** The tables and editions by which the finding was made, where it was made by any. */
    readFrom: jsonb('read_from').$type<TableReference[]>(),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('overrides_once').on(t.batchId, t.check, t.subject),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
  ],
);

/** Traveller and purchase order, by version. `content` is all that the page shows, so that it can be made again to the byte. */
export const batchDocuments = pgTable(
  'batch_documents',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    kind: documentKind('kind').notNull(),
    documentVersion: integer('document_version').notNull(),
    content: jsonb('content').notNull(),
    /** What is different from the version before, in words. */
    changes: text('changes').array().notNull().default([]),
    statedAt: moment('stated_at').notNull(),
    fileId: uuid('file_id'),
    sha256: text('sha256'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('batch_documents_version').on(t.batchId, t.kind, t.documentVersion),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

/** The processor's key to one batch, sent with the dispatch mail. */
export const batchLinks = pgTable(
  'batch_links',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    processorId: uuid('processor_id').notNull(),
    tokenHash: text('token_hash').notNull(),
    withdrawnAt: moment('withdrawn_at'),
    firstOpenedAt: moment('first_opened_at'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('batch_links_token').on(t.tokenHash),
    index('batch_links_batch').on(t.batchId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
    doorOnly(),
  ],
);

export const promises = pgTable(
  'promises',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    promisedOn: date('promised_on').notNull(),
    note: text('note'),
    madeBy: text('made_by').notNull(),
    madeAt: moment('made_at').notNull(),
  },
  (t) => [
    index('promises_batch').on(t.batchId, t.madeAt),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);

export const messages = pgTable(
  'messages',
  {
    id: idColumn(),
    shopId: shopColumn(),
    batchId: uuid('batch_id').notNull(),
    lineId: uuid('line_id'),
    kind: messageKind('kind').notNull(),
    /** `shop` or `processor`. */
    side: text('side').notNull(),
    author: text('author').notNull(),
    body: text('body').notNull(),
    /** The question this answers. */
    answersId: uuid('answers_id'),
    createdAt: createdColumn(),
  },
  (t) => [
    check('side_is_known', sql`${t.side} in ('shop', 'processor')`),
    index('messages_batch').on(t.batchId, t.id),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    ownShopOnly(),
    portalReadsBatch(),
  ],
);
