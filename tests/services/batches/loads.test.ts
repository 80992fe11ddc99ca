import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { batchLines } from '@/db/schema/batches';
import { parts } from '@/db/schema/parts';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { getLoadPlan } from '@/lib/batches/get-load-plan';
import { getTraveller } from '@/lib/batches/queries';
import { reissueBatch } from '@/lib/batches/reissue-batch';
import { setLoads } from '@/lib/batches/set-loads';
import { newId } from '@/lib/ids';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);

test('a plan is read and its loads are set, all at once and on the record', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, here.processorId, { pieces: [4, 6] });
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    const [, second] = lines;
    // Thick and bare: the thin clad one may not soak as long.
    await ctx.tx
      .update(parts)
      .set({ clad: false, thicknessMm: 6.35, thicknessEntered: '0.250 in' })
      .where(eq(parts.id, second?.partId ?? ''));

    const plan = await getLoadPlan(ctx, { batchId: batch.id });
    expect(plan).toMatchObject({ method: 'exact', isSet: false, unplaced: [] });
    expect(plan.loads.map(({ governing }) => governing.thickness)).toEqual(['0.040 in', '0.250 in']);

    await setLoads(ctx, {
      batchId: batch.id,
      version: batch.version,
      loads: plan.loads.flatMap(({ number, lines: of }) =>
        of.map(({ lineId }) => ({ lineId, loadNo: number })),
      ),
    });
    const kept = await ctx.tx
      .select({ loadNo: batchLines.loadNo })
      .from(batchLines)
      .where(eq(batchLines.batchId, batch.id))
      .orderBy(batchLines.lineNo);
    expect(kept).toEqual([{ loadNo: 1 }, { loadNo: 2 }]);
    expect(await getLoadPlan(ctx, { batchId: batch.id })).toMatchObject({ isSet: true });
    const [entry] = await ctx.tx
      .select({ after: auditEntries.after })
      .from(auditEntries)
      .where(eq(auditEntries.action, 'batch.set_loads'));
    expect(entry?.after).toEqual({ loads: ['line 1: load 1', 'line 2: load 2'] });
  });
});

test('an inspector, a batch that left, a stale version and a line of elsewhere are refused', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, here.processorId);
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    const loads = lines.map(({ id }) => ({ lineId: id, loadNo: 1 }));
    const asked = { batchId: batch.id, version: batch.version, loads };
    await expect(setLoads(ctx, { ...asked, loads: [{ lineId: newId(), loadNo: 1 }] })).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(setLoads(ctx, { ...asked, version: 1 })).rejects.toMatchObject({ code: 'conflict' });
  });
  const sent = await here.as(['lead'], async (ctx) => {
    const batch = await makeDispatchedBatch(ctx, here.processorId);
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    const asked = {
      batchId: batch.id,
      version: batch.version,
      loads: lines.map(({ id }) => ({ lineId: id, loadNo: 1 })),
    };
    await expect(setLoads(ctx, asked)).rejects.toMatchObject({ code: 'conflict' });
    return asked;
  });
  await here.as(['inspector'], async (ctx) => {
    await expect(setLoads(ctx, sent)).rejects.toMatchObject({ code: 'not_allowed' });
  });
  const elsewhere = await world();
  await elsewhere.as(['lead'], async (ctx) => {
    await expect(setLoads(ctx, sent)).rejects.toMatchObject({ code: 'not_found' });
    await expect(getLoadPlan(ctx, { batchId: sent.batchId })).rejects.toMatchObject({ code: 'not_found' });
  });
});

test('a line says what can be computed of a part that was not weighed', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeBatch(ctx, here.processorId);
    const read = async () => (await getBatchLines(ctx, { batchId: batch.id })).lines[0];
    const line = await read();
    expect(line).toMatchObject({ massG: null, computed: null });
    await ctx.tx
      .update(parts)
      .set({ lengthMm: 1000, widthMm: 500 })
      .where(eq(parts.id, line?.partId ?? ''));
    const sized = await read();
    expect(sized?.massG).toBeNull();
    expect(sized?.computed?.areaMm2).toBeCloseTo(2 * (1000 * 500 + 1500 * 1.016), 3);
  });
});

test('what a traveller said of the loads stays when it is stated again, though a part was changed', async () => {
  const here = await world();
  await here.as(['lead'], async (ctx) => {
    const batch = await makeDispatchedBatch(ctx, here.processorId);
    const read = async () => (await getTraveller(ctx, { batchId: batch.id })).furnaceLoads;
    const stated = await read();
    expect(stated?.loads[0]?.rows).toContainEqual(
      expect.objectContaining({ name: 'Governs', says: '0.040 in' }),
    );
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    await ctx.tx
      .update(parts)
      .set({ clad: false, thicknessMm: 25.4, thicknessEntered: '1 in' })
      .where(eq(parts.id, lines[0]?.partId ?? ''));
    await reissueBatch(ctx, {
      batchId: batch.id,
      version: batch.version,
      note: 'ring first',
      prices: [],
      requirements: [],
    });
    expect(await read()).toEqual(stated);
  });
});
