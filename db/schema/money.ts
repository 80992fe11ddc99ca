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
  pgTable,
  text,
  unique,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';

import { batches, batchLines } from './batches';
import {
  createdColumn,
  doorOnly,
  idColumn,
  moment,
  ownShopOnly,
  portalReadsBatch,
  shopColumn,
} from './columns';
import { files } from './files';

export const invoiceLineKind = pgEnum('invoice_line_kind', [
  'pieces',
  'lot_minimum',
  'certification',
  'freight',
  'tax',
  'other',
]);
export const paymentState = pgEnum('payment_state', ['pending', 'succeeded', 'failed', 'refunded']);
export const moneyEntryKind = pgEnum('money_entry_kind', [
  'invoiced',
  'withheld',
  'credited',
  'paid',
  'refunded',
]);

/** A processor's invoice as the office reads it, against one order. */
export const invoices = pgTable(
  'invoices',
  {
    id: idColumn(),
    shopId: shopColumn(),
    processorId: uuid('processor_id').notNull(),
    batchId: uuid('batch_id').notNull(),
    fileId: uuid('file_id'),
    number: text('number'),
    /** The number without case, spaces, dashes and leading zeros: two spellings of one invoice meet here. */
    numberKey: text('number_key'),
    datedOn: date('dated_on'),
    dueOn: date('due_on'),
    currency: text('currency').notNull(),
    totalMinor: bigint('total_minor', { mode: 'number' }),
    sentBy: text('sent_by').notNull(),
    enteredAt: moment('entered_at'),
    refusedAt: moment('refused_at'),
    refusedReason: text('refused_reason'),
    approvedAt: moment('approved_at'),
    approvedBy: uuid('approved_by'),
    approvedMinor: bigint('approved_minor', { mode: 'number' }),
    secondApprovedAt: moment('second_approved_at'),
    secondApprovedBy: uuid('second_approved_by'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('invoices_shop').on(t.shopId, t.id),
    // The same invoice twice is refused by the database; a refused one frees its number for a corrected copy.
    uniqueIndex('invoices_number_once')
      .on(t.shopId, t.processorId, t.numberKey)
      .where(sql`refused_at is null`),
    index('invoices_number_search').on(t.shopId, t.number.op('text_pattern_ops')),
    index('invoices_newest').on(t.shopId, t.id.desc()),
    index('invoices_batch').on(t.batchId),
    foreignKey({ columns: [t.shopId, t.batchId], foreignColumns: [batches.shopId, batches.id] }),
    foreignKey({ columns: [t.shopId, t.fileId], foreignColumns: [files.shopId, files.id] }),
    ownShopOnly(),
    portalReadsBatch(),
    doorOnly(),
  ],
);

export const invoiceLines = pgTable(
  'invoice_lines',
  {
    id: idColumn(),
    shopId: shopColumn(),
    invoiceId: uuid('invoice_id').notNull(),
    seq: integer('seq').notNull(),
    kind: invoiceLineKind('kind').notNull(),
    lineId: uuid('line_id'),
    description: text('description').notNull(),
    pieces: integer('pieces'),
    unitPriceMinor: bigint('unit_price_minor', { mode: 'number' }),
    amountMinor: bigint('amount_minor', { mode: 'number' }).notNull(),
  },
  (t) => [
    unique('invoice_lines_seq').on(t.invoiceId, t.seq),
    foreignKey({ columns: [t.shopId, t.invoiceId], foreignColumns: [invoices.shopId, invoices.id] }),
    foreignKey({ columns: [t.shopId, t.lineId], foreignColumns: [batchLines.shopId, batchLines.id] }),
    ownShopOnly(),
  ],
);

/** How one named difference between invoice, order and accepted pieces was cleared. */
export const clearances = pgTable(
  'clearances',
  {
    id: idColumn(),
    shopId: shopColumn(),
    invoiceId: uuid('invoice_id').notNull(),
    /** The difference's key, as `lib/invoices/differences.ts` names it. */
    difference: text('difference').notNull(),
    /** `accept`: pay it as invoiced; `withhold`: pay without it. */
    choice: text('choice').notNull(),
    amountMinor: bigint('amount_minor', { mode: 'number' }).notNull(),
    reason: text('reason').notNull().default(''),
    clearedBy: text('cleared_by').notNull(),
    clearedAt: moment('cleared_at').notNull(),
  },
  (t) => [
    unique('clearances_once').on(t.invoiceId, t.difference),
    check('choice_is_known', sql`${t.choice} in ('accept', 'withhold')`),
    foreignKey({ columns: [t.shopId, t.invoiceId], foreignColumns: [invoices.shopId, invoices.id] }),
    ownShopOnly(),
  ],
);

export const payments = pgTable(
  'payments',
  {
    id: idColumn(),
    shopId: shopColumn(),
    invoiceId: uuid('invoice_id').notNull(),
    /** First attempt 1; a further one only after the one before failed. */
    attempt: integer('attempt').notNull(),
    amountMinor: bigint('amount_minor', { mode: 'number' }).notNull(),
    currency: text('currency').notNull(),
    state: paymentState('state').notNull().default('pending'),
    intentId: text('intent_id'),
    failure: text('failure'),
    paidBy: uuid('paid_by').notNull(),
    startedAt: moment('started_at').notNull(),
    endedAt: moment('ended_at'),
  },
  (t) => [
    unique('payments_shop').on(t.shopId, t.id),
    unique('payments_attempt').on(t.invoiceId, t.attempt),
    unique('payments_intent').on(t.intentId),
    check('amount_positive', sql`${t.amountMinor} > 0`),
    foreignKey({ columns: [t.shopId, t.invoiceId], foreignColumns: [invoices.shopId, invoices.id] }),
    ownShopOnly(),
    doorOnly(),
  ],
);

/** The ledger of money: what is owed for an invoice is the sum of its entries. Rows are only ever added. */
export const moneyEntries = pgTable(
  'money_entries',
  {
    id: idColumn(),
    shopId: shopColumn(),
    invoiceId: uuid('invoice_id').notNull(),
    kind: moneyEntryKind('kind').notNull(),
    /** Positive raises what is owed, negative lowers it. */
    amountMinor: bigint('amount_minor', { mode: 'number' }).notNull(),
    currency: text('currency').notNull(),
    /** What caused it, once: a payment, a clearance, a refund. */
    cause: text('cause').notNull(),
    enteredBy: text('entered_by').notNull(),
    enteredAt: moment('entered_at').notNull(),
  },
  (t) => [
    unique('money_entries_cause').on(t.invoiceId, t.cause),
    foreignKey({ columns: [t.shopId, t.invoiceId], foreignColumns: [invoices.shopId, invoices.id] }),
    ownShopOnly(),
  ],
);

/** Events from the payment service as they came; each is worked once. */
export const paymentEvents = pgTable(
  'payment_events',
  {
    id: text('id').primaryKey(),
    type: text('type').notNull(),
    payload: jsonb('payload').notNull(),
    receivedAt: moment('received_at').notNull(),
    workedAt: moment('worked_at'),
  },
  () => [doorOnly()],
);
