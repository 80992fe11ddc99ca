import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { parts } from '@/db/schema/parts';
import { getBatchLines } from '@/lib/batches/get-batch-lines';
import { getBatchChecks } from '@/lib/batches/queries';
import { addEquipment, changeEquipment, retireEquipment } from '@/lib/equipment/change-equipment';
import { addEquipment as declaration, EquipmentFields } from '@/lib/equipment/contract';
import { listEquipment } from '@/lib/equipment/queries';
import { newId } from '@/lib/ids';

import { makeApproval, makeBatch } from '../../factories/batches';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const world = () => makeWorld(base.db, base.owner);
const furnace = EquipmentFields.parse({
  kind: 'furnace',
  name: 'F-3',
  length: '48 in',
  width: '24 in',
  height: '24 in',
  limit: '600 lb',
  temperatureMin: '300 °F',
  temperatureMax: '1050 °F',
  furnaceClass: 2,
});
const add = (here: World, given: Partial<EquipmentFields> = {}) =>
  here.as(['inspector'], (ctx) => addEquipment(ctx, { processorId: here.processorId, ...furnace, ...given }));
const list = (here: World) =>
  here.as(
    ['auditor'],
    async (ctx) => (await listEquipment(ctx, { processorId: here.processorId })).equipment,
  );

test('a furnace is kept in SI and as it was typed, changed, taken out of use, and the trail says so', async () => {
  const here = await world();
  const { equipmentId } = await add(here);
  const [kept] = await list(here);
  expect(kept).toMatchObject({
    id: equipmentId,
    name: 'F-3',
    length: { entered: '48 in', value: 1219.2 },
    limit: { entered: '600 lb', value: 272_155.422 },
    temperatureMax: { entered: '1050 °F', value: 565.5556 },
    furnaceClass: 2,
    version: 1,
  });
  await here.as(['admin'], async (ctx) => {
    const named = { processorId: here.processorId, equipmentId };
    await changeEquipment(ctx, { ...named, ...furnace, length: '1.5 m', limit: '', version: 1 });
    expect(await lastAudit(ctx, 'processor.change_equipment')).toMatchObject({
      before: { length: '48 in' },
      after: { length: '1.5 m' },
    });
  });
  expect(await list(here)).toMatchObject([{ length: { value: 1500 }, limit: null, version: 2 }]);
  await here.as(['admin'], (ctx) => retireEquipment(ctx, { processorId: here.processorId, equipmentId }));
  expect(await list(here)).toEqual([]);
  // Its name is free again.
  await add(here);
});

test('one name twice, a stale version, a lead, another shop are refused', async () => {
  const here = await world();
  const { equipmentId } = await add(here);
  const named = { processorId: here.processorId, equipmentId };
  await expect(add(here)).rejects.toMatchObject({ code: 'conflict' });
  await here.as(['admin'], async (ctx) => {
    await expect(changeEquipment(ctx, { ...named, ...furnace, version: 7 })).rejects.toMatchObject({
      code: 'conflict',
    });
    await expect(retireEquipment(ctx, { ...named, equipmentId: newId() })).rejects.toMatchObject({
      code: 'not_found',
    });
  });
  await here.as(['lead'], async (ctx) => {
    await expect(addEquipment(ctx, { processorId: here.processorId, ...furnace })).rejects.toMatchObject({
      code: 'not_allowed',
    });
    await expect(retireEquipment(ctx, named)).rejects.toMatchObject({ code: 'not_allowed' });
  });
  const elsewhere = await world();
  await elsewhere.as(['admin'], async (ctx) => {
    await expect(listEquipment(ctx, { processorId: here.processorId })).rejects.toMatchObject({
      code: 'not_found',
    });
    await expect(retireEquipment(ctx, named)).rejects.toMatchObject({ code: 'not_found' });
    await expect(changeEquipment(ctx, { ...named, ...furnace, version: 1 })).rejects.toMatchObject({
      code: 'not_found',
    });
  });
});

test.each([
  ['a size without its unit', { length: '48' }],
  ['no size', { width: '' }],
  ['a temperature without its scale', { temperatureMax: '1000' }],
  ['temperatures the wrong way round', { temperatureMin: '500 °C', temperatureMax: '600 °F' }],
  ['a class that there is not', { furnaceClass: 7 }],
])('%s is refused', (_, wrong) =>
  expect(declaration.input.safeParse({ processorId: newId(), ...furnace, ...wrong }).success).toBe(false),
);

test('a part longer than the furnace stops the batch; laid diagonally it is only noted', async () => {
  const here = await world();
  await add(here);
  await here.as(['lead'], async (ctx) => {
    await makeApproval(ctx, here.processorId);
    const batch = await makeBatch(ctx, here.processorId);
    const { lines } = await getBatchLines(ctx, { batchId: batch.id });
    const found = async (lengthMm: number, widthMm: number) => {
      await ctx.tx
        .update(parts)
        .set({ lengthMm, widthMm, heightMm: 25.4, lengthEntered: `${lengthMm / 25.4} in` })
        .where(eq(parts.id, lines[0]?.partId ?? ''));
      const { findings } = await getBatchChecks(ctx, { batchId: batch.id });
      return findings.filter(({ code }) => code.startsWith('part_')).map(({ level, code }) => [level, code]);
    };
    expect(await found(1000, 100)).toEqual([]);
    expect(await found(50 * 25.4, 4 * 25.4)).toEqual([['note', 'part_lies_diagonally']]);
    expect(await found(70 * 25.4, 4 * 25.4)).toEqual([['stop', 'part_fits_nowhere']]);
  });
});
