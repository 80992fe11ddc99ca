import { and, asc, eq, inArray, isNotNull, notInArray } from 'drizzle-orm';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { approvals, processors, shops } from '@/db/schema/organisations';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { covers } from '@/lib/batches/approval';
import { calendarDay } from '@/lib/day-words';
import type { Order, Requirements } from '@/lib/evidence/order';

import { askedInFigures, type AskedInFigures } from './asked-in-figures';

/** A requirement of the batch with its figures, where it has some. */
export interface AskedRequirement {
  id: string;
  lineNo: number | null;
  characteristic: string;
  figures: AskedInFigures | null;
}

/** A batch as a document from its processor is compared with it. */
export interface BatchOrder {
  batchId: string;
  processorId: string;
  /** Without what must be proved; that differs from line to line. */
  order: Order;
  requirements: AskedRequirement[];
}

/** No paper is awaited for these. */
const WITHOUT_PAPERS = ['building', 'cancelled', 'stocked'] as const;

/** The order of one batch. Null where it was not dispatched yet. */
export async function readBatchOrder(ctx: Ctx, batchId: string): Promise<BatchOrder | null> {
  const [order] = await readOrders(ctx, and(eq(batches.id, batchId), isNotNull(batches.dispatchedAt)));
  return order ?? null;
}

/** The orders of several batches; those that were not dispatched yet are left out. */
export const readBatchOrders = (ctx: Ctx, batchIds: readonly string[]): Promise<BatchOrder[]> =>
  batchIds.length === 0
    ? Promise.resolve([])
    : readOrders(ctx, and(inArray(batches.id, [...batchIds]), isNotNull(batches.dispatchedAt)));

/** Every order that a paper may still come for. */
export const readOpenOrders = (ctx: Ctx): Promise<BatchOrder[]> => readOrders(ctx, isOpen);

/** Those that were given to one processor. */
export const readOpenOrdersOf = (ctx: Ctx, processorId: string): Promise<BatchOrder[]> =>
  readOrders(ctx, and(isOpen, eq(batches.processorId, processorId)));

const isOpen = and(isNotNull(batches.dispatchedAt), notInArray(batches.stage, [...WITHOUT_PAPERS]));

async function readOrders(ctx: Ctx, which: ReturnType<typeof and>): Promise<BatchOrder[]> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const found = await ctx.tx
    .select({ batch: batches, processor: processors.name, address: processors.address })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(which)
    .orderBy(asc(batches.id));
  const ids = found.map(({ batch }) => batch.id);
  if (!shop || ids.length === 0) return [];
  const lines = await ctx.tx
    .select()
    .from(batchLines)
    .where(inArray(batchLines.batchId, ids))
    .orderBy(asc(batchLines.lineNo));
  const approved = await ctx.tx
    .select()
    .from(approvals)
    .where(inArray(approvals.processorId, [...new Set(found.map(({ batch }) => batch.processorId))]))
    .orderBy(asc(approvals.validFrom));
  const asked = await ctx.tx
    .select()
    .from(requirements)
    .where(inArray(requirements.batchId, ids))
    .orderBy(asc(requirements.seq));
  return found.map(({ batch, processor, address }) => {
    const ofBatch = lines.filter((line) => line.batchId === batch.id);
    return {
      batchId: batch.id,
      processorId: batch.processorId,
      order: {
        batch: batch.number,
        po: batch.orderNumber,
        processor: {
          name: processor,
          address,
          approvals: approved
            .filter(({ processorId }) => processorId === batch.processorId)
            .map((one) => approvalOf(one, batch, shop.zone)),
        },
        process: batch.process,
        dispatched: batch.dispatchedAt && calendarDay(batch.dispatchedAt, shop.zone),
        due: batch.wantedBackOn,
        spec: batch.specification,
        spec_rev: batch.specificationRevision,
        class_type: batch.classType,
        requirements: {},
        lines: ofBatch.map(({ lineNo, pieces, frozen }) => ({
          line: lineNo,
          part_number: frozen?.partNumber ?? '',
          rev: frozen?.partRevision ?? null,
          description: frozen?.partName ?? null,
          qty: pieces,
          material: frozen?.material ?? null,
          lot: frozen?.lotNumber ?? null,
          serials: frozen && frozen.serials.length > 0 ? frozen.serials : null,
        })),
      },
      requirements: asked
        .filter((one) => one.batchId === batch.id)
        .map(({ id, lineId, characteristic, limit, unit }) => ({
          id,
          lineNo: ofBatch.find((line) => line.id === lineId)?.lineNo ?? null,
          characteristic,
          figures: askedInFigures({ characteristic, limit, unit }),
        })),
    };
  });
}

/** An approval as the comparison takes it: for the batch's process where its scope takes that in, until it was withdrawn. */
function approvalOf(
  approval: typeof approvals.$inferSelect,
  { process, specification }: Pick<typeof batches.$inferSelect, 'process' | 'specification'>,
  zone: string,
) {
  const { validFrom, validTo, withdrawnAt } = approval;
  const withdrawnOn = withdrawnAt && calendarDay(withdrawnAt, zone);
  return {
    processes: covers(approval, { process, specification }) ? [process] : [],
    valid_from: validFrom,
    valid_to: withdrawnOn !== null && withdrawnOn < validTo ? withdrawnOn : validTo,
  };
}

/** What is asked in figures, requirement by requirement. */
export const figuresOf = ({ requirements }: BatchOrder): Requirements[] =>
  requirements.flatMap(({ figures }) => (figures ? [figures.asked] : []));
