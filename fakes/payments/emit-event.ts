import { newPaymentId, seconds } from './call';
import type { Call } from './call';

/** Records what happened with a copy of the thing as it was then, and queues it for the webhook. */
export function emitEvent(call: Call, type: string, thing: object, account?: string): void {
  const id = newPaymentId('evt');
  call.state.events[id] = {
    id,
    object: 'event',
    api_version: call.apiVersion,
    created: seconds(call),
    livemode: false,
    type,
    data: { object: structuredClone(thing) },
    ...(account === undefined ? {} : { account }),
    pending_webhooks: 1,
    request: { id: call.requestId, idempotency_key: call.idempotencyKey },
  };
  call.state.deliveries.push({
    event: id,
    attempts: 0,
    nextAtMs: call.nowMs,
    state: 'waiting',
    lastAnswer: null,
  });
}
