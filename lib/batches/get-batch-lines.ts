import { and, asc, eq, sql } from 'drizzle-orm';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { balances } from '@/db/schema/lots';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { computedMassOf, computedSize } from '@/lib/parts/computed-mass';
import { tablesOf } from '@/lib/reference/tables-of';

import { readLinesAsTheyAre } from './freeze-lines';

/** Lines and requirements of a batch. What it said when it left, once it left; before, what part, lot and route say now. */
export async function getBatchLines(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const [batch] = await ctx.tx.select({ id: batches.id }).from(batches).where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const lines = await readLinesAsTheyAre(ctx, batchId);
  const waiting = await ctx.tx
    .select({ lineId: batchLines.id, pieces: sql<number>`${balances.pieces}::int` })
    .from(batchLines)
    .innerJoin(
      balances,
      and(
        eq(balances.lotId, batchLines.lotId),
        eq(balances.place, 'making'),
        eq(balances.holderId, batchLines.stepId),
      ),
    )
    .where(eq(batchLines.batchId, batchId));
  const asked = await ctx.tx
    .select({
      id: requirements.id,
      lineId: requirements.lineId,
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
      source: requirements.source,
      sourceText: requirements.sourceText,
      readFrom: requirements.readFrom,
    })
    .from(requirements)
    .where(eq(requirements.batchId, batchId))
    .orderBy(asc(requirements.seq), asc(requirements.id));
  const tables = await tablesOf(ctx);
  return {
    requirements: asked,
    lines: lines.map(({ line, now, part }) => ({
      ...(line.frozen ?? now),
      id: line.id,
      lineNo: line.lineNo,
      lotId: line.lotId,
      stepId: line.stepId,
      partId: part.id,
      pieces: line.pieces,
      waiting: waiting.find((one) => one.lineId === line.id)?.pieces ?? 0,
      unitPriceMinor: line.unitPriceMinor,
      loadNo: line.loadNo,
      massG: part.massG,
      areaMm2: part.areaMm2,
      computed: computedSize(computedMassOf(tables, part)),
    })),
  };
}
