import { sql } from 'drizzle-orm';
import {
  bigint,
  boolean,
  check,
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

import { appPortal, appShop, createdColumn, doorOnly, idColumn, moment } from './columns';
import { processors, shops } from './organisations';

export const unitSystem = pgEnum('unit_system', ['inch', 'metric']);
export const linkPurpose = pgEnum('link_purpose', ['sign_in', 'reset']);

export const users = pgTable(
  'users',
  {
    id: idColumn(),
    email: text('email').notNull(),
    name: text('name').notNull(),
    passwordHash: text('password_hash'),
    /** Raised to end every session of this person at once. */
    sessionVersion: integer('session_version').notNull().default(1),
    active: boolean('active').notNull().default(true),
    units: unitSystem('units').notNull().default('inch'),
    singleKeys: boolean('single_keys').notNull().default(true),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('users_email').on(t.email),
    check('email_is_lower_case', sql`${t.email} = lower(${t.email})`),
    pgPolicy('shop_reads_its_people', {
      for: 'select',
      to: appShop,
      using: sql`id in (select user_id from memberships)`,
    }),
    pgPolicy('shop_person_changes_self', {
      for: 'update',
      to: appShop,
      using: sql`id = (select current_person())`,
    }),
    pgPolicy('portal_reads_its_people', {
      for: 'select',
      to: appPortal,
      using: sql`id in (select user_id from memberships)`,
    }),
    pgPolicy('portal_person_changes_self', {
      for: 'update',
      to: appPortal,
      using: sql`id = (select current_person())`,
    }),
    doorOnly(),
  ],
);

/** Which person belongs to which organisation, with which roles. */
export const memberships = pgTable(
  'memberships',
  {
    id: idColumn(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    shopId: uuid('shop_id').references(() => shops.id),
    processorId: uuid('processor_id').references(() => processors.id),
    roles: text('roles').array().notNull(),
    active: boolean('active').notNull().default(true),
    version: integer('version').notNull().default(1),
    createdAt: createdColumn(),
  },
  (t) => [
    check('one_organisation', sql`(${t.shopId} is null) <> (${t.processorId} is null)`),
    unique('one_membership_per_shop').on(t.userId, t.shopId),
    unique('one_membership_per_processor').on(t.userId, t.processorId),
    index('memberships_shop').on(t.shopId),
    pgPolicy('own_shop_only', {
      for: 'all',
      to: appShop,
      using: sql`shop_id = (select current_shop())`,
      withCheck: sql`shop_id = (select current_shop())`,
    }),
    pgPolicy('own_processor_only', {
      for: 'select',
      to: appPortal,
      using: sql`processor_id = (select current_processor()) and (select current_batch()) is null`,
    }),
    doorOnly(),
  ],
);

export const invitations = pgTable(
  'invitations',
  {
    id: idColumn(),
    shopId: uuid('shop_id').references(() => shops.id),
    processorId: uuid('processor_id').references(() => processors.id),
    email: text('email').notNull(),
    name: text('name').notNull(),
    roles: text('roles').array().notNull(),
    tokenHash: text('token_hash').notNull(),
    invitedBy: uuid('invited_by').references(() => users.id),
    expiresAt: moment('expires_at').notNull(),
    acceptedAt: moment('accepted_at'),
    withdrawnAt: moment('withdrawn_at'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('invitations_token').on(t.tokenHash),
    check('one_organisation', sql`(${t.shopId} is null) <> (${t.processorId} is null)`),
    pgPolicy('own_shop_only', {
      for: 'all',
      to: appShop,
      using: sql`shop_id = (select current_shop())`,
      withCheck: sql`shop_id = (select current_shop())`,
    }),
    doorOnly(),
  ],
);

/** Single-use links by mail: sign in without a password, or set a new one. */
export const mailedLinks = pgTable(
  'mailed_links',
  {
    id: idColumn(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    purpose: linkPurpose('purpose').notNull(),
    tokenHash: text('token_hash').notNull(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
    createdAt: createdColumn(),
  },
  (t) => [unique('mailed_links_token').on(t.tokenHash), doorOnly()],
);

/** Personal tokens for programs: at most what their owner may do. Only the hash is kept. */
export const apiTokens = pgTable(
  'api_tokens',
  {
    id: idColumn(),
    shopId: uuid('shop_id')
      .notNull()
      .references(() => shops.id),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    name: text('name').notNull(),
    tokenHash: text('token_hash').notNull(),
    /** First characters, shown so that a person recognises it. */
    hint: text('hint').notNull(),
    scopes: text('scopes').array().notNull(),
    expiresAt: moment('expires_at'),
    lastUsedAt: moment('last_used_at'),
    revokedAt: moment('revoked_at'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('api_tokens_token').on(t.tokenHash),
    pgPolicy('own_tokens_only', {
      for: 'all',
      to: appShop,
      using: sql`shop_id = (select current_shop()) and user_id = (select current_person())`,
      withCheck: sql`shop_id = (select current_shop()) and user_id = (select current_person())`,
    }),
    doorOnly(),
  ],
);

/** Answers to writes that may be repeated: the same key gets the same answer. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    id: idColumn(),
    /** Whose key: shop, processor or link, and the actor's id. */
    owner: text('owner').notNull(),
    key: text('key').notNull(),
    operation: text('operation').notNull(),
    requestHash: text('request_hash').notNull(),
    status: integer('status'),
    response: jsonb('response'),
    createdAt: createdColumn(),
  },
  (t) => [
    unique('idempotency_keys_once').on(t.owner, t.key),
    pgPolicy('own_keys_only', {
      for: 'all',
      to: appShop,
      using: sql`owner = (select current_key_owner())`,
      withCheck: sql`owner = (select current_key_owner())`,
    }),
    pgPolicy('own_keys_only_portal', {
      for: 'all',
      to: appPortal,
      using: sql`owner = (select current_key_owner())`,
      withCheck: sql`owner = (select current_key_owner())`,
    }),
    doorOnly(),
  ],
);

/**
 * How often somebody tried lately, by account and by address. Columns and their order are what rate-limiter-flexible
 * writes; the key is a hash, so the table does not list who has an account.
 */
export const throttles = pgTable(
  'throttles',
  {
    key: text('key').primaryKey(),
    points: integer('points').notNull().default(0),
    expire: bigint('expire', { mode: 'number' }),
  },
  () => [doorOnly()],
);
