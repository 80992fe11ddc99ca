import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll } from 'vitest';

import { connect, type Db } from '@/db/client';
import { startPaymentsServer, type PaymentsServer } from '@/fakes/payments/server';

import { makeWorld, type World } from '../factories/world';
import { makeDatabase } from '../services/database';
import { DOOR, DOOR_PORT, WORKER_PORT } from './addresses';
import { cookieOf } from './browser';
import { bundleOf } from './bundle-parts';
import { Killable } from './killable';

const SECRET = 'whsec_of_the_fault_tests';

export interface Setting {
  db: Db;
  owner: Db;
  door: Killable;
  /** The first is the one that is killed; the others help to clear up. */
  workers: readonly [Killable, Killable, Killable];
  payments: PaymentsServer;
}

/** The processes of the product at a database, none of them started. */
export function partsAt(urls: { appUrl: string; ownerUrl: string }, paymentsAddress: string) {
  const env = {
    DATABASE_URL: urls.appUrl,
    DATABASE_OWNER_URL: urls.ownerUrl,
    APP_URL: DOOR,
    STRIPE_API_BASE: paymentsAddress,
    STRIPE_SECRET_KEY: 'sk_test_local',
    STRIPE_WEBHOOK_SECRET: SECRET,
    NODE_ENV: 'production',
  };
  const worker = (port: number) =>
    new Killable(
      [bundleOf('worker')],
      { ...env, WORKER_PORT: String(port) },
      `http://127.0.0.1:${port}/health`,
    );
  return {
    door: new Killable([bundleOf('door'), String(DOOR_PORT)], env, `${DOOR}/api/health`),
    workers: [worker(WORKER_PORT), worker(WORKER_PORT + 1), worker(WORKER_PORT + 2)] as const,
  };
}

/** A database, a door that is up, workers that are not, and a payment service that lives on. */
export function openSetting(): Setting {
  const setting = {} as Setting;
  let close = () => Promise.resolve();
  beforeAll(async () => {
    const database = await makeDatabase();
    const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl, 4)];
    const folder = await mkdtemp(join(tmpdir(), 'faults-'));
    const payments = await startPaymentsServer({
      port: 0,
      file: join(folder, 'payments.json'),
      webhookUrl: `${DOOR}/api/webhooks/payments`,
      webhookSecret: SECRET,
      settleAfterMs: 50,
    });
    const parts = partsAt(database, payments.address);
    Object.assign(setting, { db: app.db, owner: owner.db, payments, ...parts });
    close = async () => {
      await Promise.all([parts.door.close(), ...parts.workers.map((worker) => worker.close())]);
      await payments.close();
      await Promise.all([app.pool.end(), owner.pool.end()]);
      await database.drop();
      await rm(folder, { recursive: true, force: true });
    };
    await parts.door.start();
  });
  afterAll(() => close());
  return setting;
}

/** A shop of its own, and the cookie of its person's browser. */
export async function aWorld({
  db,
  owner,
}: Pick<Setting, 'db' | 'owner'>): Promise<{ world: World; cookie: string }> {
  const world = await makeWorld(db, owner);
  return { world, cookie: await cookieOf(world.userId, world.shopId) };
}

export async function count(
  { owner }: Pick<Setting, 'owner'>,
  statement: ReturnType<typeof sql>,
): Promise<number> {
  const { rows } = await owner.execute<{ n: number }>(
    sql`select count(*)::int as n from (${statement}) counted`,
  );
  return rows[0]?.n ?? -1;
}
