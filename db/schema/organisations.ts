import { sql } from 'drizzle-orm';
import {
  bigint,
  boolean,
  date,
  foreignKey,
  index,
  integer,
  pgEnum,
  pgPolicy,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';

import {
  appDoor,
  appPortal,
  appShop,
  createdColumn,
  idColumn,
  moment,
  ownShopOnly,
  shopColumn,
} from './columns';

export const separation = pgEnum('separation', ['refuse', 'record']);
export const latenessBasis = pgEnum('lateness_basis', ['first_promise', 'latest_promise']);

export const shops = pgTable(
  'shops',
  {
    id: idColumn(),
    name: text('name').notNull(),
    address: text('address').array().notNull().default([]),
    phone: text('phone'),
    zone: text('zone').notNull().default('UTC'),
    currency: text('currency').notNull().default('USD'),
    orderPrefix: text('order_prefix').notNull().default('PO'),
    /** What happens where one person does both of two things that ought to be apart. */
    dispatchAndAcceptance: separation('dispatch_and_acceptance').notNull().default('record'),
    approvalAndPayment: separation('approval_and_payment').notNull().default('record'),
    /** Above this sum an invoice needs a second approval by an admin; null: never. */
    secondApprovalAboveMinor: bigint('second_approval_above_minor', { mode: 'number' }),
    latenessBasis: latenessBasis('lateness_basis').notNull().default('latest_promise'),
    stripeCustomerId: text('stripe_customer_id'),
    stripePaymentMethodId: text('stripe_payment_method_id'),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  () => [
    pgPolicy('own_shop_only', {
      for: 'all',
      to: appShop,
      using: sql`id = (select current_shop())`,
      withCheck: sql`id = (select current_shop())`,
    }),
    pgPolicy('portal_reads_customers', {
      for: 'select',
      to: appPortal,
      using: sql`id in (select shop_id from batches)`,
    }),
    pgPolicy('door', { for: 'select', to: appDoor, using: sql`(select at_the_door())` }),
  ],
);

/** One organisation that serves many shops; what one shop thinks of it stands in `shop_processors`. */
export const processors = pgTable(
  'processors',
  {
    id: idColumn(),
    name: text('name').notNull(),
    email: text('email').notNull(),
    phone: text('phone'),
    address: text('address').array().notNull().default([]),
    zone: text('zone').notNull().default('UTC'),
    stripeAccountId: text('stripe_account_id'),
    payoutsReady: boolean('payouts_ready').notNull().default(false),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('processors_email').on(t.email),
    pgPolicy('shop_reads_its_processors', {
      for: 'select',
      to: appShop,
      using: sql`id in (select processor_id from shop_processors)`,
    }),
    pgPolicy('portal_reads_itself', {
      for: 'select',
      to: appPortal,
      using: sql`id = (select current_processor())`,
    }),
    pgPolicy('portal_changes_itself', {
      for: 'update',
      to: appPortal,
      using: sql`id = (select current_processor()) and (select current_batch()) is null`,
    }),
    pgPolicy('door', {
      for: 'all',
      to: appDoor,
      using: sql`(select at_the_door())`,
      withCheck: sql`(select at_the_door())`,
    }),
  ],
);

export const shopProcessors = pgTable(
  'shop_processors',
  {
    shopId: shopColumn().references(() => shops.id),
    processorId: uuid('processor_id')
      .notNull()
      .references(() => processors.id),
    contactName: text('contact_name'),
    contactEmail: text('contact_email').notNull(),
    note: text('note'),
    active: boolean('active').notNull().default(true),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.processorId] }),
    ownShopOnly(),
    pgPolicy('portal_reads_own', {
      for: 'select',
      to: appPortal,
      using: sql`processor_id = (select current_processor())`,
    }),
    pgPolicy('door', {
      for: 'all',
      to: appDoor,
      using: sql`(select at_the_door())`,
      withCheck: sql`(select at_the_door())`,
    }),
  ],
);

/** The shop's approval of a processor for processes, with its days. Scope by equipment and audits come later. */
export const approvals = pgTable(
  'approvals',
  {
    id: idColumn(),
    shopId: shopColumn(),
    processorId: uuid('processor_id').notNull(),
    reference: text('reference').notNull(),
    processes: text('processes').array().notNull(),
    specifications: text('specifications').array().notNull().default([]),
    validFrom: date('valid_from').notNull(),
    validTo: date('valid_to').notNull(),
    withdrawnAt: moment('withdrawn_at'),
    createdAt: createdColumn(),
  },
  (t) => [
    foreignKey({
      columns: [t.shopId, t.processorId],
      foreignColumns: [shopProcessors.shopId, shopProcessors.processorId],
    }),
    index('approvals_processor').on(t.shopId, t.processorId),
    ownShopOnly(),
  ],
);

/** Next number of each kind in a shop. A number is taken by an update, so none is given twice. */
export const counters = pgTable(
  'counters',
  {
    shopId: shopColumn().references(() => shops.id),
    kind: text('kind').notNull(),
    next: integer('next').notNull().default(1),
  },
  (t) => [primaryKey({ columns: [t.shopId, t.kind] }), ownShopOnly()],
);
