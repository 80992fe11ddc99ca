import { and, asc, eq, isNull, sql } from 'drizzle-orm';

import { batches, batchLines, overrides, requirements } from '@/db/schema/batches';
import { lots } from '@/db/schema/lots';
import { approvals, processors, shopProcessors, shops } from '@/db/schema/organisations';
import { parts, routeSteps } from '@/db/schema/parts';
import type { Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import { notFound } from '@/lib/errors';

import type { CheckedLine, CheckFacts } from './check';

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
  const [whole] = await ctx.tx
    .select({ count: sql<number>`count(*)::int` })
    .from(requirements)
    .where(and(eq(requirements.batchId, batchId), isNull(requirements.lineId)));
  return {
    zone,
    now: ctx.now,
    today: calendarDay(ctx.now, zone),
    batch: { ...batch, requirements: whole?.count ?? 0 },
    processor: {
      id: batch.processorId,
      name: head.processorName,
      active: head.active,
      approvals: await readApprovals(ctx, batch.processorId),
    },
    lines: await readLines(ctx, batchId),
  };
}

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
      id: batchLines.id,
      lineNo: batchLines.lineNo,
      unitPriceMinor: batchLines.unitPriceMinor,
      lotNumber: lots.number,
      partNumber: parts.number,
      partRevision: parts.revision,
      supersededAt: parts.supersededAt,
      process: routeSteps.process,
      specification: routeSteps.specification,
      specificationRevision: routeSteps.specificationRevision,
      classType: routeSteps.classType,
      requirements: sql<number>`(select count(*)::int from requirements r where r.line_id = ${batchLines.id})`,
    })
    .from(batchLines)
    .innerJoin(lots, eq(lots.id, batchLines.lotId))
    .innerJoin(parts, eq(parts.id, lots.partId))
    .innerJoin(routeSteps, eq(routeSteps.id, batchLines.stepId))
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  return rows.map(({ process, specification, specificationRevision, classType, supersededAt, ...line }) => ({
    ...line,
    partSuperseded: supersededAt !== null,
    step: { process, specification, specificationRevision, classType },
  }));
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
      createdAt: overrides.createdAt,
    })
    .from(overrides)
    .where(eq(overrides.batchId, batchId))
    .orderBy(asc(overrides.createdAt), asc(overrides.id));
