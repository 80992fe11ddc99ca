import { sql } from 'drizzle-orm';
import { customType, pgPolicy, pgRole, timestamp, uuid } from 'drizzle-orm/pg-core';

import { newId } from '@/lib/ids';

/** The shop's side of the application; sees rows of the shop set for the transaction. */
export const appShop = pgRole('app_shop').existing();
/** The processor's side; sees what was dispatched to the processor, or the one batch of its link. */
export const appPortal = pgRole('app_portal').existing();
/** Finds out who somebody is, before any tenant is known: sign-in, tokens, links, webhooks. */
export const appDoor = pgRole('app_door').existing();

export const idColumn = () => uuid('id').primaryKey().$defaultFn(newId);
export const shopColumn = () => uuid('shop_id').notNull();
export const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });
export const createdColumn = () => moment('created_at').notNull().defaultNow();

/** A length, mass or area in SI as an exact decimal, read as a number. */
export const measure = customType<{ data: number; driverData: string }>({
  dataType: () => 'numeric(14,4)',
  fromDriver: Number,
  toDriver: String,
});

/** Rows belong to one shop and are seen and changed only inside it. */
export const ownShopOnly = () =>
  pgPolicy('own_shop_only', {
    for: 'all',
    to: appShop,
    using: sql`shop_id = (select current_shop())`,
    withCheck: sql`shop_id = (select current_shop())`,
  });

/**
 * Rows of a batch are readable by the processor that it was dispatched to. It writes nothing by itself: what it says
 * goes through `inShopOf` (db/client.ts), after its own eyes have seen the batch.
 */
export const portalReadsBatch = () =>
  pgPolicy('portal_reads_batch', {
    for: 'select',
    to: appPortal,
    using: sql`batch_id in (select id from batches)`,
  });

/** Open while finding out who somebody is, and only then; column grants narrow what is to be seen. */
export const doorOnly = () =>
  pgPolicy('door', {
    for: 'all',
    to: appDoor,
    using: sql`(select at_the_door())`,
    withCheck: sql`(select at_the_door())`,
  });
