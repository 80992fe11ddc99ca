import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { beforeAll, expect, test } from 'vitest';

import type { StoredMessage } from '@/fakes/mail/message';
import { readObject } from '@/lib/storage/object-store';

import { makeApproval, makeBatch } from '../factories/batches';
import type { World } from '../factories/world';
import { INBOX } from './addresses';
import { andAgain, untilAnswered } from './browser';
import { inRounds, ROUNDS } from './rounds';
import { aWorld, count, openSetting } from './setting';
import { killWorkerInRounds, workOff } from './worker-rounds';

const setting = openSetting();
let shop: { world: World; cookie: string };
const dispatched: string[] = [];

beforeAll(async () => {
  shop = await aWorld(setting);
  await shop.world.as(['admin'], (ctx) => makeApproval(ctx, shop.world.processorId), new Date());
});

test(`dispatch, the door killed in ${ROUNDS} rounds: it left once, with one set of papers, one link and one job for its mail`, async () => {
  const { world, cookie } = shop;
  await inRounds(setting.door, 1, async (disturb, number) => {
    const batch = await world.as(
      ['lead'],
      (ctx) => makeBatch(ctx, world.processorId, { pieces: [3, 4] }),
      new Date(),
    );
    const asked = {
      path: `/batches/${batch.id}/dispatch`,
      cookie,
      key: `dispatch ${number}`,
      body: { version: batch.version },
    };
    const answer = await disturb(() => untilAnswered(asked));
    expect(answer.status).toBe(200);
    await andAgain(asked, answer);
    dispatched.push(batch.id);

    const moved = sql`select from movements m join batch_lines l on l.id = m.batch_line_id where l.batch_id = ${batch.id} and m.reason = 'dispatched'`;
    expect(await count(setting, moved)).toBe(2);
    const papers = sql`select from batch_documents where batch_id = ${batch.id}`;
    expect(await count(setting, papers)).toBe(2);
    const links = sql`select from batch_links where batch_id = ${batch.id}`;
    expect(await count(setting, links)).toBe(1);
    const jobs = sql`select from pgboss.job where name = 'render-documents' and data->>'batchId' = ${batch.id}`;
    expect(await count(setting, jobs)).toBe(1);
  });
});

test(`papers and mail, the worker killed in ${ROUNDS} rounds: each paper is kept once, each batch has one mail`, async () => {
  await killWorkerInRounds(setting, { queue: 'render-documents', seed: 11 });
  await workOff(setting, () => Promise.resolve());

  const { rows: papers } = await setting.owner.execute<{ batch: string; key: string; sha256: string }>(
    sql`select d.batch_id as batch, f.storage_key as key, f.sha256 from batch_documents d join files f on f.id = d.file_id and f.sha256 = d.sha256`,
  );
  expect(papers.map(({ batch }) => batch).toSorted()).toEqual([...dispatched, ...dispatched].toSorted());
  expect(await count(setting, sql`select from files`)).toBe(papers.length);
  for (const { key, sha256 } of papers)
    expect(
      createHash('sha256')
        .update(await readObject(key))
        .digest('hex'),
    ).toBe(sha256);

  const { rows: mails } = await setting.owner.execute<{ id: string }>(
    sql`select data->>'mailId' as id from pgboss.job where name = 'send-mail' and data->>'template' = 'dispatch'`,
  );
  expect(mails).toHaveLength(dispatched.length);
  // A line that breaks between "kept" and "told" sends a mail again; by its number the reader's program shows it once.
  expect(await numbersOfMails(shop.world)).toEqual(new Set(mails.map(({ id }) => id)));
});

/** The numbers of the mails that came to the processor's desk. */
async function numbersOfMails({ processorId }: World): Promise<Set<string | undefined>> {
  const to = `desk-${processorId}@processor.test`;
  const response = await fetch(`${INBOX}/messages?to=${to}`);
  const messages = (await response.json()) as StoredMessage[];
  return new Set(messages.map(({ messageId }) => /^<(.+)@/.exec(messageId ?? '')?.[1]));
}
