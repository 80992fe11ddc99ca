import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import { lockSentBatch, type LockedBatch } from '@/lib/receipts/lock-batch';

/**
 * Does something about a batch in its shop's rows. The processor's own eyes look first: another processor's batch, or
 * another than the link's, is not there for them.
 *
 * @param nothing what cannot be once the shop has cancelled it: "Do not work on it".
 */
export async function onBatch<T>(
  ctx: Ctx,
  { batchId, nothing }: { batchId: string; nothing: string },
  work: (inner: Ctx, batch: LockedBatch) => Promise<T>,
): Promise<T> {
  const [seen] = await ctx.tx.select({ shopId: batches.shopId }).from(batches).where(eq(batches.id, batchId));
  if (!seen) throw notFound('batch');
  return inOwningShop(ctx, seen.shopId, async (inner) =>
    work(inner, await lockSentBatch(inner, batchId, nothing)),
  );
}
