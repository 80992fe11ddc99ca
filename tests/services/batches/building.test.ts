import { and, eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { batches, batchLines, requirements } from '@/db/schema/batches';
import { shopProcessors } from '@/db/schema/organisations';
import { balances } from '@/db/schema/lots';
import { routeSteps } from '@/db/schema/parts';
import type { Ctx } from '@/lib/auth/context';
import { addLine } from '@/lib/batches/add-line';
import { changeLine } from '@/lib/batches/change-line';
import { createBatch } from '@/lib/batches/create-batch';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { listStepProcessors, listWaitingLots, listWaitingSteps } from '@/lib/batches/list-waiting';
import { putBatchAside } from '@/lib/batches/put-batch-aside';
import { getBatch, getBatchChecks, listBatches } from '@/lib/batches/queries';
import { removeLine } from '@/lib/batches/remove-line';
import { setRequirements } from '@/lib/batches/set-requirements';
import { updateBatch } from '@/lib/batches/update-batch';
import { newId } from '@/lib/ids';

import { makeApproval, makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeLot, makePart } from '../../factories/lots';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);

async function whereIs(ctx: Ctx, lotId: string): Promise<Record<string, number>> {
  const rows = await ctx.tx
    .select({ place: balances.place, pieces: sql<number>`sum(${balances.pieces})::int` })
    .from(balances)
    .where(and(eq(balances.lotId, lotId), sql`${balances.pieces} > 0`))
    .groupBy(balances.place);
  return Object.fromEntries(rows.map((row) => [row.place, row.pieces]));
}
const linesOf = (ctx: Ctx, batchId: string) =>
  ctx.tx.select().from(batchLines).where(eq(batchLines.batchId, batchId)).orderBy(batchLines.lineNo);
const actions = async (ctx: Ctx, batchId: string) =>
  (
    await ctx.tx
      .select({ action: auditEntries.action })
      .from(auditEntries)
      .where(eq(auditEntries.entityId, batchId))
      .orderBy(auditEntries.seq)
  ).map((row) => row.action);
const toProve = [
  {
    characteristic: 'Hardness',
    limit: '63 to 83',
    unit: 'HRB',
    source: 'specification' as const,
    sourceText: 'AMS 2658',
  },
];

test('a batch takes its step from the first lot, numbers itself and its order, and reserves the pieces', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const lot = await makeLot(ctx, { pieces: 12 });
    const made = await createBatch(ctx, {
      processorId: here.processorId,
      lines: [{ lotId: lot.id, stepId: lot.stepId, pieces: 9, unitPriceMinor: 250 }],
    });
    const [batch] = await ctx.tx.select().from(batches).where(eq(batches.id, made.id));
    expect(batch).toMatchObject({
      number: 'B-0001',
      orderNumber: 'TP-0001',
      process: 'solution_heat_treat_and_age',
      specification: 'AMS 2770',
      specificationRevision: 'R',
      stage: 'building',
      pieces: 9,
      currency: 'USD',
    });
    expect(await whereIs(ctx, lot.id)).toEqual({ making: 3, packed: 9 });
    expect(await actions(ctx, made.id)).toEqual(['batch.create']);
  });
});

test('what must be proved comes from the route when a lot is added, and can be typed over', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const part = await makePart(ctx);
    await ctx.tx.update(routeSteps).set({ toProve }).where(eq(routeSteps.partId, part.id));
    const lot = await makeLot(ctx, { part });
    const made = await createBatch(ctx, {
      processorId: here.processorId,
      lines: [{ lotId: lot.id, stepId: lot.stepId, pieces: 5, unitPriceMinor: 0 }],
    });
    const [line] = await linesOf(ctx, made.id);
    const { requirements: first } = await getBatchLines(ctx, { batchId: made.id });
    expect(first).toMatchObject([
      { lineId: line?.id, characteristic: 'Hardness', limit: '63 to 83', unit: 'HRB' },
    ]);
    await setRequirements(ctx, {
      batchId: made.id,
      version: made.version,
      lineId: line?.id ?? null,
      requirements: [
        {
          characteristic: 'Conductivity',
          limit: '28.5 to 34.0',
          unit: '% IACS',
          source: 'shop',
          sourceText: '',
        },
      ],
    });
    const { requirements: then } = await getBatchLines(ctx, { batchId: made.id });
    expect(then.map((one) => one.characteristic)).toEqual(['Conductivity']);
  });
});

test('more pieces than wait are refused by name of the field, at once and when the line is changed', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const lot = await makeLot(ctx, { pieces: 41 });
    const line = { lotId: lot.id, stepId: lot.stepId, unitPriceMinor: 0 };
    await expect(
      createBatch(ctx, { processorId: here.processorId, lines: [{ ...line, pieces: 42 }] }),
    ).rejects.toMatchObject({
      code: 'bad_input',
      details: { fields: [{ field: 'lines.0.pieces', message: 'The lot has 41. Enter 41 or less.' }] },
    });
    const made = await createBatch(ctx, { processorId: here.processorId, lines: [{ ...line, pieces: 40 }] });
    const [added] = await linesOf(ctx, made.id);
    await expect(
      changeLine(ctx, { batchId: made.id, version: made.version, lineId: added?.id ?? '', pieces: 42 }),
    ).rejects.toMatchObject({ code: 'bad_input', details: { fields: [{ field: 'pieces' }] } });
  });
});

test('a lot of another step cannot join, nor the same lot twice', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const { id, lots } = await makeBatch(ctx, here.processorId, {
      lots: [await makeLot(ctx, { pieces: 10 })],
    });
    const other = await makeLot(ctx, { part: await makePart(ctx, { processes: ['anodize'] }) });
    await expect(
      addLine(ctx, { batchId: id, lotId: other.id, stepId: other.stepId, pieces: 1, unitPriceMinor: 0 }),
    ).rejects.toMatchObject({
      code: 'bad_input',
      message: expect.stringContaining('waits for anodize') as string,
    });
    const [first] = lots;
    const [line] = await linesOf(ctx, id);
    const fewer = await changeLine(ctx, {
      batchId: id,
      version: (await getBatch(ctx, { batchId: id })).version,
      lineId: line?.id ?? '',
      pieces: 4,
    });
    expect(fewer.version).toBeGreaterThan(1);
    await expect(
      addLine(ctx, {
        batchId: id,
        lotId: first?.id ?? '',
        stepId: first?.stepId ?? '',
        pieces: 1,
        unitPriceMinor: 0,
      }),
    ).rejects.toMatchObject({ code: 'bad_input', message: expect.stringContaining('is line 1') as string });
  });
});

test('pieces go back to wait when a line gets fewer or goes, and the lines below move up', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const made = await makeBatch(ctx, here.processorId, { pieces: [10, 8, 6] });
    const [first, second] = await linesOf(ctx, made.id);
    const changed = await changeLine(ctx, {
      batchId: made.id,
      version: made.version,
      lineId: first?.id ?? '',
      pieces: 7,
      unitPriceMinor: 300,
      loadNo: 2,
    });
    expect(await whereIs(ctx, first?.lotId ?? '')).toEqual({ making: 3, packed: 7 });
    await removeLine(ctx, { batchId: made.id, version: changed.version, lineId: second?.id ?? '' });
    expect(await whereIs(ctx, second?.lotId ?? '')).toEqual({ making: 8 });
    expect((await linesOf(ctx, made.id)).map((line) => [line.lineNo, line.pieces])).toEqual([
      [1, 7],
      [2, 6],
    ]);
    expect((await getBatch(ctx, { batchId: made.id })).pieces).toBe(13);
  });
});

test('an emptied batch takes the step of the next lot', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const made = await makeBatch(ctx, here.processorId);
    const [line] = await linesOf(ctx, made.id);
    await removeLine(ctx, { batchId: made.id, version: made.version, lineId: line?.id ?? '' });
    const lot = await makeLot(ctx, { part: await makePart(ctx, { processes: ['anodize'] }) });
    await addLine(ctx, { batchId: made.id, lotId: lot.id, stepId: lot.stepId, pieces: 1, unitPriceMinor: 0 });
    expect((await getBatch(ctx, { batchId: made.id })).process).toBe('anodize');
  });
});

test('two people who change the same batch: the second is told, and the first loses nothing', async () => {
  const here = await world();
  const made = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  const change = (note: string) =>
    here.as(['lead'], (ctx) => updateBatch(ctx, { batchId: made.id, version: made.version, note }));
  const outcomes = await Promise.allSettled([change('one'), change('two')]);
  expect(outcomes.map((outcome) => outcome.status).sort()).toEqual(['fulfilled', 'rejected']);
  for (const outcome of outcomes)
    if (outcome.status === 'rejected')
      expect(outcome.reason).toMatchObject({
        code: 'conflict',
        message: expect.stringContaining('changed meanwhile') as string,
      });
});

test('two batches that want the last pieces of a lot at once share them, none twice', async () => {
  const here = await world();
  const lot = await here.as(['lead'], (ctx) => makeLot(ctx, { pieces: 10 }));
  const build = () =>
    here.as(['lead'], (ctx) =>
      createBatch(ctx, {
        processorId: here.processorId,
        lines: [{ lotId: lot.id, stepId: lot.stepId, pieces: 6, unitPriceMinor: 0 }],
      }),
    );
  const outcomes = await Promise.allSettled([build(), build(), build()]);
  expect(outcomes.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(1);
  expect(await here.as(['lead'], (ctx) => whereIs(ctx, lot.id))).toEqual({ making: 4, packed: 6 });
});

test('nothing of a batch that has left can be changed as if it were here', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const sent = await makeDispatchedBatch(ctx, here.processorId);
    const [line] = await linesOf(ctx, sent.id);
    const seen = { batchId: sent.id, version: sent.version };
    const lot = await makeLot(ctx);
    for (const change of [
      () => changeLine(ctx, { ...seen, lineId: line?.id ?? '', pieces: 1 }),
      () => removeLine(ctx, { ...seen, lineId: line?.id ?? '' }),
      () => updateBatch(ctx, { ...seen, note: 'x' }),
      () => setRequirements(ctx, { ...seen, lineId: null, requirements: [] }),
      () => putBatchAside(ctx, { ...seen, aside: true }),
      () =>
        addLine(ctx, { batchId: sent.id, lotId: lot.id, stepId: lot.stepId, pieces: 1, unitPriceMinor: 0 }),
    ])
      await expect(change()).rejects.toMatchObject({
        code: 'conflict',
        message: expect.stringContaining('has left already') as string,
      });
  });
});

test('who only inspects, and another shop, change nothing', async () => {
  const [here, stranger] = [await world(), await world()];
  const made = await here.as(['lead'], (ctx) => makeBatch(ctx, here.processorId));
  await expect(
    here.as(['inspector'], (ctx) => updateBatch(ctx, { batchId: made.id, version: made.version, note: 'x' })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(
    stranger.as(['lead'], (ctx) => updateBatch(ctx, { batchId: made.id, version: made.version, note: 'x' })),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(stranger.as(['lead'], (ctx) => getBatch(ctx, { batchId: made.id }))).rejects.toMatchObject({
    code: 'not_found',
  });
});

test('a processor that the shop does not work with is refused by its field', async () => {
  const here = await world();
  const lot = await here.as(['lead'], (ctx) => makeLot(ctx));
  const build = (processorId: string) =>
    here.as(['lead'], (ctx) =>
      createBatch(ctx, {
        processorId,
        lines: [{ lotId: lot.id, stepId: lot.stepId, pieces: 1, unitPriceMinor: 0 }],
      }),
    );
  await expect(build(newId())).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'processorId' }] },
  });
  await base.owner
    .update(shopProcessors)
    .set({ active: false })
    .where(eq(shopProcessors.shopId, here.shopId));
  await expect(build(here.processorId)).rejects.toMatchObject({
    code: 'bad_input',
    message: expect.stringContaining('no longer work') as string,
  });
});

test('named pieces go by their names', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    await makeApproval(ctx, here.processorId);
    const lot = await makeLot(ctx, { serials: ['S-1', 'S-2', 'S-3'] });
    const made = await createBatch(ctx, {
      processorId: here.processorId,
      lines: [{ lotId: lot.id, stepId: lot.stepId, pieces: 2, unitPriceMinor: 0 }],
    });
    await dispatchBatch(ctx, { batchId: made.id, version: made.version });
    expect((await linesOf(ctx, made.id))[0]?.frozen?.serials).toEqual(['S-1', 'S-2']);
  });
});

test('what waits is grouped by step, listed oldest first, and shown beside a batch without what it has', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const part = await makePart(ctx);
    const [one, two] = [await makeLot(ctx, { part, pieces: 5 }), await makeLot(ctx, { part, pieces: 7 })];
    await makeLot(ctx, { part: await makePart(ctx, { processes: ['anodize'] }), pieces: 3 });
    const { steps } = await listWaitingSteps(ctx);
    expect(steps.map(({ process, lots, pieces }) => [process, lots, pieces])).toEqual([
      ['solution_heat_treat_and_age', 2, 12],
      ['anodize', 1, 3],
    ]);
    const asked = {
      process: 'solution_heat_treat_and_age' as const,
      specification: 'AMS 2770',
      specificationRevision: 'R',
      limit: 50,
    };
    expect((await listWaitingLots(ctx, asked)).rows.map((row) => row.lotId)).toEqual([one.id, two.id]);
    const made = await createBatch(ctx, {
      processorId: here.processorId,
      lines: [{ lotId: one.id, stepId: one.stepId, pieces: 2, unitPriceMinor: 0 }],
    });
    expect(
      (await listWaitingLots(ctx, { ...asked, besideBatchId: made.id })).rows.map((row) => row.lotId),
    ).toEqual([two.id]);
    expect((await getBatchLines(ctx, { batchId: made.id })).lines[0]?.waiting).toBe(3);
    // Without a batch beside it there is no load to join; beside one of the same sheet it is the first.
    expect((await listWaitingLots(ctx, asked)).rows[0]?.load).toBeNull();
    expect((await listWaitingLots(ctx, { ...asked, besideBatchId: made.id })).rows[0]?.load).toMatchObject({
      number: 1,
      says: 'load 1',
    });
  });
});

test('processors for a step: the approved first, the others say why not', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const asked = { process: 'anodize' as const, specification: 'MIL-PRF-8625' };
    expect((await listStepProcessors(ctx, asked)).processors).toMatchObject([
      { approved: false, says: 'not approved for this step' },
    ]);
    await makeApproval(ctx, here.processorId, {
      processes: ['anodize'],
      specifications: ['MIL-PRF-8625'],
      reference: 'AP-7',
      validTo: '2026-07-01',
    });
    expect((await listStepProcessors(ctx, asked)).processors).toMatchObject([
      { approved: true, says: 'approved to Wed 1 Jul, AP-7' },
    ]);
    expect((await listStepProcessors(ctx, { ...asked, specification: 'AMS 2471' })).processors).toMatchObject(
      [{ approved: false }],
    );
  });
});

test('a list pages by key and filters by stage', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    for (let at = 0; at < 3; at++) await makeBatch(ctx, here.processorId);
    const first = await listBatches(ctx, { limit: 2 });
    expect(first.rows.map((row) => row.number)).toEqual(['B-0003', 'B-0002']);
    const next = await listBatches(ctx, { limit: 2, after: first.next ?? '' });
    expect(next.rows.map((row) => row.number)).toEqual(['B-0001']);
    expect(next.next).toBeNull();
    expect((await listBatches(ctx, { limit: 2, stage: 'dispatched' })).rows).toEqual([]);
  });
});

test('put aside keeps the pieces, is said before it leaves, and ends when it is taken up', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    await makeApproval(ctx, here.processorId);
    const made = await makeBatch(ctx, here.processorId);
    const aside = await putBatchAside(ctx, { batchId: made.id, version: made.version, aside: true });
    // Notes of the trade (loads, soak) stand beside it.
    const codes = async () =>
      (await getBatchChecks(ctx, { batchId: made.id })).findings.map((finding) => finding.code);
    expect(await codes()).toContain('put_aside');
    await putBatchAside(ctx, { batchId: made.id, version: aside.version, aside: false });
    expect(await codes()).not.toContain('put_aside');
    const [asked] = await ctx.tx.select().from(requirements).where(eq(requirements.batchId, made.id));
    expect(asked).toBeDefined();
  });
});
