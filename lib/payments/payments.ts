import Stripe from 'stripe';
import { AppError } from '@/lib/errors';
import { ownStripe } from '@/lib/payments/stripe-client';

/** What became of an attempt to pay. `declined` is an answer, not a failure: another method may be tried on the same intent. */
export type PaymentAttempt =
  | { state: 'succeeded' | 'processing'; intentId: string }
  | { state: 'declined'; intentId: string; reason: string };

export interface NewConnectedAccount {
  name: string;
  email: string;
  country: string;
  /** Our id of the processor: finds the account again, and makes a repeat give the same account. */
  processorId: string;
}

/** An account that can receive money once its owner has gone through the onboarding link. */
export async function createConnectedAccount(
  processor: NewConnectedAccount,
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const { name, email, country, processorId } = processor;
  const account = await reaching(() =>
    stripe.accounts.create(
      {
        type: 'express',
        country,
        email,
        business_profile: { name },
        capabilities: { transfers: { requested: true } },
        metadata: { processor_id: processorId },
      },
      { idempotencyKey: `account:${processorId}` },
    ),
  );
  return account.id;
}

/** Good once, for minutes. An expired one sends its visitor to `refreshUrl`, which is to make a new one. */
export async function createOnboardingLink(
  link: { account: string; returnUrl: string; refreshUrl: string },
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const { account, returnUrl, refreshUrl } = link;
  const made = await reaching(() =>
    stripe.accountLinks.create({
      account,
      type: 'account_onboarding',
      return_url: returnUrl,
      refresh_url: refreshUrl,
    }),
  );
  return made.url;
}

export async function createCustomer(
  shop: { name: string; email: string; shopId: string },
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const { name, email, shopId } = shop;
  const customer = await reaching(() =>
    stripe.customers.create(
      { name, email, metadata: { shop_id: shopId } },
      { idempotencyKey: `customer:${shopId}` },
    ),
  );
  return customer.id;
}

/** The payment service's own page on which the office saves a method. The number never passes through us; the webhook brings the result. */
export async function createPaymentMethodLink(
  link: { customer: string; successUrl: string; cancelUrl: string },
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const { customer, successUrl, cancelUrl } = link;
  const session = await reaching(() =>
    stripe.checkout.sessions.create({
      mode: 'setup',
      customer,
      currency: 'usd',
      success_url: successUrl,
      cancel_url: cancelUrl,
    }),
  );
  if (session.url === null)
    throw new AppError('unavailable', 'The payment service gave no page to save a method on. Try again.');
  return session.url;
}

/** Saves a method that is already known to the payment service, and returns its id there. */
export async function savePaymentMethod(
  saved: { customer: string; paymentMethod: string },
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const method = await reaching(() =>
    stripe.paymentMethods.attach(saved.paymentMethod, { customer: saved.customer }),
  );
  return method.id;
}

export interface InvoicePayment {
  amountMinor: number;
  currency: string;
  customer: string;
  paymentMethod: string;
  destinationAccount: string;
  /**
   * From the invoice and nothing else, so that every repeat is the same request. The service forgets keys after a day:
   * whoever calls this must also have looked whether the invoice already has an intent.
   */
  idempotencyKey: string;
  /** What the transfer carries, for whoever reads the processor's statement. */
  description?: string;
  metadata: Record<string, string>;
}

/** Pays a processor from the shop's saved method. What is returned is provisional; the truth comes by webhook. */
export function payInvoiceIntent(
  payment: InvoicePayment,
  stripe: Stripe = ownStripe(),
): Promise<PaymentAttempt> {
  const {
    amountMinor,
    currency,
    customer,
    paymentMethod,
    destinationAccount,
    idempotencyKey,
    description,
    metadata,
  } = payment;
  return attempt(() =>
    stripe.paymentIntents.create(
      {
        amount: amountMinor,
        currency: currency.toLowerCase(),
        customer,
        payment_method: paymentMethod,
        confirm: true,
        off_session: true,
        // Nobody is at a screen when the worker pays, so a method that needs a redirect must be refused, not left hanging.
        automatic_payment_methods: { enabled: true, allow_redirects: 'never' },
        transfer_data: { destination: destinationAccount },
        ...(description === undefined ? {} : { description }),
        metadata,
      },
      { idempotencyKey },
    ),
  );
}

/**
 * The intent that was made for this attempt of ours and could not be written down any more, or null. Looked for before
 * one is made: the service forgets idempotency keys after a day, this never.
 */
export async function findPaymentIntent(
  wanted: { customer: string; paymentId: string; since: Date },
  stripe: Stripe = ownStripe(),
): Promise<Stripe.PaymentIntent | null> {
  const { customer, paymentId, since } = wanted;
  const created = { gte: Math.floor(since.getTime() / 1000) - CLOCKS_APART_S };
  return reaching(async () => {
    for await (const intent of stripe.paymentIntents.list({ customer, created, limit: 100 })) {
      if (intent.metadata['payment_id'] === paymentId) return intent;
    }
    return null;
  });
}

const CLOCKS_APART_S = 3600;

/** Ends an intent that nobody has paid, so that nobody can pay it any more. */
export async function cancelPaymentIntent(intentId: string, stripe: Stripe = ownStripe()): Promise<void> {
  await reaching(() => stripe.paymentIntents.cancel(intentId));
}

/** Tries again after a decline, on the same intent: an intent can be paid only once, however often it is tried. */
export function retryInvoiceIntent(
  retry: { intentId: string; paymentMethod: string; idempotencyKey: string },
  stripe: Stripe = ownStripe(),
): Promise<PaymentAttempt> {
  const { intentId, paymentMethod, idempotencyKey } = retry;
  return attempt(() =>
    stripe.paymentIntents.confirm(
      intentId,
      { payment_method: paymentMethod, off_session: true },
      { idempotencyKey },
    ),
  );
}

/** The intent as it stands now, with its last charge: webhooks come out of order, or not at all. */
export async function getPaymentIntent(
  intentId: string,
  stripe: Stripe = ownStripe(),
): Promise<Stripe.PaymentIntent> {
  return reaching(() => stripe.paymentIntents.retrieve(intentId, { expand: ['latest_charge'] }));
}

/** Takes back all or part of a payment, from the processor's account too. Returns the refund's id. */
export async function refundPayment(
  refund: { intentId: string; amountMinor: number; idempotencyKey: string; metadata: Record<string, string> },
  stripe: Stripe = ownStripe(),
): Promise<string> {
  const { intentId, amountMinor, idempotencyKey, metadata } = refund;
  const made = await reaching(() =>
    stripe.refunds.create(
      { payment_intent: intentId, amount: amountMinor, reverse_transfer: true, metadata },
      { idempotencyKey },
    ),
  );
  return made.id;
}

async function attempt(work: () => Promise<Stripe.PaymentIntent>): Promise<PaymentAttempt> {
  try {
    const intent = await reaching(work);
    if (intent.status === 'succeeded') return { state: 'succeeded', intentId: intent.id };
    if (intent.status === 'processing') return { state: 'processing', intentId: intent.id };
    return {
      state: 'declined',
      intentId: intent.id,
      reason: intent.last_payment_error?.message ?? 'The payment was not completed.',
    };
  } catch (error) {
    if (!(error instanceof Stripe.errors.StripeCardError) || error.payment_intent === undefined) throw error;
    return { state: 'declined', intentId: error.payment_intent.id, reason: error.message };
  }
}

/** One refusal, with a way on, for a service that cannot be reached. Everything else keeps its own error. */
async function reaching<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    const isAway =
      error instanceof Stripe.errors.StripeConnectionError || error instanceof Stripe.errors.StripeAPIError;
    if (!isAway) throw error;
    throw new AppError(
      'unavailable',
      'The payment service does not answer just now. Nothing has been paid twice; it will be tried again.',
      {
        extra: { reason: error.name },
      },
    );
  }
}
