import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { movePieces } from '@/lib/stock/move-pieces';
import { statePapers } from '@/lib/travellers/state-papers';

import { changeBuilding, refOf } from './change-building';
import { checkBatch } from './checks';
import { canOverride, type Finding } from './finding';
import type { dispatchBatch as declaration } from './contract';
import { freezeLines } from './freeze-lines';
import { readCheckFacts, readOverrides } from './read-check-facts';
import { refreshStanding } from './refresh-standing';

/**
 * Sends a batch: from here on its lines and requirements are frozen, its papers stated, its pieces on the way and the
 * mail queued. One transaction: all of it happened or none.
 *
 * The batch is taken under a condition (not yet gone, in the version the person saw), so that of two presses one wins
 * and the other is told.
 */
export async function dispatchBatch(ctx: Ctx, { batchId, version }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'batch.dispatch');
  const batch = await changeBuilding(ctx, { batchId, version });
  const stopping = await readStopping(ctx, batchId);
  if (stopping.length > 0) {
    const [first] = stopping;
    throw new AppError(
      'conflict',
      `${batch.number} stays here: ${first?.sentence ?? ''} ${first?.rest ?? ''}`.trim(),
      { extra: { stops: stopping } },
    );
  }

  await ctx.tx
    .update(batches)
    .set({ dispatchedAt: ctx.now, dispatchedBy: personOf(ctx.actor), putAsideAt: null })
    .where(eq(batches.id, batchId));
  const lines = await freezeLines(ctx, batchId);
  const papers = await statePapers(ctx, batchId, { mail: 'dispatch', changes: [] });
  for (const line of lines) {
    await movePieces(ctx, {
      lotId: line.lotId,
      pieces: line.pieces,
      from: { place: 'packed', holderId: line.id },
      to: { place: 'transit_out', holderId: line.id },
      reason: 'dispatched',
      batchLineId: line.id,
    });
  }
  await recordAudit(ctx, {
    action: 'batch.dispatch',
    entity: 'batch',
    entityId: batchId,
    after: {
      number: batch.number,
      orderNumber: batch.orderNumber,
      processorId: batch.processorId,
      pieces: lines.reduce((sum, line) => sum + line.pieces, 0),
      papers,
    },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

/** Blockers that nobody let pass. An override counts only for exactly what it was given for. */
async function readStopping(ctx: Ctx, batchId: string): Promise<Finding[]> {
  const { findings } = checkBatch(await readCheckFacts(ctx, batchId));
  const passed = await readOverrides(ctx, batchId);
  return findings.filter(
    (finding) =>
      finding.level === 'stop' &&
      !(
        canOverride(finding) &&
        passed.some((one) => one.check === finding.code && one.subject === finding.subject)
      ),
  );
}
