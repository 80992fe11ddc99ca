import { and, desc, eq, isNull, like, ne, notInArray, sql } from 'drizzle-orm';
import type Stripe from 'stripe';

import { invoices, moneyEntries, payments } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';

import { enterMoney } from './money-ledger';
import { queueRemittance } from './queue-remittance';

type Payment = typeof payments.$inferSelect;

/** What the payment service says of an intent, as far as we act on it. */
export interface IntentNews {
  intentId: string;
  state: 'succeeded' | 'processing' | 'failed';
  receivedMinor: number;
  refundedMinor: number;
  reason: string;
}

export function newsOf(intent: Stripe.PaymentIntent): IntentNews {
  const charge = typeof intent.latest_charge === 'string' ? null : intent.latest_charge;
  const states: Partial<Record<Stripe.PaymentIntent.Status, IntentNews['state']>> = {
    succeeded: 'succeeded',
    processing: 'processing',
  };
  return {
    intentId: intent.id,
    state: states[intent.status] ?? 'failed',
    receivedMinor: intent.amount_received,
    refundedMinor: charge?.amount_refunded ?? 0,
    reason: intent.last_payment_error?.message ?? 'The payment was not completed.',
  };
}

/**
 * Writes down how an intent stands, as retrieved from the payment service: order and repeats of what told us of it do
 * not matter. The invoice is locked first, so that two who heard the same news write one after the other.
 *
 * @param paymentId the attempt that the intent belonged to *before* it was retrieved. A failure is written to that
 * attempt only: a later attempt on the same intent may have begun since.
 */
export async function recordIntent(ctx: Ctx, paymentId: string, news: IntentNews): Promise<void> {
  const [known] = await ctx.tx
    .select({ invoiceId: payments.invoiceId })
    .from(payments)
    .where(eq(payments.id, paymentId));
  if (!known) return;
  const [invoice] = await ctx.tx
    .select()
    .from(invoices)
    .where(eq(invoices.id, known.invoiceId))
    .for('update');
  const attempts = await ctx.tx
    .select()
    .from(payments)
    .where(eq(payments.invoiceId, known.invoiceId))
    .orderBy(desc(payments.attempt));
  const heardOf = attempts.find((one) => one.id === paymentId);
  if (!invoice || !heardOf) return;

  if (news.state === 'failed')
    return recordFailure(ctx, {
      payment: heardOf,
      number: invoice.number,
      intentId: news.intentId,
      reason: news.reason,
    });
  const payment = attemptOf(news.intentId, heardOf, attempts);
  if (payment.state === 'pending' || news.state === 'succeeded')
    await keepIntent(ctx, payment, news.intentId);
  if (news.state === 'processing') return;
  await recordSuccess(ctx, { payment, invoice, news });
  if (news.refundedMinor > 0) await recordRefund(ctx, { payment, invoice, news });
}

/** An attempt that ended without success; the office sees why and may pay again. */
export async function recordFailure(
  ctx: Ctx,
  {
    payment,
    number,
    intentId,
    reason,
  }: {
    payment: Pick<Payment, 'id' | 'invoiceId' | 'attempt'>;
    number: string | null;
    intentId: string | null;
    reason: string;
  },
): Promise<void> {
  const [failed] = await ctx.tx
    .update(payments)
    .set({ state: 'failed', failure: reason, endedAt: ctx.now })
    .where(and(eq(payments.id, payment.id), eq(payments.state, 'pending')))
    .returning({ id: payments.id });
  if (!failed) return;
  if (intentId !== null) await keepIntent(ctx, payment, intentId);
  await recordAudit(ctx, {
    action: 'invoice.payment_failed',
    entity: 'invoice',
    entityId: payment.invoiceId,
    after: { number, attempt: payment.attempt, reason },
  });
}

/**
 * The intent belongs to the attempt that is under way with it: an intent is paid once, however often it is tried, so
 * no two attempts may claim it.
 */
export async function keepIntent(
  ctx: Ctx,
  { id, invoiceId }: Pick<Payment, 'id' | 'invoiceId'>,
  intentId: string,
): Promise<void> {
  await ctx.tx
    .update(payments)
    .set({ intentId: null })
    .where(and(eq(payments.invoiceId, invoiceId), eq(payments.intentId, intentId), ne(payments.id, id)));
  await ctx.tx
    .update(payments)
    .set({ intentId })
    .where(and(eq(payments.id, id), isNull(payments.intentId)));
}

/**
 * Which attempt an intent that goes on belongs to. One that failed before and goes on after all does so for the next
 * attempt, whose job had no time to write it down.
 */
function attemptOf(intentId: string, heardOf: Payment, attempts: readonly Payment[]): Payment {
  const carrier = attempts.find((one) => one.intentId === intentId) ?? heardOf;
  if (carrier.state !== 'failed') return carrier;
  return (
    attempts.find(
      (one) => one.state === 'pending' && one.intentId === null && one.attempt > carrier.attempt,
    ) ?? carrier
  );
}

interface Ended {
  payment: Payment;
  invoice: typeof invoices.$inferSelect;
  news: IntentNews;
}

async function recordSuccess(ctx: Ctx, { payment, invoice, news }: Ended): Promise<void> {
  const [ended] = await ctx.tx
    .update(payments)
    .set({ state: 'succeeded', failure: null, endedAt: ctx.now })
    .where(and(eq(payments.id, payment.id), notInArray(payments.state, ['succeeded', 'refunded'])))
    .returning({ id: payments.id });
  if (!ended) return;
  await enterMoney(ctx, {
    invoiceId: invoice.id,
    kind: 'paid',
    amountMinor: -news.receivedMinor,
    currency: payment.currency,
    cause: `payment:${news.intentId}`,
  });
  await recordAudit(ctx, {
    action: 'invoice.paid',
    entity: 'invoice',
    entityId: invoice.id,
    after: {
      number: invoice.number,
      paidMinor: news.receivedMinor,
      attempt: payment.attempt,
      reference: news.intentId,
    },
  });
  await refreshStanding(ctx, invoice.batchId);
  await queueRemittance(ctx, {
    invoiceId: invoice.id,
    paidMinor: news.receivedMinor,
    paidBy: payment.paidBy,
  });
}

/** The service tells the sum of all refunds so far; what is not entered of it yet is entered now. */
async function recordRefund(ctx: Ctx, { payment, invoice, news }: Ended): Promise<void> {
  const cause = `refund:${news.intentId}`;
  const [before] = await ctx.tx
    .select({ minor: sql<number>`coalesce(sum(${moneyEntries.amountMinor}), 0)::int` })
    .from(moneyEntries)
    .where(and(eq(moneyEntries.invoiceId, invoice.id), like(moneyEntries.cause, `${cause}:%`)));
  const amountMinor = news.refundedMinor - (before?.minor ?? 0);
  if (amountMinor <= 0) return;
  await enterMoney(ctx, {
    invoiceId: invoice.id,
    kind: 'refunded',
    amountMinor,
    currency: payment.currency,
    cause: `${cause}:${news.refundedMinor}`,
  });
  if (news.refundedMinor >= payment.amountMinor)
    await ctx.tx.update(payments).set({ state: 'refunded' }).where(eq(payments.id, payment.id));
  await recordAudit(ctx, {
    action: 'invoice.refunded',
    entity: 'invoice',
    entityId: invoice.id,
    after: { number: invoice.number, refundedMinor: amountMinor, reference: news.intentId },
  });
  await refreshStanding(ctx, invoice.batchId);
}
