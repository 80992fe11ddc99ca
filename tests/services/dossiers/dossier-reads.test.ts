import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { withTenant } from '@/db/client';
import { dossiers } from '@/db/schema/dossiers';
import type { Ctx } from '@/lib/auth/context';
import { NOBODY } from '@/lib/auth/identify';
import {
  listMadeDossiers as madeDeclaration,
  readDossierLink as faceDeclaration,
} from '@/lib/dossiers/contract';
import { shareDossier, withdrawDossierLink } from '@/lib/dossiers/dossier-links';
import { listMadeDossiers, requestDossier } from '@/lib/dossiers/queries';
import { readDossierLink } from '@/lib/dossiers/read-dossier-link';

import { makeLot } from '../../factories/lots';
import { lastAudit } from '../../factories/standing';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const DAY_MS = 24 * 3600 * 1000;

const newLot = (world: World) => world.as(['lead'], async (ctx) => (await makeLot(ctx, { pieces: 2 })).id);
const madeOf = (world: World, lotId: string) =>
  world.as(['auditor'], (ctx) => listMadeDossiers(ctx, { lotId }));

/** As anybody who holds the address, signed in nowhere. */
const faceOf = (token: string, now: Date = TODAY) =>
  withTenant(base.db, { kind: 'door' }, (tx) =>
    readDossierLink({ ...NOBODY, tx, now, requestId: 'test', address: null } satisfies Ctx, { token }),
  );

async function share(world: World, days = 10) {
  const lotId = await newLot(world);
  const { id, url } = await world.as(['inspector'], (ctx) =>
    shareDossier(ctx, { lotId, forWhom: 'The customer', days }),
  );
  return { id, lotId, token: url.split('/').at(-1) ?? '' };
}

test('what was asked for stands in the list, the last first, and is audited', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lotId = await newLot(world);
  const first = await world.as(['auditor'], (ctx) => requestDossier(ctx, { lotId }));
  const second = await world.as(['auditor'], (ctx) => requestDossier(ctx, { lotId }));
  expect((await madeOf(world, lotId)).rows).toMatchObject([
    { id: second.id, finished: false, failure: null, documentFileId: null, requestedBy: 'Test Person' },
    { id: first.id },
  ]);
  await world.as(['lead'], async (ctx) =>
    expect(await lastAudit(ctx, 'dossier.request')).toMatchObject({ entityId: lotId }),
  );
});

test('a try that failed says why, and one that is made says so', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lotId = await newLot(world);
  const { id } = await world.as(['lead'], (ctx) => requestDossier(ctx, { lotId }));
  await world.as(['lead'], (ctx) =>
    ctx.tx.update(dossiers).set({ failure: 'Storage did not answer.' }).where(eq(dossiers.id, id)),
  );
  expect((await madeOf(world, lotId)).rows).toMatchObject([
    { finished: false, failure: 'Storage did not answer.' },
  ]);
  await world.as(['lead'], (ctx) =>
    ctx.tx.update(dossiers).set({ failure: null, finishedAt: ctx.now }).where(eq(dossiers.id, id)),
  );
  expect((await madeOf(world, lotId)).rows).toMatchObject([{ finished: true, failure: null }]);
});

test('a processor may not list dossiers, another shop sees none, and no id is no lot', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const lotId = await newLot(world);
  await world.as(['lead'], (ctx) => requestDossier(ctx, { lotId }));
  await expect(world.asProcessor((ctx) => listMadeDossiers(ctx, { lotId }))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  expect(await madeOf(stranger, lotId)).toEqual({ rows: [] });
  expect(madeDeclaration.input.safeParse({ lotId: 'L-0001' }).success).toBe(false);
});

test('a link that stands says whose it is to anybody who holds it; giving it out is audited', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { lotId, token } = await share(world);
  expect(await faceOf(token)).toMatchObject({
    state: 'open',
    shop: `Shop ${world.shopId.slice(-6)}`,
    zone: 'UTC',
    endedAt: null,
  });
  await world.as(['lead'], async (ctx) =>
    expect(await lastAudit(ctx, 'dossier.share')).toMatchObject({ entityId: lotId }),
  );
});

test('a link whose day has passed, and one that was withdrawn, still name the shop to ask', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { id, token } = await share(world);
  const ends = new Date(TODAY.getTime() + 10 * DAY_MS);
  expect(await faceOf(token, new Date(ends.getTime() - 1))).toMatchObject({ state: 'open' });
  expect(await faceOf(token, ends)).toMatchObject({
    state: 'ended',
    shop: expect.any(String) as string,
    endedAt: ends.toISOString(),
  });
  await world.as(['inspector'], (ctx) => withdrawDossierLink(ctx, { linkId: id }));
  expect(await faceOf(token)).toMatchObject({ state: 'withdrawn', endedAt: TODAY.toISOString() });
});

test('what is no link of ours names no shop, and an address without end is refused', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { token } = await share(world);
  expect(await faceOf(`${token}x`)).toEqual({
    state: 'unknown',
    shop: null,
    phone: null,
    zone: null,
    endedAt: null,
  });
  expect(faceDeclaration.input.safeParse({ token: 'x'.repeat(401) }).success).toBe(false);
});

test('a lead may not withdraw a link, and another shop finds none', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { id, token } = await share(world);
  await expect(world.as(['lead'], (ctx) => withdrawDossierLink(ctx, { linkId: id }))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(
    stranger.as(['inspector'], (ctx) => withdrawDossierLink(ctx, { linkId: id })),
  ).rejects.toMatchObject({ code: 'not_found' });
  expect(await faceOf(token)).toMatchObject({ state: 'open' });
});
