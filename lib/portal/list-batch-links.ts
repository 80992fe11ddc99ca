import { and, desc, eq } from 'drizzle-orm';

import { batches, batchLinks } from '@/db/schema/batches';
import { shopProcessors, shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { LINK_ENDS_AT } from '@/lib/auth/identify';
import { notFound } from '@/lib/errors';

export async function listBatchLinks(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const [batch] = await ctx.tx
    .select({
      stage: batches.stage,
      dispatchedAt: batches.dispatchedAt,
      deskEmail: shopProcessors.contactEmail,
      zone: shops.zone,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .innerJoin(
      shopProcessors,
      and(eq(shopProcessors.shopId, batches.shopId), eq(shopProcessors.processorId, batches.processorId)),
    )
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const links = await ctx.tx
    .select({
      id: batchLinks.id,
      createdAt: batchLinks.createdAt,
      firstOpenedAt: batchLinks.firstOpenedAt,
      withdrawnAt: batchLinks.withdrawnAt,
    })
    .from(batchLinks)
    .where(eq(batchLinks.batchId, batchId))
    .orderBy(desc(batchLinks.id));
  return {
    links,
    deskEmail: batch.deskEmail,
    zone: batch.zone,
    ended: batch.dispatchedAt === null || LINK_ENDS_AT.includes(batch.stage),
  };
}
