import { sql } from 'drizzle-orm';
import pg from 'pg';
import { expect, inject, test } from 'vitest';

import { recordAudit } from '@/lib/audit/record-audit';
import { verifyChains, type ChainReport } from '@/lib/audit/verify-chain';
import { newId } from '@/lib/ids';

import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function tell(world: World, count: number): Promise<void> {
  for (let at = 1; at <= count; at++) {
    await world.as(['lead'], (ctx) =>
      recordAudit(ctx, {
        action: 'lot.create',
        entity: 'lot',
        entityId: newId(),
        after: { pieces: at, note: 'µ-finish “as is”', none: null },
      }),
    );
  }
}

/** As the cluster's superuser, who can take any trigger away. */
async function asSuperuser<T>(work: (client: pg.Client) => Promise<T>): Promise<T> {
  const { rows } = await base.owner.execute<{ name: string }>(sql`select current_database() as name`);
  const url = new URL(inject('superUrl'));
  url.pathname = `/${rows[0]?.name ?? ''}`;
  const client = new pg.Client({ connectionString: url.href });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

const tamper = (statement: string, values: unknown[]) =>
  asSuperuser(async (client) => {
    await client.query('alter table audit_entries disable trigger append_only');
    await client.query(statement, values);
    await client.query('alter table audit_entries enable trigger append_only');
  });

async function reportOf(world: World): Promise<ChainReport | undefined> {
  return asSuperuser(async (client) => {
    for await (const report of verifyChains(client)) if (report.shopId === world.shopId) return report;
    return undefined;
  });
}

test('an untouched chain holds, whatever signs and letters stand in it', async () => {
  const world = await makeWorld(base.db, base.owner);
  await tell(world, 5);
  expect(await reportOf(world)).toMatchObject({ entries: 5, broken: null });
});

test('entries that are added at the same moment make one chain', async () => {
  const world = await makeWorld(base.db, base.owner);
  await Promise.all(Array.from({ length: 10 }, () => tell(world, 2)));
  expect(await reportOf(world)).toMatchObject({ entries: 20, broken: null });
});

test.each([
  ['who', `update audit_entries set actor_name = 'Somebody Else' where shop_id = $1 and seq = 3`],
  ['what', `update audit_entries set after = '{"pieces": 40}' where shop_id = $1 and seq = 3`],
  ['when', `update audit_entries set at = at - interval '1 minute' where shop_id = $1 and seq = 3`],
  ['from where', `update audit_entries set address = null where shop_id = $1 and seq = 3`],
])('a superuser who changes %s is found at that entry', async (_, statement) => {
  const world = await makeWorld(base.db, base.owner);
  await tell(world, 5);
  await tamper(statement, [world.shopId]);
  expect(await reportOf(world)).toMatchObject({ entries: 2, broken: { seq: 3, what: 'altered' } });
});

test('a hash that is computed anew after the change breaks the link to the next entry', async () => {
  const world = await makeWorld(base.db, base.owner);
  await tell(world, 5);
  await tamper(`update audit_entries set actor_name = 'Somebody Else' where shop_id = $1 and seq = 3`, [
    world.shopId,
  ]);
  await tamper(
    `update audit_entries e set hash = encode(sha256(convert_to(previous_hash || audit_text(e), 'UTF8')), 'hex') where shop_id = $1 and seq = 3`,
    [world.shopId],
  );
  expect(await reportOf(world)).toMatchObject({ entries: 3, broken: { seq: 4, what: 'unlinked' } });
});

test('an entry that was taken out is missed', async () => {
  const world = await makeWorld(base.db, base.owner);
  await tell(world, 5);
  await tamper('delete from audit_entries where shop_id = $1 and seq = 2', [world.shopId]);
  expect(await reportOf(world)).toMatchObject({ entries: 1, broken: { seq: 2, what: 'missing' } });
});

test('the application and the owner of the tables can neither change nor delete an entry', async () => {
  const world = await makeWorld(base.db, base.owner);
  await tell(world, 2);
  for (const statement of [sql`update audit_entries set action = 'x'`, sql`delete from audit_entries`]) {
    await expect(world.as(['admin'], ({ tx }) => tx.execute(statement))).rejects.toThrow();
    await expect(base.owner.execute(statement)).rejects.toThrow();
  }
  await expect(base.db.execute(sql`truncate audit_entries`)).rejects.toThrow();
  expect(await reportOf(world)).toMatchObject({ entries: 2, broken: null });
});
