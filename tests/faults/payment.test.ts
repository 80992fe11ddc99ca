import { sql } from 'drizzle-orm';
import type Stripe from 'stripe';
import { beforeAll, expect, test } from 'vitest';

import {
  createConnectedAccount,
  createCustomer,
  createOnboardingLink,
  savePaymentMethod,
} from '@/lib/payments/payments';
import { makeStripe } from '@/lib/payments/stripe-client';

import { changeProcessor, changeShop, makeApprovedInvoice } from '../factories/invoices';
import type { World } from '../factories/world';
import { DOOR } from './addresses';
import { andAgain, untilAnswered } from './browser';
import { inRounds, ROUNDS } from './rounds';
import { aWorld, count, openSetting } from './setting';
import { killWorkerInRounds, workOff } from './worker-rounds';

const setting = openSetting();
let shop: { world: World; cookie: string };
let stripe: Stripe;
let customer: string;
/** Invoices whose payment was ordered, with what is to be paid. */
const ordered = new Map<string, number>();

beforeAll(async () => {
  shop = await aWorld(setting);
  stripe = makeStripe({ secretKey: 'sk_test_local', apiBase: setting.payments.address });
  customer = await makeReady(shop.world);
});

test(`payment order, the door killed in ${ROUNDS} rounds: there is one attempt and one job for it`, async () => {
  const { world, cookie } = shop;
  await inRounds(setting.door, 3, async (disturb, number) => {
    // Whole dollars: the stand-in declines some amounts by their cents.
    const amountMinor = 100 * (100 + number);
    const { invoiceId, version } = await makeApprovedInvoice(world, setting.owner, {
      pieces: 1,
      unitPriceMinor: amountMinor,
    });
    const asked = { path: `/invoices/${invoiceId}/pay`, cookie, key: `pay ${number}`, body: { version } };
    const answer = await disturb(() => untilAnswered(asked));
    expect(answer.status).toBe(200);
    await andAgain(asked, answer);
    ordered.set(invoiceId, amountMinor);

    const { paymentId } = answer.body as { paymentId: string };
    const { rows } = await setting.owner.execute(
      sql`select id, attempt from payments where invoice_id = ${invoiceId}`,
    );
    expect(rows).toEqual([{ id: paymentId, attempt: 1 }]);
    const jobs = sql`select from pgboss.job where name = 'pay-invoice' and data->>'paymentId' = ${paymentId}`;
    expect(await count(setting, jobs)).toBe(1);
  });
});

test(`payment, the worker killed in ${ROUNDS} rounds and the door in some: the money moved once, and the ledger says so`, async () => {
  await killWorkerInRounds(setting, {
    queue: 'pay-invoice',
    seed: 13,
    // The payment service tells the door what became of it.
    meanwhile: async (round) => {
      if (round % 5 > 0) return;
      await setting.door.kill();
      await setting.door.start();
    },
  });
  const unpaid = sql`select from payments where state <> 'succeeded'`;
  await workOff(setting, async () => expect(await count(setting, unpaid)).toBe(0));

  const { data: intents } = await stripe.paymentIntents.list({ customer, limit: 100 });
  const paid = intents.filter((intent) => intent.status === 'succeeded');
  expect(paid.map((intent) => [intent.metadata['invoice_id'], intent.amount_received]).toSorted()).toEqual(
    [...ordered].toSorted(),
  );
  const { rows: entries } = await setting.owner.execute<{ invoice: string; minor: number }>(
    sql`select invoice_id as invoice, -amount_minor::int as minor from money_entries where kind = 'paid'`,
  );
  expect(entries.map(({ invoice, minor }) => [invoice, minor]).toSorted()).toEqual([...ordered].toSorted());
  const remittances = sql`select from pgboss.job where name = 'send-mail' and data->>'template' = 'remittance'`;
  expect(await count(setting, remittances)).toBe(ordered.size);
});

/** A way to pay for the shop, and a place to be paid for its processor; gives back the shop's number there. */
async function makeReady(world: World): Promise<string> {
  const office = { name: 'Heron Slough Float Works', email: 'office@shop.test', shopId: world.shopId };
  const id = await createCustomer(office, stripe);
  const desk = { name: 'Cedar Hollow Plating', email: 'desk@processor.test', country: 'US' };
  const account = await createConnectedAccount({ ...desk, processorId: world.processorId }, stripe);
  const page = await createOnboardingLink({ account, returnUrl: DOOR, refreshUrl: DOOR }, stripe);
  const form = { name: desk.name, bank: 'Test Bank', account_number: '000123456789' };
  await fetch(page, { method: 'POST', body: new URLSearchParams(form), redirect: 'manual' });
  const method = await savePaymentMethod({ customer: id, paymentMethod: 'pm_card_visa' }, stripe);
  await changeShop(setting.owner, world, { stripeCustomerId: id, stripePaymentMethodId: method });
  await changeProcessor(setting.owner, world, { stripeAccountId: account, payoutsReady: true });
  return id;
}
