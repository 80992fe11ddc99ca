import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

import type * as contract from './pay-contract';

/** Lets the pieces of a batch pass the gate although money is open. What is owed stays owed. */
export async function waivePayment(
  ctx: Ctx,
  { batchId, reason }: z.output<(typeof contract.waivePayment)['input']>,
) {
  authorize(ctx, 'payment.waive');
  const { number } = await lockSentBatch(ctx, batchId, 'There is nothing to let pass');
  const [batch] = await ctx.tx
    .select({ waivedAt: batches.paymentWaivedAt })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (batch?.waivedAt) throw new AppError('conflict', `Payment for ${number} is waived already.`);
  await ctx.tx
    .update(batches)
    .set({ paymentWaivedAt: ctx.now, paymentWaivedReason: reason })
    .where(eq(batches.id, batchId));
  await recordAudit(ctx, {
    action: 'batch.waive_payment',
    entity: 'batch',
    entityId: batchId,
    after: { number, reason },
  });
  await refreshStanding(ctx, batchId);
  return { done: true as const };
}
