import { and, desc, eq, isNotNull, isNull } from 'drizzle-orm';
import Stripe from 'stripe';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { invoices, payments } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { enqueue } from '@/lib/jobs/queue';
import type { JobTools } from '@/lib/jobs/job';
import {
  cancelPaymentIntent,
  findPaymentIntent,
  getPaymentIntent,
  payInvoiceIntent,
  retryInvoiceIntent,
  type PaymentAttempt,
} from '@/lib/payments/payments';
import { lookAgainAt } from '@/lib/payments/look-again-at';
import { workPaymentEventQueue } from '@/lib/payments/work-payment-event-queue';

import type { payInvoiceQueue } from './pay-invoice-queue';
import { paymentReference } from './payment-reference';
import { keepIntent, newsOf, recordFailure } from './record-intent';

type Payload = z.output<typeof payInvoiceQueue.payload>;
type Due = NonNullable<Awaited<ReturnType<typeof readDue>>>;

/** `refused`: the service would not even begin, and will not for the same request. */
type Outcome = PaymentAttempt | { state: 'refused'; intentId: null; reason: string };

/**
 * Hands one attempt to the payment service, between two short transactions. Run again after a crash at any point it
 * finds what it made before: by what is stored, by what the service keeps of this attempt, by the idempotency key.
 */
export async function sendPayment(tools: JobTools, payload: Payload): Promise<void> {
  const due = await tools.inShop(payload.shopId, (ctx) => readDue(ctx, payload.paymentId));
  if (!due) return;
  const outcome = await handOver(due, payload);
  await tools.inShop(payload.shopId, (ctx) => recordOutcome(ctx, due, outcome));
}

/** Null once the attempt has ended or is with the service. */
async function readDue(ctx: Ctx, paymentId: string) {
  const [payment] = await ctx.tx
    .select({
      id: payments.id,
      shopId: payments.shopId,
      invoiceId: payments.invoiceId,
      attempt: payments.attempt,
      amountMinor: payments.amountMinor,
      currency: payments.currency,
      startedAt: payments.startedAt,
      number: invoices.number,
      orderNumber: batches.orderNumber,
    })
    .from(payments)
    .innerJoin(invoices, eq(invoices.id, payments.invoiceId))
    .innerJoin(batches, eq(batches.id, invoices.batchId))
    .where(and(eq(payments.id, paymentId), eq(payments.state, 'pending'), isNull(payments.intentId)));
  if (!payment) return null;
  const [failed] = await ctx.tx
    .select({ intentId: payments.intentId })
    .from(payments)
    .where(
      and(
        eq(payments.invoiceId, payment.invoiceId),
        eq(payments.state, 'failed'),
        isNotNull(payments.intentId),
      ),
    )
    .orderBy(desc(payments.attempt))
    .limit(1);
  return { ...payment, intentBefore: failed?.intentId ?? null };
}

async function handOver(due: Due, payload: Payload): Promise<Outcome> {
  const { customer, paymentMethod } = payload;
  const mine = await findPaymentIntent({ customer, paymentId: due.id, since: due.startedAt });
  if (mine) return outcomeOf(await getPaymentIntent(mine.id));
  if (due.intentBefore !== null) {
    const before = await getPaymentIntent(due.intentBefore);
    if (before.status === 'succeeded' || before.status === 'processing') return outcomeOf(before);
    const fits =
      before.amount === due.amountMinor && before.transfer_data?.destination === payload.destinationAccount;
    if (fits && before.status !== 'canceled')
      return refusable(() =>
        retryInvoiceIntent({ intentId: before.id, paymentMethod, idempotencyKey: keyOf(due) }),
      );
    // Another sum or another account is another payment; the old one must never be paid beside it.
    if (before.status !== 'canceled') await cancelPaymentIntent(before.id);
  }
  return refusable(() => payInvoiceIntent(requestOf(due, payload)));
}

function requestOf(due: Due, { customer, paymentMethod, destinationAccount }: Payload) {
  return {
    amountMinor: due.amountMinor,
    currency: due.currency,
    customer,
    paymentMethod,
    destinationAccount,
    idempotencyKey: keyOf(due),
    description: paymentReference({ invoiceNumber: due.number ?? '', orderNumber: due.orderNumber }),
    metadata: { shop_id: due.shopId, invoice_id: due.invoiceId, payment_id: due.id },
  };
}

/** From the invoice alone for the first attempt; a further one, which only exists after that failed, says which it is. */
const keyOf = ({ invoiceId, attempt }: Due): string =>
  attempt === 1 ? `invoice:${invoiceId}` : `invoice:${invoiceId}:${attempt}`;

function outcomeOf(intent: Stripe.PaymentIntent): Outcome {
  const { state, intentId, reason } = newsOf(intent);
  return state === 'failed' ? { state: 'declined', intentId, reason } : { state, intentId };
}

/** What is wrong with the request itself stays wrong, so the office is told; anything else is tried again by the queue. */
async function refusable(work: () => Promise<PaymentAttempt>): Promise<Outcome> {
  try {
    return await work();
  } catch (error) {
    const isRefusal =
      error instanceof Stripe.errors.StripeInvalidRequestError ||
      error instanceof Stripe.errors.StripeCardError;
    // The intent moved on between two calls; the next try sees where to.
    if (!isRefusal || error.code === 'payment_intent_unexpected_state') throw error;
    return { state: 'refused', intentId: null, reason: error.message };
  }
}

/** A success is not written here: it is believed from the signed webhook, or from a later look. */
async function recordOutcome(ctx: Ctx, due: Due, outcome: Outcome): Promise<void> {
  await ctx.tx.select({ id: invoices.id }).from(invoices).where(eq(invoices.id, due.invoiceId)).for('update');
  if (outcome.state === 'declined' || outcome.state === 'refused')
    return recordFailure(ctx, {
      payment: due,
      number: due.number,
      intentId: outcome.intentId,
      reason: outcome.reason,
    });
  await keepIntent(ctx, due, outcome.intentId);
  await enqueue(
    ctx,
    workPaymentEventQueue,
    { shopId: due.shopId, paymentId: due.id, look: 1 },
    { startAfter: lookAgainAt(ctx.now, 0) },
  );
}
