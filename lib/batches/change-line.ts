import { and, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines } from '@/db/schema/batches';
import { balances, lots } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { movePieces } from '@/lib/stock/move-pieces';

import { changeBuilding, refOf } from './change-building';
import type { changeLine as declaration } from './contract';
import { refreshStanding } from './refresh-standing';

/** Changes pieces, price or load of a line; pieces come from and go back to those that wait for the step. */
export async function changeLine(
  ctx: Ctx,
  { batchId, version, lineId, ...change }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version });
  const before = await readPackedLine(ctx, { batchId, lineId });
  const pieces = change.pieces ?? before.pieces;
  await movePackedTo(ctx, before, pieces);

  const set = {
    pieces,
    unitPriceMinor: change.unitPriceMinor ?? before.unitPriceMinor,
    loadNo: change.loadNo === undefined ? before.loadNo : change.loadNo,
  };
  await ctx.tx.update(batchLines).set(set).where(eq(batchLines.id, lineId));
  await recordAudit(ctx, {
    action: 'batch.change_line',
    entity: 'batch',
    entityId: batchId,
    before: {
      line: before.lineNo,
      lot: before.lotNumber,
      pieces: before.pieces,
      unitPriceMinor: before.unitPriceMinor,
      loadNo: before.loadNo,
    },
    after: { line: before.lineNo, lot: before.lotNumber, ...set },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

export type PackedLine = Awaited<ReturnType<typeof readPackedLine>>;

/** A line of the batch with what else of its lot waits for the same step. */
export async function readPackedLine(ctx: Ctx, { batchId, lineId }: { batchId: string; lineId: string }) {
  const [line] = await ctx.tx
    .select({
      id: batchLines.id,
      lineNo: batchLines.lineNo,
      lotId: batchLines.lotId,
      lotNumber: lots.number,
      stepId: batchLines.stepId,
      pieces: batchLines.pieces,
      unitPriceMinor: batchLines.unitPriceMinor,
      loadNo: batchLines.loadNo,
      waiting: sql<number>`coalesce(${balances.pieces}, 0)::int`,
    })
    .from(batchLines)
    .innerJoin(lots, eq(lots.id, batchLines.lotId))
    .leftJoin(
      balances,
      and(
        eq(balances.lotId, batchLines.lotId),
        eq(balances.place, 'making'),
        eq(balances.holderId, batchLines.stepId),
      ),
    )
    .where(and(eq(batchLines.id, lineId), eq(batchLines.batchId, batchId)));
  if (!line) throw notFound('line');
  return line;
}

/** Brings a packed line to a number of pieces; to none when it is taken out. */
export async function movePackedTo(ctx: Ctx, line: PackedLine, pieces: number): Promise<void> {
  const more = pieces - line.pieces;
  if (more === 0) return;
  const most = line.pieces + line.waiting;
  if (pieces > most) {
    const message = `The lot has ${most}. Enter ${most} or less.`;
    throw new AppError('bad_input', `${line.lotNumber}: ${message}`, {
      fields: [{ field: 'pieces', message }],
    });
  }
  const waiting = { place: 'making', holderId: line.stepId } as const;
  const packed = { place: 'packed', holderId: line.id } as const;
  const way =
    more > 0
      ? ({ from: waiting, to: packed, reason: 'packed' } as const)
      : ({ from: packed, to: waiting, reason: 'unpacked' } as const);
  await movePieces(ctx, { lotId: line.lotId, pieces: Math.abs(more), batchLineId: line.id, ...way });
}
