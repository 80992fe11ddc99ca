import { sql, type ExtractTablesWithRelations } from 'drizzle-orm';
import { drizzle, type NodePgDatabase, type NodePgTransaction } from 'drizzle-orm/node-postgres';
import pg from 'pg';

// Dates without time stay the text they are; a Date would move them by the server's zone.
pg.types.setTypeParser(pg.types.builtins.DATE, (text) => text);

type NoSchema = Record<string, never>;
export type Db = NodePgDatabase<NoSchema>;
export type Tx = NodePgTransaction<NoSchema, ExtractTablesWithRelations<NoSchema>>;

/** For whom a transaction is opened. Each sees its own rows only; `door` sees who people are and nothing else. */
export type Tenant =
  | { kind: 'shop'; shopId: string; personId: string | null }
  | { kind: 'processor'; processorId: string; batchId: string | null; personId: string | null }
  | { kind: 'door' };

const ROLE = { shop: 'app_shop', processor: 'app_portal', door: 'app_door' } as const;

export function connect(url: string, max = 20): { db: Db; pool: pg.Pool } {
  const pool = new pg.Pool({ connectionString: url, max, connectionTimeoutMillis: 10_000 });
  // A connection that dies while idle (database restarted) is replaced by the pool; without a listener it would end the process.
  pool.on('error', () => undefined);
  // The same for one that dies between two statements of a transaction: the next statement fails, which is enough.
  pool.on('connect', (client) => client.on('error', () => undefined));
  return { db: drizzle(pool), pool };
}

/**
 * Opens a transaction as the tenant's database role. The only place that enters a tenant: outside it every query of
 * the application sees no rows.
 */
export function withTenant<T>(
  db: Db,
  tenant: Tenant,
  work: (tx: Tx) => Promise<T>,
  keyOwner = '',
): Promise<T> {
  return db.transaction(async (tx) => {
    await enter(tx, tenant, keyOwner);
    return work(tx);
  });
}

/**
 * Runs `work` in the shop's name inside a processor's transaction, then goes back. A processor has no right to write:
 * callers first read the batch with the processor's own eyes, which proves that it is theirs, and then record what was
 * said about it here.
 */
export async function inShopOf<T>(tx: Tx, from: Tenant, shopId: string, work: () => Promise<T>): Promise<T> {
  await enter(tx, { kind: 'shop', shopId, personId: null });
  const result = await work();
  await enter(tx, from);
  return result;
}

/**
 * Looks at who people are from inside a transaction, then goes back: a signature asks its signer once more, and a shop's
 * own side cannot see what a password is compared with.
 */
export async function atDoorOf<T>(tx: Tx, from: Tenant, work: () => Promise<T>): Promise<T> {
  await enter(tx, { kind: 'door' });
  const result = await work();
  await enter(tx, from);
  return result;
}

async function enter(tx: Tx, tenant: Tenant, keyOwner?: string): Promise<void> {
  const shopId = tenant.kind === 'shop' ? tenant.shopId : '';
  const processorId = tenant.kind === 'processor' ? tenant.processorId : '';
  const batchId = tenant.kind === 'processor' ? (tenant.batchId ?? '') : '';
  const personId = tenant.kind === 'door' ? '' : (tenant.personId ?? '');
  // One round trip: role and settings end with the transaction.
  await tx.execute(sql`select set_config('role', ${ROLE[tenant.kind]}, true), set_config('app.shop_id', ${shopId}, true),
    set_config('app.processor_id', ${processorId}, true), set_config('app.batch_id', ${batchId}, true),
    set_config('app.person_id', ${personId}, true), set_config('app.door', ${tenant.kind === 'door' ? 'open' : ''}, true)${keyOwner === undefined ? sql`` : sql`, set_config('app.key_owner', ${keyOwner}, true)`}`);
}
