import { sql } from 'drizzle-orm';
import { beforeAll, expect, test } from 'vitest';

import { addLocation } from '@/lib/stock/add-location';
import { getGate } from '@/lib/stock/queries';

import { makeDispatchedBatch } from '../factories/batches';
import { countInAll, givePassword, makeSignedCertificate } from '../factories/evidence';
import { ALL } from '../factories/invoices';
import { makeLot } from '../factories/lots';
import { placesOf } from '../factories/standing';
import type { World } from '../factories/world';
import { andAgain, untilAnswered } from './browser';
import { inRounds, ROUNDS } from './rounds';
import { aWorld, count, openSetting } from './setting';

const setting = openSetting();
let shop: { world: World; cookie: string };
let locationId: string;

beforeAll(async () => {
  shop = await aWorld(setting);
  await givePassword(setting.owner, shop.world.userId);
  locationId = (await shop.world.as(ALL, (ctx) => addLocation(ctx, { name: 'Rack F' }))).id;
});

test(`release, the door killed in ${ROUNDS} rounds: the pieces are in stock once`, async () => {
  const { world, cookie } = shop;
  await inRounds(setting.door, 4, async (disturb, number) => {
    const { lot, batchId, lineId } = await provedBatch(world);
    const asked = {
      path: `/batches/${batchId}/release`,
      cookie,
      key: `release ${number}`,
      body: { lines: [{ lineId, pieces: 5, locationId }] },
    };
    const answer = await disturb(() => untilAnswered(asked));
    expect(answer.status).toBe(200);
    await andAgain(asked, answer);

    expect(await world.as(['lead'], (ctx) => placesOf(ctx, lot.id))).toEqual({ stock: 5 });
    expect(await count(setting, sql`select from releases where batch_id = ${batchId}`)).toBe(1);
    expect(
      await count(setting, sql`select from movements where lot_id = ${lot.id} and reason = 'released'`),
    ).toBe(1);
    expect(
      await count(
        setting,
        sql`select from audit_entries where action = 'batch.release' and entity_id = ${batchId}`,
      ),
    ).toBe(1);
  });
});

const provedBatch = (world: World) =>
  world.as(ALL, async (ctx) => {
    const lot = await makeLot(ctx, { pieces: 5 });
    const batch = await makeDispatchedBatch(ctx, world.processorId, { lots: [lot], unitPriceMinor: 0 });
    await countInAll(ctx, batch.id, [{ good: 5 }]);
    await makeSignedCertificate(ctx, batch.id, [5]);
    const { lines } = await getGate(ctx, { batchId: batch.id });
    return { lot, batchId: batch.id, lineId: lines[0]?.lineId ?? '' };
  });
