import { and, eq, inArray, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines } from '@/db/schema/batches';
import { dispositions, nonconformances } from '@/db/schema/nonconformances';
import { pieces as namedPieces } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId, NO_HOLDER } from '@/lib/ids';
import { awayOf, takenFrom } from '@/lib/receipts/away';
import { readLineStanding, type LineStanding } from '@/lib/receipts/line-standing';
import { lockSentBatch } from '@/lib/receipts/lock-batch';
import { movePieces, type Move, type Spot } from '@/lib/stock/move-pieces';
import { AWAY_PLACES } from '@/lib/stock/places';

import { ruleOf } from './allowed-dispositions';
import type { DisposeNonconformance } from './contract';
import { faultsOfDisposition } from './faults-of-disposition';

type Input = z.output<typeof DisposeNonconformance>;

/** Decides about some or all pieces of a nonconformance. It closes when every piece is decided about. */
export async function disposeNonconformance(ctx: Ctx, input: Input) {
  authorize(ctx, 'nonconformance.disposition');
  const found = await ctx.tx
    .select({ batchId: nonconformances.batchId })
    .from(nonconformances)
    .where(eq(nonconformances.id, input.nonconformanceId));
  if (!found[0]) throw notFound('nonconformance');
  const batch = await lockSentBatch(ctx, found[0].batchId, 'Nothing of it can be decided');
  const { row, line, left } = await readUndecided(ctx, input.nonconformanceId, batch.id);

  if (row.closedAt !== null)
    throw new AppError('conflict', `${row.number} is closed: all ${row.pieces} pieces are decided about.`);
  if (row.version !== input.version) throw changedMeanwhile('nonconformance');
  const fields = faultsOfDisposition(input, {
    kind: row.kind,
    left,
    away: awayOf(line),
    serialised: line.serialised,
  });
  const [first] = fields;
  if (first) throw new AppError('bad_input', `Not decided. ${first.message}`, { fields });
  if (input.fileId !== null) await requireVerifiedFile(ctx, { fileId: input.fileId, purpose: 'concession' });

  const id = newId();
  await ctx.tx.insert(dispositions).values({
    id,
    shopId: shopOf(ctx),
    nonconformanceId: row.id,
    disposition: input.disposition,
    pieces: input.pieces,
    reason: input.reason,
    authority: input.authority || null,
    fileId: input.fileId,
    decidedBy: ctx.actor.name,
    decidedAt: ctx.now,
  });
  const closed = left === input.pieces;
  await ctx.tx
    .update(nonconformances)
    .set({ version: row.version + 1, closedAt: closed ? ctx.now : null })
    .where(eq(nonconformances.id, row.id));
  await movePiecesBy(ctx, input, { nonconformanceId: row.id, kind: row.kind, line });
  await recordAudit(ctx, {
    action: 'nonconformance.dispose',
    entity: 'nonconformance',
    entityId: row.id,
    before: { left },
    after: {
      number: row.number,
      disposition: input.disposition,
      pieces: input.pieces,
      reason: input.reason,
      authority: input.authority || null,
      left: left - input.pieces,
      closed,
    },
  });
  await refreshStanding(ctx, batch.id);
  return { id, left: left - input.pieces, closed };
}

async function readUndecided(ctx: Ctx, nonconformanceId: string, batchId: string) {
  const [row] = await ctx.tx
    .select({
      id: nonconformances.id,
      number: nonconformances.number,
      kind: nonconformances.kind,
      lineId: nonconformances.lineId,
      pieces: nonconformances.pieces,
      closedAt: nonconformances.closedAt,
      version: nonconformances.version,
      decided: sql<number>`coalesce((select sum(d.pieces) from dispositions d where d.nonconformance_id = ${nonconformances.id}), 0)::int`,
    })
    .from(nonconformances)
    .innerJoin(batchLines, eq(batchLines.id, nonconformances.lineId))
    .where(eq(nonconformances.id, nonconformanceId));
  const line = (await readLineStanding(ctx, batchId)).find((one) => one.lineId === row?.lineId);
  if (!row || !line) throw notFound('nonconformance');
  return { row, line, left: row.pieces - row.decided };
}

interface Held {
  nonconformanceId: string;
  kind: Parameters<typeof ruleOf>[0];
  line: LineStanding;
}

async function movePiecesBy(ctx: Ctx, input: Input, { nonconformanceId, kind, line }: Held): Promise<void> {
  const to = ruleOf(kind, input.disposition)?.to ?? null;
  if (to === null) return;
  const common = { lotId: line.lotId, batchLineId: line.lineId, note: input.reason.slice(0, 200) };
  if (to === 'lost') return writeOff(ctx, input, line);
  const spot: Spot = { place: to, holderId: holderIn(to, line) };
  await movePieces(ctx, {
    ...common,
    pieces: input.pieces,
    from: { place: 'hold', holderId: nonconformanceId },
    to: spot,
    reason: REASONS[input.disposition],
    ...(line.serialised ? { pieceIds: input.pieceIds } : {}),
  });
}

const REASONS: Record<Input['disposition'], Move['reason']> = {
  use_as_is: 'accepted',
  concession: 'accepted',
  reprocess: 'reprocess',
  return_to_processor: 'returned_to_processor',
  scrap: 'scrapped',
};

function holderIn(place: Spot['place'], line: LineStanding): string {
  if (place === 'making') return line.stepId;
  return place === 'scrapped' ? NO_HOLDER : line.lineId;
}

/** Short pieces are written off from wherever the ledger last had them. */
async function writeOff(ctx: Ctx, input: Input, line: LineStanding): Promise<void> {
  const common = {
    lotId: line.lotId,
    batchLineId: line.lineId,
    to: { place: 'lost', holderId: NO_HOLDER },
    reason: 'lost',
    note: input.reason.slice(0, 200),
  } as const;
  if (!line.serialised) {
    for (const taken of takenFrom(line, input.pieces))
      await movePieces(ctx, {
        ...common,
        pieces: taken.pieces,
        from: { place: taken.place, holderId: line.lineId },
      });
    return;
  }
  const named = await ctx.tx
    .select({ id: namedPieces.id, place: namedPieces.place })
    .from(namedPieces)
    .where(
      and(
        inArray(namedPieces.id, input.pieceIds),
        eq(namedPieces.holderId, line.lineId),
        inArray(namedPieces.place, [...AWAY_PLACES]),
      ),
    );
  if (named.length < input.pieces)
    throw new AppError(
      'conflict',
      'A ticked serial number is not away any more. Look again, then tick what is missing.',
    );
  for (const place of AWAY_PLACES) {
    const there = named.filter((piece) => piece.place === place).map((piece) => piece.id);
    if (there.length > 0)
      await movePieces(ctx, {
        ...common,
        pieces: there.length,
        pieceIds: there,
        from: { place, holderId: line.lineId },
      });
  }
}
