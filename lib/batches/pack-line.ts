import { and, eq, sql } from 'drizzle-orm';

import { batchLines, requirements } from '@/db/schema/batches';
import { balances, lots } from '@/db/schema/lots';
import { parts, routeSteps } from '@/db/schema/parts';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { movePieces } from '@/lib/stock/move-pieces';

import type { Batch } from './change-building';
import type { NewLine } from './contract';
import { isSameStep, stepWords, type StepAsked } from './step-asked';

/** One step of one lot's part, with how many pieces wait for it. */
export interface WaitingStep extends StepAsked {
  lotId: string;
  lotNumber: string;
  partNumber: string;
  stepId: string;
  toProve: (typeof routeSteps.$inferSelect)['toProve'];
  waiting: number;
}

/** The step of a line to be, with what waits there. `field` is where the person gave it, for the refusal. */
export async function readWaitingStep(
  ctx: Ctx,
  { lotId, stepId }: NewLine,
  field = 'lotId',
): Promise<WaitingStep> {
  const [found] = await ctx.tx
    .select({
      lotId: lots.id,
      lotNumber: lots.number,
      partNumber: parts.number,
      stepId: routeSteps.id,
      process: routeSteps.process,
      specification: routeSteps.specification,
      specificationRevision: routeSteps.specificationRevision,
      classType: routeSteps.classType,
      toProve: routeSteps.toProve,
      waiting: sql<number>`coalesce(${balances.pieces}, 0)::int`,
    })
    .from(lots)
    .innerJoin(parts, eq(parts.id, lots.partId))
    .innerJoin(routeSteps, and(eq(routeSteps.partId, parts.id), eq(routeSteps.id, stepId)))
    .leftJoin(
      balances,
      and(eq(balances.lotId, lots.id), eq(balances.place, 'making'), eq(balances.holderId, routeSteps.id)),
    )
    .where(eq(lots.id, lotId));
  if (!found)
    throw new AppError('bad_input', 'This lot has no such step.', {
      fields: [{ field, message: 'Choose a lot that waits for this step.' }],
    });
  return found;
}

/** Puts pieces of a lot on a batch: from now on they are reserved, and what must be proved comes from the route. */
export async function packLine(
  ctx: Ctx,
  batch: Batch,
  line: NewLine,
  at: { lineNo: number; step: WaitingStep; prefix: string },
): Promise<string> {
  const { step, prefix, lineNo } = at;
  refuseOtherStep(batch, step, prefix);
  refuseMoreThanWaits(step, line.pieces, `${prefix}pieces`);
  await refuseSecondLine(ctx, batch, step, prefix);

  const id = newId();
  const shopId = shopOf(ctx);
  await ctx.tx.insert(batchLines).values({
    id,
    shopId,
    batchId: batch.id,
    lineNo,
    lotId: line.lotId,
    stepId: line.stepId,
    pieces: line.pieces,
    unitPriceMinor: line.unitPriceMinor,
    createdAt: ctx.now,
  });
  if (step.toProve.length > 0) {
    await ctx.tx.insert(requirements).values(
      step.toProve.map((one, seq) => ({
        id: newId(),
        shopId,
        batchId: batch.id,
        lineId: id,
        seq: seq + 1,
        ...one,
      })),
    );
  }
  await movePieces(ctx, {
    lotId: line.lotId,
    pieces: line.pieces,
    from: { place: 'making', holderId: line.stepId },
    to: { place: 'packed', holderId: id },
    reason: 'packed',
    batchLineId: id,
    ...(line.pieceIds ? { pieceIds: line.pieceIds } : {}),
  });
  return id;
}

export function refuseMoreThanWaits(
  { lotNumber, waiting }: Pick<WaitingStep, 'lotNumber' | 'waiting'>,
  pieces: number,
  field: string,
): void {
  if (pieces <= waiting) return;
  const message =
    waiting === 0
      ? 'No piece of this lot waits for this step now.'
      : `The lot has ${waiting}. Enter ${waiting} or less.`;
  throw new AppError('bad_input', `${lotNumber}: ${message}`, { fields: [{ field, message }] });
}

function refuseOtherStep(batch: Batch, step: WaitingStep, prefix: string): void {
  if (isSameStep(batch, step)) return;
  const message = `${step.lotNumber} waits for ${stepWords(step)}; ${batch.number} is ${stepWords(batch)}. Put it on a batch of its own step.`;
  throw new AppError('bad_input', message, { fields: [{ field: `${prefix}lotId`, message }] });
}

async function refuseSecondLine(ctx: Ctx, batch: Batch, step: WaitingStep, prefix: string): Promise<void> {
  const [there] = await ctx.tx
    .select({ lineNo: batchLines.lineNo })
    .from(batchLines)
    .where(
      and(
        eq(batchLines.batchId, batch.id),
        eq(batchLines.lotId, step.lotId),
        eq(batchLines.stepId, step.stepId),
      ),
    );
  if (!there) return;
  const message = `${step.lotNumber} is line ${there.lineNo} of ${batch.number} already. Change its pieces there.`;
  throw new AppError('bad_input', message, { fields: [{ field: `${prefix}lotId`, message }] });
}
