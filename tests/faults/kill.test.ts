import { createHash } from 'node:crypto';

import { sql } from 'drizzle-orm';
import { expect, test, vi } from 'vitest';

import { env } from '@/lib/env';
import { createConnectedAccount, createCustomer, createOnboardingLink, savePaymentMethod } from '@/lib/payments/payments';
import { makeStripe } from '@/lib/payments/stripe-client';
import { addLocation } from '@/lib/stock/add-location';
import { getGate } from '@/lib/stock/queries';

import { makeApproval, makeBatch, makeDispatchedBatch } from '../factories/batches';
import { countInAll, givePassword, makeSignedCertificate } from '../factories/evidence';
import { ALL, changeProcessor, changeShop, makeApprovedInvoice } from '../factories/invoices';
import { makeLot } from '../factories/lots';
import { placesOf } from '../factories/standing';
import { somePdf } from '../factories/uploads';
import { makeWorld, type World } from '../factories/world';
import { seeded } from './killable';
import { cookieOf, openSetting, tryOnce, tryUntilAnswered } from './setting';

const ROUNDS = 50;
/** The kill falls anywhere between the request's arrival and well after its usual end. */
const LONGEST_MS = 120;

const setting = openSetting();
const random = seeded(20_261_201);

/** Sends a write and kills the door somewhere in the middle of it; then does what a browser does, until it is answered. */
async function killedInTheMiddle(asked: Parameters<typeof tryOnce>[0]): Promise<{ status: number; body: unknown }> {
  const killed = setting.door.killAfter(random() * LONGEST_MS);
  const first = await tryOnce(asked);
  await killed;
  const answered = await tryUntilAnswered(setting, asked);
  // What was answered before the kill is what is answered after it.
  if (first?.status === 200) expect(answered).toEqual(first);
  return answered;
}

const count = async (statement: ReturnType<typeof sql>): Promise<number> => (await setting.owner.execute<{ n: number }>(statement)).rows[0]?.n ?? -1;
const aWorld = async (): Promise<{ world: World; cookie: string }> => {
  const world = await makeWorld(setting.db, setting.owner);
  return { world, cookie: await cookieOf(world.userId, world.shopId) };
};

test(`dispatch, the door killed in ${ROUNDS} rounds: it left once, with one set of papers, one link and one job for its mail`, async () => {
  for (let round = 0; round < ROUNDS; round++) {
    const { world, cookie } = await aWorld();
    const batch = await world.as(['lead', 'admin'], async (ctx) => {
      await makeApproval(ctx, world.processorId);
      return makeBatch(ctx, world.processorId, { pieces: [3, 4] });
    }, new Date());
    const { status } = await killedInTheMiddle({ path: `/batches/${batch.id}/dispatch`, cookie, key: `dispatch-${round}`, body: { version: batch.version } });
    expect(status, `round ${round}`).toBe(200);
    expect(await count(sql`select count(*)::int as n from movements m join batch_lines l on l.id = m.batch_line_id where l.batch_id = ${batch.id} and m.reason = 'dispatched'`)).toBe(2);
    expect(await count(sql`select count(*)::int as n from batch_documents where batch_id = ${batch.id}`)).toBe(2);
    expect(await count(sql`select count(*)::int as n from batch_links where batch_id = ${batch.id}`)).toBe(1);
    expect(await count(sql`select count(*)::int as n from pgboss.job where name = 'render-documents' and data->>'batchId' = ${batch.id}`)).toBe(1);
  }
});

test(`papers and mail, the worker killed in the middle until all is done: each paper is kept once, each mail has one number`, async () => {
  const open = () => count(sql`select count(*)::int as n from pgboss.job where name in ('render-documents', 'send-mail') and state in ('created', 'retry', 'active')`);
  for (let killing = 0; killing < 12 && (await open()) > 0; killing++) {
    await setting.worker.start();
    await setting.worker.killAfter(400 + random() * 1500);
    // A job whose worker died is found when its time is over; the tests do not wait ten minutes for that.
    await setting.owner.execute(sql`update pgboss.job set state = 'retry', start_after = now() where state = 'active'`);
  }
  await setting.worker.start();
  await vi.waitFor(async () => expect(await open()).toBe(0), { timeout: 240_000, interval: 500 });
  await setting.worker.kill();
  expect(await count(sql`select count(*)::int as n from batch_documents where file_id is null`)).toBe(0);
  expect(await count(sql`select count(*)::int as n from (select 1 from batch_documents d join files f on f.id = d.file_id group by d.batch_id, d.kind, d.document_version having count(*) > 1) x`)).toBe(0);
  const batches = await count(sql`select count(*)::int as n from batches where dispatched_at is not null`);
  expect(await count(sql`select count(*)::int as n from pgboss.job where name = 'send-mail' and data->>'template' = 'dispatch'`)).toBe(batches);
  expect(await count(sql`select count(distinct data->>'mailId')::int as n from pgboss.job where name = 'send-mail' and data->>'template' = 'dispatch'`)).toBe(batches);
});

test(`upload, the door killed in ${ROUNDS} rounds: the file counts once and is what was sent`, async () => {
  const { cookie } = await aWorld();
  for (let round = 0; round < ROUNDS; round++) {
    const content = somePdf(`round ${round}`);
    const sha256 = createHash('sha256').update(content).digest('hex');
    const asked = { cookie, body: { purpose: 'mill_certificate', name: `mill ${round}.pdf`, size: content.length, mediaType: 'application/pdf', sha256 } };
    const announced = (await killedInTheMiddle({ ...asked, path: '/files', key: `upload-${round}` })).body as { file: { id: string }; upload: { url: string; headers: Record<string, string> } };
    await fetch(announced.upload.url, { method: 'PUT', headers: announced.upload.headers, body: new Uint8Array(content) });
    const { status } = await killedInTheMiddle({ path: `/files/${announced.file.id}/complete`, cookie, key: `complete-${round}`, body: {} });
    expect(status, `round ${round}`).toBe(200);
    expect(await count(sql`select count(*)::int as n from files where sha256 = ${sha256} and state = 'verified'`)).toBe(1);
  }
});

test(`payment, door and worker killed in ${ROUNDS} rounds: the money moved once, and the ledger says so`, async () => {
  const stripe = makeStripe({ secretKey: 'sk_test_local', apiBase: setting.payments.address });
  const { world, cookie } = await aWorld();
  const customer = await createCustomer({ name: 'Fault Shop', email: 'office@shop.test', shopId: world.shopId }, stripe);
  const account = await createConnectedAccount({ name: 'Fault Plating', email: 'desk@processor.test', country: 'US', processorId: world.processorId }, stripe);
  const page = await createOnboardingLink({ account, returnUrl: env.APP_URL, refreshUrl: env.APP_URL }, stripe);
  await fetch(page, { method: 'POST', body: new URLSearchParams({ name: 'Fault Plating', bank: 'Test Bank', account_number: '000123456789' }), redirect: 'manual' });
  await changeShop(setting.owner, world, { stripeCustomerId: customer, stripePaymentMethodId: await savePaymentMethod({ customer, paymentMethod: 'pm_card_visa' }, stripe) });
  await changeProcessor(setting.owner, world, { stripeAccountId: account, payoutsReady: true });

  const invoices: string[] = [];
  for (let round = 0; round < ROUNDS; round++) {
    const { invoiceId, version } = await makeApprovedInvoice(world, setting.owner, { pieces: 1, unitPriceMinor: 1_000 + round * 100 });
    const { status } = await killedInTheMiddle({ path: `/invoices/${invoiceId}/pay`, cookie, key: `pay-${round}`, body: { invoiceId, version } });
    expect(status, `round ${round}`).toBe(200);
    invoices.push(invoiceId);
  }
  const unpaid = () => count(sql`select count(*)::int as n from payments where shop_id = ${world.shopId} and state <> 'succeeded'`);
  for (let killing = 0; killing < ROUNDS && (await unpaid()) > 0; killing++) {
    await setting.worker.start();
    await Promise.all([setting.worker.killAfter(300 + random() * 1200), ...(killing % 3 === 0 ? [setting.door.killAfter(random() * 1000)] : [])]);
    if (killing % 3 === 0) await setting.door.start();
    await setting.owner.execute(sql`update pgboss.job set state = 'retry', start_after = now() where state = 'active' or (state = 'retry' and start_after > now())`);
  }
  await setting.worker.start();
  await vi.waitFor(async () => expect(await unpaid()).toBe(0), { timeout: 120_000, interval: 500 });
  await setting.worker.kill();

  const { data } = await stripe.paymentIntents.list({ customer, limit: 100 });
  expect(data.filter((intent) => intent.status === 'succeeded')).toHaveLength(ROUNDS);
  expect(await count(sql`select count(*)::int as n from money_entries where shop_id = ${world.shopId} and kind = 'paid'`)).toBe(ROUNDS);
  expect(await count(sql`select count(*)::int as n from (select invoice_id from money_entries where shop_id = ${world.shopId} group by invoice_id having sum(amount_minor) <> 0) x`)).toBe(0);
  expect(invoices).toHaveLength(ROUNDS);
});

test(`release, the door killed in ${ROUNDS} rounds: the pieces are in stock once`, async () => {
  const { world, cookie } = await aWorld();
  await givePassword(setting.owner, world.userId);
  const location = await world.as(ALL, (ctx) => addLocation(ctx, { name: 'Rack F' }));
  for (let round = 0; round < ROUNDS; round++) {
    const { lot, batchId, lineId } = await world.as(ALL, async (ctx) => {
      const lot = await makeLot(ctx, { pieces: 5 });
      const batch = await makeDispatchedBatch(ctx, world.processorId, { lots: [lot], unitPriceMinor: 0 });
      await countInAll(ctx, batch.id, [{ good: 5 }]);
      await makeSignedCertificate(ctx, batch.id, [5]);
      return { lot, batchId: batch.id, lineId: (await getGate(ctx, { batchId: batch.id })).lines[0]?.lineId ?? '' };
    });
    const { status } = await killedInTheMiddle({ path: `/batches/${batchId}/release`, cookie, key: `release-${round}`, body: { lines: [{ lineId, pieces: 5, locationId: location.id }] } });
    expect(status, `round ${round}`).toBe(200);
    expect(await world.as(['lead'], (ctx) => placesOf(ctx, lot.id))).toEqual({ stock: 5 });
    expect(await count(sql`select count(*)::int as n from releases where batch_id = ${batchId}`)).toBe(1);
  }
});
