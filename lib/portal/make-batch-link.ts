import { batchLinks } from '@/db/schema/batches';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { batchLinkToken, batchLinkUrl } from '@/lib/batches/batch-link-token';
import { newId } from '@/lib/ids';

/** A new key to one batch for its processor, beside those that stand. Only its hash is kept. */
export async function makeBatchLink(
  ctx: Ctx,
  { batchId, processorId }: { batchId: string; processorId: string },
): Promise<{ linkId: string; url: string }> {
  const linkId = newId();
  await ctx.tx.insert(batchLinks).values({
    id: linkId,
    shopId: shopOf(ctx),
    batchId,
    processorId,
    tokenHash: hashToken(batchLinkToken(linkId)),
    createdAt: ctx.now,
  });
  return { linkId, url: batchLinkUrl(linkId) };
}
