import { asc, desc, eq } from 'drizzle-orm';

import { batchDocuments, batches, batchLines, promises, requirements } from '@/db/schema/batches';
import { processors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { specificationWords } from '@/lib/batches/step-asked';
import { notFound } from '@/lib/errors';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import { readLineStanding, type LineStanding } from '@/lib/receipts/line-standing';

import { askedWords } from './asked-words';
import { readPapers } from './read-papers';

/** One batch with all that its processor is to see and do. Read with the processor's own eyes, but for the counts. */
export async function getPortalBatch(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'portal.read');
  const {
    shopId,
    shopName,
    shopPhone,
    zone,
    specification,
    specificationRevision,
    classType,
    process,
    dispatchedAt,
    ...batch
  } = await readHead(ctx, batchId);
  if (dispatchedAt === null) throw notFound('batch');
  const { standing, contactName } = await inOwningShop(ctx, shopId, async (inner) => ({
    standing: await readLineStanding(inner, batchId),
    contactName: await dispatcherName(inner, batchId),
  }));
  const lines = await readLines(ctx, batchId, standing);
  return {
    ...batch,
    dispatchedAt,
    shop: { id: shopId, name: shopName, phone: shopPhone, zone },
    contactName,
    asked: askedWords(
      process,
      lines.map((line) => line.targetCondition),
    ),
    specification: specificationWords({ specification, specificationRevision, classType }),
    lines,
    requirements: await readRequirements(ctx, batchId),
    documents: await readDocuments(ctx, batchId),
    promises: await readPromises(ctx, batchId),
    papers: await readPapers(ctx, { batchId, shopId }),
  };
}

async function readHead(ctx: Ctx, batchId: string) {
  const [head] = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      stage: batches.stage,
      shopId: batches.shopId,
      shopName: shops.name,
      shopPhone: shops.phone,
      zone: shops.zone,
      processor: processors.name,
      process: batches.process,
      specification: batches.specification,
      specificationRevision: batches.specificationRevision,
      classType: batches.classType,
      note: batches.note,
      dispatchedAt: batches.dispatchedAt,
      cancelledAt: batches.cancelledAt,
      wantedBackOn: batches.wantedBackOn,
      acknowledgedAt: batches.acknowledgedAt,
      acknowledgedPieces: batches.acknowledgedPieces,
      promisedOn: batches.promisedOn,
      markedDoneAt: batches.markedDoneAt,
      shippedAt: batches.shippedAt,
      shippedNote: batches.shippedNote,
      pieces: batches.pieces,
      piecesBack: batches.piecesBack,
      lastBackAt: batches.lastBackAt,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(batches.id, batchId));
  if (!head) throw notFound('batch');
  return head;
}

async function dispatcherName(ctx: Ctx, batchId: string): Promise<string | null> {
  const [found] = await ctx.tx
    .select({ name: users.name })
    .from(batches)
    .innerJoin(users, eq(users.id, batches.dispatchedBy))
    .where(eq(batches.id, batchId));
  return found?.name ?? null;
}

async function readLines(ctx: Ctx, batchId: string, standing: readonly LineStanding[]) {
  const lines = await ctx.tx
    .select({
      id: batchLines.id,
      lineNo: batchLines.lineNo,
      pieces: batchLines.pieces,
      loadNo: batchLines.loadNo,
      frozen: batchLines.frozen,
    })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  return lines.map(({ frozen, ...line }) => {
    const where = standing.find((one) => one.lineId === line.id);
    return {
      ...line,
      part: frozen === null ? '' : `${frozen.partNumber} ${frozen.partRevision}`,
      name: frozen?.partName ?? '',
      material: [frozen?.material, frozen?.thickness].filter(Boolean).join(', '),
      lotNumber: frozen?.lotNumber ?? '',
      conditionBefore: frozen?.conditionBefore ?? null,
      targetCondition: frozen?.targetCondition ?? null,
      note: frozen?.stepNote ?? null,
      serials: frozen?.serials ?? [],
      onTheWay: where?.transitOut ?? 0,
      here: where?.atProcessor ?? 0,
      onTheWayBack: where?.transitBack ?? 0,
    };
  });
}

const readRequirements = (ctx: Ctx, batchId: string) =>
  ctx.tx
    .select({
      id: requirements.id,
      lineNo: batchLines.lineNo,
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
      source: requirements.source,
      sourceText: requirements.sourceText,
    })
    .from(requirements)
    .leftJoin(batchLines, eq(batchLines.id, requirements.lineId))
    .where(eq(requirements.batchId, batchId))
    .orderBy(asc(batchLines.lineNo), asc(requirements.seq));

const readDocuments = (ctx: Ctx, batchId: string) =>
  ctx.tx
    .select({
      id: batchDocuments.id,
      kind: batchDocuments.kind,
      documentVersion: batchDocuments.documentVersion,
      statedAt: batchDocuments.statedAt,
      changes: batchDocuments.changes,
      fileId: batchDocuments.fileId,
    })
    .from(batchDocuments)
    .where(eq(batchDocuments.batchId, batchId))
    .orderBy(desc(batchDocuments.documentVersion), asc(batchDocuments.kind));

const readPromises = (ctx: Ctx, batchId: string) =>
  ctx.tx
    .select({
      promisedOn: promises.promisedOn,
      note: promises.note,
      madeBy: promises.madeBy,
      madeAt: promises.madeAt,
    })
    .from(promises)
    .where(eq(promises.batchId, batchId))
    .orderBy(desc(promises.madeAt), desc(promises.id));
