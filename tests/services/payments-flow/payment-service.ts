import { mkdtemp, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { sql } from 'drizzle-orm';
import type Stripe from 'stripe';
import { afterAll, afterEach, beforeAll, expect, vi } from 'vitest';

import { withTenant, type Db } from '@/db/client';
import { startPaymentsServer, type PaymentsServer } from '@/fakes/payments/server';
import type { Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import type { Job } from '@/lib/jobs/job';
import {
  createConnectedAccount,
  createCustomer,
  createOnboardingLink,
  savePaymentMethod,
} from '@/lib/payments/payments';
import type { receivePaymentEvent as ReceivePaymentEvent } from '@/lib/payments/receive-payment-event';
import { makeStripe } from '@/lib/payments/stripe-client';

import { changeProcessor, changeShop } from '../../factories/invoices';
import type { World } from '../../factories/world';
import { runJobs } from '../run-jobs';

/** A payment service of this file's own, with the product's webhook behind it: taking it down disturbs nobody. */
export function openPaymentService(base: { db: Db; owner: Db }) {
  const opened = {} as { stripe: Stripe; payJob: Job; workJob: Job; receive: typeof ReceivePaymentEvent };
  let folder = '';
  let server: PaymentsServer;
  let webhook: Server;

  beforeAll(async () => {
    folder = await mkdtemp(path.join(tmpdir(), 'payment-flow-'));
    webhook = createServer((request, response) => {
      let body = '';
      request.on('data', (chunk: Buffer) => (body += chunk.toString()));
      request.on('end', () => {
        const signature = request.headers['stripe-signature'];
        void answer(body, typeof signature === 'string' ? signature : null).then((status) =>
          response.writeHead(status).end(),
        );
      });
    });
    await new Promise<void>((done) => webhook.listen(0, '127.0.0.1', done));
    const webhookUrl = `http://127.0.0.1:${(webhook.address() as AddressInfo).port}/api/webhooks/payments`;
    server = await startPaymentsServer({
      port: 0,
      file: path.join(folder, 'payments.json'),
      webhookUrl,
      webhookSecret: 'whsec_of_this_test',
      settleAfterMs: 3_600_000,
    });
    vi.resetModules();
    vi.stubEnv('STRIPE_API_BASE', server.address);
    vi.stubEnv('STRIPE_SECRET_KEY', 'sk_test_local');
    vi.stubEnv('STRIPE_WEBHOOK_SECRET', 'whsec_of_this_test');
    Object.assign(opened, {
      stripe: makeStripe({ secretKey: 'sk_test_local', apiBase: server.address }),
      payJob: (await import('@/lib/jobs/definitions/pay-invoice')).payInvoiceJob,
      workJob: (await import('@/lib/jobs/definitions/work-payment-event')).workPaymentEventJob,
      receive: (await import('@/lib/payments/receive-payment-event')).receivePaymentEvent,
    });
  });
  afterEach(async () => {
    await control('', { fail: 'none' });
    await control('webhooks', { mode: 'deliver' });
  });
  afterAll(async () => {
    vi.unstubAllEnvs();
    await server.close();
    webhook.close();
    await rm(folder, { recursive: true, force: true });
  });

  const atDoor = <T>(work: (ctx: Ctx) => Promise<T>) =>
    withTenant(base.db, { kind: 'door' }, (tx) =>
      work({
        tx,
        tenant: { kind: 'door' },
        actor: { kind: 'nobody', name: 'nobody', roles: [] },
        now: new Date(),
        requestId: newId(),
        address: null,
      }),
    );

  /** What the route answers, without the web server around it. */
  async function answer(body: string, signature: string | null): Promise<number> {
    try {
      await atDoor((ctx) => opened.receive(ctx, { body, signature }));
      return 200;
    } catch (error) {
      return (error as { code?: string }).code === 'bad_input' ? 400 : 500;
    }
  }

  async function control(action: string, given: object): Promise<Record<string, unknown>> {
    const response = await fetch(`${server.address}/control/${action}`, {
      method: 'POST',
      body: JSON.stringify(given),
    });
    expect(response.status).toBe(200);
    return (await response.json()) as Record<string, unknown>;
  }

  /** A way to pay for the shop, and a place to be paid for its processor. */
  async function makeReady(world: World, method = 'pm_card_visa') {
    const { stripe } = opened;
    const customer = await createCustomer(
      { name: 'Heron Slough Float Works', email: 'office@shop.test', shopId: world.shopId },
      stripe,
    );
    const account = await createConnectedAccount(
      {
        name: 'Cedar Hollow Plating',
        email: 'desk@processor.test',
        country: 'US',
        processorId: world.processorId,
      },
      stripe,
    );
    await visit(
      await createOnboardingLink(
        { account, returnUrl: 'http://localhost:5600/back', refreshUrl: 'http://localhost:5600/again' },
        stripe,
      ),
      { name: 'Cedar Hollow Plating', bank: 'Test Bank', account_number: '000123456789' },
    );
    await changeShop(base.owner, world, {
      stripeCustomerId: customer,
      stripePaymentMethodId: await savePaymentMethod({ customer, paymentMethod: method }, stripe),
    });
    await changeProcessor(base.owner, world, { stripeAccountId: account, payoutsReady: true });
    return {
      customer,
      account,
      intents: async () => (await stripe.paymentIntents.list({ customer, limit: 100 })).data,
    };
  }

  const visit = (url: string, form: Record<string, string>) =>
    fetch(url, { method: 'POST', body: new URLSearchParams(form), redirect: 'manual' });

  return {
    opened,
    control,
    makeReady,
    visit,
    /** Jobs that wait for their next try are due now. */
    hurry: (name: string) =>
      base.owner.execute(
        sql`update pgboss.job set start_after = now() where name = ${name} and state in ('created', 'retry')`,
      ),
    sendPayments: () => runJobs(base, opened.payJob),
    /** Works off the news until the check holds. */
    workUntil: (check: () => Promise<void>) =>
      vi.waitFor(
        async () => {
          const ran = await runJobs(base, opened.workJob);
          expect(ran.filter((one) => one.error)).toEqual([]);
          await check();
        },
        { timeout: 20_000, interval: 100 },
      ),
  };
}
