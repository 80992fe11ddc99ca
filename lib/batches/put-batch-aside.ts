import type { z } from 'zod';

import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { changeBuilding, refOf } from './change-building';
import type { putBatchAside as declaration } from './contract';
import { refreshStanding } from './refresh-standing';

/** Puts a batch that is being built aside, or takes it up again. Its pieces stay reserved. */
export async function putBatchAside(
  ctx: Ctx,
  { batchId, version, aside }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version }, { putAsideAt: aside ? ctx.now : null });
  await recordAudit(ctx, {
    action: aside ? 'batch.put_aside' : 'batch.take_up',
    entity: 'batch',
    entityId: batchId,
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}
