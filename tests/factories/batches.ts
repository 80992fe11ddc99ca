import { approvals } from '@/db/schema/organisations';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { createBatch } from '@/lib/batches/create-batch';
import { dispatchBatch } from '@/lib/batches/dispatch-batch';
import { setRequirements } from '@/lib/batches/set-requirements';
import { calendarDay, addDays } from '@/lib/day-words';
import { newId } from '@/lib/ids';
import { PROCESSES } from '@/lib/trade/process';
import type { ToProve } from '@/lib/parts/to-prove';

import { makeLot } from './lots';

/** An approval for every process, from a year ago to a year ahead of the context's now. */
export async function makeApproval(
  ctx: Ctx,
  processorId: string,
  given: Partial<typeof approvals.$inferInsert> = {},
) {
  const today = calendarDay(ctx.now, 'UTC');
  const id = newId();
  await ctx.tx.insert(approvals).values({
    id,
    shopId: shopOf(ctx),
    processorId,
    reference: `AP-${id.slice(-4)}`,
    processes: [...PROCESSES],
    validFrom: addDays(today, -365),
    validTo: addDays(today, 365),
    createdAt: ctx.now,
    ...given,
  });
  return id;
}

const hardness: ToProve = {
  characteristic: 'Hardness',
  limit: '63 to 83',
  unit: 'HRB',
  source: 'specification',
  sourceText: 'AMS 2658',
};

interface Given {
  /** Pieces of each lot; a line each. */
  pieces?: readonly number[];
  lots?: readonly Awaited<ReturnType<typeof makeLot>>[];
  unitPriceMinor?: number;
  lotMinimumMinor?: number;
  wantedBackOn?: string | null;
  requirements?: readonly ToProve[];
}

/** A batch being built: a line of 10 pieces at 5.00, hardness to be proved on all lines. Call it as a lead. */
export async function makeBatch(ctx: Ctx, processorId: string, given: Given = {}) {
  const lots = given.lots ? [...given.lots] : [];
  if (!given.lots) for (const pieces of given.pieces ?? [10]) lots.push(await makeLot(ctx, { pieces }));
  const created = await createBatch(ctx, {
    processorId,
    lines: lots.map((lot) => ({
      lotId: lot.id,
      stepId: lot.stepId,
      pieces: lot.pieces,
      unitPriceMinor: given.unitPriceMinor ?? 500,
    })),
    wantedBackOn:
      given.wantedBackOn === undefined ? addDays(calendarDay(ctx.now, 'UTC'), 14) : given.wantedBackOn,
    ...(given.lotMinimumMinor === undefined ? {} : { lotMinimumMinor: given.lotMinimumMinor }),
  });
  const batch = await setRequirements(ctx, {
    batchId: created.id,
    version: created.version,
    lineId: null,
    requirements: [...(given.requirements ?? [hardness])],
  });
  return { ...batch, lots };
}

/** The same, approved and sent. */
export async function makeDispatchedBatch(ctx: Ctx, processorId: string, given: Given = {}) {
  await makeApproval(ctx, processorId);
  const { lots, ...built } = await makeBatch(ctx, processorId, given);
  return { ...(await dispatchBatch(ctx, { batchId: built.id, version: built.version })), lots };
}
