import { and, eq, sql } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import { expect, test } from 'vitest';

import { withTenant } from '@/db/client';
import { batchDocuments } from '@/db/schema/batches';
import { files } from '@/db/schema/files';
import { newId } from '@/lib/ids';
import type { JobTools } from '@/lib/jobs/job';
import { readObject } from '@/lib/storage/object-store';
import { renderAndSend } from '@/lib/travellers/render-and-send';
import { renderDocumentsQueue } from '@/lib/travellers/render-documents-queue';

import { makeDispatchedBatch } from '../../factories/batches';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

const toolsOf = (here: World): JobTools => ({
  attempt: 1,
  gaveUp: null,
  now: () => TODAY,
  inShop: (shopId, work) =>
    withTenant(here.db, { kind: 'shop', shopId, personId: null }, (tx) =>
      work({
        tenant: { kind: 'shop', shopId, personId: null },
        actor: { kind: 'job', name: 'render-documents', roles: [] },
        tx,
        now: TODAY,
        requestId: newId(),
        address: null,
      }),
    ),
  atDoor: (work) =>
    withTenant(here.db, { kind: 'door' }, (tx) =>
      work({
        tenant: { kind: 'door' },
        actor: { kind: 'job', name: 'render-documents', roles: [] },
        tx,
        now: TODAY,
        requestId: newId(),
        address: null,
      }),
    ),
});

async function sent() {
  const here = await makeWorld(base.db, base.owner);
  const batch = await here.as(['lead'], (ctx) => makeDispatchedBatch(ctx, here.processorId));
  const { rows } = await base.owner.execute<{ data: unknown }>(
    sql`select data from pgboss.job where name = 'render-documents' and data->>'batchId' = ${batch.id}`,
  );
  return { here, batch, payload: renderDocumentsQueue.payload.parse(rows[0]?.data) };
}

const mails = (here: World) =>
  base.owner.execute<{ data: { props: Record<string, unknown> } }>(
    sql`select data from pgboss.job where name = 'send-mail' and data->>'shopId' = ${here.shopId}`,
  );

test('both papers are made, kept as verified files with their hash, and one mail waits with the link', async () => {
  const { here, batch, payload } = await sent();
  await renderAndSend(toolsOf(here), payload);
  const papers = await base.owner
    .select({
      kind: batchDocuments.kind,
      sha256: batchDocuments.sha256,
      key: files.storageKey,
      state: files.state,
      purpose: files.purpose,
    })
    .from(batchDocuments)
    .innerJoin(files, eq(files.id, batchDocuments.fileId))
    .where(eq(batchDocuments.batchId, batch.id));
  expect(papers.map((paper) => paper.purpose).sort()).toEqual(['purchase_order', 'traveller']);
  for (const paper of papers) {
    expect(paper.state).toBe('verified');
    const content = await readObject(paper.key);
    expect(content.subarray(0, 5).toString()).toBe('%PDF-');
    expect(createHash('sha256').update(content).digest('hex')).toBe(paper.sha256);
  }
  const { rows } = await mails(here);
  expect(rows).toHaveLength(1);
  expect(rows[0]?.data.props['url']).toMatch(/\/b\/[\w-]{43}$/);
});

test('run again, and by two workers at once, there is one file of each and one mail', async () => {
  const { here, batch, payload } = await sent();
  await Promise.all([renderAndSend(toolsOf(here), payload), renderAndSend(toolsOf(here), payload)]);
  await renderAndSend(toolsOf(here), payload);
  expect((await mails(here)).rows).toHaveLength(1);
  expect(
    await base.owner
      .select()
      .from(files)
      .where(and(eq(files.batchId, batch.id))),
  ).toHaveLength(2);
});

test('a worker that dies after keeping the files, before recording them, loses and doubles nothing', async () => {
  const { here, batch, payload } = await sent();
  const tools = toolsOf(here);
  let calls = 0;
  // One look at what is awaited and two files kept; the fourth transaction would record them.
  const dying: JobTools = {
    ...tools,
    inShop: (shopId, work) =>
      ++calls === 4 ? Promise.reject(new Error('killed')) : tools.inShop(shopId, work),
  };
  await expect(renderAndSend(dying, payload)).rejects.toThrow('killed');
  expect((await mails(here)).rows).toHaveLength(0);
  await renderAndSend(tools, payload);
  expect((await mails(here)).rows).toHaveLength(1);
  expect(await base.owner.select().from(files).where(eq(files.batchId, batch.id))).toHaveLength(2);
});
