import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { shopProcessors } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { changedMeanwhile } from '@/lib/errors';

import type { updateProcessor as declaration } from './contract';
import { getProcessor } from './queries';

export async function updateProcessor(
  ctx: Ctx,
  { processorId, version, ...wanted }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  const { contactName, contactEmail, note, active } = await getProcessor(ctx, { processorId });
  const [changed] = await ctx.tx
    .update(shopProcessors)
    .set({ ...wanted, version: version + 1 })
    .where(and(eq(shopProcessors.processorId, processorId), eq(shopProcessors.version, version)))
    .returning({ version: shopProcessors.version });
  if (!changed) throw changedMeanwhile('processor');
  await recordAudit(ctx, {
    action: 'processor.change',
    entity: 'processor',
    entityId: processorId,
    before: { contactName, contactEmail, note, active },
    after: wanted,
  });
  return { version: changed.version };
}
