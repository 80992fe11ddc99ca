import { bigint, index, jsonb, pgPolicy, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';

import { appShop, moment, shopColumn } from './columns';

/**
 * What happened, to what, by whom: one chain a shop. Number, time and hashes are set by the database's trigger, which
 * links each entry to the one before; the application may add and read, nothing else.
 */
export const auditEntries = pgTable(
  'audit_entries',
  {
    shopId: shopColumn(),
    seq: bigint('seq', { mode: 'number' }).notNull().default(0),
    at: moment('at').notNull(),
    actorKind: text('actor_kind').notNull(),
    actorId: text('actor_id').notNull(),
    actorName: text('actor_name').notNull(),
    address: text('address'),
    requestId: text('request_id'),
    action: text('action').notNull(),
    entity: text('entity').notNull(),
    entityId: uuid('entity_id').notNull(),
    before: jsonb('before'),
    after: jsonb('after'),
    previousHash: text('previous_hash').notNull().default(''),
    hash: text('hash').notNull().default(''),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.seq] }),
    index('audit_entity').on(t.shopId, t.entity, t.entityId),
    pgPolicy('own_shop_reads', { for: 'select', to: appShop, using: sql`shop_id = (select current_shop())` }),
    pgPolicy('own_shop_adds', {
      for: 'insert',
      to: appShop,
      withCheck: sql`shop_id = (select current_shop())`,
    }),
  ],
);
