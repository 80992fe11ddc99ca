import { randomUUID } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type Stripe from 'stripe';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { startPaymentsServer, type PaymentsServer } from '@/fakes/payments/server';
import { parseWebhook, type PaymentNotice } from '@/lib/payments/parse-webhook';
import {
  createConnectedAccount,
  createCustomer,
  createOnboardingLink,
  createPaymentMethodLink,
  getPaymentIntent,
  payInvoiceIntent,
  refundPayment,
  retryInvoiceIntent,
  savePaymentMethod,
  type InvoicePayment,
} from '@/lib/payments/payments';
import { makeStripe } from '@/lib/payments/stripe-client';

const SECRET = 'whsec_of_this_test';
/** Generous, because the machine may be busy; what is awaited comes at once on an idle one. */
const SOON = { timeout: 20_000 };

let dir: string;
let server: PaymentsServer;
let stripe: Stripe;
let shop: Server;
let webhookUrl: string;
/** What the shop's server got, as it came. */
let received: { body: string; signature: string | null }[] = [];
let shopAnswers = 200;

beforeAll(async () => {
  dir = await mkdtemp(path.join(tmpdir(), 'payments-'));
  shop = createServer((request, response) => {
    let body = '';
    request.on('data', (chunk: Buffer) => (body += chunk.toString()));
    request.on('end', () => {
      const signature = request.headers['stripe-signature'];
      received.push({ body, signature: typeof signature === 'string' ? signature : null });
      response.writeHead(isGenuine(received.at(-1)) ? shopAnswers : 400).end();
    });
  });
  await new Promise<void>((done) => shop.listen(0, '127.0.0.1', done));
  webhookUrl = `http://127.0.0.1:${(shop.address() as AddressInfo).port}/api/webhooks/payments`;
  await start();
});
beforeEach(() => {
  received = [];
  shopAnswers = 200;
});
afterEach(() => control('', { fail: 'none' }));
afterAll(async () => {
  await server.close();
  shop.close();
  await rm(dir, { recursive: true, force: true });
});

async function start(): Promise<void> {
  server = await startPaymentsServer({
    port: 0,
    file: path.join(dir, 'payments.json'),
    webhookUrl,
    webhookSecret: SECRET,
    // Long enough that nothing settles by itself in a test that does not ask for it.
    settleAfterMs: 3_600_000,
  });
  stripe = makeStripe({ secretKey: 'sk_test_local', apiBase: server.address });
}

async function control(action: string, body: object): Promise<Record<string, unknown>> {
  const answer = await fetch(`${server.address}/control/${action}`, {
    method: 'POST',
    body: JSON.stringify(body),
  });
  expect(answer.status).toBe(200);
  return (await answer.json()) as Record<string, unknown>;
}

function isGenuine(message: { body: string; signature: string | null } | undefined): boolean {
  if (message === undefined) return false;
  try {
    parseWebhook(message.body, message.signature, SECRET, stripe);
    return true;
  } catch {
    return false;
  }
}

const notices = (): PaymentNotice[] =>
  received.filter(isGenuine).map(({ body, signature }) => parseWebhook(body, signature, SECRET, stripe));

/** The states of one payment in the order in which the shop heard of them. */
const heardOf = (intentId: string) =>
  notices().flatMap((notice) =>
    notice.about === 'payment' && notice.intentId === intentId ? [notice.state] : [],
  );

async function processor({ isOnboarded = true } = {}): Promise<string> {
  const account = await createConnectedAccount(
    { name: 'Cedar Hollow Plating', email: 'desk@processor.test', country: 'US', processorId: randomUUID() },
    stripe,
  );
  if (isOnboarded)
    await visit(
      await createOnboardingLink(
        { account, returnUrl: 'http://localhost:5600/back', refreshUrl: 'http://localhost:5600/again' },
        stripe,
      ),
      ONBOARDING_FORM,
    );
  return account;
}

const ONBOARDING_FORM = { name: 'Cedar Hollow Plating', bank: 'Test Bank', account_number: '000123456789' };

/** Sends the form of a hosted page and says where it leads. */
async function visit(url: string, form: Record<string, string>): Promise<string | null> {
  const answer = await fetch(url, { method: 'POST', body: new URLSearchParams(form), redirect: 'manual' });
  return answer.headers.get('location');
}

async function invoice(changes: Partial<InvoicePayment> & { method?: string } = {}): Promise<InvoicePayment> {
  const { method = 'pm_card_visa', ...rest } = changes;
  const customer = await createCustomer(
    { name: 'Heron Slough Float Works', email: 'office@shop.test', shopId: randomUUID() },
    stripe,
  );
  return {
    amountMinor: 41_250,
    currency: 'USD',
    customer,
    paymentMethod: await savePaymentMethod({ customer, paymentMethod: method }, stripe),
    destinationAccount: await processor(),
    idempotencyKey: `invoice:${randomUUID()}`,
    metadata: { invoice_id: randomUUID() },
    ...rest,
  };
}

async function countOfIntents(customer: string): Promise<number> {
  return (await stripe.paymentIntents.list({ customer, limit: 100 })).data.length;
}

describe('paying an invoice', () => {
  test('takes the money once, passes it on to the processor, and the shop hears of it in a signed message', async () => {
    const payment = await invoice();
    const paid = await payInvoiceIntent(payment, stripe);
    expect(paid.state).toBe('succeeded');

    const intent = await stripe.paymentIntents.retrieve(paid.intentId, {
      expand: ['latest_charge.transfer'],
    });
    expect(intent).toMatchObject({
      amount_received: 41_250,
      currency: 'usd',
      latest_charge: { paid: true, transfer: { amount: 41_250, destination: payment.destinationAccount } },
    });

    await expect.poll(() => heardOf(paid.intentId), SOON).toEqual(['succeeded']);
    expect(
      notices().find((notice) => notice.about === 'payment' && notice.intentId === paid.intentId),
    ).toMatchObject({
      amountMinor: 41_250,
      currency: 'USD',
      metadata: payment.metadata,
    });
  });

  test('twice with the same key pays once', async () => {
    const payment = await invoice();
    const [first, second] = await Promise.all([
      payInvoiceIntent(payment, stripe),
      payInvoiceIntent(payment, stripe),
    ]);
    expect(second).toEqual(first);
    expect(await payInvoiceIntent(payment, stripe)).toEqual(first);
    expect(await countOfIntents(payment.customer)).toBe(1);
  });

  test('with the key of another payment is refused', async () => {
    const payment = await invoice();
    await payInvoiceIntent(payment, stripe);
    await expect(payInvoiceIntent({ ...payment, amountMinor: 41_251 }, stripe)).rejects.toMatchObject({
      type: 'StripeIdempotencyError',
      statusCode: 400,
    });
    expect(await countOfIntents(payment.customer)).toBe(1);
  });

  test('whose answer is lost on the way pays once', async () => {
    const payment = await invoice();
    await control('', { fail: 'lose_answer', times: 1 });
    expect(await payInvoiceIntent(payment, stripe)).toMatchObject({ state: 'succeeded' });
    expect(await countOfIntents(payment.customer)).toBe(1);
  });

  test('whose key was refused for its parameters may be mended and sent again', async () => {
    const payment = await invoice();
    await expect(payInvoiceIntent({ ...payment, amountMinor: 10 }, stripe)).rejects.toMatchObject({
      code: 'amount_too_small',
    });
    expect(await payInvoiceIntent(payment, stripe)).toMatchObject({ state: 'succeeded' });
  });

  test('while the service is away is one refusal with a way on', async () => {
    const payment = await invoice();
    await control('', { fail: 'refuse' });
    await expect(payInvoiceIntent(payment, stripe)).rejects.toMatchObject({ code: 'unavailable' });
    await control('', { fail: 'none' });
    expect(await payInvoiceIntent(payment, stripe)).toMatchObject({ state: 'succeeded' });
    expect(await countOfIntents(payment.customer)).toBe(1);
  });
});

describe('a payment that is declined', () => {
  test.each([
    ['by its amount', { amountMinor: 41_213 }, /insufficient funds/],
    ['by its card', { method: 'pm_card_chargeDeclined' }, /declined/],
    ['by an expired card', { method: 'pm_card_chargeDeclinedExpiredCard' }, /expired/],
  ])('%s is an answer with a reason, and stays the same answer', async (_how, changes, reason) => {
    const payment = await invoice(changes);
    const declined = await payInvoiceIntent(payment, stripe);
    expect(declined).toMatchObject({ state: 'declined', reason: expect.stringMatching(reason) as string });
    expect(await payInvoiceIntent(payment, stripe)).toEqual(declined);
    await expect.poll(() => heardOf(declined.intentId), SOON).toEqual(['failed']);
  });

  test('can be paid with another card on the same intent, and only once', async () => {
    const payment = await invoice({ method: 'pm_card_chargeDeclined' });
    const { intentId } = await payInvoiceIntent(payment, stripe);
    const paymentMethod = await savePaymentMethod(
      { customer: payment.customer, paymentMethod: 'pm_card_visa' },
      stripe,
    );

    const again = (key: string) =>
      retryInvoiceIntent({ intentId, paymentMethod, idempotencyKey: key }, stripe);
    expect(await again('retry-1-' + intentId)).toEqual({ state: 'succeeded', intentId });
    await expect(again('retry-2-' + intentId)).rejects.toMatchObject({
      code: 'payment_intent_unexpected_state',
    });
    expect(await countOfIntents(payment.customer)).toBe(1);
  });
});

describe('a payment that takes a while', () => {
  test.each([
    ['succeeds later by its amount', { amountMinor: 41_217 }, 'succeeded'],
    ['fails later by its amount', { amountMinor: 41_219 }, 'failed'],
    ['succeeds later from a bank account', { method: 'pm_usBankAccount_success' }, 'succeeded'],
    ['fails later from a closed account', { method: 'pm_usBankAccount_accountClosed' }, 'failed'],
  ])('%s, and the shop hears both', async (_how, changes, end) => {
    const payment = await invoice(changes);
    const attempt = await payInvoiceIntent(payment, stripe);
    expect(attempt.state).toBe('processing');
    await control('settle', { payment_intent: attempt.intentId });
    await expect.poll(() => heardOf(attempt.intentId), SOON).toEqual(['processing', end]);
    expect((await getPaymentIntent(attempt.intentId, stripe)).status).toBe(
      end === 'succeeded' ? 'succeeded' : 'requires_payment_method',
    );
    // One attempt is one charge, pending first and then what it became.
    expect(
      (await stripe.charges.list({ limit: 100 })).data.filter(
        (charge) => charge.payment_intent === attempt.intentId,
      ),
    ).toHaveLength(1);
  });

  test('is not forgotten when the service is killed and started again', async () => {
    const payment = await invoice({ amountMinor: 41_217 });
    const attempt = await payInvoiceIntent(payment, stripe);
    await server.close();
    await start();
    expect(await payInvoiceIntent(payment, stripe)).toEqual(attempt);
    await control('settle', { payment_intent: attempt.intentId });
    await expect.poll(() => heardOf(attempt.intentId), SOON).toContain('succeeded');
    expect(await countOfIntents(payment.customer)).toBe(1);
  });
});

describe('a message to the shop', () => {
  test('that is not taken comes again until it is', async () => {
    shopAnswers = 500;
    const { intentId } = await payInvoiceIntent(await invoice(), stripe);
    await expect.poll(() => heardOf(intentId).length, SOON).toBeGreaterThan(1);
    shopAnswers = 200;
    await expect
      .poll(
        async () =>
          (await stripe.events.list({ limit: 100 })).data.filter((event) => event.pending_webhooks > 0)
            .length,
        SOON,
      )
      .toBe(0);
  });

  test('can come twice, with the same event id', async () => {
    const { intentId } = await payInvoiceIntent(await invoice(), stripe);
    await expect.poll(() => heardOf(intentId), SOON).toEqual(['succeeded']);
    const notice = notices().find((each) => each.about === 'payment' && each.intentId === intentId);
    await control('redeliver', { event: notice?.eventId });
    expect(notices().filter(({ eventId }) => eventId === notice?.eventId)).toHaveLength(2);
  });

  test('can come out of order', async () => {
    await control('webhooks', { mode: 'hold' });
    const { intentId } = await payInvoiceIntent(await invoice({ amountMinor: 41_217 }), stripe);
    await control('settle', { payment_intent: intentId });
    expect(heardOf(intentId)).toEqual([]);
    await control('redeliver', { order: 'reverse' });
    await control('webhooks', { mode: 'deliver' });
    expect(heardOf(intentId)).toEqual(['succeeded', 'processing']);
  });

  test.each(['wrong_secret', 'tampered', 'old', 'unsigned'])(
    'with a signature that is %s is refused',
    async (how) => {
      await payInvoiceIntent(await invoice(), stripe);
      const { answer } = await control('forge', { how });
      expect(answer).toBe('400');
      const forged = received.filter((message) => !isGenuine(message));
      expect(forged).toHaveLength(1);
      expect(() => parseWebhook(forged[0]?.body ?? '', forged[0]?.signature ?? null, SECRET, stripe)).toThrow(
        'does not belong',
      );
    },
  );
});

describe('a processor', () => {
  test('cannot be paid before its account is complete, and can afterwards', async () => {
    const account = await processor({ isOnboarded: false });
    const payment = await invoice({ destinationAccount: account });
    await expect(payInvoiceIntent(payment, stripe)).rejects.toMatchObject({
      code: 'insufficient_capabilities_for_transfer',
    });

    const link = {
      account,
      returnUrl: 'http://localhost:5600/back',
      refreshUrl: 'http://localhost:5600/again',
    };
    expect(await visit(await createOnboardingLink(link, stripe), ONBOARDING_FORM)).toBe(link.returnUrl);
    await expect
      .poll(() => notices(), SOON)
      .toContainEqual(expect.objectContaining({ about: 'account', accountId: account, canReceive: true }));
    expect(await payInvoiceIntent(payment, stripe)).toMatchObject({ state: 'succeeded' });
  });

  test('who opens a used link is sent to where a new one is made', async () => {
    const account = await processor({ isOnboarded: false });
    const url = await createOnboardingLink(
      { account, returnUrl: 'http://localhost:5600/back', refreshUrl: 'http://localhost:5600/again' },
      stripe,
    );
    await visit(url, ONBOARDING_FORM);
    expect(await visit(url, ONBOARDING_FORM)).toBe('http://localhost:5600/again');
  });

  test('is one account, however often it is made', async () => {
    const same = {
      name: 'Alder Flat Heat Treating',
      email: 'a@processor.test',
      country: 'US',
      processorId: randomUUID(),
    };
    expect(await createConnectedAccount(same, stripe)).toBe(await createConnectedAccount(same, stripe));
  });
});

describe('a saved method', () => {
  test('comes from the hosted page by webhook, and pays', async () => {
    const payment = await invoice();
    const successUrl = 'http://localhost:5600/settings?session={CHECKOUT_SESSION_ID}';
    const url = await createPaymentMethodLink(
      { customer: payment.customer, successUrl, cancelUrl: 'http://localhost:5600/settings' },
      stripe,
    );
    expect(await visit(url, { method: 'pm_card_visa' })).toMatch(/settings\?session=cs_test_/);
    expect((await fetch(url)).status).toBe(410);

    const saved = () =>
      notices().find((notice) => notice.about === 'payment_method' && notice.customer === payment.customer);
    await expect.poll(saved, SOON).toBeDefined();
    const notice = saved();
    const paymentMethod = notice?.about === 'payment_method' ? notice.paymentMethod : '';
    expect(await payInvoiceIntent({ ...payment, paymentMethod }, stripe)).toMatchObject({
      state: 'succeeded',
    });
  });

  test('of another shop does not pay', async () => {
    const mine = await invoice();
    const theirs = await invoice();
    await expect(
      payInvoiceIntent({ ...mine, paymentMethod: theirs.paymentMethod }, stripe),
    ).rejects.toMatchObject({ param: 'payment_method' });
  });
});

describe('a refund', () => {
  test('gives back part and then the rest, from the processor too, and no more', async () => {
    const payment = await invoice();
    const { intentId } = await payInvoiceIntent(payment, stripe);
    const refund = (amountMinor: number, key: string = randomUUID()) =>
      refundPayment({ intentId, amountMinor, idempotencyKey: key, metadata: { credit_id: key } }, stripe);

    expect(await refund(1_250, 'credit-' + intentId)).toBe(await refund(1_250, 'credit-' + intentId));
    await expect(refund(40_001)).rejects.toMatchObject({ type: 'StripeInvalidRequestError' });
    await refund(40_000);
    await expect(refund(1)).rejects.toMatchObject({ code: 'charge_already_refunded' });

    const [transfer] = (await stripe.transfers.list({ destination: payment.destinationAccount })).data;
    expect(transfer).toMatchObject({ amount_reversed: 41_250, reversed: true });
    const refundsHeard = () =>
      notices().flatMap((notice) =>
        notice.about === 'refund' && notice.intentId === intentId ? [notice.refundedMinor] : [],
      );
    await expect.poll(refundsHeard, SOON).toEqual([1_250, 41_250]);
  });
});

describe('the service', () => {
  test('refuses who has no key, unknown things, unknown parameters and unknown addresses', async () => {
    expect((await fetch(`${server.address}/v1/accounts`)).status).toBe(401);
    await expect(stripe.accounts.retrieve('acct_nobody')).rejects.toMatchObject({
      code: 'resource_missing',
      statusCode: 404,
    });
    await expect(stripe.customers.create({ phone: '1' })).rejects.toMatchObject({
      code: 'parameter_unknown',
      param: 'phone',
    });
    await expect(stripe.products.list()).rejects.toMatchObject({ statusCode: 404 });
  });

  test('shows payments and messages on a page, without believing their text', async () => {
    const payment = await invoice({ metadata: { note: '<b>bold</b>' } });
    const { intentId } = await payInvoiceIntent(payment, stripe);
    const shown = await (await fetch(server.address)).text();
    expect(shown).toContain(intentId);
    expect(shown).toContain('&lt;b&gt;bold');
  });
});
