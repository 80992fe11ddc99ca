import { and, asc, eq, inArray, isNotNull, isNull, ne, sql } from 'drizzle-orm';

import { batches, batchLines, overrides, requirements } from '@/db/schema/batches';
import { lots, movements } from '@/db/schema/lots';
import { approvals, processors, shopProcessors, shops } from '@/db/schema/organisations';
import { parts, routeSteps } from '@/db/schema/parts';
import type { Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import type { Equipment } from '@/lib/equipment/contract';
import { readEquipment } from '@/lib/equipment/queries';
import { notFound } from '@/lib/errors';
import { tablesOf } from '@/lib/reference/tables-of';

import type { CheckedEquipment, CheckedLine, CheckedPart, CheckFacts } from './check';
import { groupedBy } from './grouped-by';
import { solutionTreatedBefore } from './solution-treated-before';

/** Reads what the checks look at. */
export async function readCheckFacts(ctx: Ctx, batchId: string): Promise<CheckFacts> {
  const [head] = await ctx.tx
    .select({
      batch: batches,
      zone: shops.zone,
      processorName: processors.name,
      active: shopProcessors.active,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(
      shopProcessors,
      and(eq(shopProcessors.shopId, batches.shopId), eq(shopProcessors.processorId, batches.processorId)),
    )
    .where(eq(batches.id, batchId));
  if (!head) throw notFound('batch');
  const { batch, zone } = head;
  const whole = await ctx.tx
    .select({ characteristic: requirements.characteristic })
    .from(requirements)
    .where(and(eq(requirements.batchId, batchId), isNull(requirements.lineId)));
  return {
    zone,
    now: ctx.now,
    today: calendarDay(ctx.now, zone),
    batch: {
      ...batch,
      requirements: whole.length,
      characteristics: whole.map(({ characteristic }) => characteristic),
    },
    processor: {
      id: batch.processorId,
      name: head.processorName,
      active: head.active,
      approvals: await readApprovals(ctx, batch.processorId),
      equipment: (await readEquipment(ctx, batch.processorId)).map(checkedEquipment),
    },
    lines: await readLines(ctx, batchId),
    tables: await tablesOf(ctx),
  };
}

const checkedEquipment = ({
  length,
  width,
  height,
  limit,
  temperatureMin,
  temperatureMax,
  ...said
}: Equipment): CheckedEquipment => ({
  ...said,
  ...{ lengthMm: length.value, widthMm: width.value, heightMm: height.value },
  sizeWords: [length, width, height].map(({ entered }) => entered).join(' × '),
  limitG: limit?.value ?? null,
  limitWords: limit?.entered ?? null,
  temperatureCMin: temperatureMin?.value ?? null,
  temperatureCMax: temperatureMax?.value ?? null,
  temperatureWords: [temperatureMin?.entered, temperatureMax?.entered].filter(Boolean).join(' to '),
});

const readApprovals = (ctx: Ctx, processorId: string) =>
  ctx.tx
    .select({
      reference: approvals.reference,
      processes: approvals.processes,
      specifications: approvals.specifications,
      validFrom: approvals.validFrom,
      validTo: approvals.validTo,
      withdrawnAt: approvals.withdrawnAt,
    })
    .from(approvals)
    .where(eq(approvals.processorId, processorId));

async function readLines(ctx: Ctx, batchId: string): Promise<CheckedLine[]> {
  const rows = await ctx.tx
    .select({
      line: batchLines,
      lotNumber: lots.number,
      partId: lots.partId,
      partNumber: parts.number,
      partRevision: parts.revision,
      partName: parts.name,
      supersededAt: parts.supersededAt,
      characteristics: sql<
        string[]
      >`array(select r.characteristic from requirements r where r.line_id = ${batchLines.id} order by r.seq)`,
    })
    .from(batchLines)
    .innerJoin(lots, eq(lots.id, batchLines.lotId))
    .innerJoin(parts, eq(parts.id, lots.partId))
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const known = await readCheckedParts(ctx, [...new Set(rows.map(({ partId }) => partId))]);
  const treated = await readSolutionTreated(
    ctx,
    batchId,
    rows.map(({ line }) => line),
  );
  return rows.flatMap(({ line, partId, supersededAt, characteristics, ...said }) => {
    const part = known.get(partId);
    const step = part?.route.find(({ id }) => id === line.stepId);
    if (!part || !step) return [];
    const { id, lineNo, stepId, pieces, loadNo, unitPriceMinor } = line;
    return {
      ...said,
      ...{ id, lineNo, stepId, pieces, loadNo, unitPriceMinor },
      partSuperseded: supersededAt !== null,
      part,
      step,
      solutionTreated: treated.get(id) ?? [],
      requirements: characteristics.length,
      characteristics,
    };
  });
}

/** Parts with their routes, by id. */
export async function readCheckedParts(
  ctx: Ctx,
  partIds: readonly string[],
): Promise<Map<string, CheckedPart>> {
  const found = await ctx.tx
    .select()
    .from(parts)
    .where(inArray(parts.id, [...partIds]));
  const steps = await ctx.tx
    .select()
    .from(routeSteps)
    .where(inArray(routeSteps.partId, [...partIds]))
    .orderBy(asc(routeSteps.partId), asc(routeSteps.seq));
  const routes = groupedBy(steps, ({ partId }) => partId);
  return new Map(
    found.map(({ thicknessEntered, lengthEntered, widthEntered, heightEntered, ...part }) => {
      const said = [lengthEntered, widthEntered, heightEntered].filter((one) => one !== null);
      const sizeWords = said.length > 0 ? said.join(' × ') : null;
      return [part.id, { ...part, sizeWords, thickness: thicknessEntered, route: routes.get(part.id) ?? [] }];
    }),
  );
}

/** By line, the solution treatments that its pieces may have had in batches that left and were not cancelled. */
async function readSolutionTreated(
  ctx: Ctx,
  batchId: string,
  lines: readonly (typeof batchLines.$inferSelect)[],
) {
  const lotIds = [...new Set(lines.map(({ lotId }) => lotId))];
  const sent = await ctx.tx
    .select({
      lotId: batchLines.lotId,
      stepId: batchLines.stepId,
      process: batches.process,
      pieces: batchLines.pieces,
    })
    .from(batchLines)
    .innerJoin(batches, eq(batches.id, batchLines.batchId))
    .where(
      and(
        inArray(batchLines.lotId, lotIds),
        ne(batches.id, batchId),
        inArray(batches.process, ['solution_heat_treat', 'solution_heat_treat_and_age']),
        isNotNull(batches.dispatchedAt),
        isNull(batches.cancelledAt),
      ),
    );
  if (sent.length === 0) return new Map<string, ReturnType<typeof solutionTreatedBefore>>();
  const made = await ctx.tx
    .select({ lotId: movements.lotId, pieces: sql<number>`sum(${movements.pieces})::int` })
    .from(movements)
    .where(and(inArray(movements.lotId, lotIds), isNull(movements.fromPlace)))
    .groupBy(movements.lotId);
  const sentOf = groupedBy(sent, ({ lotId }) => lotId);
  const madeOf = new Map(made.map(({ lotId, pieces }) => [lotId, pieces]));
  return new Map(
    lines.map(({ id, lotId, stepId, pieces }) => [
      id,
      solutionTreatedBefore(sentOf.get(lotId) ?? [], { stepId, pieces, made: madeOf.get(lotId) ?? 0 }),
    ]),
  );
}

/** What an admin let pass on this batch, by the finding it names. */
export const readOverrides = (ctx: Ctx, batchId: string) =>
  ctx.tx
    .select({
      id: overrides.id,
      check: overrides.check,
      subject: overrides.subject,
      reason: overrides.reason,
      by: overrides.by,
      readFrom: overrides.readFrom,
      createdAt: overrides.createdAt,
    })
    .from(overrides)
    .where(eq(overrides.batchId, batchId))
    .orderBy(asc(overrides.createdAt), asc(overrides.id));
