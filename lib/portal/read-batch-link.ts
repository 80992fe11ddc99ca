import { eq } from 'drizzle-orm';

import { batches, batchLinks } from '@/db/schema/batches';
import { processors, shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken, LINK_ENDS_AT } from '@/lib/auth/identify';
import type { Stage } from '@/lib/batches/stage';
import { specificationWords } from '@/lib/batches/step-asked';

import type { LinkState } from './link-contract';

/** What a link is for. Mail scanners come here too, so it changes nothing. */
export async function readBatchLink(ctx: Ctx, { token }: { token: string }) {
  authorize(ctx, 'public.use');
  const [found] = await ctx.tx
    .select({
      withdrawnAt: batchLinks.withdrawnAt,
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      shop: shops.name,
      shopPhone: shops.phone,
      zone: shops.zone,
      processorId: batches.processorId,
      processor: processors.name,
      stage: batches.stage,
      process: batches.process,
      specification: batches.specification,
      specificationRevision: batches.specificationRevision,
      classType: batches.classType,
      pieces: batches.pieces,
      wantedBackOn: batches.wantedBackOn,
    })
    .from(batchLinks)
    .innerJoin(batches, eq(batches.id, batchLinks.batchId))
    .innerJoin(shops, eq(shops.id, batchLinks.shopId))
    .innerJoin(processors, eq(processors.id, batchLinks.processorId))
    .where(eq(batchLinks.tokenHash, hashToken(token)));
  if (!found) return { state: 'unknown' as const, batch: null };
  const { withdrawnAt, specificationRevision, classType, ...batch } = found;
  return {
    state: stateOf(withdrawnAt, batch.stage),
    batch: {
      ...batch,
      specification: specificationWords({
        specification: batch.specification,
        specificationRevision,
        classType,
      }),
    },
  };
}

function stateOf(withdrawnAt: Date | null, stage: Stage): LinkState {
  if (stage === 'cancelled') return 'cancelled';
  if (withdrawnAt !== null) return 'withdrawn';
  return LINK_ENDS_AT.includes(stage) ? 'settled' : 'open';
}
