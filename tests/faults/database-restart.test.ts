import { sql } from 'drizzle-orm';
import type pg from 'pg';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';

import { connect, type Db } from '@/db/client';
import { verifyChains } from '@/lib/audit/verify-chain';

import { makeApproval, makeBatch } from '../factories/batches';
import type { World } from '../factories/world';
import { readOnce, untilAnswered } from './browser';
import { openOwnCluster, type OwnCluster } from './own-cluster';
import { aWorld, count, partsAt } from './setting';
import { missWhatWasInHand, workOff } from './worker-rounds';

const RESTARTS = ['fast', 'immediate', 'fast', 'immediate', 'immediate', 'fast'] as const;
const BATCHES = 40;
const PATIENCE = { timeout: 300_000, interval: 50 };

let cluster: OwnCluster;
let setting: ReturnType<typeof partsAt> & { db: Db; owner: Db; pool: pg.Pool };
let shop: { world: World; cookie: string };
let close = () => Promise.resolve();

beforeAll(async () => {
  cluster = await openOwnCluster();
  const [app, owner] = [connect(cluster.appUrl), connect(cluster.ownerUrl, 4)];
  setting = { db: app.db, owner: owner.db, pool: owner.pool, ...partsAt(cluster, 'http://127.0.0.1:9') };
  close = async () => {
    await Promise.all([setting.door, ...setting.workers].map((part) => part.close()));
    await Promise.all([app.pool.end(), owner.pool.end()]);
    await cluster.close();
  };
  shop = await aWorld(setting);
  await shop.world.as(['admin'], (ctx) => makeApproval(ctx, shop.world.processorId), new Date());
});
afterAll(() => close());

test(`the database restarted ${RESTARTS.length} times under load: what was answered is there once, and everything goes on`, async () => {
  const batches = await makeBatches(BATCHES);
  const [worker] = setting.workers;
  await Promise.all([setting.door.start(), worker.start()]);
  const before = [setting.door.pid, worker.pid];
  const load = startLoad(batches);

  for (const how of RESTARTS) {
    const answered = load.answered();
    await vi.waitFor(async () => {
      load.check();
      expect(load.answered()).toBeGreaterThan(answered + 10);
      expect(
        await count(
          setting,
          sql`select from pgboss.job where name = 'render-documents' and state = 'active'`,
        ),
      ).toBe(1);
    }, PATIENCE);
    await cluster.restart(how);
  }
  const { names, dispatched } = await load.end();

  // The worker that saw it all still works.
  const doneBefore = await count(setting, DONE);
  await vi.waitFor(async () => expect(await count(setting, DONE)).toBeGreaterThan(doneBefore + 2), PATIENCE);
  expect([setting.door.pid, worker.pid]).toEqual(before);
  await worker.kill();
  await missWhatWasInHand(setting);
  await workOff(setting, () => Promise.resolve());

  const { rows: locations } = await setting.owner.execute<{ name: string }>(sql`select name from locations`);
  expect(locations.map(({ name }) => name).toSorted()).toEqual(names.toSorted());
  const { rows: moved } = await setting.owner.execute<{ batch: string }>(
    sql`select l.batch_id as batch from movements m join batch_lines l on l.id = m.batch_line_id where m.reason = 'dispatched'`,
  );
  expect(moved.map(({ batch }) => batch).toSorted()).toEqual(dispatched.toSorted());
  const papers = sql`select from batch_documents where file_id is not null`;
  expect(await count(setting, papers)).toBe(2 * dispatched.length);
  const mails = sql`select from pgboss.job where name = 'send-mail' and data->>'template' = 'dispatch'`;
  expect(await count(setting, mails)).toBe(dispatched.length);
  for await (const chain of verifyChains(setting.pool)) expect(chain.broken).toBeNull();
});

const DONE = sql`select from pgboss.job where name in ('render-documents', 'send-mail') and state = 'completed'`;

async function makeBatches(many: number) {
  const { world } = shop;
  const made: { id: string; version: number }[] = [];
  while (made.length < many)
    made.push(
      await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId, { pieces: [3] }), new Date()),
    );
  return made;
}

/** Two who add, one who dispatches, two who read, each one call after the other, whatever becomes of the database. */
function startLoad(batches: readonly { id: string; version: number }[]) {
  const { cookie } = shop;
  const [names, dispatched]: [string[], string[]] = [[], []];
  let goesOn = true;
  let failure: unknown;

  const write = async (path: string, key: string, body: object) => {
    const answer = await untilAnswered({ path, cookie, key, body });
    expect(answer, JSON.stringify(answer.body)).toMatchObject({ status: 200 });
  };
  const add = async (who: string) => {
    for (let number = 1; goesOn; number++) {
      const name = `Rack ${who} ${number}`;
      await write('/stock/locations', name, { name });
      names.push(name);
    }
  };
  const dispatch = async () => {
    for (const { id, version } of batches) {
      if (!goesOn) return;
      await write(`/batches/${id}/dispatch`, id, { version });
      dispatched.push(id);
    }
  };
  const read = async (path: string) => {
    while (goesOn) expect([200, 503]).toContain(await readOnce(path, cookie));
  };
  const all = [add('A'), add('B'), dispatch(), read('/batches'), read('/tideline')];
  for (const one of all) one.catch((error: unknown) => (failure ??= error));

  return {
    answered: () => names.length + dispatched.length,
    check: () => {
      if (failure !== undefined) throw failure;
    },
    end: async () => {
      goesOn = false;
      await Promise.all(all);
      return { names, dispatched };
    },
  };
}
