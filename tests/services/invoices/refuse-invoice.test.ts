import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { approveInvoice } from '@/lib/invoices/approve-invoice';
import { refuseInvoice as declaration } from '@/lib/invoices/pay-contract';
import { enterInvoice } from '@/lib/invoices/enter-invoice';
import { getInvoice } from '@/lib/invoices/queries';
import { refuseInvoice } from '@/lib/invoices/refuse-invoice';

import { entering, makeProvedBatch, pieceLine, takeUp } from '../../factories/invoices';
import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();
const REASON = 'The order says 10 pieces.\nThe lot charge stands twice.';

async function setUp() {
  const world = await makeWorld(base.db, base.owner);
  const batch = await makeProvedBatch(world, base.owner);
  const { invoiceId, lineId } = await takeUp(world, batch.id);
  await world.as(['office'], (ctx) =>
    enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 500)], { number: '8841' })),
  );
  return { world, invoiceId };
}

const refuse = (world: World, invoiceId: string, version = 2) =>
  world.as(['office'], (ctx) => refuseInvoice(ctx, { invoiceId, version, reason: REASON }));
const mailsOf = async (shopId: string) =>
  (
    await base.owner.execute<{ data: { to: string[]; props: Record<string, unknown> } }>(
      sql`select data from pgboss.job where name = 'send-mail' and data->>'template' = 'invoice-refused' and data->>'shopId' = ${shopId}`,
    )
  ).rows.map(({ data }) => data);

test('a refused invoice is told to the processor with its reason, once, and stands in the trail', async () => {
  const { world, invoiceId } = await setUp();
  await refuse(world, invoiceId);
  await world.as(['office'], async (ctx) => {
    expect(await getInvoice(ctx, { invoiceId })).toMatchObject({ state: 'refused', refusedReason: REASON });
    expect(await lastAudit(ctx, 'invoice.refuse')).toMatchObject({
      entityId: invoiceId,
      after: { number: '8841', reason: REASON },
    });
  });
  const mails = await mailsOf(world.shopId);
  expect(mails).toHaveLength(1);
  expect(mails[0]).toMatchObject({
    to: [expect.stringContaining('@')],
    props: { invoiceNumber: '8841', totalMinor: 5_000, reason: REASON },
  });
});

test('refused twice, or after it was approved, it is refused in words and no mail leaves', async () => {
  const { world, invoiceId } = await setUp();
  await world.as(['office'], (ctx) => approveInvoice(ctx, { invoiceId, version: 2 }));
  await expect(refuse(world, invoiceId, 3)).rejects.toMatchObject({ code: 'conflict' });
  expect(await mailsOf(world.shopId)).toEqual([]);

  const other = await setUp();
  await refuse(other.world, other.invoiceId);
  await expect(refuse(other.world, other.invoiceId, 3)).rejects.toMatchObject({ code: 'conflict' });
  expect(await mailsOf(other.world.shopId)).toHaveLength(1);
});

test('a lead may not, and another shop is told that there is no such invoice', async () => {
  const [{ world, invoiceId }, stranger] = [await setUp(), await makeWorld(base.db, base.owner)];
  await expect(
    world.as(['lead'], (ctx) => refuseInvoice(ctx, { invoiceId, version: 2, reason: REASON })),
  ).rejects.toMatchObject({ code: 'not_allowed' });
  await expect(refuse(stranger, invoiceId)).rejects.toMatchObject({ code: 'not_found' });
  expect(await mailsOf(world.shopId)).toEqual([]);
});

test.each([
  ['without a reason', ''],
  ['with a reason of spaces', '         '],
  ['with a reason longer than a mail carries', 'x'.repeat(501)],
])('%s it is not taken', (_, reason) => {
  const given = { invoiceId: '01a230b4-42a8-7b41-8131-c321ee37f0f3', version: 2, reason };
  expect(declaration.input.safeParse(given).success).toBe(false);
  expect(declaration.input.safeParse({ ...given, reason: REASON }).success).toBe(true);
});
