import { and, eq, isNull, sql } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';

export type Batch = typeof batches.$inferSelect;

/** Which batch, and in which version the person saw it; without a version the change only adds and cannot lose another's. */
export interface SeenBatch {
  batchId: string;
  version?: number | undefined;
}

/**
 * Changes the head of a batch that is still being built and holds its row until the transaction ends, so that lines
 * are changed by one person at a time and never after it left.
 *
 * @throws AppError `not_found`, or `conflict` when it has left, was cancelled or was changed meanwhile.
 */
export async function changeBuilding(
  ctx: Ctx,
  { batchId, version }: SeenBatch,
  set: Partial<typeof batches.$inferInsert> = {},
): Promise<Batch> {
  const [batch] = await ctx.tx
    .update(batches)
    .set({ ...set, version: sql`${batches.version} + 1` })
    .where(
      and(
        eq(batches.id, batchId),
        isNull(batches.dispatchedAt),
        isNull(batches.cancelledAt),
        version === undefined ? sql`true` : eq(batches.version, version),
      ),
    )
    .returning();
  if (batch) return batch;
  throw await whyNot(ctx, batchId);
}

async function whyNot(ctx: Ctx, batchId: string): Promise<AppError> {
  const [now] = await ctx.tx
    .select({ number: batches.number, dispatchedAt: batches.dispatchedAt, cancelledAt: batches.cancelledAt })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!now) return notFound('batch');
  if (now.cancelledAt) return new AppError('conflict', `${now.number} was cancelled. Build a new batch.`);
  if (now.dispatchedAt)
    return new AppError(
      'conflict',
      `${now.number} has left already. Its lines and requirements are frozen; day, note and price change by a re-issue.`,
    );
  return changedMeanwhile('batch');
}

/** What every write of a batch tells: which one, and the version to send with the next change. */
export const refOf = ({ id, number, version }: Batch): { id: string; number: string; version: number } => ({
  id,
  number,
  version,
});
