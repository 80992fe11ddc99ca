import { and, eq, isNull } from 'drizzle-orm';

import { batches, batchLinks } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

/** Ends all links to a batch. Whoever is on its page by one of them is out with the next thing they do. */
export async function withdrawBatchLinks(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.dispatch');
  const [batch] = await ctx.tx.select({ id: batches.id }).from(batches).where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const withdrawn = await ctx.tx
    .update(batchLinks)
    .set({ withdrawnAt: ctx.now })
    .where(and(eq(batchLinks.batchId, batchId), isNull(batchLinks.withdrawnAt)))
    .returning({ id: batchLinks.id });
  // Pressed a second time there is nothing left to withdraw, which is what was wanted.
  if (withdrawn.length > 0)
    await recordAudit(ctx, {
      action: 'batch.withdraw_links',
      entity: 'batch',
      entityId: batchId,
      after: { links: withdrawn.map((link) => link.id) },
    });
  return { done: true as const };
}
