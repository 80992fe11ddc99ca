import { and, eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';
import type { z } from 'zod';

import { batches, batchLines, messages, promises } from '@/db/schema/batches';
import { pieces } from '@/db/schema/lots';
import { acknowledgeBatch } from '@/lib/portal/acknowledge-batch';
import { acknowledgeBatch as declaration } from '@/lib/portal/contract';
import { getPortalBatch } from '@/lib/portal/get-portal-batch';
import type { Ctx } from '@/lib/auth/context';

import { lastAudit, placesOf, stageNow } from '../../factories/standing';
import { makeLot } from '../../factories/lots';
import { makeDispatchedBatch } from '../../factories/batches';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { makeSent, queuedMails, refusalOf } from './portal-kit';

const base = openDatabase();

type Given = z.input<typeof declaration.input>;
const acknowledge = (ctx: Ctx, given: Given) => acknowledgeBatch(ctx, declaration.input.parse(given));
const linesOf = (world: World, batchId: string) =>
  world.as(['lead'], ({ tx }) =>
    tx
      .select({ id: batchLines.id, lotId: batchLines.lotId, pieces: batchLines.pieces })
      .from(batchLines)
      .where(eq(batchLines.batchId, batchId))
      .orderBy(batchLines.lineNo),
  );

describe('acknowledging', () => {
  test('moves what came to the processor, keeps the promise, and is told in the trail under the link', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16, 15, 10] });
    const result = await world.asProcessor(
      (ctx) => acknowledge(ctx, { batchId, promisedOn: '2026-06-30' }),
      batchId,
    );
    expect(result).toEqual({ acknowledgedPieces: 41, missing: 0 });
    await world.as(['lead'], async (ctx) => {
      expect(await stageNow(ctx, batchId)).toBe('at_processor');
      const lines = await ctx.tx
        .select({ lotId: batchLines.lotId, pieces: batchLines.pieces })
        .from(batchLines)
        .where(eq(batchLines.batchId, batchId));
      for (const line of lines)
        expect(await placesOf(ctx, line.lotId)).toEqual({ at_processor: line.pieces });
      const [batch] = await ctx.tx.select().from(batches).where(eq(batches.id, batchId));
      expect(batch).toMatchObject({
        acknowledgedPieces: 41,
        promisedOn: '2026-06-30',
        firstPromisedOn: '2026-06-30',
      });
      const audit = await lastAudit(ctx, 'batch.acknowledge');
      expect(audit).toMatchObject({ actorKind: 'link', entityId: batchId, after: { came: 41, missing: 0 } });
      expect(await lastAudit(ctx, 'batch.promise')).toMatchObject({
        actorKind: 'link',
        after: { promisedOn: '2026-06-30' },
      });
      expect(await ctx.tx.select().from(messages)).toEqual([]);
    });
  });

  test('of fewer says so to the shop, and leaves the rest on the way until it comes', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16, 10] });
    const [first, second] = await linesOf(world, batchId);
    const counts = [
      { lineId: first?.id ?? '', pieces: 16 },
      { lineId: second?.id ?? '', pieces: 9 },
    ];
    expect(
      await world.asProcessor(
        (ctx) => acknowledge(ctx, { batchId, counts, note: 'The box was open.' }),
        batchId,
      ),
    ).toEqual({ acknowledgedPieces: 25, missing: 1 });

    await world.as(['lead'], async (ctx) => {
      expect(await placesOf(ctx, second?.lotId ?? '')).toEqual({ at_processor: 9, transit_out: 1 });
      expect(await stageNow(ctx, batchId)).toBe('at_processor');
      const [message] = await ctx.tx.select().from(messages);
      expect(message).toMatchObject({ kind: 'trouble', side: 'processor' });
      expect(message?.body).toMatch(/1 is missing/);
      expect(message?.body).toMatch(/line 2, P-\S+ A: 9 of 10/);
      expect(message?.body).toMatch(/The box was open/);
    });
    const trouble = (await queuedMails(base.owner, world.shopId)).find((mail) => mail.template === 'trouble');
    expect(trouble).toMatchObject({
      to: [`person-${world.userId}@shop.test`],
      replyTo: `desk-${world.processorId}@processor.test`,
      props: { to: 'shop' },
    });

    const seen = await world.asProcessor((ctx) => getPortalBatch(ctx, { batchId }), batchId);
    expect(seen.lines.map((line) => [line.onTheWay, line.here])).toEqual([
      [0, 16],
      [1, 9],
    ]);
    expect(await world.asProcessor((ctx) => acknowledge(ctx, { batchId }), batchId)).toEqual({
      acknowledgedPieces: 26,
      missing: 0,
    });
    await world.as(['lead'], async (ctx) =>
      expect(await placesOf(ctx, second?.lotId ?? '')).toEqual({ at_processor: 10 }),
    );
  });

  test('of more than were sent is refused on its line, in words, and nothing moves', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16, 10] });
    const [first, second] = await linesOf(world, batchId);
    const refusal = await refusalOf(
      world.asProcessor(
        (ctx) =>
          acknowledge(ctx, {
            batchId,
            counts: [
              { lineId: first?.id ?? '', pieces: 16 },
              { lineId: second?.id ?? '', pieces: 11 },
            ],
          }),
        batchId,
      ),
    );
    expect(refusal).toEqual({
      code: 'bad_input',
      message: 'The traveller says 10 on line 2. Enter 10 or less; if you have more, write to the shop.',
      fields: ['counts.1.pieces'],
    });
    await world.as(['lead'], async (ctx) => expect(await stageNow(ctx, batchId)).toBe('dispatched'));
  });

  test('of none at all, of a line twice, and of a line of another batch is refused', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16] });
    const [line] = await linesOf(world, batchId);
    const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    const [foreign] = await linesOf(world, other.id);
    const lineId = line?.id ?? '';
    expect(
      await refusalOf(
        world.asProcessor((ctx) => acknowledge(ctx, { batchId, counts: [{ lineId, pieces: 0 }] }), batchId),
      ),
    ).toMatchObject({ code: 'bad_input', fields: ['counts'] });
    expect(
      await refusalOf(
        world.asProcessor(
          (ctx) =>
            acknowledge(ctx, {
              batchId,
              counts: [
                { lineId, pieces: 3 },
                { lineId, pieces: 3 },
              ],
            }),
          batchId,
        ),
      ),
    ).toMatchObject({ code: 'bad_input', fields: ['counts.1.pieces'] });
    expect(
      await refusalOf(
        world.asProcessor(
          (ctx) => acknowledge(ctx, { batchId, counts: [{ lineId: foreign?.id ?? '', pieces: 3 }] }),
          batchId,
        ),
      ),
    ).toMatchObject({ code: 'bad_input', fields: ['counts.0.lineId'] });
    expect(() => declaration.input.parse({ batchId, counts: [{ lineId, pieces: 1.5 }] })).toThrow(
      /whole number/,
    );
    expect(() => declaration.input.parse({ batchId, counts: [{ lineId, pieces: -1 }] })).toThrow(/0 or more/);
  });

  test('a second time, with nothing on the way, is refused', async () => {
    const { world, batchId } = await makeSent(base);
    await world.asProcessor((ctx) => acknowledge(ctx, { batchId }), batchId);
    expect(await refusalOf(world.asProcessor((ctx) => acknowledge(ctx, { batchId }), batchId))).toMatchObject(
      { code: 'conflict', message: expect.stringContaining('on its way to you any more') as string },
    );
  });

  test('pressed on two phones at once, the pieces are counted once', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16] });
    const press = () => world.asProcessor((ctx) => acknowledge(ctx, { batchId }), batchId);
    const outcomes = await Promise.allSettled([press(), press(), press()]);
    expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
    await world.as(['lead'], async ({ tx }) =>
      expect(
        (
          await tx.select({ pieces: batches.acknowledgedPieces }).from(batches).where(eq(batches.id, batchId))
        )[0]?.pieces,
      ).toBe(16),
    );
  });

  test('a promise of a day that is past keeps the whole answer back', async () => {
    const { world, batchId } = await makeSent(base);
    expect(
      await refusalOf(
        world.asProcessor((ctx) => acknowledge(ctx, { batchId, promisedOn: '2026-06-16' }), batchId),
      ),
    ).toMatchObject({
      code: 'bad_input',
      fields: ['promisedOn'],
      message: 'Tue 16 Jun is past. Choose today or a later day.',
    });
    await world.as(['lead'], async (ctx) => {
      expect(await stageNow(ctx, batchId)).toBe('dispatched');
      expect(await ctx.tx.select().from(promises)).toEqual([]);
    });
  });

  test('of named pieces asks which ones came, and moves exactly those', async () => {
    const world = await makeWorld(base.db, base.owner);
    const batch = await world.as(['lead'], async (ctx) =>
      makeDispatchedBatch(ctx, world.processorId, {
        lots: [await makeLot(ctx, { serials: ['S-1', 'S-2', 'S-3'] })],
      }),
    );
    const [line] = await linesOf(world, batch.id);
    const lineId = line?.id ?? '';
    const send = (serials?: string[]) =>
      world.asProcessor(
        (ctx) =>
          acknowledge(ctx, {
            batchId: batch.id,
            counts: [{ lineId, pieces: 2, ...(serials ? { serials } : {}) }],
          }),
        batch.id,
      );
    expect(await refusalOf(send())).toMatchObject({ code: 'bad_input', fields: ['counts.0.pieces'] });
    expect(await refusalOf(send(['S-1', 'S-9']))).toMatchObject({ code: 'conflict' });
    await send(['S-1', 'S-3']);
    await world.as(['lead'], async ({ tx }) => {
      const missing = await tx
        .select({ serial: pieces.serial })
        .from(pieces)
        .where(and(eq(pieces.holderId, lineId), eq(pieces.place, 'transit_out')));
      expect(missing).toEqual([{ serial: 'S-2' }]);
    });
  });
});

describe('who may', () => {
  test('a person of the processor, without a link, may too; a shop may not', async () => {
    const { world, batchId } = await makeSent(base);
    expect(
      await refusalOf(world.as(['lead', 'admin'], (ctx) => acknowledge(ctx, { batchId }))),
    ).toMatchObject({ code: 'not_allowed' });
    await world.asProcessor((ctx) => acknowledge(ctx, { batchId }));
    await world.as(['lead'], async (ctx) =>
      expect(await lastAudit(ctx, 'batch.acknowledge')).toMatchObject({ actorKind: 'person' }),
    );
  });

  test('another processor does not find the batch, nor does the link of another batch of the same processor', async () => {
    const { world, batchId } = await makeSent(base);
    const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    const stranger = await makeWorld(base.db, base.owner);
    for (const attempt of [
      () => stranger.asProcessor((ctx) => acknowledge(ctx, { batchId })),
      () => world.asProcessor((ctx) => acknowledge(ctx, { batchId }), other.id),
    ]) {
      expect(await refusalOf(attempt())).toMatchObject({ code: 'not_found' });
    }
    expect(
      await refusalOf(world.asProcessor((ctx) => getPortalBatch(ctx, { batchId }), other.id)),
    ).toMatchObject({ code: 'not_found' });
    await world.as(['lead'], async (ctx) => expect(await stageNow(ctx, batchId)).toBe('dispatched'));
  });

  test('a cancelled batch is not worked on', async () => {
    const { world, batchId } = await makeSent(base);
    await base.owner
      .update(batches)
      .set({ cancelledAt: new Date('2026-06-17T10:00:00Z'), cancelReason: 'drawing' })
      .where(eq(batches.id, batchId));
    expect(await refusalOf(world.asProcessor((ctx) => acknowledge(ctx, { batchId })))).toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('Do not work on it') as string,
    });
  });
});
