import { and, eq, inArray } from 'drizzle-orm';
import type { z } from 'zod';

import { messages } from '@/db/schema/batches';
import { receiptLines, receiptPhotos, receipts } from '@/db/schema/receipts';
import { pieces as namedPieces } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId } from '@/lib/ids';
import { openNonconformance } from '@/lib/nonconformances/open-nonconformance';
import { movePieces, type Spot } from '@/lib/stock/move-pieces';
import { AWAY_PLACES } from '@/lib/stock/places';

import { awayOf, takenFrom, without, type AwayStanding } from './away';
import type { CountIn } from './contract';
import { faultsOfCount } from './faults-of-count';
import { readLineStanding, type LineStanding } from './line-standing';
import { lockSentBatch, type LockedBatch } from './lock-batch';

type Input = z.output<typeof CountIn>;
type Counted = Input['lines'][number];

/**
 * Counts what came back. Good pieces go to quarantine, damaged ones on hold; what is short stays where the ledger has
 * it until somebody decides; what is over is not the shop's and is told to the processor.
 */
export async function countIn(ctx: Ctx, input: Input) {
  authorize(ctx, 'receipt.count');
  const batch = await lockSentBatch(ctx, input.batchId, 'Nothing of it can come back');
  const lines = await readLineStanding(ctx, batch.id);
  refuseFaults(input, lines);
  await refuseUnusablePhotos(ctx, input);

  const counted = input.lines.filter((line) => line.good + line.damaged + line.short + line.over > 0);
  const receiptId = await keepCount(ctx, batch.id, { ...input, lines: counted });
  const opened = [];
  for (const count of counted) {
    const line = lineOf(lines, count);
    opened.push(...(await takeIn(ctx, { batch, line, count })));
  }
  await tellOver(ctx, batch, { lines, counted });

  const sum = (of: 'good' | 'damaged' | 'short' | 'over') => counted.reduce((all, line) => all + line[of], 0);
  await recordAudit(ctx, {
    action: 'receipt.count',
    entity: 'batch',
    entityId: batch.id,
    after: {
      receiptId,
      lines: counted.map(({ lineId, good, damaged, short, over }) => ({
        line: lineOf(lines, { lineId }).lineNo,
        good,
        damaged,
        short,
        over,
      })),
      photos: input.photos.length,
    },
  });
  await refreshStanding(ctx, batch.id);
  return { receiptId, good: sum('good'), damaged: sum('damaged'), nonconformances: opened };
}

function refuseFaults(input: Input, lines: readonly LineStanding[]): void {
  const fields = faultsOfCount(
    input.lines,
    lines.map((line) => ({ ...line, away: awayOf(line) })),
  );
  const [first] = fields;
  if (first)
    throw new AppError(
      'bad_input',
      fields.length === 1
        ? `Not counted in. ${first.message}`
        : `Not counted in: ${fields.length} lines do not add up. Each says why.`,
      { fields },
    );
  if (input.lines.every((line) => line.good + line.damaged + line.short + line.over === 0)) {
    throw new AppError('bad_input', 'Nothing is counted yet. Count at least one line.', {
      fields: [{ field: 'lines.0.good', message: 'Count at least one line.' }],
    });
  }
}

async function refuseUnusablePhotos(ctx: Ctx, { photos }: Input): Promise<void> {
  for (const [at, photo] of photos.entries())
    await requireVerifiedFile(ctx, { fileId: photo.fileId, purpose: 'photo', field: `photos.${at}.fileId` });
}

async function keepCount(ctx: Ctx, batchId: string, input: Input): Promise<string> {
  const receiptId = newId();
  const shopId = shopOf(ctx);
  await ctx.tx.insert(receipts).values({
    id: receiptId,
    shopId,
    batchId,
    receivedAt: ctx.now,
    receivedBy: ctx.actor.name,
    note: input.note || null,
  });
  await ctx.tx.insert(receiptLines).values(
    input.lines.map(({ lineId, good, damaged, short, over, note }) => ({
      shopId,
      receiptId,
      lineId,
      good,
      damaged,
      short,
      over,
      note: note || null,
    })),
  );
  if (input.photos.length > 0)
    await ctx.tx
      .insert(receiptPhotos)
      .values(input.photos.map(({ fileId, lineId }) => ({ shopId, receiptId, lineId, fileId })));
  return receiptId;
}

interface TakingIn {
  batch: LockedBatch;
  line: LineStanding;
  count: Counted;
}

async function takeIn(ctx: Ctx, { batch, line, count }: TakingIn): Promise<{ id: string; number: string }[]> {
  const opened = [];
  let away: AwayStanding = line;
  if (count.good > 0) {
    await bring(ctx, {
      line,
      away,
      pieces: count.good,
      pieceIds: count.goodPieceIds,
      to: { place: 'quarantine', holderId: line.lineId },
    });
    away = without(away, takenFrom(away, count.good));
  }
  const about = { batchId: batch.id, lineId: line.lineId, lotId: line.lotId, coveredPieces: 0 };
  if (count.damaged > 0) {
    const nonconformance = await openNonconformance(ctx, {
      ...about,
      kind: 'damaged',
      pieces: count.damaged,
      what: `Counted in damaged.${count.note ? ` ${count.note}` : ''}`,
    });
    await bring(ctx, {
      line,
      away,
      pieces: count.damaged,
      pieceIds: count.damagedPieceIds,
      to: { place: 'hold', holderId: nonconformance.id },
    });
    opened.push(nonconformance);
  }
  if (count.short > 0)
    opened.push(
      await openNonconformance(ctx, {
        ...about,
        kind: 'short',
        pieces: count.short,
        what: `Not in the delivery that should have held it.${count.note ? ` ${count.note}` : ''}`,
      }),
    );
  return opened;
}

interface Bringing {
  line: LineStanding;
  away: AwayStanding;
  pieces: number;
  pieceIds: readonly string[];
  to: Spot;
}

async function bring(ctx: Ctx, { line, away, pieces, pieceIds, to }: Bringing): Promise<void> {
  const common = { lotId: line.lotId, to, reason: 'received', batchLineId: line.lineId } as const;
  if (!line.serialised) {
    for (const taken of takenFrom(away, pieces))
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
        inArray(namedPieces.id, [...pieceIds]),
        eq(namedPieces.lotId, line.lotId),
        eq(namedPieces.holderId, line.lineId),
        inArray(namedPieces.place, [...AWAY_PLACES]),
      ),
    );
  if (named.length < pieces)
    throw new AppError(
      'conflict',
      `Line ${line.lineNo}, ${line.partNumber}: a ticked serial number is not away any more. Look again, then tick what is here.`,
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

/** What is over belongs to somebody else: the processor finds it in the thread of the batch. */
async function tellOver(
  ctx: Ctx,
  batch: LockedBatch,
  { lines, counted }: { lines: readonly LineStanding[]; counted: readonly Counted[] },
): Promise<void> {
  for (const count of counted.filter((one) => one.over > 0)) {
    const line = lineOf(lines, count);
    await ctx.tx.insert(messages).values({
      shopId: shopOf(ctx),
      batchId: batch.id,
      lineId: line.lineId,
      kind: 'note',
      side: 'shop',
      author: ctx.actor.name,
      body: `Counted ${count.over} over on line ${line.lineNo}, ${line.partNumber}. They are not ours and stay out of our count.${count.note ? ` ${count.note}` : ''}`,
      createdAt: ctx.now,
    });
  }
}

function lineOf(lines: readonly LineStanding[], { lineId }: { lineId: string }): LineStanding {
  const line = lines.find((one) => one.lineId === lineId);
  if (!line) throw new Error('a line that was checked is gone');
  return line;
}
