import { and, eq, isNull } from 'drizzle-orm';
import type Stripe from 'stripe';
import { z } from 'zod';

import { payments, paymentEvents } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { newsOf, recordIntent } from '@/lib/invoices/record-intent';
import type { JobTools } from '@/lib/jobs/job';
import { enqueue } from '@/lib/jobs/queue';

import { lookAgainAt } from './look-again-at';
import { noticeOf, type PaymentNotice } from './parse-webhook';
import { getPaymentIntent } from './payments';
import { recordPayingMethod } from './record-paying-method';
import { recordPayoutAccount } from './record-payout-account';
import { workPaymentEventQueue } from './work-payment-event-queue';

type Payload = z.output<typeof workPaymentEventQueue.payload>;

/**
 * Works what the payment service told, or looks at a payment of which it told nothing. An event only says that there
 * is something to see: what is written down is the state as retrieved, so that events twice or out of order, and a job
 * that is run again, write the same thing once.
 */
export async function workPaymentEvent(tools: JobTools, payload: Payload): Promise<void> {
  if ('paymentId' in payload) return look(tools, payload);
  const event = await tools.atDoor((ctx) => readUnworked(ctx, payload.eventId));
  if (!event) return;
  await workNotice(tools, noticeOf(event));
  await tools.atDoor((ctx) =>
    ctx.tx.update(paymentEvents).set({ workedAt: ctx.now }).where(eq(paymentEvents.id, payload.eventId)),
  );
}

async function readUnworked(ctx: Ctx, eventId: string): Promise<Stripe.Event | null> {
  const [event] = await ctx.tx
    .select({ payload: paymentEvents.payload })
    .from(paymentEvents)
    .where(and(eq(paymentEvents.id, eventId), isNull(paymentEvents.workedAt)));
  return event ? (event.payload as Stripe.Event) : null;
}

async function workNotice(tools: JobTools, notice: PaymentNotice): Promise<void> {
  switch (notice.about) {
    case 'payment':
    case 'refund':
      return notice.intentId === null ? undefined : workIntent(tools, notice.intentId, notice.metadata);
    case 'account':
      return recordPayoutAccount(tools, notice.accountId);
    case 'payment_method':
      return recordPayingMethod(tools, notice.customer);
    case 'nothing':
      return undefined;
  }
}

async function workIntent(
  tools: JobTools,
  intentId: string,
  metadata: Record<string, string>,
): Promise<void> {
  // Whose it is, is read before the intent is: see `recordIntent`.
  const payment = await tools.atDoor((ctx) => findPayment(ctx, intentId, metadata['payment_id']));
  if (!payment) return;
  const intent = await getPaymentIntent(intentId);
  await tools.inShop(payment.shopId, (ctx) => recordIntent(ctx, payment.id, newsOf(intent)));
}

/** By the intent; while that is not written down yet, by what we gave the intent to carry. */
async function findPayment(ctx: Ctx, intentId: string, paymentId: string | undefined) {
  const columns = { id: payments.id, shopId: payments.shopId };
  const [byIntent] = await ctx.tx.select(columns).from(payments).where(eq(payments.intentId, intentId));
  if (byIntent || !z.uuid().safeParse(paymentId).success) return byIntent ?? null;
  const [byId] = await ctx.tx
    .select(columns)
    .from(payments)
    .where(eq(payments.id, paymentId ?? ''));
  return byId ?? null;
}

/** While nothing is decided, looks again, ever less often. */
async function look(tools: JobTools, payload: Extract<Payload, { paymentId: string }>): Promise<void> {
  const { shopId, paymentId } = payload;
  const before = await tools.inShop(shopId, (ctx) => readPayment(ctx, paymentId));
  if (before?.state !== 'pending' || before.intentId === null) return;
  const intent = await getPaymentIntent(before.intentId);
  await tools.inShop(shopId, async (ctx) => {
    await recordIntent(ctx, paymentId, newsOf(intent));
    const after = await readPayment(ctx, paymentId);
    if (after?.state === 'pending')
      await enqueue(
        ctx,
        workPaymentEventQueue,
        { ...payload, look: payload.look + 1 },
        { startAfter: lookAgainAt(ctx.now, payload.look) },
      );
  });
}

async function readPayment(ctx: Ctx, paymentId: string) {
  const [payment] = await ctx.tx
    .select({ state: payments.state, intentId: payments.intentId })
    .from(payments)
    .where(eq(payments.id, paymentId));
  return payment;
}
