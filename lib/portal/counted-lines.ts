import { and, eq, inArray } from 'drizzle-orm';

import { pieces as namedPieces } from '@/db/schema/lots';
import type { Ctx } from '@/lib/auth/context';
import { AppError, type FieldError } from '@/lib/errors';
import type { LineStanding } from '@/lib/receipts/line-standing';
import { movePieces, type MoveReason } from '@/lib/stock/move-pieces';
import type { Place } from '@/lib/stock/places';

import type { LineCount } from './contract';

/** One line with how many of it are meant. */
export interface CountedLine {
  line: LineStanding;
  pieces: number;
  serials: readonly string[] | undefined;
}

interface Asked {
  lines: readonly LineStanding[];
  /** How many of a line there can be at most. */
  most: (line: LineStanding) => number;
  /** The refusal where it is more: "The traveller says 16. Enter 16 or less." */
  tooMany: (line: LineStanding, most: number) => string;
}

/** The counts a person gave, line by line; without any, all there can be. Each wrong one is named with its field. */
export function countedLines(
  counts: readonly LineCount[] | undefined,
  { lines, most, tooMany }: Asked,
): CountedLine[] {
  if (counts === undefined)
    return lines
      .map((line) => ({ line, pieces: most(line), serials: undefined }))
      .filter((one) => one.pieces > 0);
  const faults: FieldError[] = [];
  const counted = counts.map(({ lineId, pieces, serials }, at): CountedLine | null => {
    const line = lines.find((one) => one.lineId === lineId);
    const field = `counts.${at}.pieces`;
    if (!line) faults.push({ field: `counts.${at}.lineId`, message: 'This line is not on the batch.' });
    else if (counts.findIndex((one) => one.lineId === lineId) < at)
      faults.push({ field, message: `Line ${line.lineNo} stands here twice. Count it once.` });
    else if (pieces > most(line)) faults.push({ field, message: tooMany(line, most(line)) });
    else if (line.serialised && pieces < most(line) && pieces > 0 && new Set(serials).size !== pieces)
      faults.push({
        field,
        message: `The pieces of line ${line.lineNo} have numbers. Tick the ${pieces} you mean.`,
      });
    return line ? { line, pieces, serials } : null;
  });
  const [first] = faults;
  if (first)
    throw new AppError(
      'bad_input',
      faults.length === 1 ? first.message : 'Some counts cannot be right. Each line says why.',
      { fields: faults },
    );
  return counted.filter((one): one is CountedLine => one !== null && one.pieces > 0);
}

/** Moves what was counted from one place of its line to the next. */
export async function moveCounted(
  ctx: Ctx,
  counted: readonly CountedLine[],
  { from, to, reason }: { from: Place; to: Place; reason: MoveReason },
): Promise<void> {
  for (const { line, pieces, serials } of counted) {
    const holderId = line.lineId;
    const named =
      line.serialised && serials !== undefined
        ? { pieceIds: await pieceIdsOf(ctx, line, { place: from, serials }) }
        : {};
    await movePieces(ctx, {
      lotId: line.lotId,
      pieces,
      from: { place: from, holderId },
      to: { place: to, holderId },
      reason,
      batchLineId: line.lineId,
      ...named,
    });
  }
}

async function pieceIdsOf(
  ctx: Ctx,
  line: LineStanding,
  { place, serials }: { place: Place; serials: readonly string[] },
): Promise<string[]> {
  const found = await ctx.tx
    .select({ id: namedPieces.id })
    .from(namedPieces)
    .where(
      and(
        eq(namedPieces.lotId, line.lotId),
        eq(namedPieces.place, place),
        eq(namedPieces.holderId, line.lineId),
        inArray(namedPieces.serial, [...serials]),
      ),
    );
  if (found.length < serials.length)
    throw new AppError('conflict', `Line ${line.lineNo}: a ticked number is not there any more. Look again.`);
  return found.map((piece) => piece.id);
}

export const sumOf = (counted: readonly CountedLine[]): number =>
  counted.reduce((sum, one) => sum + one.pieces, 0);
