import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { messages } from '@/db/schema/batches';
import { nonconformances } from '@/db/schema/nonconformances';
import { receiptPhotos } from '@/db/schema/receipts';
import { newId } from '@/lib/ids';
import { countIn } from '@/lib/receipts/count-in';
import { findForReceiving, getReceiving, listReceipts } from '@/lib/receipts/queries';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { countInAll, makeFile } from '../../factories/evidence';
import { makeLot } from '../../factories/lots';
import { lastAudit, placesOf, stageNow } from '../../factories/standing';
import { makeWorld } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup(pieces: readonly number[] = [10]) {
  const world = await makeWorld(base.db, base.owner);
  const batch = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId, { pieces }));
  return { world, batch, lots: batch.lots };
}

test('good pieces are counted into quarantine, and the trail says who counted', async () => {
  const { world, batch, lots } = await setup([10, 4]);
  await world.as(['inspector'], async (ctx) => {
    const done = await countInAll(ctx, batch.id, [{ good: 10 }, { good: 4 }]);
    expect(done).toMatchObject({ good: 14, damaged: 0, nonconformances: [] });
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ quarantine: 10 });
    expect(await stageNow(ctx, batch.id)).toBe('returned');
    expect(await lastAudit(ctx, 'receipt.count')).toMatchObject({
      actorName: 'Test Person',
      entityId: batch.id,
    });
  });
});

test('a batch comes back in several deliveries', async () => {
  const { world, batch, lots } = await setup([10]);
  await world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 4 }]));
  expect(await world.as(['lead'], (ctx) => stageNow(ctx, batch.id))).toBe('at_processor');
  await world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 6 }]));
  await world.as(['lead'], async (ctx) => {
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ quarantine: 10 });
    const { receipts, away } = await listReceipts(ctx, { batchId: batch.id });
    expect(away).toBe(0);
    expect(receipts.map((receipt) => receipt.lines.map((line) => line.good))).toEqual([[6], [4]]);
  });
});

test('damaged pieces go on hold under a nonconformance, short ones stay away under another', async () => {
  const { world, batch, lots } = await setup([10]);
  await world.as(['inspector'], async (ctx) => {
    const done = await countInAll(ctx, batch.id, [{ good: 7, damaged: 2, short: 1 }]);
    expect(done.nonconformances).toHaveLength(2);
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ quarantine: 7, hold: 2, transit_out: 1 });
    const rows = await ctx.tx
      .select({ kind: nonconformances.kind, pieces: nonconformances.pieces })
      .from(nonconformances)
      .where(eq(nonconformances.batchId, batch.id));
    expect(rows).toEqual(
      expect.arrayContaining([
        { kind: 'damaged', pieces: 2 },
        { kind: 'short', pieces: 1 },
      ]),
    );
    expect(await stageNow(ctx, batch.id)).toBe('held');
  });
});

test('what is over stays out of the ledger and is told to the processor', async () => {
  const { world, batch, lots } = await setup([10]);
  await world.as(['inspector'], async (ctx) => {
    await countInAll(ctx, batch.id, [{ good: 10, over: 2 }]);
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ quarantine: 10 });
    const [note] = await ctx.tx.select().from(messages).where(eq(messages.batchId, batch.id));
    expect(note).toMatchObject({
      kind: 'note',
      side: 'shop',
      body: expect.stringContaining('2 over on line 1') as string,
    });
  });
});

test('more than is away is refused with the line and the numbers, and nothing is counted', async () => {
  const { world, batch, lots } = await setup([10, 4]);
  const refused = world.as(['inspector'], (ctx) =>
    countInAll(ctx, batch.id, [{ good: 10 }, { good: 4, damaged: 1 }]),
  );
  await expect(refused).rejects.toMatchObject({
    code: 'bad_input',
    details: {
      fields: [{ field: 'lines.1.damaged', message: expect.stringContaining('4 away, 5 counted') as string }],
    },
  });
  await world.as(['inspector'], async (ctx) =>
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ transit_out: 10 }),
  );
});

test('the pieces of a serialised lot come back by their serial numbers', async () => {
  const world = await makeWorld(base.db, base.owner);
  const batch = await world.as(['lead'], async (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, {
      lots: [await makeLot(ctx, { serials: ['A1', 'A2', 'A3'] })],
    }),
  );
  await world.as(['inspector'], async (ctx) => {
    const [line] = (await getReceiving(ctx, { batchId: batch.id })).lines;
    expect(line).toMatchObject({ alloy: '2024', targetCondition: 'T42' });
    const [, a2] = line?.awayPieces ?? [];
    expect(line?.awayPieces.map((piece) => piece.serial)).toEqual(['A1', 'A2', 'A3']);
    await countIn(ctx, {
      batchId: batch.id,
      note: '',
      photos: [],
      lines: [
        {
          lineId: line?.id ?? '',
          good: 1,
          damaged: 0,
          short: 0,
          over: 0,
          note: '',
          goodPieceIds: [a2?.id ?? ''],
          damagedPieceIds: [],
        },
      ],
    });
    const [after] = (await getReceiving(ctx, { batchId: batch.id })).lines;
    expect(after?.awayPieces.map((piece) => piece.serial)).toEqual(['A1', 'A3']);
  });
  const unnamed = world.as(['inspector'], async (ctx) => {
    const [line] = (await getReceiving(ctx, { batchId: batch.id })).lines;
    return countIn(ctx, {
      batchId: batch.id,
      note: '',
      photos: [],
      lines: [
        {
          lineId: line?.id ?? '',
          good: 1,
          damaged: 0,
          short: 0,
          over: 0,
          note: '',
          goodPieceIds: [],
          damagedPieceIds: [],
        },
      ],
    });
  });
  await expect(unnamed).rejects.toMatchObject({ code: 'bad_input' });
});

test('photos are kept with the count, and one that did not arrive is refused', async () => {
  const { world, batch } = await setup([10]);
  await world.as(['inspector'], async (ctx) => {
    const [line] = (await getReceiving(ctx, { batchId: batch.id })).lines;
    const count = {
      lineId: line?.id ?? '',
      good: 5,
      damaged: 0,
      short: 0,
      over: 0,
      note: '',
      goodPieceIds: [],
      damagedPieceIds: [],
    };
    const fileId = await makeFile(ctx, { purpose: 'photo' });
    const { receiptId } = await countIn(ctx, {
      batchId: batch.id,
      note: 'crate dented',
      lines: [count],
      photos: [{ fileId, lineId: null }],
    });
    expect(
      await ctx.tx.select().from(receiptPhotos).where(eq(receiptPhotos.receiptId, receiptId)),
    ).toHaveLength(1);
    const awaited = await makeFile(ctx, { purpose: 'photo', state: 'awaited' });
    await expect(
      countIn(ctx, {
        batchId: batch.id,
        note: '',
        lines: [count],
        photos: [{ fileId: awaited, lineId: null }],
      }),
    ).rejects.toMatchObject({ code: 'bad_input' });
  });
});

test('office and auditor may not count', async () => {
  const { world, batch } = await setup([10]);
  await expect(
    world.as(['office', 'auditor'], (ctx) => countInAll(ctx, batch.id, [{ good: 1 }])),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('a batch that has not left cannot come back', async () => {
  const world = await makeWorld(base.db, base.owner);
  const batch = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
  await expect(world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 1 }]))).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('has not left yet') as string,
  });
});

test('another shop cannot count it, and is told it does not exist', async () => {
  const { batch } = await setup([10]);
  const stranger = await makeWorld(base.db, base.owner);
  await expect(
    stranger.as(['inspector'], (ctx) =>
      countIn(ctx, {
        batchId: batch.id,
        note: '',
        photos: [],
        lines: [
          {
            lineId: newId(),
            good: 1,
            damaged: 0,
            short: 0,
            over: 0,
            note: '',
            goodPieceIds: [],
            damagedPieceIds: [],
          },
        ],
      }),
    ),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['inspector'], (ctx) => findForReceiving(ctx, { text: batch.id })),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('a count of nothing is refused', async () => {
  const { world, batch } = await setup([10]);
  await expect(world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 0 }]))).rejects.toMatchObject({
    code: 'bad_input',
    message: expect.stringContaining('Nothing is counted') as string,
  });
});

test('two who count the same pieces at once: one is told they are not away any more', async () => {
  const { world, batch, lots } = await setup([10]);
  const outcomes = await Promise.allSettled(
    [0, 1].map(() => world.as(['lead'], (ctx) => countInAll(ctx, batch.id, [{ good: 10 }]))),
  );
  expect(outcomes.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
  await world.as(['lead'], async (ctx) =>
    expect(await placesOf(ctx, lots[0]?.id ?? '')).toEqual({ quarantine: 10 }),
  );
});

test('a batch is found by its number, by its order and by less than its number', async () => {
  const { world, batch } = await setup([10]);
  await world.as(['auditor'], async (ctx) => {
    for (const text of [
      batch.number,
      batch.number.toLowerCase(),
      batch.number.replace('B-', ''),
      batch.id,
      `http://localhost/batches/${batch.id}`,
    ])
      expect(await findForReceiving(ctx, { text })).toMatchObject({ batchId: batch.id });
    await expect(findForReceiving(ctx, { text: 'B-9999' })).rejects.toMatchObject({
      code: 'not_found',
      message: expect.stringContaining('B-9999') as string,
    });
  });
});
