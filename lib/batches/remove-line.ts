import { and, asc, eq, gt } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines, requirements } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { changeBuilding, refOf } from './change-building';
import { movePackedTo, readPackedLine } from './change-line';
import type { removeLine as declaration } from './contract';
import { refreshStanding } from './refresh-standing';

/** Takes a line out of a batch that is being built; its pieces wait for the step again and the lines below move up. */
export async function removeLine(
  ctx: Ctx,
  { batchId, version, lineId }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version });
  const line = await readPackedLine(ctx, { batchId, lineId });
  await movePackedTo(ctx, line, 0);
  await ctx.tx
    .delete(requirements)
    .where(and(eq(requirements.batchId, batchId), eq(requirements.lineId, lineId)));
  await ctx.tx.delete(batchLines).where(eq(batchLines.id, lineId));
  await moveUp(ctx, batchId, line.lineNo);
  await recordAudit(ctx, {
    action: 'batch.remove_line',
    entity: 'batch',
    entityId: batchId,
    before: { line: line.lineNo, lot: line.lotNumber, pieces: line.pieces },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

/** One by one from the top: two lines may never have the same number, not even for a moment. */
async function moveUp(ctx: Ctx, batchId: string, gap: number): Promise<void> {
  const below = await ctx.tx
    .select({ id: batchLines.id, lineNo: batchLines.lineNo })
    .from(batchLines)
    .where(and(eq(batchLines.batchId, batchId), gt(batchLines.lineNo, gap)))
    .orderBy(asc(batchLines.lineNo));
  for (const line of below)
    await ctx.tx
      .update(batchLines)
      .set({ lineNo: line.lineNo - 1 })
      .where(eq(batchLines.id, line.id));
}
