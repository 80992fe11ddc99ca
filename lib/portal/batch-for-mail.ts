import { and, asc, eq } from 'drizzle-orm';

import { batches, batchLines } from '@/db/schema/batches';
import { processors, shopProcessors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { specificationWords } from '@/lib/batches/step-asked';
import { notFound } from '@/lib/errors';

import { askedWords } from './asked-words';

/** All that mails say of a batch, read in the shop. */
export async function batchForMail(ctx: Ctx, batchId: string) {
  const [batch] = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      processorId: batches.processorId,
      process: batches.process,
      specification: batches.specification,
      specificationRevision: batches.specificationRevision,
      classType: batches.classType,
      note: batches.note,
      wantedBackOn: batches.wantedBackOn,
      pieces: batches.pieces,
      stage: batches.stage,
      dispatchedBy: batches.dispatchedBy,
      shop: shops.name,
      shopPhone: shops.phone,
      zone: shops.zone,
      processor: processors.name,
      deskEmail: shopProcessors.contactEmail,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(
      shopProcessors,
      and(eq(shopProcessors.shopId, batches.shopId), eq(shopProcessors.processorId, batches.processorId)),
    )
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const lines = await ctx.tx
    .select({
      lineNo: batchLines.lineNo,
      loadNo: batchLines.loadNo,
      pieces: batchLines.pieces,
      frozen: batchLines.frozen,
    })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const [dispatcher] =
    batch.dispatchedBy === null
      ? []
      : await ctx.tx
          .select({ name: users.name, email: users.email })
          .from(users)
          .where(eq(users.id, batch.dispatchedBy));
  const contactName = dispatcher?.name ?? (batch.shopPhone === null ? null : batch.shop);
  return {
    ...batch,
    lines,
    pieces: lines.reduce((sum, line) => sum + line.pieces, 0),
    dispatcherEmail: dispatcher?.email ?? null,
    contact: contactName === null ? null : { name: contactName, phone: batch.shopPhone },
    asked: askedWords(
      batch.process,
      lines.map((line) => line.frozen?.targetCondition ?? null),
    ),
    specificationWords: specificationWords(batch),
  };
}
export type BatchForMail = Awaited<ReturnType<typeof batchForMail>>;
