import { and, eq } from 'drizzle-orm';
import { DrizzleQueryError } from 'drizzle-orm/errors';
import { DatabaseError } from 'pg';

import { lots, movements, pieces as namedPieces } from '@/db/schema/lots';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import type { Place } from './places';

/** Why pieces moved. `made` alone brings pieces into being. */
export type MoveReason =
  | 'made'
  | 'packed'
  | 'unpacked'
  | 'dispatched'
  | 'cancelled'
  | 'acknowledged'
  | 'shipped'
  | 'received'
  | 'held'
  | 'released'
  | 'accepted'
  | 'scrapped'
  | 'lost'
  | 'fitted'
  | 'unfitted'
  | 'moved'
  | 'returned_to_processor'
  | 'reprocess'
  | 'found';

export interface Spot {
  place: Place;
  /** Which line, nonconformance, location, assembly or route step: see `PLACES`. */
  holderId: string;
}

export interface Move {
  lotId: string;
  pieces: number;
  /** Null only where the pieces are made. */
  from: Spot | null;
  to: Spot;
  reason: MoveReason;
  batchLineId?: string;
  /** The named pieces, where the lot is serialised; without it the first by serial at `from` are taken. */
  pieceIds?: readonly string[];
  note?: string;
}

/**
 * The one way to change where pieces are. Writes a movement; the database's ledger refuses what is not there.
 *
 * @throws AppError `conflict` when fewer pieces are at `from` than the move takes, naming how it stands.
 */
export async function movePieces(ctx: Ctx, move: Move): Promise<void> {
  if (!Number.isInteger(move.pieces) || move.pieces <= 0)
    throw new AppError('bad_input', 'Enter a whole number of pieces, 1 or more.');
  const [lot] = await ctx.tx
    .select({ number: lots.number, serialised: lots.serialised })
    .from(lots)
    .where(eq(lots.id, move.lotId));
  if (!lot) throw new AppError('not_found', 'This lot belongs to another shop, or it does not exist.');
  const pieceIds = lot.serialised ? (move.pieceIds ?? (await firstBySerial(ctx, move))) : undefined;

  try {
    await ctx.tx.insert(movements).values({
      shopId: shopOf(ctx),
      lotId: move.lotId,
      pieces: move.pieces,
      fromPlace: move.from?.place ?? null,
      fromHolderId: move.from?.holderId ?? null,
      toPlace: move.to.place,
      toHolderId: move.to.holderId,
      pieceIds: pieceIds ? [...pieceIds] : null,
      batchLineId: move.batchLineId ?? null,
      reason: move.reason,
      note: move.note ?? null,
      movedBy: ctx.actor.name,
      movedAt: ctx.now,
    });
  } catch (error) {
    throw isShortage(error)
      ? new AppError(
          'conflict',
          `Lot ${lot.number} has fewer than ${move.pieces} pieces there now. Look again, then enter what there is.`,
        )
      : error;
  }
}

async function firstBySerial(ctx: Ctx, move: Move): Promise<string[]> {
  if (!move.from) throw new AppError('bad_input', 'Name the serial number of each piece.');
  const found = await ctx.tx
    .select({ id: namedPieces.id })
    .from(namedPieces)
    .where(
      and(
        eq(namedPieces.lotId, move.lotId),
        eq(namedPieces.place, move.from.place),
        eq(namedPieces.holderId, move.from.holderId),
      ),
    )
    .orderBy(namedPieces.serial)
    .limit(move.pieces);
  if (found.length < move.pieces)
    throw new AppError('conflict', `Only ${found.length} of the named pieces are there now.`);
  return found.map((piece) => piece.id);
}

function isShortage(error: unknown): boolean {
  const cause = error instanceof DrizzleQueryError ? error.cause : error;
  return cause instanceof DatabaseError && cause.constraint === 'never_negative';
}
