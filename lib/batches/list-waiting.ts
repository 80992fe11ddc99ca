import { and, asc, desc, eq, gt, isNull, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines } from '@/db/schema/batches';
import { balances, lots } from '@/db/schema/lots';
import { approvals, processors, shopProcessors, shops } from '@/db/schema/organisations';
import { parts, routeSteps } from '@/db/schema/parts';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay, dayWords, type Clock } from '@/lib/day-words';
import { computedMassOf, computedSize } from '@/lib/parts/computed-mass';
import { tablesOf } from '@/lib/reference/tables-of';

import { approvalStanding, type Approval, type ApprovalStanding } from './approval';
import { loadsToJoin, loadToJoinWords } from './load-to-join';
import type { LoadLine } from './loads-of-batch';
import { materialWords } from './material-words';
import { readCheckFacts } from './read-check-facts';
import type {
  AskedStep,
  listStepProcessors as processorsDeclaration,
  listWaitingLots as lotsDeclaration,
  WaitingLot,
} from './waiting-contract';

const waits = and(eq(balances.place, 'making'), gt(balances.pieces, 0));

/** Which steps pieces wait for, most pieces first. */
export async function listWaitingSteps(ctx: Ctx) {
  authorize(ctx, 'batch.read');
  const pieces = sql<number>`sum(${balances.pieces})::int`;
  const steps = await ctx.tx
    .select({
      process: routeSteps.process,
      specification: routeSteps.specification,
      specificationRevision: routeSteps.specificationRevision,
      classType: routeSteps.classType,
      lots: sql<number>`count(distinct ${balances.lotId})::int`,
      pieces,
      since: sql<string>`min(${lots.madeOn})`,
    })
    .from(balances)
    .innerJoin(routeSteps, eq(routeSteps.id, balances.holderId))
    .innerJoin(lots, eq(lots.id, balances.lotId))
    .where(waits)
    .groupBy(
      routeSteps.process,
      routeSteps.specification,
      routeSteps.specificationRevision,
      routeSteps.classType,
    )
    .orderBy(desc(pieces), asc(routeSteps.process), asc(routeSteps.specification));
  return { steps: steps.map((step) => ({ ...step, since: new Date(step.since) })) };
}

/** Oldest lot first. Lots that already have a line on `besideBatchId` are changed there, not added again. */
export async function listWaitingLots(
  ctx: Ctx,
  { after, limit, besideBatchId, ...asked }: z.output<(typeof lotsDeclaration)['input']>,
) {
  authorize(ctx, 'batch.read');
  const rows = await ctx.tx
    .select({
      lotId: lots.id,
      stepId: routeSteps.id,
      lotNumber: lots.number,
      partId: parts.id,
      partNumber: parts.number,
      partRevision: parts.revision,
      partName: parts.name,
      supersededAt: parts.supersededAt,
      alloy: parts.alloy,
      clad: parts.clad,
      form: parts.form,
      thickness: parts.thicknessEntered,
      conditionBefore: routeSteps.conditionBefore,
      targetCondition: routeSteps.targetCondition,
      pieces: sql<number>`${balances.pieces}::int`,
      serialised: lots.serialised,
      massG: parts.massG,
      endCondition: parts.endCondition,
      lengthMm: parts.lengthMm,
      widthMm: parts.widthMm,
      heightMm: parts.heightMm,
      thicknessMm: parts.thicknessMm,
      madeCondition: parts.madeCondition,
      madeOn: lots.madeOn,
    })
    .from(balances)
    .innerJoin(routeSteps, eq(routeSteps.id, balances.holderId))
    .innerJoin(lots, eq(lots.id, balances.lotId))
    .innerJoin(parts, eq(parts.id, lots.partId))
    .where(
      and(
        waits,
        isOf(asked),
        besideBatchId === undefined
          ? undefined
          : sql`not exists (select 1 from ${batchLines} l where l.batch_id = ${besideBatchId} and l.lot_id = ${lots.id} and l.step_id = ${routeSteps.id})`,
        after === undefined ? undefined : gt(lots.id, after),
      ),
    )
    .orderBy(asc(lots.id))
    .limit(limit + 1);
  const page = toPage(rows, limit, (row) => row.lotId);
  const tables = await tablesOf(ctx);
  const loadOf = await loadsBeside(ctx, besideBatchId);
  return {
    ...page,
    rows: page.rows.map((row) => ({
      ...row,
      computed: computedSize(computedMassOf(tables, row)),
      material: materialWords(row),
      partSuperseded: row.supersededAt !== null,
      load: loadOf({
        id: row.lotId,
        part: row,
        step: {
          ...row,
          process: asked.process,
          specification: asked.specification,
          specificationRevision: asked.specificationRevision ?? null,
          classType: asked.classType ?? null,
        },
      }),
    })),
  };
}

/** Left out, a part of the step means that the step has none. */
function isOf({ process, specification, specificationRevision, classType }: AskedStep) {
  return and(
    eq(routeSteps.process, process),
    eq(routeSteps.specification, specification),
    specificationRevision === undefined
      ? isNull(routeSteps.specificationRevision)
      : eq(routeSteps.specificationRevision, specificationRevision),
    classType === undefined ? isNull(routeSteps.classType) : eq(routeSteps.classType, classType),
  );
}

/** Which load of a batch a lot could join; none without a batch. */
async function loadsBeside(
  ctx: Ctx,
  batchId: string | undefined,
): Promise<(waiting: LoadLine) => WaitingLot['load']> {
  if (batchId === undefined) return () => null;
  const { tables, lines } = await readCheckFacts(ctx, batchId);
  const toJoin = loadsToJoin(tables, lines);
  return (waiting) => {
    const found = toJoin(waiting);
    return found && { number: found.number, says: loadToJoinWords(found) };
  };
}

/** Every processor the shop works with: those approved for the step today first, the others with the reason. */
export async function listStepProcessors(
  ctx: Ctx,
  { process, specification }: z.output<(typeof processorsDeclaration)['input']>,
) {
  authorize(ctx, 'batch.read');
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const clock = { zone: shop?.zone ?? 'UTC', now: ctx.now };
  const today = calendarDay(ctx.now, clock.zone);
  const all = await ctx.tx
    .select({ processorId: processors.id, name: processors.name })
    .from(shopProcessors)
    .innerJoin(processors, eq(processors.id, shopProcessors.processorId))
    .where(eq(shopProcessors.active, true))
    .orderBy(asc(processors.name));
  const given = await ctx.tx.select().from(approvals);
  const standings = all.map((one) => {
    const standing = approvalStanding(
      given.filter((approval) => approval.processorId === one.processorId) satisfies Approval[],
      { process, specification, on: today },
    );
    return {
      ...one,
      approved: standing.state === 'approved',
      says: standingWords(standing, clock),
      approvalEndsOn: standing.state === 'approved' ? standing.approval.validTo : null,
    };
  });
  return {
    processors: [...standings.filter((one) => one.approved), ...standings.filter((one) => !one.approved)],
  };
}

function standingWords(standing: ApprovalStanding, clock: Clock): string {
  if (standing.state === 'none') return 'not approved for this step';
  const { reference, validFrom, validTo, withdrawnAt } = standing.approval;
  if (standing.state === 'approved') return `approved to ${dayWords(validTo, clock)}, ${reference}`;
  if (standing.state === 'not_yet') return `${reference} begins ${dayWords(validFrom, clock)}`;
  return standing.state === 'expired'
    ? `${reference} ended ${dayWords(validTo, clock)}`
    : `${reference} was withdrawn${withdrawnAt ? ` ${dayWords(withdrawnAt, clock)}` : ''}`;
}
