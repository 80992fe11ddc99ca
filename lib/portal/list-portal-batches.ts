import { and, asc, desc, eq, inArray, lt, notInArray, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines, messages } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { invoices } from '@/db/schema/money';
import { processors, shops } from '@/db/schema/organisations';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import type { Stage } from '@/lib/batches/stage';
import { notFound } from '@/lib/errors';

import { askedWords } from './asked-words';
import type { listPortalBatches as declaration } from './contract';

const FINISHED: Stage[] = ['settled', 'stocked', 'cancelled'];

/** The work list of a processor, over all shops that send it parts. */
export async function listPortalBatches(
  ctx: Ctx,
  { after, limit, shopId, show }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'portal.read');
  const [processor] = await ctx.tx.select({ name: processors.name, zone: processors.zone }).from(processors);
  if (!processor) throw notFound('processor');
  const found = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      stage: batches.stage,
      shopId: batches.shopId,
      shop: shops.name,
      process: batches.process,
      pieces: batches.pieces,
      piecesBack: batches.piecesBack,
      dispatchedAt: batches.dispatchedAt,
      acknowledgedAt: batches.acknowledgedAt,
      wantedBackOn: batches.wantedBackOn,
      promisedOn: batches.promisedOn,
      markedDoneAt: batches.markedDoneAt,
      shippedAt: batches.shippedAt,
      lastBackAt: batches.lastBackAt,
      certificates: sql<number>`(select count(*)::int from ${certificates} where ${certificates.batchId} = ${batches.id} and ${certificates.setAsideAt} is null)`,
      invoices: sql<number>`(select count(*)::int from ${invoices} where ${invoices.batchId} = ${batches.id} and ${invoices.refusedAt} is null)`,
      asksMe: sql<boolean>`exists (select 1 from ${messages} m where m.batch_id = ${batches.id} and m.side = 'shop' and m.kind = 'question' and not exists (select 1 from ${messages} x where x.batch_id = m.batch_id and x.side = 'processor' and x.id > m.id))`,
      answered: sql<boolean>`coalesce((select m.side = 'shop' and m.kind = 'answer' from ${messages} m where m.batch_id = ${batches.id} order by m.id desc limit 1), false)`,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .where(
      and(
        show === 'open' ? notInArray(batches.stage, FINISHED) : inArray(batches.stage, FINISHED),
        shopId === undefined ? undefined : eq(batches.shopId, shopId),
        after === undefined ? undefined : lt(batches.id, after),
      ),
    )
    .orderBy(desc(batches.id))
    .limit(limit + 1);
  const { rows, next } = toPage(found, limit, (row) => row.id);
  const lines = await readFrozen(
    ctx,
    rows.map((row) => row.id),
  );
  return {
    ...{ processor: processor.name, zone: processor.zone, next },
    rows: rows.map(({ process, dispatchedAt, ...row }) => {
      const frozen = lines.filter((line) => line.batchId === row.id).flatMap((line) => line.frozen ?? []);
      return {
        ...row,
        dispatchedAt: dispatchedAt ?? ctx.now,
        asked: askedWords(
          process,
          frozen.map((line) => line.targetCondition),
        ),
        parts: once(frozen.map((line) => line.partName)),
        materials: once(frozen.map((line) => line.material)),
        thicknesses: once(frozen.flatMap((line) => line.thickness ?? [])),
      };
    }),
  };
}

async function readFrozen(ctx: Ctx, batchIds: readonly string[]) {
  if (batchIds.length === 0) return [];
  return ctx.tx
    .select({ batchId: batchLines.batchId, frozen: batchLines.frozen })
    .from(batchLines)
    .where(inArray(batchLines.batchId, [...batchIds]))
    .orderBy(asc(batchLines.lineNo));
}

const once = (words: readonly string[]): string[] => [...new Set(words)];
