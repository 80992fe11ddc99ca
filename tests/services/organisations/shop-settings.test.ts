import { expect, test } from 'vitest';

import { updateShopSettings as declaration } from '@/lib/organisations/contract';
import { getShopSettings, updateShopSettings } from '@/lib/organisations/shop-settings';

import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function settingsOf(world: World) {
  const { id: _, ...settings } = await world.as(['admin'], (ctx) => getShopSettings(ctx));
  return settings;
}

test('an admin settles the policies; the trail holds what is different', async () => {
  const world = await makeWorld(base.db, base.owner);
  const before = await settingsOf(world);
  const wanted = {
    ...before,
    zone: 'America/Halifax',
    approvalAndPayment: 'refuse' as const,
    secondApprovalAboveMinor: 250_000,
    latenessBasis: 'first_promise' as const,
  };
  expect(await world.as(['admin'], (ctx) => updateShopSettings(ctx, wanted))).toEqual({ version: 2 });
  expect(await settingsOf(world)).toEqual({ ...wanted, version: 2 });
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'shop.change_settings'))).toMatchObject({
    before: {
      zone: 'UTC',
      approvalAndPayment: 'record',
      secondApprovalAboveMinor: null,
      latenessBasis: 'latest_promise',
    },
    after: {
      zone: 'America/Halifax',
      approvalAndPayment: 'refuse',
      secondApprovalAboveMinor: 250_000,
      latenessBasis: 'first_promise',
    },
  });
});

test('nobody but an admin does, everybody of the shop reads', async () => {
  const world = await makeWorld(base.db, base.owner);
  const settings = await settingsOf(world);
  await expect(
    world.as(['lead', 'inspector', 'office', 'auditor'], (ctx) => updateShopSettings(ctx, settings)),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  expect(await world.as(['auditor'], (ctx) => getShopSettings(ctx))).toMatchObject({ id: world.shopId });
});

test('an older version is a conflict', async () => {
  const world = await makeWorld(base.db, base.owner);
  const settings = await settingsOf(world);
  await world.as(['admin'], (ctx) => updateShopSettings(ctx, settings));
  await expect(world.as(['admin'], (ctx) => updateShopSettings(ctx, settings))).rejects.toMatchObject({
    code: 'conflict',
  });
});

test('another shop’s settings are its own', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  const before = await settingsOf(two);
  await one.as(['admin'], async (ctx) =>
    updateShopSettings(ctx, { ...(await getShopSettings(ctx)), name: 'Renamed' }),
  );
  expect(await settingsOf(two)).toEqual(before);
});

test.each([
  ['name', { name: '  ' }],
  ['zone', { zone: 'Mars/Olympus' }],
  ['currency', { currency: 'XXX' }],
  ['orderPrefix', { orderPrefix: 'to long!' }],
  ['secondApprovalAboveMinor', { secondApprovalAboveMinor: -1 }],
])('%s that cannot be is named', async (field, wrong) => {
  const world = await makeWorld(base.db, base.owner);
  const parsed = declaration.input.safeParse({ ...(await settingsOf(world)), ...wrong });
  expect(parsed.error?.issues.map((issue) => issue.path.join('.'))).toEqual([field]);
});
