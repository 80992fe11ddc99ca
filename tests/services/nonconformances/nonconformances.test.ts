import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { nonconformances } from '@/db/schema/nonconformances';
import type { Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import { disposeNonconformance } from '@/lib/nonconformances/dispose-nonconformance';
import type { Disposition } from '@/lib/nonconformances/disposition';
import { getNonconformance, getRaisable, listNonconformances } from '@/lib/nonconformances/queries';
import { raiseNonconformance } from '@/lib/nonconformances/raise-nonconformance';
import { getCertificate } from '@/lib/certificates/get-certificate';

import { makeDispatchedBatch } from '../../factories/batches';
import { countInAll, givePassword, makeFile, makeSignedCertificate } from '../../factories/evidence';
import { makeLot } from '../../factories/lots';
import { lastAudit, placesOf, stageNow } from '../../factories/standing';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup({
  back = { good: 10 } as Parameters<typeof countInAll>[2][number],
  serials,
}: { back?: Parameters<typeof countInAll>[2][number]; serials?: readonly string[] } = {}) {
  const world = await makeWorld(base.db, base.owner);
  await givePassword(base.owner, world.userId);
  return world.as(['lead'], async (ctx) => {
    const batch = await makeDispatchedBatch(ctx, world.processorId, {
      lots: [await makeLot(ctx, serials ? { serials } : { pieces: 10 })],
    });
    await countInAll(ctx, batch.id, [back]);
    const { lines } = await getRaisable(ctx, { batchId: batch.id });
    const lotId = batch.lots[0]?.id ?? '';
    return { world, batch, lotId, lineId: lines[0]?.lineId ?? '', named: lines[0]?.pieces ?? [] };
  });
}

const raising = (batchId: string, lineId: string, pieces: number) => ({
  batchId,
  lineId,
  kind: 'requirement' as const,
  pieces,
  what: 'Final condition reads T6, ordered T62',
  requirementId: null,
  certificateId: null,
  pieceIds: [],
});

function disposing(
  nonconformanceId: string,
  disposition: Disposition,
  pieces: number,
  more: Partial<Parameters<typeof disposeNonconformance>[1]> = {},
) {
  return {
    nonconformanceId,
    version: 1,
    disposition,
    pieces,
    reason: 'Decided at the bench',
    authority: '',
    fileId: null,
    pieceIds: [],
    ...more,
  };
}

const coveredOf = async (ctx: Ctx, id: string) =>
  (
    await ctx.tx
      .select({ covered: nonconformances.coveredPieces })
      .from(nonconformances)
      .where(eq(nonconformances.id, id))
  )[0]?.covered;

test('raised pieces leave quarantine for hold, and the batch is held', async () => {
  const { world, batch, lotId, lineId } = await setup();
  await world.as(['lead'], async (ctx) => {
    const { id, number } = await raiseNonconformance(ctx, raising(batch.id, lineId, 4));
    expect(number).toMatch(/^NC-\d{4}$/);
    expect(await placesOf(ctx, lotId)).toEqual({ quarantine: 6, hold: 4 });
    expect(await stageNow(ctx, batch.id)).toBe('held');
    expect(await lastAudit(ctx, 'nonconformance.open')).toMatchObject({
      entityId: id,
      after: { pieces: 4, kind: 'requirement' },
    });
    expect(await getNonconformance(ctx, { nonconformanceId: id })).toMatchObject({
      number,
      onHold: 4,
      decided: 0,
      batchNumber: batch.number,
    });
  });
});

test('a hold on doubtful papers takes uncovered pieces first, a damaged piece takes its proof along', async () => {
  const { world, batch, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await makeSignedCertificate(ctx, batch.id, [6]);
    const papers = await raiseNonconformance(ctx, { ...raising(batch.id, lineId, 5), kind: 'papers' });
    expect(await coveredOf(ctx, papers.id)).toBe(1);
    const damaged = await raiseNonconformance(ctx, { ...raising(batch.id, lineId, 2), kind: 'damaged' });
    expect(await coveredOf(ctx, damaged.id)).toBe(2);
  });
});

test('more than is in quarantine, foreign lines and serial numbers that are not ticked are refused', async () => {
  const { world, batch, lineId } = await setup();
  await world.as(['lead'], async (ctx) => {
    await expect(raiseNonconformance(ctx, raising(batch.id, lineId, 11))).rejects.toMatchObject({
      code: 'bad_input',
      details: {
        fields: [{ field: 'pieces', message: expect.stringContaining('10 in quarantine') as string }],
      },
    });
    await expect(raiseNonconformance(ctx, raising(batch.id, newId(), 1))).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(
      raiseNonconformance(ctx, { ...raising(batch.id, lineId, 1), requirementId: newId() }),
    ).rejects.toMatchObject({ code: 'not_found' });
    await expect(
      raiseNonconformance(ctx, { ...raising(batch.id, lineId, 1), certificateId: newId() }),
    ).rejects.toMatchObject({ code: 'not_found' });
  });
  const named = await setup({ back: { good: 2 }, serials: ['A1', 'A2'] });
  await named.world.as(['lead'], async (ctx) => {
    await expect(raiseNonconformance(ctx, raising(named.batch.id, named.lineId, 1))).rejects.toMatchObject({
      code: 'bad_input',
    });
    const { id } = await raiseNonconformance(ctx, {
      ...raising(named.batch.id, named.lineId, 1),
      pieceIds: [named.named[1]?.id ?? ''],
    });
    expect(
      (await getNonconformance(ctx, { nonconformanceId: id })).heldPieces.map((piece) => piece.serial),
    ).toEqual(['A2']);
  });
});

test('office raises nothing, and only inspectors decide', async () => {
  const { world, batch, lineId } = await setup();
  await expect(
    world.as(['office', 'auditor'], (ctx) => raiseNonconformance(ctx, raising(batch.id, lineId, 1))),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  const { id } = await world.as(['lead'], (ctx) => raiseNonconformance(ctx, raising(batch.id, lineId, 1)));
  await expect(
    world.as(['lead', 'admin', 'office'], (ctx) => disposeNonconformance(ctx, disposing(id, 'scrap', 1))),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('another shop sees neither, and is told they do not exist', async () => {
  const { world, batch, lineId } = await setup();
  const { id } = await world.as(['lead'], (ctx) => raiseNonconformance(ctx, raising(batch.id, lineId, 1)));
  const stranger = await makeWorld(base.db, base.owner);
  await stranger.as(['inspector'], async (ctx) => {
    await expect(raiseNonconformance(ctx, raising(batch.id, lineId, 1))).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(disposeNonconformance(ctx, disposing(id, 'scrap', 1))).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(getNonconformance(ctx, { nonconformanceId: id })).rejects.toMatchObject({
      code: 'not_found',
    });
    expect((await listNonconformances(ctx, { limit: 50 })).rows).toEqual([]);
  });
});

test.each([
  ['scrap', { scrapped: 4, quarantine: 6 }],
  ['reprocess', { making: 4, quarantine: 6 }],
  ['return_to_processor', { at_processor: 4, quarantine: 6 }],
] as const)('%s moves the pieces and closes the nonconformance', async (disposition, places) => {
  const { world, batch, lotId, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const { id } = await raiseNonconformance(ctx, raising(batch.id, lineId, 4));
    expect(await disposeNonconformance(ctx, disposing(id, disposition, 4))).toMatchObject({
      left: 0,
      closed: true,
    });
    expect(await placesOf(ctx, lotId)).toEqual(places);
    expect(await stageNow(ctx, batch.id)).not.toBe('held');
    expect(await lastAudit(ctx, 'nonconformance.dispose')).toMatchObject({
      entityId: id,
      after: { disposition, closed: true },
    });
  });
});

test('use as is asks for the authority, and its pieces count as proved', async () => {
  const { world, batch, lotId, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    await makeSignedCertificate(ctx, batch.id, [6]);
    const { id } = await raiseNonconformance(ctx, raising(batch.id, lineId, 4));
    await expect(disposeNonconformance(ctx, disposing(id, 'use_as_is', 4))).rejects.toMatchObject({
      code: 'bad_input',
      details: { fields: [{ field: 'authority' }] },
    });
    await disposeNonconformance(
      ctx,
      disposing(id, 'use_as_is', 4, { authority: 'R. Amador, engineering order 12' }),
    );
    expect(await placesOf(ctx, lotId)).toEqual({ quarantine: 10 });
    expect(await stageNow(ctx, batch.id)).toBe('proved');
  });
});

test('a concession asks for authority and paper', async () => {
  const { world, batch, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const { id } = await raiseNonconformance(ctx, raising(batch.id, lineId, 2));
    await expect(disposeNonconformance(ctx, disposing(id, 'concession', 2))).rejects.toMatchObject({
      code: 'bad_input',
      details: { fields: [{ field: 'authority' }, { field: 'fileId' }] },
    });
    const fileId = await makeFile(ctx, { purpose: 'concession' });
    await disposeNonconformance(ctx, disposing(id, 'concession', 2, { authority: 'Customer, CR-7', fileId }));
    expect((await getNonconformance(ctx, { nonconformanceId: id })).dispositions).toMatchObject([
      { disposition: 'concession', authority: 'Customer, CR-7', file: { id: fileId } },
    ]);
  });
});

test('pieces are decided about in parts; the last one closes it', async () => {
  const { world, batch, lotId, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const { id } = await raiseNonconformance(ctx, raising(batch.id, lineId, 5));
    expect(await disposeNonconformance(ctx, disposing(id, 'scrap', 2))).toMatchObject({
      left: 3,
      closed: false,
    });
    await expect(disposeNonconformance(ctx, disposing(id, 'scrap', 2))).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('changed meanwhile') as string,
    });
    await expect(disposeNonconformance(ctx, disposing(id, 'scrap', 4, { version: 2 }))).rejects.toMatchObject(
      { code: 'bad_input', message: expect.stringContaining('3 left to decide') as string },
    );
    expect(await stageNow(ctx, batch.id)).toBe('held');
    expect(await disposeNonconformance(ctx, disposing(id, 'reprocess', 3, { version: 2 }))).toMatchObject({
      left: 0,
      closed: true,
    });
    expect(await placesOf(ctx, lotId)).toEqual({ quarantine: 5, scrapped: 2, making: 3 });
    await expect(disposeNonconformance(ctx, disposing(id, 'scrap', 1, { version: 3 }))).rejects.toMatchObject(
      { code: 'conflict', message: expect.stringContaining('is closed') as string },
    );
    expect((await getNonconformance(ctx, { nonconformanceId: id })).reprocessedBefore).toBe(1);
  });
});

test('short pieces are still to come, or written off from where they were last', async () => {
  const { world, batch, lotId } = await setup({ back: { good: 7, short: 3 } });
  await world.as(['inspector'], async (ctx) => {
    const { rows } = await listNonconformances(ctx, { limit: 50, batchId: batch.id });
    const id = rows[0]?.id ?? '';
    expect(rows).toMatchObject([{ kind: 'short', pieces: 3 }]);
    await expect(
      disposeNonconformance(ctx, disposing(id, 'use_as_is', 1, { authority: 'x' })),
    ).rejects.toMatchObject({ code: 'bad_input', details: { fields: [{ field: 'disposition' }] } });
    await disposeNonconformance(ctx, disposing(id, 'scrap', 1));
    expect(await placesOf(ctx, lotId)).toEqual({ quarantine: 7, transit_out: 2, lost: 1 });
    await disposeNonconformance(ctx, disposing(id, 'return_to_processor', 2, { version: 2 }));
    expect(await placesOf(ctx, lotId)).toEqual({ quarantine: 7, transit_out: 2, lost: 1 });
    await countInAll(ctx, batch.id, [{ good: 2 }]);
    expect(await stageNow(ctx, batch.id)).toBe('returned');
  });
});

test('what was returned and came back again must be proved again', async () => {
  const { world, batch, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const signed = await makeSignedCertificate(ctx, batch.id, [10]);
    const { id } = await raiseNonconformance(ctx, raising(batch.id, lineId, 4));
    await disposeNonconformance(ctx, disposing(id, 'return_to_processor', 4));
    expect(await stageNow(ctx, batch.id)).toBe('at_processor');
    await countInAll(ctx, batch.id, [{ good: 4 }]);
    expect(await stageNow(ctx, batch.id)).toBe('returned');
    expect((await getCertificate(ctx, { certificateId: signed.certificateId })).lines[0]).toMatchObject({
      covered: 6,
      coverable: 4,
    });
  });
});

test('the list has open ones first and pages by key', async () => {
  const { world, batch, lineId } = await setup();
  await world.as(['inspector'], async (ctx) => {
    const first = await raiseNonconformance(ctx, raising(batch.id, lineId, 1));
    const second = await raiseNonconformance(ctx, raising(batch.id, lineId, 1));
    await disposeNonconformance(ctx, disposing(second.id, 'scrap', 1));
    const page = await listNonconformances(ctx, { limit: 1 });
    expect(page.rows.map((row) => row.id)).toEqual([first.id]);
    const next = await listNonconformances(ctx, { limit: 1, after: page.next ?? '' });
    expect(next.rows.map((row) => row.id)).toEqual([second.id]);
    expect(next.next).toBeNull();
  });
});
