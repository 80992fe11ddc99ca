import { and, eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { batchDocuments, batches, batchLines, batchLinks, overrides } from '@/db/schema/batches';
import { approvals } from '@/db/schema/organisations';
import { auditEntries } from '@/db/schema/audit';
import { balances } from '@/db/schema/lots';
import { parts } from '@/db/schema/parts';
import { hashToken } from '@/lib/auth/identify';
import { batchLinkToken } from '@/lib/batches/batch-link-token';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { removeLine } from '@/lib/batches/remove-line';
import { TravellerContent } from '@/lib/travellers/content';

import { makeApproval, makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);

const queued = (shopId: string) =>
  base.owner.execute(
    sql`select data from pgboss.job where name = 'render-documents' and data->>'shopId' = ${shopId}`,
  );

async function ready(here: World, given: Parameters<typeof makeBatch>[2] = {}) {
  return here.as(['lead'], async (ctx) => {
    await makeApproval(ctx, here.processorId);
    return makeBatch(ctx, here.processorId, given);
  });
}

test('dispatch freezes the lines, moves the pieces, states both papers, makes a link, queues one job and tells the trail', async () => {
  const here = await world();
  const { id, version, lots } = await ready(here, { pieces: [14, 6] });
  await here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version }));

  await here.as(['lead'], async ({ tx }) => {
    const [batch] = await tx.select().from(batches).where(eq(batches.id, id));
    expect(batch).toMatchObject({ stage: 'dispatched', pieces: 20, dispatchedBy: here.userId });
    const lines = await tx
      .select()
      .from(batchLines)
      .where(eq(batchLines.batchId, id))
      .orderBy(batchLines.lineNo);
    expect(lines.map((line) => [line.lotId, line.frozen?.material, line.frozen?.targetCondition])).toEqual(
      lots.map((lot) => [lot.id, '2024 clad sheet', 'T42']),
    );
    const away = await tx
      .select({ pieces: balances.pieces })
      .from(balances)
      .where(and(eq(balances.place, 'transit_out'), sql`holder_id in (select id from batch_lines)`));
    expect(away.map((one) => one.pieces).sort()).toEqual([14, 6]);
    const papers = await tx.select().from(batchDocuments).where(eq(batchDocuments.batchId, id));
    expect(papers.map((paper) => [paper.kind, paper.documentVersion])).toEqual(
      expect.arrayContaining([
        ['traveller', 1],
        ['purchase_order', 1],
      ]),
    );
    const traveller = TravellerContent.parse(papers.find((paper) => paper.kind === 'traveller')?.content);
    expect(traveller.lines.map((line) => line.pieces)).toEqual([14, 6]);
    expect(traveller.requirements).toMatchObject([{ characteristic: 'Hardness', lines: [] }]);
    const [link] = await tx.select().from(batchLinks).where(eq(batchLinks.batchId, id));
    expect(link?.tokenHash).toBe(hashToken(batchLinkToken(link?.id ?? '')));
    expect(JSON.stringify(papers)).not.toContain(batchLinkToken(link?.id ?? ''));
    const [entry] = await tx
      .select()
      .from(auditEntries)
      .where(and(eq(auditEntries.entityId, id), eq(auditEntries.action, 'batch.dispatch')));
    expect(entry?.after).toMatchObject({ pieces: 20, papers: 1 });
  });
  expect((await queued(here.shopId)).rows).toHaveLength(1);
});

test('pressed twice at once, it leaves once', async () => {
  const here = await world();
  const { id, version } = await ready(here);
  const press = () => here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version }));
  const outcomes = await Promise.allSettled([press(), press(), press(), press()]);
  expect(outcomes.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(1);
  for (const outcome of outcomes)
    if (outcome.status === 'rejected') expect(outcome.reason).toMatchObject({ code: 'conflict' });
  expect((await queued(here.shopId)).rows).toHaveLength(1);
});

test('a dispatch that fails at its end leaves nothing behind: no mail, no paper, no moved piece', async () => {
  const here = await world();
  const { id, version } = await ready(here);
  const fault = here.as(['lead'], async (ctx) => {
    await dispatchBatch(ctx, { batchId: id, version });
    throw new Error('the server died here');
  });
  await expect(fault).rejects.toThrow('the server died here');
  expect((await queued(here.shopId)).rows).toHaveLength(0);
  await here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version }));
  expect((await queued(here.shopId)).rows).toHaveLength(1);
});

test('an inspector may not dispatch', async () => {
  const here = await world();
  const { id, version } = await ready(here);
  await expect(
    here.as(['inspector'], (ctx) => dispatchBatch(ctx, { batchId: id, version })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('what the person saw is what leaves: an older version is refused', async () => {
  const here = await world();
  const { id, version } = await ready(here);
  await expect(
    here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version: version - 1 })),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('changed meanwhile') as string,
  });
});

test('another shop is told that the batch does not exist', async () => {
  const [here, stranger] = [await world(), await world()];
  const { id, version } = await ready(here);
  await expect(
    stranger.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version })),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('an empty batch stays', async () => {
  const here = await world();
  const { id, version } = await ready(here);
  const emptied = await here.as(['lead'], async (ctx) => {
    const [line] = await ctx.tx
      .select({ id: batchLines.id })
      .from(batchLines)
      .where(eq(batchLines.batchId, id));
    return removeLine(ctx, { batchId: id, version, lineId: line?.id ?? '' });
  });
  await expect(
    here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version: emptied.version })),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('Nothing is in it') as string,
  });
});

test.each([
  [
    'was never given',
    (here: World) => base.owner.delete(approvals).where(eq(approvals.shopId, here.shopId)),
    'is not approved for this',
  ],
  [
    'has ended',
    (here: World) =>
      base.owner.update(approvals).set({ validTo: '2026-06-16' }).where(eq(approvals.shopId, here.shopId)),
    'ended',
  ],
  [
    'was withdrawn',
    (here: World) =>
      base.owner
        .update(approvals)
        .set({ withdrawnAt: new Date('2026-06-01') })
        .where(eq(approvals.shopId, here.shopId)),
    'was withdrawn',
  ],
])(
  'without an approval (it %s) the batch stays, unless an admin lets it pass with a reason',
  async (_, spoil, says) => {
    const here = await world();
    const { id, version } = await ready(here);
    await spoil(here);
    await expect(
      here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version })),
    ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining(says) as string });
    await base.owner.insert(overrides).values({
      shopId: here.shopId,
      batchId: id,
      check: 'processor_not_approved',
      subject: here.processorId,
      reason: 'The renewed approval is in the post; checked by telephone.',
      by: here.userId,
    });
    await here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: id, version }));
    await here.as(['lead'], async ({ tx }) => {
      const [paper] = await tx
        .select()
        .from(batchDocuments)
        .where(and(eq(batchDocuments.batchId, id), eq(batchDocuments.kind, 'traveller')));
      expect(TravellerContent.parse(paper?.content).overrides).toMatchObject([
        { reason: 'The renewed approval is in the post; checked by telephone.', by: 'Test Person' },
      ]);
    });
  },
);

test('what is changed on the part afterwards does not reach a batch that left', async () => {
  const here = await world();
  const { id, lots } = await here.as(['lead'], (ctx) => makeDispatchedBatch(ctx, here.processorId));
  await base.owner
    .update(parts)
    .set({ name: 'Renamed' })
    .where(eq(parts.id, lots[0]?.part.id ?? ''));
  await here.as(['lead'], async ({ tx }) => {
    const [line] = await tx
      .select({ frozen: batchLines.frozen })
      .from(batchLines)
      .where(eq(batchLines.batchId, id));
    expect(line?.frozen?.partName).toBe('Rib clip');
  });
});
