import type Stripe from 'stripe';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { ownStripe } from '@/lib/payments/stripe-client';

/** What a webhook tells us, as far as we act on it. Events come more than once and in any order: `eventId` tells repeats apart. */
export type PaymentNotice = { eventId: string; type: string; occurredAt: Date } & (
  | {
      about: 'payment';
      intentId: string;
      state: 'succeeded' | 'processing' | 'failed' | 'cancelled';
      amountMinor: number;
      currency: string;
      reason: string | null;
      metadata: Record<string, string>;
    }
  | {
      about: 'refund';
      intentId: string | null;
      refundedMinor: number;
      currency: string;
      metadata: Record<string, string>;
    }
  | { about: 'account'; accountId: string; canReceive: boolean }
  | { about: 'payment_method'; customer: string; paymentMethod: string }
  | { about: 'nothing' }
);

/** Reads a webhook, or refuses it if we cannot know that the payment service wrote it. Needs the body exactly as received. */
export function parseWebhook(
  rawBody: string,
  signature: string | null,
  secret: string = env.STRIPE_WEBHOOK_SECRET,
  stripe: Stripe = ownStripe(),
): PaymentNotice {
  return noticeOf(verified(rawBody, signature ?? '', { secret, stripe }));
}

/** What an event tells us, of one whose signature was checked when it came. */
export function noticeOf(event: Stripe.Event): PaymentNotice {
  return {
    eventId: event.id,
    type: event.type,
    occurredAt: new Date(event.created * 1000),
    ...contentOf(event),
  };
}

function verified(
  rawBody: string,
  signature: string,
  { secret, stripe }: { secret: string; stripe: Stripe },
): Stripe.Event {
  try {
    return stripe.webhooks.constructEvent(rawBody, signature, secret);
  } catch {
    throw new AppError('bad_input', 'The signature does not belong to this message.');
  }
}

type Content = PaymentNotice extends infer Notice
  ? Notice extends unknown
    ? Omit<Notice, 'eventId' | 'type' | 'occurredAt'>
    : never
  : never;

function contentOf(event: Stripe.Event): Content {
  switch (event.type) {
    case 'payment_intent.succeeded':
      return paymentOf(event.data.object, 'succeeded');
    case 'payment_intent.processing':
      return paymentOf(event.data.object, 'processing');
    case 'payment_intent.payment_failed':
      return paymentOf(event.data.object, 'failed');
    case 'payment_intent.canceled':
      return paymentOf(event.data.object, 'cancelled');
    case 'charge.refunded':
      return refundOf(event.data.object);
    case 'account.updated':
      return accountOf(event.data.object);
    case 'setup_intent.succeeded':
      return methodOf(event.data.object);
    default:
      return { about: 'nothing' };
  }
}

function paymentOf(
  intent: Stripe.PaymentIntent,
  state: 'succeeded' | 'processing' | 'failed' | 'cancelled',
): Content {
  return {
    about: 'payment',
    intentId: intent.id,
    state,
    amountMinor: intent.amount,
    currency: intent.currency.toUpperCase(),
    reason: intent.last_payment_error?.message ?? null,
    metadata: intent.metadata,
  };
}

function refundOf(charge: Stripe.Charge): Content {
  return {
    about: 'refund',
    intentId: idOf(charge.payment_intent),
    refundedMinor: charge.amount_refunded,
    currency: charge.currency.toUpperCase(),
    metadata: charge.metadata,
  };
}

function accountOf(account: Stripe.Account): Content {
  const canReceive = account.payouts_enabled === true && account.capabilities?.transfers === 'active';
  return { about: 'account', accountId: account.id, canReceive };
}

function methodOf(intent: Stripe.SetupIntent): Content {
  const customer = idOf(intent.customer);
  const paymentMethod = idOf(intent.payment_method);
  return customer === null || paymentMethod === null
    ? { about: 'nothing' }
    : { about: 'payment_method', customer, paymentMethod };
}

function idOf(linked: string | { id: string } | null | undefined): string | null {
  if (linked === null || linked === undefined) return null;
  return typeof linked === 'string' ? linked : linked.id;
}
