import { expect, test } from 'vitest';

import { addLocation } from '@/lib/stock/add-location';
import { closeLocation, reopenLocation } from '@/lib/stock/close-location';
import { closeLocation as declaration } from '@/lib/stock/contract';
import { moveStock } from '@/lib/stock/move-stock';
import { listLocations } from '@/lib/stock/queries';

import { makeStock } from '../../factories/lots';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

/** Two places; 10 pieces lie in the first. */
async function setup(world: World) {
  return world.as(['lead'], async (ctx) => {
    const full = (await addLocation(ctx, { name: 'Rack A' })).id;
    const empty = (await addLocation(ctx, { name: 'Rack B' })).id;
    const lot = await makeStock(ctx, { locationId: full, pieces: 10 });
    return { full, empty, lot };
  });
}
const placesOf = (world: World) =>
  world.as(['auditor'], async (ctx) =>
    (await listLocations(ctx)).rows.map(
      ({ name, pieces, closed }) => `${name} ${pieces}${closed ? ' closed' : ''}`,
    ),
  );

test('an empty place is closed and opened again, and both are audited', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { full, empty, lot } = await setup(world);
  const move = () =>
    world.as(['lead'], (ctx) =>
      moveStock(ctx, { lotId: lot.id, fromLocationId: full, toLocationId: empty, pieces: 1 }),
    );
  await world.as(['inspector'], (ctx) => closeLocation(ctx, { locationId: empty }));
  expect(await placesOf(world)).toEqual(['Rack A 10', 'Rack B 0 closed']);
  await expect(move()).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringContaining('closed') as string,
  });
  await world.as(['inspector'], (ctx) => reopenLocation(ctx, { locationId: empty }));
  await move();
  await world.as(['lead'], async (ctx) => {
    expect(await lastAudit(ctx, 'location.close')).toMatchObject({
      entityId: empty,
      after: { name: 'Rack B' },
    });
    expect(await lastAudit(ctx, 'location.reopen')).toMatchObject({ entityId: empty });
  });
});

test('an auditor may neither close nor open', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { empty } = await setup(world);
  for (const verb of [closeLocation, reopenLocation])
    await expect(world.as(['auditor'], (ctx) => verb(ctx, { locationId: empty }))).rejects.toMatchObject({
      code: 'not_allowed',
    });
});

test('a place with pieces stays open and says how many; closed twice or opened twice is refused', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { full, empty } = await setup(world);
  const close = (locationId: string) => world.as(['lead'], (ctx) => closeLocation(ctx, { locationId }));
  const reopen = (locationId: string) => world.as(['lead'], (ctx) => reopenLocation(ctx, { locationId }));
  await expect(close(full)).rejects.toMatchObject({
    code: 'conflict',
    message: '10 pc are in Rack A. Move them first, then close it.',
  });
  await expect(reopen(empty)).rejects.toMatchObject({ code: 'conflict' });
  await close(empty);
  await expect(close(empty)).rejects.toMatchObject({ code: 'conflict' });
});

test('whoever comes first, nothing ever lies in a closed place', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { full, empty, lot } = await setup(world);
  const outcomes = await Promise.allSettled([
    world.as(['lead'], (ctx) =>
      moveStock(ctx, { lotId: lot.id, fromLocationId: full, toLocationId: empty, pieces: 10 }),
    ),
    world.as(['lead'], (ctx) => closeLocation(ctx, { locationId: empty })),
  ]);
  expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
});

test('another shop is told that the place does not exist', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { empty } = await setup(world);
  for (const verb of [closeLocation, reopenLocation])
    await expect(stranger.as(['lead'], (ctx) => verb(ctx, { locationId: empty }))).rejects.toMatchObject({
      code: 'not_found',
    });
});

test('what is no id is no place', () =>
  expect(declaration.input.safeParse({ locationId: 'Rack A' }).success).toBe(false));
