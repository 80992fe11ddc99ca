import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { processors, shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import { readThread } from './read-thread';

export async function listMessages(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const [batch] = await ctx.tx
    .select({
      number: batches.number,
      dispatchedAt: batches.dispatchedAt,
      other: processors.name,
      zone: shops.zone,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const closed =
    batch.dispatchedAt === null
      ? `${batch.number} has not left yet, so ${batch.other} does not see it.`
      : null;
  return { ...(await readThread(ctx, batchId)), other: batch.other, zone: batch.zone, closed };
}
