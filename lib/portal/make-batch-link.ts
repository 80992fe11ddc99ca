import { randomBytes } from 'node:crypto';

import { batchLinks } from '@/db/schema/batches';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { env } from '@/lib/env';
import { newId } from '@/lib/ids';

/**
 * A new key to one batch for its processor. Only the hash is kept, so an address is told once and a later mail carries
 * a key of its own; all of them open the same page and end together.
 */
export async function makeBatchLink(ctx: Ctx, { batchId, processorId }: { batchId: string; processorId: string }): Promise<{ linkId: string; url: string }> {
  const token = randomBytes(24).toString('base64url');
  const linkId = newId();
  await ctx.tx.insert(batchLinks).values({ id: linkId, shopId: shopOf(ctx), batchId, processorId, tokenHash: hashToken(token), createdAt: ctx.now });
  return { linkId, url: `${env.APP_URL}/b/${token}` };
}
