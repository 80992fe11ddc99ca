import { signWebhook } from './sign-webhook';
import type { Delivery, PaymentsStore } from './store';

/** Quick at first, because somebody is watching; then slower, for up to about a day. */
const WAITS_MS = [500, 1_000, 2_000, 5_000, 10_000, 30_000, 60_000, 5 * 60_000, 15 * 60_000, 60 * 60_000];
const MAX_ATTEMPTS = 30;
const TIMEOUT_MS = 15_000;

export const FORGERIES = ['wrong_secret', 'tampered', 'old', 'unsigned'] as const;
export type Forgery = (typeof FORGERIES)[number];

export interface WebhookOptions {
  url: string;
  secret: string;
  now: () => number;
}

export interface Webhooks {
  /** Sends what is due, in the order it happened. One that fails does not hold up the others. */
  sendDue(): Promise<void>;
  /** Sends these now, in this order, whatever their state. */
  send(eventIds: readonly string[]): Promise<{ event: string; answer: string }[]>;
  /** Sends one with a signature that must be refused, and says what the receiver answered. */
  forge(eventId: string, how: Forgery): Promise<string>;
}

export function webhooksTo({ url, secret, now }: WebhookOptions, store: PaymentsStore): Webhooks {
  let isSending = false;

  async function deliver(delivery: Delivery): Promise<string> {
    const event = store.state.events[delivery.event];
    if (event === undefined) return 'no such event';
    const body = JSON.stringify(event, null, 2);
    const answer = await post(url, body, signWebhook(body, secret, Math.floor(now() / 1000)));
    recordAnswer(delivery, answer, now());
    if (delivery.state === 'delivered') event.pending_webhooks = 0;
    store.save();
    return answer;
  }

  return {
    async sendDue() {
      if (isSending) return;
      isSending = true;
      try {
        const due = store.state.deliveries.filter(
          ({ state, nextAtMs }) => state === 'waiting' && nextAtMs <= now(),
        );
        for (const delivery of due) await deliver(delivery);
      } finally {
        isSending = false;
      }
    },
    async send(eventIds) {
      const answers: { event: string; answer: string }[] = [];
      for (const event of eventIds) {
        const delivery = store.state.deliveries.find((each) => each.event === event);
        answers.push({ event, answer: delivery === undefined ? 'no such event' : await deliver(delivery) });
      }
      return answers;
    },
    async forge(eventId, how) {
      const event = store.state.events[eventId];
      if (event === undefined) return 'no such event';
      const body = JSON.stringify(event, null, 2);
      return post(
        url,
        how === 'tampered' ? body.replace('"livemode": false', '"livemode":  false') : body,
        forgedSignature(body, secret, { how, nowMs: now() }),
      );
    },
  };
}

function forgedSignature(
  body: string,
  secret: string,
  { how, nowMs }: { how: Forgery; nowMs: number },
): string | null {
  const atSeconds = Math.floor(nowMs / 1000);
  switch (how) {
    case 'wrong_secret':
      return signWebhook(body, `${secret}_not`, atSeconds);
    case 'tampered':
      return signWebhook(body, secret, atSeconds);
    case 'old':
      return signWebhook(body, secret, atSeconds - 3600);
    case 'unsigned':
      return null;
  }
}

function recordAnswer(delivery: Delivery, answer: string, nowMs: number): void {
  delivery.attempts += 1;
  delivery.lastAnswer = answer;
  if (/^2\d\d/.test(answer)) {
    delivery.state = 'delivered';
    return;
  }
  if (delivery.state === 'delivered') return;
  delivery.state = delivery.attempts >= MAX_ATTEMPTS ? 'given_up' : 'waiting';
  delivery.nextAtMs = nowMs + (WAITS_MS[Math.min(delivery.attempts, WAITS_MS.length) - 1] ?? 0);
}

async function post(url: string, body: string, signature: string | null): Promise<string> {
  try {
    const response = await fetch(url, {
      method: 'POST',
      redirect: 'manual',
      headers: {
        'content-type': 'application/json; charset=utf-8',
        ...(signature === null ? {} : { 'stripe-signature': signature }),
      },
      body,
      signal: AbortSignal.timeout(TIMEOUT_MS),
    });
    await response.arrayBuffer();
    return String(response.status);
  } catch (error) {
    const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
    return cause instanceof Error ? `no answer: ${cause.message || cause.name}` : 'no answer';
  }
}
