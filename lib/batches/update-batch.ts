import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import { changeBuilding, refOf } from './change-building';
import { changesBetween } from './changes-between';
import type { updateBatch as declaration } from './contract';
import { requireOwnProcessor } from './create-batch';
import { refreshStanding } from './refresh-standing';

/** Changes processor, days, prices or note of a batch that is being built. */
export async function updateBatch(
  ctx: Ctx,
  { batchId, version, ...change }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const [before] = await ctx.tx.select().from(batches).where(eq(batches.id, batchId));
  if (!before) throw notFound('batch');
  if (change.processorId !== undefined && change.processorId !== before.processorId)
    await requireOwnProcessor(ctx, change.processorId);

  const given = Object.fromEntries(Object.entries(change).filter(([, value]) => value !== undefined));
  const batch = await changeBuilding(ctx, { batchId, version }, given);
  await recordAudit(ctx, {
    action: 'batch.update',
    entity: 'batch',
    entityId: batchId,
    ...changesBetween(before, batch, Object.keys(given) as (keyof typeof before)[]),
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}
