import { and, asc, eq, inArray, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { certificates, decisions } from '@/db/schema/evidence';
import { dispositions, nonconformances } from '@/db/schema/nonconformances';
import { files } from '@/db/schema/files';
import { balances, lots, pieces as namedPieces } from '@/db/schema/lots';
import { processors } from '@/db/schema/organisations';
import { parts } from '@/db/schema/parts';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { awayOf } from '@/lib/receipts/away';
import { readLineStanding } from '@/lib/receipts/line-standing';
import { AWAY_PLACES } from '@/lib/stock/places';

import type { listNonconformances as declaration } from './contract';

const isClosed = sql<boolean>`(${nonconformances.closedAt} is not null)`;
const decided = sql<number>`coalesce((select sum(d.pieces) from dispositions d where d.nonconformance_id = ${nonconformances.id}), 0)::int`;

const rowColumns = {
  id: nonconformances.id,
  number: nonconformances.number,
  kind: nonconformances.kind,
  what: nonconformances.what,
  pieces: nonconformances.pieces,
  decided,
  batchId: nonconformances.batchId,
  batchNumber: batches.number,
  stage: batches.stage,
  processor: processors.name,
  lineNo: batchLines.lineNo,
  partNumber: sql<string>`coalesce(${batchLines.frozen} ->> 'partNumber', ${parts.number})`,
  partName: sql<string>`coalesce(${batchLines.frozen} ->> 'partName', ${parts.name})`,
  lotNumber: lots.number,
  openedBy: nonconformances.openedBy,
  openedAt: nonconformances.openedAt,
  closedAt: nonconformances.closedAt,
};

const rowsOf = (ctx: Ctx) =>
  ctx.tx
    .select(rowColumns)
    .from(nonconformances)
    .innerJoin(batches, eq(batches.id, nonconformances.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(batchLines, eq(batchLines.id, nonconformances.lineId))
    .innerJoin(lots, eq(lots.id, nonconformances.lotId))
    .innerJoin(parts, eq(parts.id, lots.partId));

/** What waits for a decision first. The key of a page says in which of the two halves it ended. */
export async function listNonconformances(
  ctx: Ctx,
  { after, limit, batchId }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'nonconformance.read');
  const rows = await rowsOf(ctx)
    .where(
      and(
        batchId === undefined ? undefined : eq(nonconformances.batchId, batchId),
        after === undefined ? undefined : isAfter(after),
      ),
    )
    .orderBy(isClosed, sql`${nonconformances.id} desc`)
    .limit(limit + 1);
  return toPage(rows, limit, (row) => `${row.closedAt === null ? 'open' : 'closed'}.${row.id}`);
}

function isAfter(key: string): SQL {
  const [half, id] = key.split('.');
  if (id === undefined || !/^[0-9a-f-]{36}$/.test(id)) return sql`false`;
  return half === 'open'
    ? sql`(${isClosed} or ${nonconformances.id} < ${id})`
    : sql`(${isClosed} and ${nonconformances.id} < ${id})`;
}

export async function getNonconformance(ctx: Ctx, { nonconformanceId }: { nonconformanceId: string }) {
  authorize(ctx, 'nonconformance.read');
  const [row] = await rowsOf(ctx).where(eq(nonconformances.id, nonconformanceId));
  if (!row) throw notFound('nonconformance');
  const [more] = await ctx.tx
    .select({
      version: nonconformances.version,
      lineId: nonconformances.lineId,
      lotId: nonconformances.lotId,
      coveredPieces: nonconformances.coveredPieces,
      requirementId: nonconformances.requirementId,
      certificateId: nonconformances.certificateId,
      orderNumber: batches.orderNumber,
    })
    .from(nonconformances)
    .innerJoin(batches, eq(batches.id, nonconformances.batchId))
    .where(eq(nonconformances.id, nonconformanceId));
  const line = (await readLineStanding(ctx, row.batchId)).find((one) => one.lineId === more?.lineId);
  if (!more || !line) throw notFound('nonconformance');
  return {
    ...row,
    version: more.version,
    orderNumber: more.orderNumber,
    lineId: more.lineId,
    coveredPieces: more.coveredPieces,
    partRevision: line.partRevision,
    linePieces: line.pieces,
    serialised: line.serialised,
    away: awayOf(line),
    onHold: await heldFor(ctx, more.lotId, nonconformanceId),
    ...(await evidenceOf(ctx, more)),
    reprocessedBefore: await reprocessedBefore(ctx, more.lotId, line.stepId),
    heldPieces: line.serialised
      ? await namedPiecesOf(
          ctx,
          row.kind === 'short'
            ? { places: AWAY_PLACES, holderId: more.lineId }
            : { places: ['hold'], holderId: nonconformanceId },
        )
      : [],
    dispositions: await dispositionsOf(ctx, nonconformanceId),
  };
}

async function heldFor(ctx: Ctx, lotId: string, nonconformanceId: string): Promise<number> {
  const [held] = await ctx.tx
    .select({ pieces: balances.pieces })
    .from(balances)
    .where(
      and(eq(balances.lotId, lotId), eq(balances.place, 'hold'), eq(balances.holderId, nonconformanceId)),
    );
  return held?.pieces ?? 0;
}

async function evidenceOf(
  ctx: Ctx,
  { requirementId, certificateId }: { requirementId: string | null; certificateId: string | null },
) {
  const [requirement] =
    requirementId === null
      ? []
      : await ctx.tx
          .select({
            characteristic: requirements.characteristic,
            limit: requirements.limit,
            unit: requirements.unit,
          })
          .from(requirements)
          .where(eq(requirements.id, requirementId));
  const [certificate] =
    certificateId === null
      ? []
      : await ctx.tx
          .select({ id: certificates.id, number: certificates.number })
          .from(certificates)
          .where(eq(certificates.id, certificateId));
  const [decision] =
    requirementId === null || certificateId === null
      ? []
      : await ctx.tx
          .select({ stated: decisions.stated })
          .from(decisions)
          .where(and(eq(decisions.requirementId, requirementId), eq(decisions.certificateId, certificateId)));
  return {
    requirement: requirement ? { ...requirement, stated: decision?.stated ?? null } : null,
    certificate: certificate ?? null,
  };
}

async function reprocessedBefore(ctx: Ctx, lotId: string, stepId: string): Promise<number> {
  const { rows } = await ctx.tx.execute<{ times: number }>(
    sql`select count(*)::int as times from movements where lot_id = ${lotId} and reason = 'reprocess' and to_holder_id = ${stepId}`,
  );
  return rows[0]?.times ?? 0;
}

async function namedPiecesOf(
  ctx: Ctx,
  {
    places,
    holderId,
  }: { places: readonly ('hold' | 'quarantine' | (typeof AWAY_PLACES)[number])[]; holderId: string },
) {
  return ctx.tx
    .select({ id: namedPieces.id, serial: namedPieces.serial })
    .from(namedPieces)
    .where(and(eq(namedPieces.holderId, holderId), inArray(namedPieces.place, [...places])))
    .orderBy(asc(namedPieces.serial));
}

async function dispositionsOf(ctx: Ctx, nonconformanceId: string) {
  const rows = await ctx.tx
    .select({
      id: dispositions.id,
      disposition: dispositions.disposition,
      pieces: dispositions.pieces,
      reason: dispositions.reason,
      authority: dispositions.authority,
      fileId: files.id,
      fileName: files.name,
      decidedBy: dispositions.decidedBy,
      decidedAt: dispositions.decidedAt,
    })
    .from(dispositions)
    .leftJoin(files, eq(files.id, dispositions.fileId))
    .where(eq(dispositions.nonconformanceId, nonconformanceId))
    .orderBy(asc(dispositions.decidedAt), asc(dispositions.id));
  return rows.map(({ fileId, fileName, ...row }) => ({
    ...row,
    file: fileId === null || fileName === null ? null : { id: fileId, name: fileName },
  }));
}

/** What of a batch can be held now. */
export async function getRaisable(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'nonconformance.read');
  const [batch] = await ctx.tx.select({ id: batches.id }).from(batches).where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const lines = (await readLineStanding(ctx, batchId)).filter((line) => line.inQuarantine > 0);
  const raisable = [];
  for (const { lineId, lineNo, partNumber, partRevision, lotNumber, serialised, inQuarantine } of lines) {
    const pieces = serialised ? await namedPiecesOf(ctx, { places: ['quarantine'], holderId: lineId }) : [];
    raisable.push({ lineId, lineNo, partNumber, partRevision, lotNumber, serialised, inQuarantine, pieces });
  }
  return { lines: raisable };
}
