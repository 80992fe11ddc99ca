import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerWith } from '../answer';
import { readBody } from '../read-body';
import { newPaymentId } from './call';
import type { Call } from './call';
import { expandFields } from './expand-fields';
import { parseForm } from './form';
import { keepAnswer, savedAnswer } from './idempotency';
import type { KeyedRequest } from './idempotency';
import { PaymentFault } from './payment-fault';
import { routeOf } from './routes';
import type { PaymentsWorld } from './world';

interface ApiAnswer {
  status: number;
  body: unknown;
  isReplay?: boolean;
}

/** Answers a request under /v1 as the real service would. */
export async function serveApi(
  world: PaymentsWorld,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const requestId = newPaymentId('req');
  const body = await readBody(request);
  // From here to the answer nothing is awaited: requests are handled one after the other, whole.
  const answer = answerOf(world, { request, body, requestId });
  if (request.method === 'POST' && world.losesAnswer()) return void request.socket.destroy();

  const key = headerOf(request, 'idempotency-key');
  answerWith(response, {
    status: answer.status,
    type: 'application/json',
    body: JSON.stringify(answer.body, null, 2),
    headers: {
      'request-id': requestId,
      ...(key === null ? {} : { 'idempotency-key': key }),
      ...(answer.isReplay === true ? { 'idempotent-replayed': 'true' } : {}),
    },
  });
}

function answerOf(
  world: PaymentsWorld,
  { request, body, requestId }: { request: IncomingMessage; body: string; requestId: string },
): ApiAnswer {
  const { pathname, search } = new URL(request.url ?? '/', world.address());
  const method = request.method ?? 'GET';
  const key = method === 'POST' ? headerOf(request, 'idempotency-key') : null;
  const keyed: KeyedRequest | null = key === null ? null : { key, method, path: pathname, body };

  try {
    mustBeSignedIn(request);
    const saved = keyed === null ? null : savedAnswer(world.store.state, keyed, world.now());
    if (saved !== null) return { status: saved.status, body: saved.body, isReplay: true };

    const { handler, id } = routeOf(method, pathname);
    const form = parseForm(method === 'GET' ? search.slice(1) : body);
    const call: Call = world.call({
      id,
      form,
      requestId,
      idempotencyKey: key,
      apiVersion: headerOf(request, 'stripe-version'),
    });
    const answer = run(() => expandFields(world.store.state, handler(call), expandOf(form['expand'])));
    if (keyed !== null) keepAnswer(world.store.state, keyed, { ...answer, nowMs: world.now() });
    if (method !== 'GET') world.changed();
    return answer;
  } catch (error) {
    return faultAnswer(error);
  }
}

/** A decline is an answer of its own, not a failure to answer: it must be kept under its key too. */
function run(work: () => unknown): ApiAnswer {
  try {
    return { status: 200, body: work() };
  } catch (error) {
    return faultAnswer(error);
  }
}

function faultAnswer(error: unknown): ApiAnswer {
  if (error instanceof PaymentFault) return { status: error.status, body: { error: error.detail } };
  const message = error instanceof Error ? error.message : String(error);
  return { status: 500, body: { error: { type: 'api_error', message: `The stand-in failed: ${message}` } } };
}

function mustBeSignedIn(request: IncomingMessage): void {
  const given = request.headers.authorization ?? '';
  const key = given.startsWith('Basic ')
    ? Buffer.from(given.slice(6), 'base64').toString().split(':')[0]
    : given.replace(/^Bearer /, '');
  if (key?.startsWith('sk_') !== true) {
    throw new PaymentFault(401, { type: 'invalid_request_error', message: 'Invalid API Key provided.' });
  }
}

function headerOf(request: IncomingMessage, name: string): string | null {
  const value = request.headers[name];
  return (Array.isArray(value) ? value[0] : value) ?? null;
}

function expandOf(asked: unknown): string[] {
  return Array.isArray(asked) ? asked.filter((path) => typeof path === 'string') : [];
}
