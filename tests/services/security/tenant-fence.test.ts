import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import pg from 'pg';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';

import { withTenant, type Tenant, type Tx } from '@/db/client';
import { SHOP_GRANTS } from '@/db/grants';

import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { dropChecks, fillRow, tablesOf, type TableFacts } from './fill-rows';

const base = openDatabase();

/** So that the processor's side has something to see. */
const DISPATCHED = { dispatched_at: '2026-06-17T12:00:00Z', stage: 'dispatched' };

/** Belong to no shop and no processor, only to the door. */
const OF_THE_DOOR = ['mailed_links', 'payment_events', 'throttles'];

let superuser: pg.Client;
let tables: TableFacts[];
let [shopA, shopB]: World[] = [];
/** The row of shop A in each table, and its batch. */
const rowsOfA = new Map<string, Record<string, unknown>>();
let batchOfA = '';
let otherBatchOfA = '';

beforeAll(async () => {
  const { rows } = await base.owner.execute<{ name: string }>(sql`select current_database() as name`);
  const url = new URL(inject('superUrl'));
  url.pathname = `/${rows[0]?.name ?? ''}`;
  superuser = new pg.Client({ connectionString: url.href });
  await superuser.connect();
  [shopA, shopB] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  tables = await tablesOf(superuser);
  await dropChecks(superuser);
  batchOfA = await fillWorld(shopA);
  otherBatchOfA = String(
    (
      await fillRow(superuser, factsOf('batches'), {
        shop_id: shopA.shopId,
        processor_id: shopA.processorId,
        ...DISPATCHED,
      })
    )['id'],
  );
});

afterAll(() => superuser.end());

const factsOf = (name: string): TableFacts => {
  const found = tables.find((table) => table.name === name);
  if (!found) throw new Error(`no table ${name}`);
  return found;
};

/** One row of shop A in every table, hung on its batch and its processor. Returns the batch. */
async function fillWorld(world: World): Promise<string> {
  const batch = await fillRow(superuser, factsOf('batches'), {
    shop_id: world.shopId,
    processor_id: world.processorId,
    ...DISPATCHED,
  });
  const common = {
    shop_id: world.shopId,
    processor_id: world.processorId,
    batch_id: batch['id'],
    user_id: world.userId,
  };
  for (const table of tables) {
    if (table.name === 'batches') rowsOfA.set('batches', batch);
    else if (table.name === 'shops') rowsOfA.set('shops', { id: world.shopId });
    else if (table.name === 'processors') rowsOfA.set('processors', { id: world.processorId });
    else if (table.name === 'users') rowsOfA.set('users', { id: world.userId });
    else if (table.name === 'shop_processors')
      rowsOfA.set('shop_processors', { shop_id: world.shopId, processor_id: world.processorId });
    else if (['memberships', 'invitations'].includes(table.name))
      rowsOfA.set(
        table.name,
        await fillRow(superuser, table, { shop_id: world.shopId, user_id: randomUUID(), processor_id: null }),
      );
    else rowsOfA.set(table.name, await fillRow(superuser, table, common));
  }
  return String(batch['id']);
}

const worldB = (): World => {
  if (!shopB) throw new Error('no shop B');
  return shopB;
};

/** Everybody to whom shop A is a stranger, and what of it each may see all the same. */
const strangers: [string, () => Tenant, readonly string[]][] = [
  ['another shop', () => ({ kind: 'shop', shopId: worldB().shopId, personId: worldB().userId }), []],
  [
    'another processor',
    () => ({ kind: 'processor', processorId: worldB().processorId, batchId: null, personId: null }),
    [],
  ],
  // The same processor, so it knows the shop, itself and that the two deal with each other; not the other batch.
  [
    'the link of another batch',
    () => ({
      kind: 'processor',
      processorId: shopA?.processorId ?? '',
      batchId: otherBatchOfA,
      personId: null,
    }),
    ['shops', 'processors', 'shop_processors'],
  ],
];

test('every table has a row to look at', () => {
  expect([...rowsOfA.keys()].sort()).toEqual(tables.map((table) => table.name).sort());
  expect(tables.length).toBeGreaterThan(45);
  expect(batchOfA).not.toBe(otherBatchOfA);
});

test('the shop itself sees its row in every table that it may read: what follows would find a trespass', async () => {
  const unseen: string[] = [];
  for (const table of tables.filter((one) => one.name in SHOP_GRANTS && one.name !== 'idempotency_keys')) {
    const seen = await allowed(
      { kind: 'shop', shopId: shopA?.shopId ?? '', personId: shopA?.userId ?? '' },
      (tx) =>
        count(
          tx,
          sql`select ${key(table)} from ${name(table)} where ${where(table, rowsOfA.get(table.name) ?? {})}`,
        ),
    );
    if (seen !== 1) unseen.push(table.name);
  }
  expect(unseen).toEqual([]);
});

test.each(strangers)(
  '%s neither reads, changes, deletes nor adds a row of shop A, in any table',
  async (_, tenant, maySee) => {
    const trespasses: string[] = [];
    for (const table of tables) {
      const row = rowsOfA.get(table.name) ?? {};
      const here = where(table, row);
      const tried: [string, (tx: Tx) => Promise<number>][] = [
        ...(maySee.includes(table.name)
          ? []
          : [
              [
                'read',
                (tx: Tx) => count(tx, sql`select ${key(table)} from ${name(table)} where ${here}`),
              ] as [string, (tx: Tx) => Promise<number>],
            ]),
        [
          'change',
          (tx) =>
            count(
              tx,
              sql`update ${name(table)} set ${sql.raw(`"${settable(table)}" = "${settable(table)}"`)} where ${here}`,
            ),
        ],
        ['delete', (tx) => count(tx, sql`delete from ${name(table)} where ${here}`)],
      ];
      for (const [what, attempt] of tried) {
        const touched = await allowed(tenant(), attempt);
        if (touched > 0) trespasses.push(`${what} ${table.name}`);
      }
      const added = await allowed(tenant(), (tx) => count(tx, insertion(table, row)));
      if (added > 0) trespasses.push(`insert ${table.name}`);
    }
    expect(trespasses).toEqual([]);
  },
);

test('a query outside any tenant sees nothing, in any table', async () => {
  const seen: string[] = [];
  for (const table of tables) {
    const found = await base.db.execute(sql`select count(*)::int as n from ${name(table)}`).then(
      ({ rows }) => Number((rows[0] as { n: number }).n),
      () => 0,
    );
    if (found > 0) seen.push(table.name);
  }
  expect(seen).toEqual([]);
});

test('a list without any condition shows a shop its own rows only', async () => {
  const strangersRows: string[] = [];
  for (const table of tables.filter((one) => one.columns.some((column) => column.name === 'shop_id'))) {
    const foreign = await allowed(
      { kind: 'shop', shopId: worldB().shopId, personId: worldB().userId },
      (tx) =>
        count(tx, sql`select shop_id from ${name(table)} where shop_id is distinct from ${worldB().shopId}`),
    );
    if (foreign > 0) strangersRows.push(table.name);
  }
  expect(strangersRows).toEqual([]);
});

test('a shop cannot hand a row of its own over to another shop', async () => {
  const handedOver: string[] = [];
  for (const table of tables.filter(
    (one) => one.columns.some((column) => column.name === 'shop_id') && !OF_THE_DOOR.includes(one.name),
  )) {
    const row = rowsOfA.get(table.name) ?? {};
    const moved = await allowed(
      { kind: 'shop', shopId: shopA?.shopId ?? '', personId: shopA?.userId ?? '' },
      (tx) =>
        count(tx, sql`update ${name(table)} set shop_id = ${worldB().shopId} where ${where(table, row)}`),
    );
    if (moved > 0) handedOver.push(table.name);
  }
  expect(handedOver).toEqual([]);
});

test('the door reads nothing of the shop’s work, not even what a batch costs', async () => {
  const open: string[] = [];
  const meant = [
    'shops',
    'processors',
    'shop_processors',
    'users',
    'memberships',
    'invitations',
    'mailed_links',
    'api_tokens',
    'throttles',
    'idempotency_keys',
    'batches',
    'batch_links',
    'dossier_links',
    'payments',
    'payment_events',
  ];
  for (const table of tables.filter((one) => !meant.includes(one.name))) {
    if (
      (await allowed({ kind: 'door' }, (tx) => count(tx, sql`select ${key(table)} from ${name(table)}`))) > 0
    )
      open.push(table.name);
  }
  expect(open).toEqual([]);
  await expect(
    withTenant(base.db, { kind: 'door' }, (tx) => tx.execute(sql`select lot_minimum_minor from batches`)),
  ).rejects.toThrow();
});

test('the processor’s side cannot ask for the shop’s prices beside the order, its notes or its people’s passwords', async () => {
  const asProcessor: Tenant = {
    kind: 'processor',
    processorId: shopA?.processorId ?? '',
    batchId: null,
    personId: null,
  };
  for (const statement of [
    sql`select note from shop_processors`,
    sql`select * from batches`,
    sql`select password_hash from users`,
    sql`select second_approval_above_minor from shops`,
    sql`select * from approvals`,
    sql`select * from audit_entries`,
  ]) {
    await expect(withTenant(base.db, asProcessor, (tx) => tx.execute(statement))).rejects.toThrow();
  }
});

const name = (table: TableFacts) => sql.raw(`"${table.name}"`);
const key = (table: TableFacts) => sql.raw(table.key.map((column) => `"${column}"`).join(', '));
const settable = (table: TableFacts): string =>
  (table.columns.find((column) => !table.key.includes(column.name)) ?? table.columns[0])?.name ?? '';

const where = (table: TableFacts, row: Record<string, unknown>) =>
  sql.join(
    table.key.map((column) => sql`${sql.raw(`"${column}"`)}::text = ${String(row[column])}`),
    sql` and `,
  );

/** A copy of A's row under a fresh id. */
function insertion(table: TableFacts, row: Record<string, unknown>) {
  const fresh = {
    ...row,
    ...(table.key.includes('id') ? { id: randomUUID() } : {}),
    ...('token_hash' in row ? { token_hash: randomUUID() } : {}),
  };
  const names = sql.raw(
    Object.keys(fresh)
      .map((column) => `"${column}"`)
      .join(', '),
  );
  return sql`insert into ${name(table)} (${names}) select ${names} from jsonb_populate_record(null::${name(table)}, ${JSON.stringify(fresh)}::jsonb)`;
}

/** How many rows came back or were touched. */
async function count(tx: Tx, statement: ReturnType<typeof sql>): Promise<number> {
  return (await tx.execute(statement)).rowCount ?? 0;
}

/** Tries it and takes it back; a refusal of the database counts as nothing done, any other fault is a fault. */
async function allowed(tenant: Tenant, attempt: (tx: Tx) => Promise<number>): Promise<number> {
  const outcome: { touched: number } = { touched: 0 };
  try {
    await withTenant(base.db, tenant, async (tx) => {
      outcome.touched = await attempt(tx);
      throw new TakenBack();
    });
  } catch (error) {
    if (!(error instanceof TakenBack) && !isRefusal(error)) throw error;
  }
  return outcome.touched;
}

class TakenBack extends Error {}

/** No right to the table, a row policy, or a rule of the ledger that stands before the policy. */
function isRefusal(error: unknown): boolean {
  const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  const { code } = cause as { code?: string };
  return code === '42501' || code === '23514' || code === 'P0002';
}
