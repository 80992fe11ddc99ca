import { eq } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';

import { batches, batchLines, messages, promises } from '@/db/schema/batches';
import { certificates, charts } from '@/db/schema/evidence';
import { invoices } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { listMessages } from '@/lib/messages/list-messages';
import { NewMessage } from '@/lib/messages/contract';
import { writeToProcessor } from '@/lib/messages/write-to-processor';
import { newId } from '@/lib/ids';
import * as contract from '@/lib/portal/contract';
import { acknowledgeBatch } from '@/lib/portal/acknowledge-batch';
import { getPortalBatch } from '@/lib/portal/get-portal-batch';
import { listPortalBatches } from '@/lib/portal/list-portal-batches';
import { markDone } from '@/lib/portal/mark-done';
import { promiseDay } from '@/lib/portal/promise-day';
import { sendPaper } from '@/lib/portal/send-paper';
import { shipBatch } from '@/lib/portal/ship-batch';
import { listPortalMessages, reportTrouble, writeToShop } from '@/lib/portal/write-to-shop';

import { makeBatch, makeDispatchedBatch } from '../../factories/batches';
import { countInAll } from '../../factories/evidence';
import { lastAudit, placesOf, stageNow } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { makeSent, makeSentFile, queuedMails, refusalOf } from './portal-kit';

const base = openDatabase();

const acknowledge = (world: World, batchId: string) =>
  world.asProcessor(
    (ctx) => acknowledgeBatch(ctx, contract.acknowledgeBatch.input.parse({ batchId })),
    batchId,
  );
const ship = (ctx: Ctx, given: object) => shipBatch(ctx, contract.shipBatch.input.parse(given));
const lotsOf = (world: World, batchId: string) =>
  world.as(['lead'], ({ tx }) =>
    tx
      .select({ id: batchLines.id, lotId: batchLines.lotId })
      .from(batchLines)
      .where(eq(batchLines.batchId, batchId))
      .orderBy(batchLines.lineNo),
  );
const message = (given: object) => NewMessage.parse(given);

describe('a promise', () => {
  test('is kept beside the earlier ones, the latest counts, and the trail has both', async () => {
    const { world, batchId } = await makeSent(base);
    await world.asProcessor(
      (ctx) => promiseDay(ctx, { batchId, promisedOn: '2026-06-25', note: '' }),
      batchId,
    );
    await world.asProcessor(
      (ctx) => promiseDay(ctx, { batchId, promisedOn: '2026-07-01', note: 'Furnace is down.' }),
      batchId,
      new Date(TODAY.getTime() + 60_000),
    );
    await world.as(['lead'], async (ctx) => {
      const [batch] = await ctx.tx.select().from(batches).where(eq(batches.id, batchId));
      expect(batch).toMatchObject({ firstPromisedOn: '2026-06-25', promisedOn: '2026-07-01' });
      expect(await lastAudit(ctx, 'batch.promise')).toMatchObject({
        before: { promisedOn: '2026-06-25' },
        after: { promisedOn: '2026-07-01' },
      });
    });
  });

  test('of the same day again adds nothing', async () => {
    const { world, batchId } = await makeSent(base);
    for (let press = 0; press < 2; press++)
      await world.asProcessor(
        (ctx) => promiseDay(ctx, { batchId, promisedOn: '2026-06-25', note: '' }),
        batchId,
      );
    await world.as(['lead'], async ({ tx }) => expect(await tx.select().from(promises)).toHaveLength(1));
  });

  test('of a day that is past, or years away, is refused with the field', async () => {
    const { world, batchId } = await makeSent(base);
    for (const promisedOn of ['2026-06-16', '2029-01-01']) {
      expect(
        await refusalOf(
          world.asProcessor((ctx) => promiseDay(ctx, { batchId, promisedOn, note: '' }), batchId),
        ),
      ).toMatchObject({ code: 'bad_input', fields: ['promisedOn'] });
    }
  });

  test("for pieces that are all back is refused; so is another processor's, and a shop's", async () => {
    const { world, batchId } = await makeSent(base);
    const stranger = await makeWorld(base.db, base.owner);
    const given = { batchId, promisedOn: '2026-06-25', note: '' };
    expect(await refusalOf(stranger.asProcessor((ctx) => promiseDay(ctx, given)))).toMatchObject({
      code: 'not_found',
    });
    expect(await refusalOf(world.as(['admin'], (ctx) => promiseDay(ctx, given)))).toMatchObject({
      code: 'not_allowed',
    });
    await world.as(['inspector'], (ctx) => countInAll(ctx, batchId, [{ good: 10 }]));
    expect(await refusalOf(world.asProcessor((ctx) => promiseDay(ctx, given), batchId))).toMatchObject({
      code: 'conflict',
    });
  });
});

describe('done and shipped', () => {
  test('done is marked, taken back, and marked again; the trail tells', async () => {
    const { world, batchId } = await makeSent(base);
    expect(
      await refusalOf(world.asProcessor((ctx) => markDone(ctx, { batchId, done: true }), batchId)),
    ).toMatchObject({ code: 'conflict', message: expect.stringContaining('Say first how many') as string });
    await acknowledge(world, batchId);
    for (const done of [true, true, false, true])
      await world.asProcessor((ctx) => markDone(ctx, { batchId, done }), batchId);
    await world.as(['lead'], async (ctx) => {
      expect((await ctx.tx.select().from(batches).where(eq(batches.id, batchId)))[0]?.markedDoneAt).toEqual(
        TODAY,
      );
      expect(await lastAudit(ctx, 'batch.mark_not_done')).toMatchObject({ actorKind: 'link' });
    });
  });

  test('shipping moves what is here on its way back, whole or in parts, and marks it done', async () => {
    const { world, batchId } = await makeSent(base, { pieces: [16, 10] });
    await acknowledge(world, batchId);
    const [first, second] = await lotsOf(world, batchId);
    expect(
      await world.asProcessor(
        (ctx) =>
          ship(ctx, { batchId, counts: [{ lineId: first?.id, pieces: 12 }], note: 'Our van, two boxes' }),
        batchId,
      ),
    ).toEqual({ shipped: 12 });
    await world.as(['lead'], async (ctx) => {
      expect(await placesOf(ctx, first?.lotId ?? '')).toEqual({ at_processor: 4, transit_back: 12 });
      expect((await ctx.tx.select().from(batches).where(eq(batches.id, batchId)))[0]).toMatchObject({
        shippedNote: 'Our van, two boxes',
        markedDoneAt: TODAY,
        stage: 'at_processor',
      });
      expect(await lastAudit(ctx, 'batch.ship')).toMatchObject({
        actorKind: 'link',
        after: { shipped: 12, lines: [{ line: 1, pieces: 12 }] },
      });
    });
    expect(await world.asProcessor((ctx) => ship(ctx, { batchId }), batchId)).toEqual({ shipped: 14 });
    await world.as(['lead'], async (ctx) => {
      expect(await placesOf(ctx, second?.lotId ?? '')).toEqual({ transit_back: 10 });
      expect((await ctx.tx.select().from(batches).where(eq(batches.id, batchId)))[0]?.shippedNote).toBe(
        'Our van, two boxes',
      );
    });
  });

  test('more than is here, before it is here, or when it has gone, is refused', async () => {
    const { world, batchId } = await makeSent(base);
    const [line] = await lotsOf(world, batchId);
    expect(await refusalOf(world.asProcessor((ctx) => ship(ctx, { batchId }), batchId))).toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('Say first how many') as string,
    });
    await acknowledge(world, batchId);
    expect(
      await refusalOf(
        world.asProcessor(
          (ctx) => ship(ctx, { batchId, counts: [{ lineId: line?.id, pieces: 11 }] }),
          batchId,
        ),
      ),
    ).toMatchObject({
      code: 'bad_input',
      fields: ['counts.0.pieces'],
      message: 'You have 10 of line 1. Enter 10 or less.',
    });
    await world.asProcessor((ctx) => ship(ctx, { batchId }), batchId);
    expect(await refusalOf(world.asProcessor((ctx) => ship(ctx, { batchId }), batchId))).toMatchObject({
      code: 'conflict',
    });
    expect(
      await refusalOf(world.asProcessor((ctx) => markDone(ctx, { batchId, done: false }), batchId)),
    ).toMatchObject({ code: 'conflict' });
  });

  test("is nobody else's to say", async () => {
    const { world, batchId } = await makeSent(base);
    await acknowledge(world, batchId);
    const stranger = await makeWorld(base.db, base.owner);
    expect(await refusalOf(stranger.asProcessor((ctx) => ship(ctx, { batchId })))).toMatchObject({
      code: 'not_found',
    });
    expect(
      await refusalOf(stranger.asProcessor((ctx) => markDone(ctx, { batchId, done: true }))),
    ).toMatchObject({ code: 'not_found' });
    expect(await refusalOf(world.as(['lead'], (ctx) => ship(ctx, { batchId })))).toMatchObject({
      code: 'not_allowed',
    });
    expect(
      await refusalOf(world.as(['lead'], (ctx) => markDone(ctx, { batchId, done: true }))),
    ).toMatchObject({ code: 'not_allowed' });
  });
});

describe('the thread', () => {
  test('a question of the processor reaches the shop, its answer the processor, each by mail, with the question in it', async () => {
    const { world, batchId } = await makeSent(base);
    const [line] = await lotsOf(world, batchId);
    const asked = await world.asProcessor(
      (ctx) =>
        writeToShop(
          ctx,
          message({
            batchId,
            kind: 'question',
            body: 'Burrs on line 1. May we take them off?',
            lineId: line?.id,
          }),
        ),
      batchId,
    );
    await world.as(
      ['lead'],
      (ctx) =>
        writeToProcessor(
          ctx,
          message({ batchId, kind: 'answer', body: 'Yes, by hand.', answersId: asked.id }),
        ),
      new Date(TODAY.getTime() + 1000),
    );

    const thread = await world.asProcessor((ctx) => listPortalMessages(ctx, { batchId }), batchId);
    expect(thread.messages.map((one) => [one.side, one.kind, one.answersId])).toEqual([
      ['processor', 'question', null],
      ['shop', 'answer', asked.id],
    ]);
    expect(await world.as(['auditor'], (ctx) => listMessages(ctx, { batchId }))).toMatchObject({
      messages: thread.messages,
      closed: null,
    });

    const [question, answer] = (await queuedMails(base.owner, world.shopId)).filter(
      (mail) => mail.template === 'message',
    );
    expect(question).toMatchObject({
      to: [`person-${world.userId}@shop.test`],
      replyTo: `desk-${world.processorId}@processor.test`,
      props: { to: 'shop', about: expect.stringMatching(/^line 1, P-/) as string },
    });
    expect(String(question?.props['url'])).toMatch(new RegExp(`/batches/${batchId}#messages$`));
    expect(answer).toMatchObject({
      to: [`desk-${world.processorId}@processor.test`],
      replyTo: `person-${world.userId}@shop.test`,
      props: { to: 'processor', answers: { body: 'Burrs on line 1. May we take them off?' } },
    });
    expect(String(answer?.props['url'])).toMatch(/\/b\/[\w-]{20,}$/);
    await world.as(['lead'], async (ctx) =>
      expect(await lastAudit(ctx, 'message.question')).toMatchObject({
        actorKind: 'link',
        entityId: batchId,
      }),
    );
  });

  test('trouble is told to the shop and not to be mistaken for a question', async () => {
    const { world, batchId } = await makeSent(base);
    await world.asProcessor(
      (ctx) => reportTrouble(ctx, { batchId, body: 'The furnace failed at 14:10.', lineId: null }),
      batchId,
    );
    await world.as(['lead'], async (ctx) => {
      expect(await ctx.tx.select({ kind: messages.kind, side: messages.side }).from(messages)).toEqual([
        { kind: 'trouble', side: 'processor' },
      ]);
      expect(await lastAudit(ctx, 'message.trouble')).toBeDefined();
    });
    expect((await queuedMails(base.owner, world.shopId)).map((mail) => mail.template)).toContain('trouble');
  });

  test("an answer to nothing, to one's own question, to another batch's, or about a foreign line is refused", async () => {
    const { world, batchId } = await makeSent(base);
    const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    const own = await world.as(['lead'], (ctx) =>
      writeToProcessor(ctx, message({ batchId, kind: 'question', body: 'When?' })),
    );
    const [foreign] = await lotsOf(world, other.id);
    const shopWrites = (given: object) =>
      refusalOf(
        world.as(['lead'], (ctx) => writeToProcessor(ctx, message({ batchId, body: 'x', ...given }))),
      );
    expect(await shopWrites({ kind: 'answer' })).toMatchObject({ code: 'bad_input', fields: ['answersId'] });
    expect(await shopWrites({ kind: 'answer', answersId: own.id })).toMatchObject({
      code: 'bad_input',
      fields: ['answersId'],
    });
    expect(await shopWrites({ kind: 'note', lineId: foreign?.id })).toMatchObject({
      code: 'bad_input',
      fields: ['lineId'],
    });
    expect(
      await refusalOf(
        world.asProcessor((ctx) =>
          writeToShop(ctx, message({ batchId: other.id, kind: 'answer', body: 'x', answersId: own.id })),
        ),
      ),
    ).toMatchObject({ fields: ['answersId'] });
    expect(() => message({ batchId, kind: 'note', body: '  ' })).toThrow(/Write something/);
  });

  test('a batch that has not left cannot be written about, and an auditor only reads', async () => {
    const world = await makeWorld(base.db, base.owner);
    const built = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
    expect(
      await refusalOf(
        world.as(['lead'], (ctx) =>
          writeToProcessor(ctx, message({ batchId: built.id, kind: 'note', body: 'x' })),
        ),
      ),
    ).toMatchObject({ code: 'conflict' });
    expect(
      await refusalOf(
        world.as(['auditor'], (ctx) =>
          writeToProcessor(ctx, message({ batchId: built.id, kind: 'note', body: 'x' })),
        ),
      ),
    ).toMatchObject({ code: 'not_allowed' });
    expect(
      await refusalOf(
        world.asProcessor((ctx) => writeToShop(ctx, message({ batchId: built.id, kind: 'note', body: 'x' }))),
      ),
    ).toMatchObject({ code: 'not_found' });
    const stranger = await makeWorld(base.db, base.owner);
    expect(
      await refusalOf(
        stranger.as(['lead'], (ctx) =>
          writeToProcessor(ctx, message({ batchId: built.id, kind: 'note', body: 'x' })),
        ),
      ),
    ).toMatchObject({ code: 'not_found' });
    expect(
      await refusalOf(stranger.as(['lead'], (ctx) => listMessages(ctx, { batchId: built.id }))),
    ).toMatchObject({ code: 'not_found' });
  });
});

describe('papers', () => {
  test.each([
    ['certificate', certificates],
    ['chart', charts],
    ['invoice', invoices],
  ] as const)("a %s is handed in once, under the sender's name", async (kind, table) => {
    const { world, batchId } = await makeSent(base);
    const fileId = await makeSentFile(base.owner, world, { purpose: kind, batchId });
    const { id } = await world.asProcessor((ctx) => sendPaper(ctx, { batchId, kind, fileId }), batchId);
    await world.as(['inspector'], async (ctx) => {
      expect(
        await ctx.tx.select({ id: table.id, sentBy: table.sentBy, batchId: table.batchId }).from(table),
      ).toEqual([{ id, sentBy: 'Test Processor', batchId }]);
      expect(await lastAudit(ctx, `${kind}.send`)).toMatchObject({
        entity: kind,
        entityId: id,
        actorKind: 'link',
      });
    });
    expect(
      await refusalOf(world.asProcessor((ctx) => sendPaper(ctx, { batchId, kind, fileId }), batchId)),
    ).toMatchObject({ code: 'conflict' });
    const seen = await world.asProcessor((ctx) => getPortalBatch(ctx, { batchId }), batchId);
    expect(seen.papers).toMatchObject([{ id, kind, file: { id: fileId }, acceptedPieces: null }]);
  });

  test("a file that has not arrived, is for something else, for another batch, or is another processor's, is refused with its field", async () => {
    const { world, batchId } = await makeSent(base);
    const other = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    const stranger = await makeWorld(base.db, base.owner);
    const give = async (given: Parameters<typeof makeSentFile>[2]) => {
      const fileId = await makeSentFile(base.owner, world, given);
      return refusalOf(
        world.asProcessor((ctx) => sendPaper(ctx, { batchId, kind: 'certificate', fileId }), batchId),
      );
    };
    for (const given of [
      { purpose: 'certificate', batchId, state: 'awaited' },
      { purpose: 'chart', batchId },
      { purpose: 'certificate', batchId: other.id },
      { purpose: 'certificate', batchId, processorId: stranger.processorId },
    ] as const) {
      expect(await give(given)).toMatchObject({ code: 'bad_input', fields: ['fileId'] });
    }
    expect(
      await refusalOf(
        world.asProcessor(
          (ctx) => sendPaper(ctx, { batchId, kind: 'certificate', fileId: newId() }),
          batchId,
        ),
      ),
    ).toMatchObject({ code: 'bad_input' });
  });

  test('a batch that has not left is not there for its processor', async () => {
    const world = await makeWorld(base.db, base.owner);
    const built = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
    const fileId = await makeSentFile(base.owner, world, { purpose: 'certificate', batchId: built.id });
    expect(
      await refusalOf(
        world.asProcessor((ctx) => sendPaper(ctx, { batchId: built.id, kind: 'certificate', fileId })),
      ),
    ).toMatchObject({ code: 'not_found' });
  });

  test('an invoice for a settled batch is refused, a certificate is not', async () => {
    const { world, batchId } = await makeSent(base);
    await base.owner.update(batches).set({ stage: 'settled' }).where(eq(batches.id, batchId));
    const invoice = await makeSentFile(base.owner, world, { purpose: 'invoice', batchId });
    expect(
      await refusalOf(
        world.asProcessor((ctx) => sendPaper(ctx, { batchId, kind: 'invoice', fileId: invoice })),
      ),
    ).toMatchObject({ code: 'conflict' });
    const certificate = await makeSentFile(base.owner, world, { purpose: 'certificate', batchId });
    await world.asProcessor((ctx) => sendPaper(ctx, { batchId, kind: 'certificate', fileId: certificate }));
  });
});

describe('what a processor sees', () => {
  test('its batches over all shops, and with a link only that one', async () => {
    const { world, batchId } = await makeSent(base);
    const second = await world.as(['lead'], (ctx) => makeDispatchedBatch(ctx, world.processorId));
    await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
    const list = (batch?: string) =>
      world.asProcessor((ctx) => listPortalBatches(ctx, contract.listPortalBatches.input.parse({})), batch);
    expect((await list()).rows.map((row) => row.id)).toEqual([second.id, batchId]);
    expect((await list(batchId)).rows.map((row) => row.id)).toEqual([batchId]);
    const [row] = (await list(batchId)).rows;
    expect(row).toMatchObject({
      parts: ['Rib clip'],
      materials: ['2024 clad sheet'],
      thicknesses: ['0.040 in'],
      certificates: 0,
      invoices: 0,
      asksMe: false,
      answered: false,
    });
  });

  test("no price, no name of a person but the one to ring, and nothing of the shop's stock", async () => {
    const { world, batchId } = await makeSent(base);
    const seen = contract.getPortalBatch.response.parse(
      await world.asProcessor((ctx) => getPortalBatch(ctx, { batchId }), batchId),
    );
    expect(JSON.stringify(seen)).not.toMatch(/price|Minor/i);
    expect(seen).toMatchObject({
      contactName: 'Test Person',
      stage: 'dispatched',
      documents: [{ documentVersion: 1 }, { documentVersion: 1 }],
      requirements: [{ characteristic: 'Hardness', lineNo: null }],
    });
  });

  test('that the shop waits for an answer', async () => {
    const { world, batchId } = await makeSent(base);
    await world.as(['lead'], (ctx) =>
      writeToProcessor(ctx, message({ batchId, kind: 'question', body: 'Which load?' })),
    );
    const list = () =>
      world.asProcessor((ctx) => listPortalBatches(ctx, contract.listPortalBatches.input.parse({})));
    expect((await list()).rows[0]?.asksMe).toBe(true);
    await world.asProcessor(
      (ctx) => writeToShop(ctx, message({ batchId, kind: 'note', body: 'Load 2.' })),
      batchId,
    );
    expect((await list()).rows[0]?.asksMe).toBe(false);
    await world.as(['lead'], async (ctx) => expect(await stageNow(ctx, batchId)).toBe('dispatched'));
  });
});
