import { expect, test } from 'vitest';

import { listNumbers as declaration, type HitKind } from '@/lib/search/contract';
import { listNumbers, searchNumbers } from '@/lib/search/search-numbers';
import { getWaiting } from '@/lib/tideline/get-waiting';

import { makeDispatchedBatch } from '../../factories/batches';
import { countInAll, makeCertificate } from '../../factories/evidence';
import { makePart } from '../../factories/lots';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

/** Eight parts, P-01 to P-08. */
const makeParts = (world: World) =>
  world.as(['lead'], async (ctx) => {
    for (let at = 1; at <= 8; at += 1) await makePart(ctx, { number: `P-0${at}` });
  });
const search = (world: World, text: string) => world.as(['office'], (ctx) => searchNumbers(ctx, { text }));
const page = (
  world: World,
  { kind = 'Part' as HitKind, text = 'P-0', after = undefined as string | undefined },
) => world.as(['office'], (ctx) => listNumbers(ctx, { kind, text, after, limit: 3 }));

test('of each kind the first are told, and of which there are more', async () => {
  const world = await makeWorld(base.db, base.owner);
  await makeParts(world);
  const { hits, more } = await search(world, 'P-0');
  expect(hits.map((hit) => hit.number)).toEqual([1, 2, 3, 4, 5, 6].map((at) => `P-0${at} rev A`));
  expect(more).toEqual(['Part']);
  expect(await search(world, 'P-08')).toMatchObject({
    hits: [{ kind: 'Part', number: 'P-08 rev A' }],
    more: [],
  });
});

test('one kind is read to its end, page by page, each once', async () => {
  const world = await makeWorld(base.db, base.owner);
  await makeParts(world);
  const seen: string[] = [];
  let after: string | undefined;
  do {
    const { rows, next } = await page(world, { after });
    seen.push(...rows.map((hit) => hit.number));
    after = next ?? undefined;
  } while (after !== undefined);
  expect(seen).toEqual([1, 2, 3, 4, 5, 6, 7, 8].map((at) => `P-0${at} rev A`));
});

test('every kind can be searched and listed', async () => {
  const world = await makeWorld(base.db, base.owner);
  for (const kind of declaration.input.shape.kind.options)
    expect(await page(world, { kind, text: '1' })).toEqual({ rows: [], next: null });
});

test('another shop finds none of it, a processor may not search, and nothing is no text', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  await makeParts(world);
  expect(await page(stranger, {})).toEqual({ rows: [], next: null });
  expect(await search(stranger, 'P-0')).toEqual({ hits: [], more: [] });
  await expect(
    world.asProcessor((ctx) => listNumbers(ctx, { kind: 'Part', text: 'P', limit: 3 })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  expect(declaration.input.safeParse({ kind: 'Part', text: ' ' }).success).toBe(false);
  expect(declaration.input.safeParse({ kind: 'Person', text: 'P' }).success).toBe(false);
});

test('what waits is counted for the roles of the reader, and for no other shop', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  await world.as(['lead', 'inspector'], async (ctx) => {
    const batch = await makeDispatchedBatch(ctx, world.processorId);
    await countInAll(ctx, batch.id, [{ good: 10 }]);
    await makeCertificate(ctx, batch.id);
  });
  const none = { total: 0, sections: { batches: 0, certificates: 0, invoices: 0 } };
  expect(await world.as(['inspector'], (ctx) => getWaiting(ctx))).toEqual({
    total: 1,
    sections: { batches: 0, certificates: 1, invoices: 0 },
  });
  expect(await world.as(['office'], (ctx) => getWaiting(ctx))).toEqual(none);
  expect(await stranger.as(['inspector'], (ctx) => getWaiting(ctx))).toEqual(none);
  await expect(world.asProcessor((ctx) => getWaiting(ctx))).rejects.toMatchObject({ code: 'not_allowed' });
});
