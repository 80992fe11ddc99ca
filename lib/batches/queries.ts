import { and, desc, eq, lt } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { processors } from '@/db/schema/organisations';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import type { listBatches as declaration } from './contract';

/** Newest first; ids are time-ordered, so the id is the key of the page. */
export async function listBatches(ctx: Ctx, { after, limit, stage, processorId }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'batch.read');
  const rows = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      stage: batches.stage,
      processorId: batches.processorId,
      processor: processors.name,
      process: batches.process,
      pieces: batches.pieces,
      piecesBack: batches.piecesBack,
      leavesOn: batches.leavesOn,
      dispatchedAt: batches.dispatchedAt,
      promisedOn: batches.promisedOn,
      wantedBackOn: batches.wantedBackOn,
      lastBackAt: batches.lastBackAt,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(and(after === undefined ? undefined : lt(batches.id, after), stage === undefined ? undefined : eq(batches.stage, stage), processorId === undefined ? undefined : eq(batches.processorId, processorId)))
    .orderBy(desc(batches.id))
    .limit(limit + 1);
  return toPage(rows, limit, (row) => row.id);
}
