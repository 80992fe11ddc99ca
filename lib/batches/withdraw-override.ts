import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { overrides } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import { changeBuilding, refOf } from './change-building';
import type { withdrawOverride as declaration } from './check-contract';
import { refreshStanding } from './refresh-standing';

/** The blocker stops the batch again. That it was let pass stays in the audit trail. */
export async function withdrawOverride(
  ctx: Ctx,
  { batchId, version, overrideId }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.override');
  const batch = await changeBuilding(ctx, { batchId, version });
  const [gone] = await ctx.tx
    .delete(overrides)
    .where(and(eq(overrides.id, overrideId), eq(overrides.batchId, batchId)))
    .returning();
  if (!gone) throw notFound('override');
  await recordAudit(ctx, {
    action: 'batch.withdraw_override',
    entity: 'batch',
    entityId: batchId,
    before: { check: gone.check, subject: gone.subject, reason: gone.reason },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}
