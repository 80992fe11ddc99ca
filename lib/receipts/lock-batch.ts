import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

export type LockedBatch = Awaited<ReturnType<typeof lockSentBatch>>;

/**
 * Holds a batch that has left until the transaction ends, so that two people who count, sign or hold at the same
 * moment do it one after the other, each on what the first left behind.
 *
 * @param nothing what cannot be yet: "Nothing can come back".
 * @throws AppError `conflict` while it has not left, or after it was cancelled.
 */
export async function lockSentBatch(ctx: Ctx, batchId: string, nothing: string) {
  const [batch] = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      processorId: batches.processorId,
      dispatchedAt: batches.dispatchedAt,
      dispatchedBy: batches.dispatchedBy,
      cancelledAt: batches.cancelledAt,
    })
    .from(batches)
    .where(eq(batches.id, batchId))
    .for('update');
  if (!batch) throw notFound('batch');
  if (batch.cancelledAt !== null) throw new AppError('conflict', `${batch.number} is cancelled. ${nothing}.`);
  if (batch.dispatchedAt === null)
    throw new AppError('conflict', `${batch.number} has not left yet. ${nothing}.`);
  return batch;
}
