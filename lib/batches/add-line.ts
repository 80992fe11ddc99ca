import { count, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { changeBuilding, refOf, type Batch } from './change-building';
import type { addLine as declaration } from './contract';
import { packLine, readWaitingStep, type WaitingStep } from './pack-line';
import { refreshStanding } from './refresh-standing';

/** Puts pieces of a lot on the batch. They leave the waiting ones at once, so that no second batch can count on them. */
export async function addLine(ctx: Ctx, { batchId, ...line }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId });
  const step = await readWaitingStep(ctx, line);
  const [held] = await ctx.tx
    .select({ lines: count(), last: sql<number>`coalesce(max(${batchLines.lineNo}), 0)::int` })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId));
  const fitting = held && held.lines > 0 ? batch : await takeStepOf(ctx, batch, step);
  const lineNo = (held?.last ?? 0) + 1;
  const lineId = await packLine(ctx, fitting, line, { lineNo, step, prefix: '' });
  await recordAudit(ctx, {
    action: 'batch.add_line',
    entity: 'batch',
    entityId: batchId,
    after: { line: lineNo, lot: step.lotNumber, part: step.partNumber, pieces: line.pieces },
  });
  await refreshStanding(ctx, batchId);
  return { ...refOf(batch), lineId };
}

/** An empty batch is of no step yet: the next lot decides again. */
async function takeStepOf(
  ctx: Ctx,
  batch: Batch,
  { process, specification, specificationRevision, classType }: WaitingStep,
): Promise<Batch> {
  const step = { process, specification, specificationRevision, classType };
  await ctx.tx.update(batches).set(step).where(eq(batches.id, batch.id));
  return { ...batch, ...step };
}
