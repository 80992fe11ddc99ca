import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';

import { onBatch } from './on-batch';

/** The work is done, or (a slip of the hand) it is not. */
export async function markDone(ctx: Ctx, { batchId, done }: { batchId: string; done: boolean }) {
  authorize(ctx, 'portal.answer');
  return onBatch(ctx, { batchId, nothing: 'Do not work on it' }, async (inner, { number }) => {
    const [batch] = await inner.tx
      .select({
        acknowledgedAt: batches.acknowledgedAt,
        markedDoneAt: batches.markedDoneAt,
        shippedAt: batches.shippedAt,
      })
      .from(batches)
      .where(eq(batches.id, batchId));
    if (!batch?.acknowledgedAt)
      throw new AppError('conflict', `Say first how many pieces of ${number} you have.`);
    if ((batch.markedDoneAt !== null) === done) return { done: true as const };
    if (!done && batch.shippedAt !== null)
      throw new AppError('conflict', `${number} is on its way back. Report trouble if it should not be.`);
    const markedDoneAt = done ? ctx.now : null;
    await inner.tx.update(batches).set({ markedDoneAt }).where(eq(batches.id, batchId));
    await recordAudit(inner, {
      action: done ? 'batch.mark_done' : 'batch.mark_not_done',
      entity: 'batch',
      entityId: batchId,
      before: { markedDoneAt: batch.markedDoneAt },
      after: { markedDoneAt },
    });
    await refreshStanding(inner, batchId);
    return { done: true as const };
  });
}
