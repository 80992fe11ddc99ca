import { and, count, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines } from '@/db/schema/batches';
import { receipts } from '@/db/schema/receipts';
import { balances } from '@/db/schema/lots';
import { invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { queueBatchMail } from '@/lib/portal/queue-batch-mail';
import { withdrawBatchLinks } from '@/lib/portal/withdraw-batch-links';
import { movePieces } from '@/lib/stock/move-pieces';

import { refOf, type Batch } from './change-building';
import type { cancelBatch as declaration } from './paper-contract';
import { refreshStanding } from './refresh-standing';

/** Where the pieces of a batch can be while nothing of it has come back. */
const OUT = ['packed', 'transit_out', 'at_processor', 'transit_back'] as const;

/**
 * Cancels a batch of which nothing came back. Its pieces wait for the step again, wherever they were on their way; its
 * links end; where it had left, the processor is told.
 */
export async function cancelBatch(
  ctx: Ctx,
  { batchId, version, reason }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.dispatch');
  const batch = await takeForCancelling(ctx, { batchId, version, reason });
  await refuseWhereWorkStands(ctx, batch);
  const pieces = await bringBack(ctx, batchId);
  if (batch.dispatchedAt !== null) {
    await withdrawBatchLinks(ctx, { batchId });
    await queueBatchMail(ctx, batchId, { template: 'batch-cancelled', reason });
  }
  await recordAudit(ctx, {
    action: 'batch.cancel',
    entity: 'batch',
    entityId: batchId,
    before: { stage: batch.stage },
    after: { reason, pieces },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

/** Under a condition, as every change of a batch: of cancelling and counting in at the same moment one is told. */
async function takeForCancelling(
  ctx: Ctx,
  { batchId, version, reason }: { batchId: string; version: number; reason: string },
): Promise<Batch> {
  const [taken] = await ctx.tx
    .update(batches)
    .set({ cancelledAt: ctx.now, cancelReason: reason, version: sql`${batches.version} + 1` })
    .where(and(eq(batches.id, batchId), isNull(batches.cancelledAt), eq(batches.version, version)))
    .returning();
  if (taken) return taken;
  const [now] = await ctx.tx
    .select({ number: batches.number, cancelledAt: batches.cancelledAt })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!now) throw notFound('batch');
  throw now.cancelledAt === null
    ? changedMeanwhile('batch')
    : new AppError('conflict', `${now.number} is cancelled already.`);
}

async function refuseWhereWorkStands(ctx: Ctx, { id, number }: Batch): Promise<void> {
  const [received] = await ctx.tx.select({ count: count() }).from(receipts).where(eq(receipts.batchId, id));
  if (received && received.count > 0)
    throw new AppError(
      'conflict',
      `Pieces of ${number} were counted in. It cannot be cancelled any more; hold or scrap what is wrong.`,
    );
  const [invoiced] = await ctx.tx
    .select({ count: count() })
    .from(invoices)
    .where(and(eq(invoices.batchId, id), isNull(invoices.refusedAt)));
  if (invoiced && invoiced.count > 0)
    throw new AppError('conflict', `An invoice stands against ${number}. Refuse it first, then cancel.`);
}

async function bringBack(ctx: Ctx, batchId: string): Promise<number> {
  const out = await ctx.tx
    .select({
      lineId: batchLines.id,
      lotId: batchLines.lotId,
      stepId: batchLines.stepId,
      place: balances.place,
      pieces: balances.pieces,
    })
    .from(batchLines)
    .innerJoin(
      balances,
      and(
        eq(balances.lotId, batchLines.lotId),
        eq(balances.holderId, batchLines.id),
        inArray(balances.place, [...OUT]),
      ),
    )
    .where(and(eq(batchLines.batchId, batchId), sql`${balances.pieces} > 0`));
  for (const { lineId, lotId, stepId, place, pieces } of out) {
    await movePieces(ctx, {
      lotId,
      pieces,
      from: { place, holderId: lineId },
      to: { place: 'making', holderId: stepId },
      reason: 'cancelled',
      batchLineId: lineId,
    });
  }
  return out.reduce((sum, one) => sum + one.pieces, 0);
}
