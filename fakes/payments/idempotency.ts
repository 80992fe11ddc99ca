import { createHash } from 'node:crypto';
import { PaymentFault } from './payment-fault';
import type { PaymentsState, SavedAnswer } from './store';

/** How long the real service promises to remember a key. After that the same key pays again, so callers must not rely on it alone. */
const REMEMBERED_MS = 24 * 60 * 60 * 1000;

export interface KeyedRequest {
  key: string;
  method: string;
  path: string;
  body: string;
}

/** The answer this key already got, or null. The same key with another request is refused: somebody mixed up two payments. */
export function savedAnswer(state: PaymentsState, request: KeyedRequest, nowMs: number): SavedAnswer | null {
  const saved = state.answers[request.key];
  if (saved === undefined) return null;
  if (nowMs - saved.at > REMEMBERED_MS) {
    delete state.answers[request.key];
    return null;
  }
  if (saved.fingerprint !== fingerprintOf(request)) {
    throw new PaymentFault(400, {
      type: 'idempotency_error',
      message: `Keys for idempotent requests can only be used with the same parameters they were first used with. Try using a key other than '${request.key}' if you meant to execute a different request.`,
    });
  }
  return saved;
}

/**
 * Keeps the answer with the change it describes, in the same write.
 *
 * Only what took effect is kept, which includes a decline. A request refused for its parameters did nothing and may be
 * mended and sent again under its key, as with the real service.
 */
export function keepAnswer(
  state: PaymentsState,
  request: KeyedRequest,
  answer: { status: number; body: unknown; nowMs: number },
): void {
  const { status, body, nowMs } = answer;
  if (status !== 200 && status !== 402) return;
  state.answers[request.key] = {
    fingerprint: fingerprintOf(request),
    status,
    body: structuredClone(body),
    at: nowMs,
  };
}

function fingerprintOf({ method, path, body }: KeyedRequest): string {
  const sorted = [...new URLSearchParams(body)].map(([name, value]) => `${name}=${value}`).sort();
  return createHash('sha256')
    .update(JSON.stringify([method, path, sorted]))
    .digest('hex');
}
