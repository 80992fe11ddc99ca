import path from 'node:path';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerHtml, answerJson } from '../answer';
import { listen } from '../listen';
import { isProgram, portFromEnv, runProgram } from '../run-program';
import type { Call } from './call';
import { serveControl } from './control';
import { serveCheckout, serveOnboarding } from './hosted-pages';
import { overviewPage } from './overview-page';
import { serveApi } from './serve-api';
import { settleDue } from './settle-intent';
import { openPaymentsStore } from './store';
import { webhooksTo } from './webhooks';
import type { PaymentFailure, PaymentsWorld } from './world';

const HEARTBEAT_MS = 200;
const API_VERSION = '2026-10-28.endive';

export interface PaymentsServerOptions {
  port: number;
  /** Where the state is kept between runs. */
  file: string;
  webhookUrl: string;
  webhookSecret: string;
  host?: string;
  /** How long "a while" is for payments that do not settle at once. */
  settleAfterMs?: number;
  now?: () => number;
}

export interface PaymentsServer {
  address: string;
  port: number;
  close(): Promise<void>;
}

/** The payment service as far as it is used here: the same wire format, so that key and address are the only change. */
export async function startPaymentsServer(options: PaymentsServerOptions): Promise<PaymentsServer> {
  const { port, host = '127.0.0.1' } = options;
  let address = `http://${host}:${port}`;
  const world = makeWorld(options, () => address);

  const http = await listen(
    (request, response) => {
      serve(world, request, response).catch((error: unknown) => {
        if (response.headersSent) return response.destroy();
        answerJson(response, 500, {
          error: { type: 'api_error', message: error instanceof Error ? error.message : String(error) },
        });
      });
    },
    { port, host },
  );
  address = `http://${host === '127.0.0.1' ? 'localhost' : host}:${http.port}`;

  const heartbeat = setInterval(() => beat(world), HEARTBEAT_MS);
  return {
    address,
    port: http.port,
    close: async () => {
      clearInterval(heartbeat);
      await http.close();
    },
  };
}

async function serve(
  world: PaymentsWorld,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const { pathname } = new URL(request.url ?? '/', world.address());
  const [section = '', id = ''] = pathname.split('/').slice(1);
  if (section === 'health') return answerJson(response, 200, { ok: true, failure: world.failure() });
  if (section === 'control' && request.method === 'POST') return serveControl(world, request, response);
  if (section === '') return answerHtml(response, overviewPage(world));
  if (section === 'onboarding') return serveOnboarding(world, id, { request, response });
  if (section === 'checkout') return serveCheckout(world, id, { request, response });
  if (world.failure() === 'drop') return void request.socket.destroy();
  if (world.failure() === 'refuse') {
    return answerJson(response, 503, {
      error: { type: 'api_error', message: 'The payment service is not available.' },
    });
  }
  return serveApi(world, request, response);
}

function beat(world: PaymentsWorld): void {
  const ended = settleDue(
    world.call({ id: '', form: {}, requestId: null, idempotencyKey: null, apiVersion: null }),
  );
  if (ended.length > 0) world.store.save();
  if (!world.isHoldingWebhooks()) void world.webhooks.sendDue();
}

function makeWorld(options: PaymentsServerOptions, address: () => string): PaymentsWorld {
  const { file, webhookUrl, webhookSecret, settleAfterMs = 3_000, now = () => Date.now() } = options;
  const store = openPaymentsStore(file);
  const webhooks = webhooksTo({ url: webhookUrl, secret: webhookSecret, now }, store);
  let failure: PaymentFailure = 'none';
  let failuresLeft = 0;
  let isHolding = false;

  return {
    store,
    webhooks,
    now,
    address,
    call: ({ apiVersion, ...request }): Call => ({
      ...request,
      state: store.state,
      nowMs: now(),
      apiVersion: apiVersion ?? API_VERSION,
      address: address(),
      settleAfterMs,
    }),
    changed: () => {
      store.save();
      if (!isHolding) setImmediate(() => void webhooks.sendDue());
    },
    failure: () => failure,
    setFailure: (next, times) => {
      failure = next;
      failuresLeft = times;
    },
    losesAnswer: () => {
      if (failure !== 'lose_answer') return false;
      failuresLeft -= 1;
      if (failuresLeft <= 0) failure = 'none';
      return true;
    },
    isHoldingWebhooks: () => isHolding,
    holdWebhooks: (hold) => void (isHolding = hold),
  };
}

if (isProgram(import.meta.url)) {
  await runProgram('Payments', () =>
    startPaymentsServer({
      port: portFromEnv('FAKE_PAYMENTS_PORT', 4612),
      file: process.env['FAKE_PAYMENTS_FILE'] ?? path.join('.data', 'payments.json'),
      host: process.env['FAKE_HOST'] ?? '127.0.0.1',
      webhookUrl: new URL('/api/webhooks/payments', process.env['APP_URL'] ?? 'http://localhost:4600').href,
      webhookSecret: process.env['STRIPE_WEBHOOK_SECRET'] || 'whsec_local',
      settleAfterMs: Number(process.env['FAKE_SETTLE_MS'] || 3_000),
    }),
  );
}
