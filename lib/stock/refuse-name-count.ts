import { AppError } from '@/lib/errors';

/** Named pieces are counted by their names; a number beside them must say the same. */
export function refuseNameCount({
  pieces,
  pieceIds,
}: {
  pieces: number;
  pieceIds?: readonly string[] | undefined;
}): void {
  if (pieceIds === undefined || new Set(pieceIds).size === pieces) return;
  throw new AppError('bad_input', `${pieceIds.length} pieces are named, but ${pieces} are to move.`, {
    fields: [{ field: 'pieces', message: `Name ${pieces} pieces, each once.` }],
  });
}

/** For `movePieces`, which does not take an undefined one. */
export const byName = (pieceIds: readonly string[] | undefined): { pieceIds?: readonly string[] } =>
  pieceIds === undefined ? {} : { pieceIds };
