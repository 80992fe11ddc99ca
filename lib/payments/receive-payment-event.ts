import { eq } from 'drizzle-orm';

import { payments, paymentEvents } from '@/db/schema/money';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { enqueue } from '@/lib/jobs/queue';

import { parseWebhook, type PaymentNotice } from './parse-webhook';
import { workPaymentEventQueue } from './work-payment-event-queue';

/**
 * Takes an event of the payment service in: kept as it came, once however often it comes, and queued to be worked in
 * the same transaction. Nothing of it is believed before its signature is checked.
 *
 * @throws AppError `bad_input` for a signature that is not the service's.
 */
export async function receivePaymentEvent(
  ctx: Ctx,
  { body, signature }: { body: string; signature: string | null },
) {
  authorize(ctx, 'public.use');
  const notice = parseWebhook(body, signature);
  const isNews = notice.about !== 'nothing';
  const [first] = await ctx.tx
    .insert(paymentEvents)
    .values({
      id: notice.eventId,
      type: notice.type,
      payload: JSON.parse(body) as unknown,
      receivedAt: ctx.now,
      workedAt: isNews ? null : ctx.now,
    })
    .onConflictDoNothing()
    .returning({ id: paymentEvents.id });
  if (first && isNews)
    await enqueue(ctx, workPaymentEventQueue, { shopId: await shopOf(ctx, notice), eventId: notice.eventId });
  return { done: true as const };
}

/** So that an event that could not be worked shows among the failed jobs of the shop it is about. */
async function shopOf(ctx: Ctx, notice: PaymentNotice): Promise<string | null> {
  if (notice.about !== 'payment' && notice.about !== 'refund') return null;
  if (notice.intentId === null) return null;
  const [known] = await ctx.tx
    .select({ shopId: payments.shopId })
    .from(payments)
    .where(eq(payments.intentId, notice.intentId));
  return known?.shopId ?? null;
}
