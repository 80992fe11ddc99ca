import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { batches } from '@/db/schema/batches';
import { createAssembly } from '@/lib/assemblies/change-assembly';
import { readReadiness } from '@/lib/assemblies/readiness';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { addLocation } from '@/lib/stock/add-location';
import { fitPieces } from '@/lib/stock/fit-pieces';
import { getGate } from '@/lib/stock/queries';
import { releasePieces } from '@/lib/stock/release-pieces';

import { makeDispatchedBatch } from '../../factories/batches';
import { countInAll, givePassword, makeSignedCertificate } from '../../factories/evidence';
import { makeLot, makePart } from '../../factories/lots';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { lastAudit, placesOf, stageNow } from '../../factories/standing';

const base = openDatabase();
const ALL = ['lead', 'inspector', 'office', 'admin'] as const;

/** A batch of one line of 10, counted in, with a certificate signed for `covered` of them. */
async function proved(
  world: World,
  {
    covered = 10,
    unitPriceMinor = 0,
    processes,
  }: { covered?: number; unitPriceMinor?: number; processes?: Parameters<typeof makePart>[1] } = {},
) {
  await givePassword(base.owner, world.userId);
  return world.as(ALL, async (ctx) => {
    const part = await makePart(ctx, processes);
    const lot = await makeLot(ctx, { part, pieces: 10 });
    const batch = await makeDispatchedBatch(ctx, world.processorId, { lots: [lot], unitPriceMinor });
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    await makeSignedCertificate(ctx, batch.id, [covered]);
    const gate = await getGate(ctx, { batchId: batch.id });
    const location = await addLocation(ctx, { name: `Shelf ${batch.number}` });
    return { batch, lot, part, lineId: gate.lines[0]?.lineId ?? '', locationId: location.id };
  });
}

test('proved pieces of a settled batch go to stock, are audited, and the batch is stocked', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lot, lineId, locationId } = await proved(world);
  expect(await world.as(['lead'], (ctx) => stageNow(ctx, batch.id))).toBe('settled');
  await world.as(['inspector'], (ctx) =>
    releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces: 10, locationId }] }),
  );
  await world.as(['lead'], async (ctx) => {
    expect(await placesOf(ctx, lot.id)).toEqual({ stock: 10 });
    expect(await stageNow(ctx, batch.id)).toBe('stocked');
    expect(await lastAudit(ctx, 'batch.release')).toMatchObject({ entityId: batch.id });
  });
});

test('40 of 41 signed: the one that no paper covers stays', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lineId, locationId } = await proved(world, { covered: 9 });
  const release = (pieces: number) =>
    world.as(['lead'], (ctx) =>
      releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces, locationId }] }),
    );
  await expect(release(10)).rejects.toMatchObject({
    code: 'bad_input',
    details: { fields: [{ field: 'lines.0.pieces' }] },
  });
  await release(9);
  await expect(release(1)).rejects.toMatchObject({ code: 'bad_input' });
});

test('unpaid pieces stay; a waiver lets them pass', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lineId, locationId } = await proved(world, { unitPriceMinor: 500 });
  const release = () =>
    world.as(['lead'], (ctx) =>
      releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces: 10, locationId }] }),
    );
  await expect(release()).rejects.toMatchObject({ code: 'bad_input' });
  await world.as(['admin'], async (ctx) => {
    await ctx.tx
      .update(batches)
      .set({ paymentWaivedAt: ctx.now, paymentWaivedReason: 'agreed' })
      .where(eq(batches.id, batch.id));
    await refreshStanding(ctx, batch.id);
  });
  await release();
});

test('pieces with a further outside step go on to wait for it', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lot, part, lineId } = await proved(world, {
    processes: { processes: ['solution_heat_treat_and_age', 'anodize'] },
  });
  await world.as(['lead'], (ctx) =>
    releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces: 10, locationId: null }] }),
  );
  await world.as(['lead'], async (ctx) => {
    expect(await placesOf(ctx, lot.id)).toEqual({ making: 10 });
    expect(part.stepIds).toHaveLength(2);
  });
});

test('two presses at once release once', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lot, lineId, locationId } = await proved(world);
  const press = () =>
    world.as(['lead'], (ctx) =>
      releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces: 10, locationId }] }),
    );
  const outcomes = await Promise.allSettled([press(), press()]);
  expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
  expect(await world.as(['lead'], (ctx) => placesOf(ctx, lot.id))).toEqual({ stock: 10 });
});

test('an auditor may not release, and another shop is told that the batch does not exist', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { batch, lineId, locationId } = await proved(world);
  const input = { batchId: batch.id, lines: [{ lineId, pieces: 1, locationId }] };
  await expect(world.as(['auditor'], (ctx) => releasePieces(ctx, input))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(stranger.as(['lead'], (ctx) => releasePieces(ctx, input))).rejects.toMatchObject({
    code: 'not_found',
  });
});

test('only what an assembly needs is fitted, and its readiness moves', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { batch, lot, part, lineId, locationId } = await proved(world);
  const assembly = await world.as(['lead'], (ctx) =>
    createAssembly(ctx, {
      name: 'Left float',
      neededOn: null,
      note: null,
      needs: [{ partNumber: part.number, pieces: 6 }],
    }),
  );
  await world.as(['lead'], (ctx) =>
    releasePieces(ctx, { batchId: batch.id, lines: [{ lineId, pieces: 10, locationId }] }),
  );
  const fit = (pieces: number) =>
    world.as(['lead'], (ctx) =>
      fitPieces(ctx, { lotId: lot.id, locationId, assemblyId: assembly.id, pieces }),
    );
  await expect(fit(7)).rejects.toMatchObject({ code: 'bad_input' });
  await fit(6);
  await world.as(['lead'], async (ctx) => {
    expect(await placesOf(ctx, lot.id)).toEqual({ fitted: 6, stock: 4 });
    expect(await readReadiness(ctx)).toMatchObject([{ name: 'Left float', needed: 6, ready: 6 }]);
  });
});
