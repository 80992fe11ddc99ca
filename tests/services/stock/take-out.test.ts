import { expect, test } from 'vitest';

import { closeAssembly, createAssembly } from '@/lib/assemblies/change-assembly';
import { addLocation } from '@/lib/stock/add-location';
import { closeLocation } from '@/lib/stock/close-location';
import { getStockSpot as spotDeclaration } from '@/lib/stock/contract';
import { fitPieces } from '@/lib/stock/fit-pieces';
import { moveStock } from '@/lib/stock/move-stock';
import { getStockSpot } from '@/lib/stock/queries';
import { takeOutPieces } from '@/lib/stock/take-out-pieces';
import { newId } from '@/lib/ids';

import { makePart, makeStock } from '../../factories/lots';
import { lastAudit, placesOf } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

/** 10 pieces in a place, or their names where they have some, and an assembly that needs 6 of the part. */
async function setup(world: World, serials?: readonly string[]) {
  return world.as(['lead'], async (ctx) => {
    const part = await makePart(ctx, { serialised: serials !== undefined });
    const [locationId, otherId] = [
      (await addLocation(ctx, { name: 'Rack A' })).id,
      (await addLocation(ctx, { name: 'Rack B' })).id,
    ];
    const lot = await makeStock(ctx, { part, locationId, pieces: 10, ...(serials ? { serials } : {}) });
    const assembly = await createAssembly(ctx, {
      name: 'Left float',
      neededOn: '2026-07-01',
      note: null,
      needs: [{ partNumber: part.number, pieces: 6 }],
    });
    return { lotId: lot.id, locationId, otherId, assemblyId: assembly.id };
  });
}
type Setup = Awaited<ReturnType<typeof setup>>;

const fit = (world: World, { lotId, locationId, assemblyId }: Setup, pieces: number) =>
  world.as(['lead'], (ctx) => fitPieces(ctx, { lotId, locationId, assemblyId, pieces }));
const takeOut = (world: World, { lotId, locationId, assemblyId }: Setup, pieces: number) =>
  world.as(['lead'], (ctx) => takeOutPieces(ctx, { lotId, locationId, assemblyId, pieces }));
const spotOf = (world: World, { lotId, locationId }: Pick<Setup, 'lotId' | 'locationId'>) =>
  world.as(['auditor'], (ctx) => getStockSpot(ctx, { lotId, locationId }));

test('fitted pieces are taken out, lie in stock again, and it is audited', async () => {
  const world = await makeWorld(base.db, base.owner);
  const stock = await setup(world);
  await fit(world, stock, 6);
  await takeOut(world, stock, 2);
  await world.as(['lead'], async (ctx) => {
    expect(await placesOf(ctx, stock.lotId)).toEqual({ stock: 6, fitted: 4 });
    expect(await lastAudit(ctx, 'assembly.take_out')).toMatchObject({
      entityId: stock.assemblyId,
      after: { pieces: 2, to: 'Rack A' },
    });
  });
});

test('an inspector may not take out', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { lotId, locationId, assemblyId } = await setup(world);
  await expect(
    world.as(['inspector'], (ctx) => takeOutPieces(ctx, { lotId, locationId, assemblyId, pieces: 1 })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('more than is fitted, out of a closed assembly, or into a closed place is refused', async () => {
  const world = await makeWorld(base.db, base.owner);
  const stock = await setup(world);
  await fit(world, stock, 3);
  await expect(takeOut(world, stock, 4)).rejects.toMatchObject({ code: 'conflict' });
  await world.as(['lead'], (ctx) => closeLocation(ctx, { locationId: stock.otherId }));
  await expect(takeOut(world, { ...stock, locationId: stock.otherId }, 1)).rejects.toMatchObject({
    code: 'conflict',
    message: 'Rack B is closed. Choose another place.',
  });
  await world.as(['lead'], (ctx) => closeAssembly(ctx, { assemblyId: stock.assemblyId, version: 1 }));
  await expect(takeOut(world, stock, 1)).rejects.toMatchObject({
    code: 'conflict',
    message: 'Left float is closed. What is fitted stays fitted.',
  });
});

test('another shop is told that the assembly does not exist', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const stock = await setup(world);
  await expect(takeOut(stranger, stock, 1)).rejects.toMatchObject({ code: 'not_found' });
});

test('names that are not as many as the pieces are refused', async () => {
  const world = await makeWorld(base.db, base.owner);
  const { lotId, locationId, assemblyId } = await setup(world, ['01', '02', '03']);
  const [first] = (await spotOf(world, { lotId, locationId })).named;
  await expect(
    world.as(['lead'], (ctx) =>
      takeOutPieces(ctx, { lotId, locationId, assemblyId, pieces: 2, pieceIds: [first?.id ?? ''] }),
    ),
  ).rejects.toMatchObject({ code: 'bad_input', details: { fields: [{ field: 'pieces' }] } });
});

test('a spot says what lies there, by name, and what needs it', async () => {
  const world = await makeWorld(base.db, base.owner);
  const stock = await setup(world, ['01', '02', '03']);
  await fit(world, stock, 1);
  const spot = await spotOf(world, stock);
  expect(spot.named.map((piece) => piece.serial)).toEqual(['02', '03']);
  expect(spot).toMatchObject({
    pieces: 2,
    needs: [{ assemblyId: stock.assemblyId, name: 'Left float', neededOn: '2026-07-01', open: 5 }],
  });
});

test('a spot from which all went on is empty, and a need that is met is no need', async () => {
  const world = await makeWorld(base.db, base.owner);
  const stock = await setup(world);
  await fit(world, stock, 6);
  await world.as(['lead'], (ctx) =>
    moveStock(ctx, {
      lotId: stock.lotId,
      fromLocationId: stock.locationId,
      toLocationId: stock.otherId,
      pieces: 4,
    }),
  );
  expect(await spotOf(world, stock)).toEqual({ pieces: 0, named: [], needs: [] });
});

test('a processor may not look into a spot, another shop finds no such lot, and no id is no spot', async () => {
  const [world, stranger] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const { lotId, locationId } = await setup(world);
  await expect(world.asProcessor((ctx) => getStockSpot(ctx, { lotId, locationId }))).rejects.toMatchObject({
    code: 'not_allowed',
  });
  await expect(spotOf(stranger, { lotId, locationId })).rejects.toMatchObject({ code: 'not_found' });
  await expect(spotOf(world, { lotId: newId(), locationId })).rejects.toMatchObject({ code: 'not_found' });
  expect(spotDeclaration.input.safeParse({ lotId: 'L-0001', locationId }).success).toBe(false);
});
