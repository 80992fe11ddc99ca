import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { approvals } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { addApproval as addDeclaration, withdrawApproval as withdrawDeclaration } from './contract';
import { getProcessor } from './queries';

export async function addApproval(
  ctx: Ctx,
  { processorId, ...given }: z.output<(typeof addDeclaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  await getProcessor(ctx, { processorId });
  const approvalId = newId();
  await ctx.tx
    .insert(approvals)
    .values({ id: approvalId, shopId: shopOf(ctx), processorId, ...given, createdAt: ctx.now });
  await recordAudit(ctx, {
    action: 'processor.approve',
    entity: 'processor',
    entityId: processorId,
    after: given,
  });
  return { approvalId };
}

/** From this moment nothing more is dispatched under it; the record of what was stays as it is. */
export async function withdrawApproval(
  ctx: Ctx,
  { processorId, approvalId, reason }: z.output<(typeof withdrawDeclaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  const [withdrawn] = await ctx.tx
    .update(approvals)
    .set({ withdrawnAt: ctx.now })
    .where(
      and(
        eq(approvals.id, approvalId),
        eq(approvals.processorId, processorId),
        isNull(approvals.withdrawnAt),
      ),
    )
    .returning({ reference: approvals.reference });
  if (!withdrawn) throw notFound('approval');
  await recordAudit(ctx, {
    action: 'processor.withdraw_approval',
    entity: 'processor',
    entityId: processorId,
    before: { reference: withdrawn.reference },
    after: { reason },
  });
  return { done: true as const };
}
