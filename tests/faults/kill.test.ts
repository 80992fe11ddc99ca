import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { makeApproval, makeBatch } from '../factories/batches';
import { makeWorld, type World } from '../factories/world';
import { seeded } from './killable';
import { cookieOf, openSetting, tryOnce, tryUntilAnswered } from './setting';

const ROUNDS = 50;
/** The kill falls anywhere between the request's arrival and well after its usual end. */
const LONGEST_MS = 120;

const setting = openSetting();
const random = seeded(20_261_201);

/** Sends a write and kills the door somewhere in the middle of it; then does what a browser does, until it is answered. */
async function killedInTheMiddle(
  asked: Parameters<typeof tryOnce>[0],
): Promise<{ status: number; body: unknown }> {
  const killed = setting.door.killAfter(random() * LONGEST_MS);
  const first = await tryOnce(asked);
  await killed;
  const answered = await tryUntilAnswered(setting, asked);
  // What was answered before the kill is what is answered after it.
  if (first?.status === 200) expect(answered).toEqual(first);
  return answered;
}

const count = async (statement: ReturnType<typeof sql>): Promise<number> =>
  (await setting.owner.execute<{ n: number }>(statement)).rows[0]?.n ?? -1;
const aWorld = async (): Promise<{ world: World; cookie: string }> => {
  const world = await makeWorld(setting.db, setting.owner);
  return { world, cookie: await cookieOf(world.userId, world.shopId) };
};

test(`dispatch, the door killed in ${ROUNDS} rounds: it left once, with one set of papers, one link and one job for its mail`, async () => {
  for (let round = 0; round < ROUNDS; round++) {
    const { world, cookie } = await aWorld();
    const batch = await world.as(
      ['lead', 'admin'],
      async (ctx) => {
        await makeApproval(ctx, world.processorId);
        return makeBatch(ctx, world.processorId, { pieces: [3, 4] });
      },
      new Date(),
    );
    const { status } = await killedInTheMiddle({
      path: `/batches/${batch.id}/dispatch`,
      cookie,
      key: `dispatch-${round}`,
      body: { version: batch.version },
    });
    expect(status, `round ${round}`).toBe(200);
    expect(
      await count(
        sql`select count(*)::int as n from movements m join batch_lines l on l.id = m.batch_line_id where l.batch_id = ${batch.id} and m.reason = 'dispatched'`,
      ),
    ).toBe(2);
    expect(
      await count(sql`select count(*)::int as n from batch_documents where batch_id = ${batch.id}`),
    ).toBe(2);
    expect(await count(sql`select count(*)::int as n from batch_links where batch_id = ${batch.id}`)).toBe(1);
    expect(
      await count(
        sql`select count(*)::int as n from pgboss.job where name = 'render-documents' and data->>'batchId' = ${batch.id}`,
      ),
    ).toBe(1);
  }
});
