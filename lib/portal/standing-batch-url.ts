import { and, desc, eq, isNull } from 'drizzle-orm';

import { batchLinks } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { batchLinkToken, batchLinkUrl } from '@/lib/batches/batch-link-token';

import { makeBatchLink } from './make-batch-link';

/**
 * The address that a mail about the batch carries: its newest standing link. Null where the shop has withdrawn them
 * all, because a mail must not give back what was taken away.
 */
export async function standingBatchUrl(
  ctx: Ctx,
  { batchId, processorId }: { batchId: string; processorId: string },
): Promise<string | null> {
  const standing = await ctx.tx
    .select({ id: batchLinks.id, tokenHash: batchLinks.tokenHash })
    .from(batchLinks)
    .where(and(eq(batchLinks.batchId, batchId), isNull(batchLinks.withdrawnAt)))
    .orderBy(desc(batchLinks.id));
  if (standing.length === 0) return null;
  // After a change of the installation's secret the key of an old link can no longer be said, only recognised.
  const known = standing.find((link) => link.tokenHash === hashToken(batchLinkToken(link.id)));
  return known ? batchLinkUrl(known.id) : (await makeBatchLink(ctx, { batchId, processorId })).url;
}
