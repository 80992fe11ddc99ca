import { and, eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import {
  batchDocuments,
  batches,
  batchLines,
  batchLinks,
  overrides,
  requirements,
} from '@/db/schema/batches';
import { certificates, decisions } from '@/db/schema/evidence';
import { receipts } from '@/db/schema/receipts';
import { files } from '@/db/schema/files';
import { balances } from '@/db/schema/lots';
import { invoices } from '@/db/schema/money';
import { cancelBatch } from '@/lib/batches/cancel-batch';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { overrideCheck } from '@/lib/batches/override-check';
import { getBatchChecks, getTraveller, listBatchDocuments } from '@/lib/batches/queries';
import { reissueBatch } from '@/lib/batches/reissue-batch';
import { withdrawOverride } from '@/lib/batches/withdraw-override';
import { withdrawBatchLinks } from '@/lib/portal/withdraw-batch-links';
import { newId } from '@/lib/ids';
import { movePieces } from '@/lib/stock/move-pieces';
import { PaperContent } from '@/lib/travellers/content';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);
const sent = (here: World, given: Parameters<typeof makeDispatchedBatch>[2] = {}) =>
  here.as(['lead'], (ctx) => makeDispatchedBatch(ctx, here.processorId, given));
const queued = async (here: World, name: string) =>
  (
    await base.owner.execute<{ data: Record<string, unknown> }>(
      sql`select data from pgboss.job where name = ${name} and data->>'shopId' = ${here.shopId} order by created_on`,
    )
  ).rows.map((row) => row.data);
const contentOf = (
  papers: readonly { content: unknown; documentVersion: number; kind: string }[],
  kind: string,
  version: number,
) =>
  PaperContent.parse(
    papers.find((paper) => paper.kind === kind && paper.documentVersion === version)?.content,
  );

test('a cancelled batch brings its pieces back from wherever they were, ends its links and tells the processor', async () => {
  const here = await world();
  const { id, version, lots } = await sent(here, { pieces: [10] });
  await here.as(['lead'], async (ctx) => {
    const [line] = await ctx.tx.select().from(batchLines).where(eq(batchLines.batchId, id));
    const holderId = line?.id ?? '';
    await movePieces(ctx, {
      lotId: lots[0]?.id ?? '',
      pieces: 6,
      from: { place: 'transit_out', holderId },
      to: { place: 'at_processor', holderId },
      reason: 'acknowledged',
    });
    await cancelBatch(ctx, { batchId: id, version, reason: 'The drawing changed' });
    const away = await ctx.tx
      .select({ place: balances.place, pieces: balances.pieces })
      .from(balances)
      .where(and(eq(balances.lotId, lots[0]?.id ?? ''), sql`pieces > 0`));
    expect(away).toEqual([{ place: 'making', pieces: 10 }]);
    const [batch] = await ctx.tx.select().from(batches).where(eq(batches.id, id));
    expect(batch).toMatchObject({ stage: 'cancelled', cancelReason: 'The drawing changed' });
    const links = await ctx.tx.select().from(batchLinks).where(eq(batchLinks.batchId, id));
    expect(links.every((link) => link.withdrawnAt !== null)).toBe(true);
  });
  expect((await queued(here, 'send-mail')).map((mail) => mail['template'])).toEqual(['batch-cancelled']);
});

test('a batch that is still here is cancelled without a word to the processor', async () => {
  const here = await world();
  const made = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  await here.as(['lead'], (ctx) =>
    cancelBatch(ctx, { batchId: made.id, version: made.version, reason: 'Not needed' }),
  );
  expect(await queued(here, 'send-mail')).toEqual([]);
});

test('once something was counted in, or an invoice stands, it is not cancelled', async () => {
  const here = await world();
  const [first, second] = [await sent(here), await sent(here)];
  await base.owner
    .insert(receipts)
    .values({ shopId: here.shopId, batchId: first.id, receivedAt: TODAY, receivedBy: 'Test Person' });
  await base.owner.insert(invoices).values({
    shopId: here.shopId,
    batchId: second.id,
    processorId: here.processorId,
    currency: 'USD',
    sentBy: 'Test Processor',
  });
  const cancel = (batch: { id: string; version: number }) =>
    here.as(['lead'], (ctx) =>
      cancelBatch(ctx, { batchId: batch.id, version: batch.version, reason: 'Not needed' }),
    );
  await expect(cancel(first)).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('counted in') as string,
  });
  await expect(cancel(second)).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('invoice stands') as string,
  });
});

test('cancelled twice at once, the pieces come back once and one mail goes', async () => {
  const here = await world();
  const { id, version } = await sent(here);
  const press = () =>
    here.as(['lead'], (ctx) => cancelBatch(ctx, { batchId: id, version, reason: 'Not needed' }));
  const outcomes = await Promise.allSettled([press(), press(), press()]);
  expect(outcomes.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(1);
  expect(await queued(here, 'send-mail')).toHaveLength(1);
});

test('an inspector may not cancel, and another shop finds nothing', async () => {
  const [here, stranger] = [await world(), await world()];
  const { id, version } = await sent(here);
  const input = { batchId: id, version, reason: 'Not needed' };
  await expect(here.as(['inspector'], (ctx) => cancelBatch(ctx, input))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(stranger.as(['lead'], (ctx) => cancelBatch(ctx, input))).rejects.toMatchObject({
    code: 'not_found',
  });
});

const nothingElse = { prices: [], requirements: [] };

test('a re-issue keeps the old papers and states new ones that say what is different', async () => {
  const here = await world();
  const { id, version } = await sent(here, { lotMinimumMinor: 10_000 });
  await here.as(['lead'], async (ctx) => {
    const [line] = await ctx.tx.select().from(batchLines).where(eq(batchLines.batchId, id));
    const done = await reissueBatch(ctx, {
      batchId: id,
      version,
      wantedBackOn: '2026-07-09',
      note: 'Van on Friday',
      prices: [{ lineId: line?.id ?? '', unitPriceMinor: 640 }],
      requirements: [],
    });
    expect(done).toMatchObject({
      documentVersion: 2,
      changes: [
        'wanted back Thu 9 Jul, was Wed 1 Jul',
        'line 1 at 6.40 each, was 5.00',
        'note: Van on Friday',
      ],
    });
    const papers = await ctx.tx.select().from(batchDocuments).where(eq(batchDocuments.batchId, id));
    expect(papers).toHaveLength(4);
    expect(contentOf(papers, 'traveller', 1)).toMatchObject({ wantedBackOn: '2026-07-01', changes: [] });
    expect(contentOf(papers, 'purchase_order', 2)).toMatchObject({
      lines: [{ unitPriceMinor: 640 }],
      changes: done.changes,
    });
    const first = contentOf(papers, 'traveller', 1);
    const second = contentOf(papers, 'traveller', 2);
    expect(
      first.kind === 'traveller' && second.kind === 'traveller' && first.link?.linkId === second.link?.linkId,
    ).toBe(true);
    expect(
      (await listBatchDocuments(ctx, { batchId: id })).documents.map((one) => one.documentVersion),
    ).toEqual([2, 2, 1, 1]);
  });
  expect((await queued(here, 'render-documents')).map((job) => job['mail'])).toEqual(['dispatch', 'reissue']);
});

test('a re-issue words a requirement anew, but not under a decision; and says when nothing is different', async () => {
  const here = await world();
  const { id, version } = await sent(here);
  const reissue = (seen: number, given: Partial<Parameters<typeof reissueBatch>[1]>) =>
    here.as(['lead'], (ctx) => reissueBatch(ctx, { batchId: id, version: seen, ...nothingElse, ...given }));
  await expect(reissue(version, { wantedBackOn: '2026-07-01' })).rejects.toMatchObject({
    code: 'bad_input',
    message: expect.stringContaining('Nothing is different') as string,
  });

  const [asked] = await base.owner.select().from(requirements).where(eq(requirements.batchId, id));
  const requirementId = asked?.id ?? '';
  const done = await reissue(version, { requirements: [{ requirementId, limit: '65 to 83', unit: 'HRB' }] });
  expect(done.changes).toEqual(['Hardness: 65 to 83 HRB, was 63 to 83 HRB']);

  const [fileId, certificateId] = [newId(), newId()];
  await base.owner.insert(files).values({
    id: fileId,
    shopId: here.shopId,
    batchId: id,
    purpose: 'certificate',
    name: 'c.pdf',
    mediaType: 'application/pdf',
    size: 1,
    storageKey: fileId,
    uploadedBy: 'Test Processor',
  });
  await base.owner
    .insert(certificates)
    .values({ id: certificateId, shopId: here.shopId, batchId: id, fileId, sentBy: 'Test Processor' });
  await base.owner.insert(decisions).values({
    shopId: here.shopId,
    certificateId,
    requirementId,
    verdict: 'meets',
    decidedBy: 'Test Person',
    decidedAt: TODAY,
  });
  await expect(
    reissue(done.version, { requirements: [{ requirementId, limit: '70', unit: 'HRB' }] }),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('Hardness was decided') as string,
  });
});

test('prices of an approved invoice stay', async () => {
  const here = await world();
  const { id, version } = await sent(here);
  await base.owner.insert(invoices).values({
    shopId: here.shopId,
    batchId: id,
    processorId: here.processorId,
    currency: 'USD',
    sentBy: 'Test Processor',
    number: 'IN-7',
    approvedAt: TODAY,
  });
  await expect(
    here.as(['lead'], (ctx) =>
      reissueBatch(ctx, { batchId: id, version, ...nothingElse, lotMinimumMinor: 99_00 }),
    ),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('IN-7 is approved') as string,
  });
});

test('a re-issue does not give back a link that the shop withdrew', async () => {
  const here = await world();
  const { id, version } = await sent(here);
  await here.as(['lead'], async (ctx) => {
    await withdrawBatchLinks(ctx, { batchId: id });
    await reissueBatch(ctx, { batchId: id, version, ...nothingElse, note: 'Another' });
    const papers = await ctx.tx.select().from(batchDocuments).where(eq(batchDocuments.batchId, id));
    expect(contentOf(papers, 'traveller', 2)).toMatchObject({ link: null });
    const standing = await ctx.tx
      .select()
      .from(batchLinks)
      .where(and(eq(batchLinks.batchId, id), sql`withdrawn_at is null`));
    expect(standing).toEqual([]);
  });
});

test('a batch that is here is not re-issued, nor by an inspector, nor by another shop', async () => {
  const [here, stranger] = [await world(), await world()];
  const built = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  const { id, version } = await sent(here);
  await expect(
    here.as(['lead'], (ctx) =>
      reissueBatch(ctx, { batchId: built.id, version: built.version, ...nothingElse, note: 'x' }),
    ),
  ).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('not left yet') as string });
  await expect(
    here.as(['inspector'], (ctx) => reissueBatch(ctx, { batchId: id, version, ...nothingElse, note: 'x' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    stranger.as(['lead'], (ctx) => reissueBatch(ctx, { batchId: id, version, ...nothingElse, note: 'x' })),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('an admin lets a blocker pass for exactly what it names, and may take that back; a lead may not', async () => {
  const here = await world();
  const made = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  const input = {
    batchId: made.id,
    version: made.version,
    check: 'processor_not_approved',
    subject: here.processorId,
    reason: 'Approved by telephone, paper follows.',
  };
  await expect(here.as(['lead'], (ctx) => overrideCheck(ctx, input))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(
    here.as(['admin'], (ctx) => overrideCheck(ctx, { ...input, check: 'empty_batch', subject: '' })),
  ).rejects.toMatchObject({ code: 'conflict' });
  const passed = await here.as(['admin'], (ctx) => overrideCheck(ctx, input));
  const checked = await here.as(['lead'], (ctx) => getBatchChecks(ctx, { batchId: made.id }));
  const findings = checked.findings.filter(({ level }) => level === 'stop');
  expect(findings).toMatchObject([
    {
      code: 'processor_not_approved',
      passed: { reason: 'Approved by telephone, paper follows.', by: 'Test Person' },
    },
  ]);

  const overrideId = findings[0]?.passed?.overrideId ?? '';
  const back = await here.as(['admin'], (ctx) =>
    withdrawOverride(ctx, { batchId: made.id, version: passed.version, overrideId }),
  );
  expect(await base.owner.select().from(overrides).where(eq(overrides.batchId, made.id))).toEqual([]);
  await expect(
    here.as(['lead'], (ctx) => dispatchBatch(ctx, { batchId: made.id, version: back.version })),
  ).rejects.toMatchObject({ code: 'conflict' });
});

test('what the traveller says is shown without the link its code opens', async () => {
  const here = await world();
  const { id } = await sent(here);
  const built = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  await here.as(['lead'], async (ctx) => {
    const stated = await getTraveller(ctx, { batchId: id });
    expect(stated).toMatchObject({ documentVersion: 1, kind: 'traveller' });
    expect(stated).not.toHaveProperty('link');
    expect(await getTraveller(ctx, { batchId: built.id })).toMatchObject({
      documentVersion: 0,
      lines: [{ pieces: 10 }],
    });
  });
});
