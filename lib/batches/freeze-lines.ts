import { and, asc, eq } from 'drizzle-orm';

import { batchLines } from '@/db/schema/batches';
import { lots, pieces } from '@/db/schema/lots';
import { parts, routeSteps } from '@/db/schema/parts';
import type { Ctx } from '@/lib/auth/context';

import type { FrozenLine } from './frozen-line';
import { materialWords } from './material-words';

/** Lines of a batch with part, lot and step as they are now. */
export async function readLinesAsTheyAre(ctx: Ctx, batchId: string) {
  const rows = await ctx.tx
    .select({ line: batchLines, lot: lots, part: parts, step: routeSteps })
    .from(batchLines)
    .innerJoin(lots, eq(lots.id, batchLines.lotId))
    .innerJoin(parts, eq(parts.id, lots.partId))
    .innerJoin(routeSteps, eq(routeSteps.id, batchLines.stepId))
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const withSerials = [];
  for (const { line, lot, part, step } of rows) {
    const now: FrozenLine = {
      lotNumber: lot.number,
      partNumber: part.number,
      partRevision: part.revision,
      partName: part.name,
      material: materialWords(part),
      thickness: part.thicknessEntered,
      heat: lot.heat,
      conditionBefore: step.conditionBefore,
      targetCondition: step.targetCondition,
      stepNote: step.note,
      ordering: step.ordering,
      serials: lot.serialised ? await serialsPackedIn(ctx, line.id) : [],
    };
    withSerials.push({ line, now, part });
  }
  return withSerials;
}

async function serialsPackedIn(ctx: Ctx, lineId: string): Promise<string[]> {
  const found = await ctx.tx
    .select({ serial: pieces.serial })
    .from(pieces)
    .where(and(eq(pieces.place, 'packed'), eq(pieces.holderId, lineId)))
    .orderBy(asc(pieces.serial));
  return found.map((piece) => piece.serial);
}

/** Writes into each line what it says at this moment; later changes to part, route or lot do not reach it. */
export async function freezeLines(
  ctx: Ctx,
  batchId: string,
): Promise<{ id: string; lotId: string; pieces: number }[]> {
  const lines = await readLinesAsTheyAre(ctx, batchId);
  for (const { line, now } of lines)
    await ctx.tx.update(batchLines).set({ frozen: now }).where(eq(batchLines.id, line.id));
  return lines.map(({ line }) => ({ id: line.id, lotId: line.lotId, pieces: line.pieces }));
}
