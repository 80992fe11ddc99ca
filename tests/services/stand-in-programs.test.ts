import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest';
import {
  createConnectedAccount,
  createCustomer,
  payInvoiceIntent,
  savePaymentMethod,
} from '@/lib/payments/payments';
import { makeStripe } from '@/lib/payments/stripe-client';

let dir: string;
const running: ChildProcess[] = [];

beforeAll(async () => {
  dir = await mkdtemp(path.join(tmpdir(), 'stand-ins-'));
});
afterEach(() => {
  for (const child of running.splice(0)) child.kill('SIGKILL');
});
afterAll(() => rm(dir, { recursive: true, force: true }));

async function freePort(): Promise<number> {
  const server = createServer();
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const { port } = server.address() as AddressInfo;
  await new Promise((done) => server.close(done));
  return port;
}

function run(name: string, env: Record<string, string>) {
  const child = spawn(process.execPath, ['--import', 'tsx', `fakes/${name}/server.ts`], {
    env: { ...process.env, ...env },
  });
  running.push(child);
  let complaint = '';
  child.stderr.on('data', (chunk: Buffer) => (complaint += chunk.toString()));
  const ended = new Promise<{ code: number | null; complaint: string }>((done) =>
    child.on('exit', (code) => done({ code, complaint })),
  );
  return { child, ended };
}

async function isUp(port: number): Promise<boolean> {
  return fetch(`http://127.0.0.1:${port}/health`).then(
    (answer) => answer.ok,
    () => false,
  );
}

const settings = async (name: string, port: number): Promise<Record<string, string>> => {
  switch (name) {
    case 'mail':
      return {
        FAKE_SMTP_PORT: String(await freePort()),
        FAKE_MAIL_HTTP_PORT: String(port),
        FAKE_MAIL_DIR: path.join(dir, 'mail'),
      };
    case 'storage':
      return { FAKE_STORAGE_PORT: String(port), FAKE_STORAGE_DIR: path.join(dir, 'storage') };
    default:
      return {
        FAKE_PAYMENTS_PORT: String(port),
        FAKE_PAYMENTS_FILE: path.join(dir, 'payments.json'),
        APP_URL: 'http://127.0.0.1:1',
      };
  }
};

describe.each(['mail', 'storage', 'payments'])('the %s stand-in as a program', (name) => {
  test('answers on its port, refuses a taken one in one sentence, and ends on a signal', async () => {
    const port = await freePort();
    const env = await settings(name, port);
    const { child, ended } = run(name, env);
    await expect.poll(() => isUp(port), { timeout: 60_000 }).toBe(true);

    const second = await run(name, env).ended;
    expect(second.code).toBe(1);
    expect(second.complaint).toMatch(/cannot start: .*EADDRINUSE/);
    expect(second.complaint.trim().split('\n')).toHaveLength(1);

    child.kill('SIGTERM');
    expect(await ended).toMatchObject({ code: 0 });
  }, 120_000);

  test('refuses a port that is none', async () => {
    const env = Object.fromEntries(
      Object.entries(await settings(name, 1)).map(([key, value]) => [
        key,
        key.endsWith('PORT') ? 'mail' : value,
      ]),
    );
    const { code, complaint } = await run(name, env).ended;
    expect(code).toBe(1);
    expect(complaint).toContain('must be a port number');
  }, 120_000);
});

test('a payment answered before the payments stand-in was killed is there afterwards, once', async () => {
  const port = await freePort();
  const env = {
    ...(await settings('payments', port)),
    FAKE_PAYMENTS_FILE: path.join(dir, `${randomUUID()}.json`),
  };
  const stripe = makeStripe({ secretKey: 'sk_test_local', apiBase: `http://127.0.0.1:${port}` });
  const first = run('payments', env);
  await expect.poll(() => isUp(port), { timeout: 60_000 }).toBe(true);

  const customer = await createCustomer(
    { name: 'Shop', email: 'office@shop.test', shopId: randomUUID() },
    stripe,
  );
  const account = await createConnectedAccount(
    { name: 'Plater', email: 'desk@plater.test', country: 'US', processorId: randomUUID() },
    stripe,
  );
  const link = await stripe.accountLinks.create({
    account,
    type: 'account_onboarding',
    return_url: 'http://localhost/a',
    refresh_url: 'http://localhost/b',
  });
  await fetch(link.url, {
    method: 'POST',
    body: new URLSearchParams({ account_number: '000123456789' }),
    redirect: 'manual',
  });
  const payment = {
    amountMinor: 12_300,
    currency: 'USD',
    customer,
    paymentMethod: await savePaymentMethod({ customer, paymentMethod: 'pm_card_visa' }, stripe),
    destinationAccount: account,
    idempotencyKey: `invoice:${randomUUID()}`,
    metadata: {},
  };
  const paid = await payInvoiceIntent(payment, stripe);
  first.child.kill('SIGKILL');
  await first.ended;

  run('payments', env);
  await expect.poll(() => isUp(port), { timeout: 60_000 }).toBe(true);
  expect(await payInvoiceIntent(payment, stripe)).toEqual(paid);
  expect((await stripe.paymentIntents.list({ customer })).data).toHaveLength(1);
}, 180_000);
