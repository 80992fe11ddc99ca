import { sql, type SQL } from 'drizzle-orm';
import pg from 'pg';
import PgBoss from 'pg-boss';
import type { z } from 'zod';

import type { Tx } from '@/db/client';
import type { Ctx } from '@/lib/auth/context';

import { QUEUES } from './queues';

/** A queue's name and what it carries; the code that runs it stays in the worker. */
export interface Queue<Payload extends z.ZodType = z.ZodType> {
  name: string;
  payload: Payload;
}

// Never started: it only words the statement, which runs in the caller's transaction.
const sender = new PgBoss({ connectionString: 'postgres://unused', schema: 'pgboss' });

/**
 * Queues a job in the transaction that causes it: it exists if and only if the transaction commits.
 *
 * @param options.once a key: while a job of the same queue and key waits, a second is not queued.
 */
export async function enqueue<Payload extends z.ZodType>(
  ctx: Pick<Ctx, 'tx'>,
  queue: Queue<Payload>,
  payload: z.input<Payload>,
  options: { once?: string; startAfter?: Date } = {},
): Promise<void> {
  const declared = QUEUES.find((known) => known.name === queue.name);
  if (!declared) throw new Error(`no such queue: ${queue.name}`);
  await sender.send(queue.name, queue.payload.parse(payload) as object, {
    db: { executeSql: (text, values) => executeIn(ctx.tx, text, values) },
    retryLimit: declared.retries,
    retryDelay: declared.retryDelayS,
    retryBackoff: true,
    expireInMinutes: 10,
    ...('givesUpTo' in declared && { deadLetter: declared.givesUpTo }),
    ...(options.once === undefined ? {} : { singletonKey: options.once }),
    ...(options.startAfter === undefined ? {} : { startAfter: options.startAfter }),
  });
}

/** Makes the queues' tables and lets the application's roles add to them. Runs as the owner, with the migrations. */
export async function installQueues(ownerUrl: string): Promise<void> {
  const boss = new PgBoss({
    connectionString: ownerUrl,
    schema: 'pgboss',
    supervise: false,
    schedule: false,
    max: 2,
  });
  await boss.start();
  try {
    for (const queue of QUEUES) await boss.createQueue(queue.name);
  } finally {
    await boss.stop({ graceful: false, close: true, wait: true });
  }
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query(`
      grant usage on schema pgboss to lotwright_app, app_shop, app_portal, app_door;
      grant select, insert, update, delete on all tables in schema pgboss to lotwright_app;
      grant select on pgboss.queue, pgboss.version to app_shop, app_portal, app_door;
      grant insert on pgboss.job to app_shop, app_portal, app_door;
      grant select (id) on pgboss.job to app_shop, app_portal, app_door`);
  } finally {
    await client.end();
  }
}

/** pg-boss words its statements with `$1`; Drizzle's transaction takes them as chunks of one template. */
async function executeIn(tx: Tx, text: string, values: readonly unknown[]): Promise<{ rows: unknown[] }> {
  const chunks: SQL[] = text
    .split(/\$(\d+)/)
    .map((chunk, at) =>
      at % 2 === 0 ? sql.raw(chunk) : sql`${sql.param(prepared(values[Number(chunk) - 1]))}`,
    );
  const { rows } = await tx.execute(sql.join(chunks));
  return { rows };
}

const prepared = (value: unknown): unknown =>
  value !== null && typeof value === 'object' && !(value instanceof Date) ? JSON.stringify(value) : value;
