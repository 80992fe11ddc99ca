import { nonconformances } from '@/db/schema/nonconformances';
import { recordAudit } from '@/lib/audit/record-audit';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import { nextNumber } from '@/lib/organisations/next-number';

import type { NonconformanceKind } from './kind';

interface Opening {
  batchId: string;
  lineId: string;
  lotId: string;
  kind: NonconformanceKind;
  pieces: number;
  coveredPieces: number;
  what: string;
  requirementId?: string | null;
  certificateId?: string | null;
}

/** Writes a nonconformance in the transaction of the verb that found it; that verb has the permission and moves the pieces. */
export async function openNonconformance(
  ctx: Ctx,
  opening: Opening,
): Promise<{ id: string; number: string }> {
  const id = newId();
  const number = await nextNumber(ctx, 'nonconformance');
  await ctx.tx
    .insert(nonconformances)
    .values({ ...opening, id, number, shopId: shopOf(ctx), openedBy: ctx.actor.name, openedAt: ctx.now });
  const { batchId, lineId, kind, pieces, coveredPieces, what } = opening;
  await recordAudit(ctx, {
    action: 'nonconformance.open',
    entity: 'nonconformance',
    entityId: id,
    after: { number, batchId, lineId, kind, pieces, coveredPieces, what },
  });
  return { id, number };
}
