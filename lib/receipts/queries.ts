import { and, asc, desc, eq, inArray, sql } from 'drizzle-orm';

import { batches, batchLines, batchLinks } from '@/db/schema/batches';
import { receiptLines, receiptPhotos, receipts } from '@/db/schema/receipts';
import { files } from '@/db/schema/files';
import { pieces as namedPieces } from '@/db/schema/lots';
import { processors } from '@/db/schema/organisations';
import { parts, routeSteps } from '@/db/schema/parts';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { AppError, notFound } from '@/lib/errors';
import { AWAY_PLACES } from '@/lib/stock/places';

import { awayOf } from './away';
import { readLineStanding } from './line-standing';
import { readScan } from './read-scan';

/** Which batch a code or a number means. */
export async function findForReceiving(ctx: Ctx, { text }: { text: string }) {
  authorize(ctx, 'receipt.read');
  const scan = readScan(text);
  const found = { batchId: batches.id, number: batches.number, stage: batches.stage };
  const [batch] =
    scan.kind === 'token'
      ? await ctx.tx
          .select(found)
          .from(batches)
          .innerJoin(batchLinks, eq(batchLinks.batchId, batches.id))
          .where(eq(batchLinks.tokenHash, hashToken(scan.token)))
      : await ctx.tx
          .select(found)
          .from(batches)
          .where(
            scan.kind === 'id'
              ? eq(batches.id, scan.id)
              : sql`${batches.number} = ${scan.number} or ${batches.orderNumber} = ${scan.number}`,
          );
  if (!batch)
    throw new AppError(
      'not_found',
      scan.kind === 'number'
        ? `No batch and no order has the number ${scan.number}.`
        : 'This code is of no batch of yours.',
    );
  return batch;
}

export async function getReceiving(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'receipt.read');
  const [batch] = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      stage: batches.stage,
      processor: processors.name,
      process: batches.process,
      pieces: batches.pieces,
      piecesBack: batches.piecesBack,
      dispatchedAt: batches.dispatchedAt,
      shippedAt: batches.shippedAt,
      shippedNote: batches.shippedNote,
      receipts: sql<number>`(select count(*)::int from receipts r where r.batch_id = ${batches.id})`,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const { receipts: count, ...head } = batch;
  const lines = await readLineStanding(ctx, batchId);
  const metals = await metalOfLines(ctx, batchId);
  const awayPieces = await namedAway(
    ctx,
    lines.filter((line) => line.serialised).map((line) => line.lineId),
  );
  return {
    batch: head,
    receipts: count,
    lines: lines.map((line) => ({
      id: line.lineId,
      lineNo: line.lineNo,
      lotNumber: line.lotNumber,
      partNumber: line.partNumber,
      partRevision: line.partRevision,
      partName: line.partName,
      alloy: metals.get(line.lineId)?.alloy ?? '',
      targetCondition: metals.get(line.lineId)?.targetCondition ?? null,
      serialised: line.serialised,
      pieces: line.pieces,
      away: awayOf(line),
      shortOpen: line.shortOpen,
      awayPieces: awayPieces
        .filter((piece) => piece.lineId === line.lineId)
        .map(({ id, serial }) => ({ id, serial })),
    })),
  };
}

/** What the lines are made of, and the condition that their step gives them. */
async function metalOfLines(ctx: Ctx, batchId: string) {
  const rows = await ctx.tx
    .select({ lineId: batchLines.id, alloy: parts.alloy, targetCondition: routeSteps.targetCondition })
    .from(batchLines)
    .innerJoin(routeSteps, eq(routeSteps.id, batchLines.stepId))
    .innerJoin(parts, eq(parts.id, routeSteps.partId))
    .where(eq(batchLines.batchId, batchId));
  return new Map(rows.map((row) => [row.lineId, row]));
}

async function namedAway(ctx: Ctx, lineIds: readonly string[]) {
  if (lineIds.length === 0) return [];
  return ctx.tx
    .select({ id: namedPieces.id, serial: namedPieces.serial, lineId: namedPieces.holderId })
    .from(namedPieces)
    .where(and(inArray(namedPieces.holderId, [...lineIds]), inArray(namedPieces.place, [...AWAY_PLACES])))
    .orderBy(asc(namedPieces.serial));
}

/** The receipts of one batch. Few, so they come whole. */
export async function listReceipts(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'receipt.read');
  const [batch] = await ctx.tx
    .select({ dispatchedAt: batches.dispatchedAt })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const heads = await ctx.tx
    .select()
    .from(receipts)
    .where(eq(receipts.batchId, batchId))
    .orderBy(desc(receipts.receivedAt), desc(receipts.id));
  const standing = await readLineStanding(ctx, batchId);
  const partOf = (lineId: string) => standing.find((line) => line.lineId === lineId)?.partNumber ?? '';
  const counts = await ctx.tx
    .select({
      receiptId: receiptLines.receiptId,
      lineId: receiptLines.lineId,
      lineNo: batchLines.lineNo,
      good: receiptLines.good,
      damaged: receiptLines.damaged,
      short: receiptLines.short,
      over: receiptLines.over,
      note: receiptLines.note,
    })
    .from(receiptLines)
    .innerJoin(batchLines, eq(batchLines.id, receiptLines.lineId))
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const photos = await ctx.tx
    .select({
      receiptId: receiptPhotos.receiptId,
      fileId: receiptPhotos.fileId,
      name: files.name,
      lineNo: batchLines.lineNo,
    })
    .from(receiptPhotos)
    .innerJoin(receipts, eq(receipts.id, receiptPhotos.receiptId))
    .innerJoin(files, eq(files.id, receiptPhotos.fileId))
    .leftJoin(batchLines, eq(batchLines.id, receiptPhotos.lineId))
    .where(eq(receipts.batchId, batchId));
  return {
    dispatched: batch.dispatchedAt !== null,
    away: standing.reduce((all, line) => all + awayOf(line), 0),
    receipts: heads.map(({ id, receivedAt, receivedBy, note }) => ({
      id,
      receivedAt,
      receivedBy,
      note,
      lines: counts
        .filter((one) => one.receiptId === id)
        .map(({ receiptId: _receipt, lineId, ...one }) => ({ ...one, partNumber: partOf(lineId) })),
      photos: photos
        .filter((one) => one.receiptId === id)
        .map(({ fileId, name, lineNo }) => ({ fileId, name, lineNo })),
    })),
  };
}
