'use client';
import { useKept } from '@/components/portal/use-kept';
import { useMe } from '@/components/session/use-me';
import type { ProvedLine } from '@/lib/certificates/contract';

import { stillCoverable, type PiecesEntered } from './still-coverable';

/** Pieces entered for each line and not signed for yet: kept on this device, for this person, through a reload. */
export function usePiecesEntered(certificateId: string, lines: readonly ProvedLine[]) {
  const who = useMe()?.name ?? '';
  const [kept, keep] = useKept<PiecesEntered>(`pieces:${who}:${certificateId}`);
  const pieces = stillCoverable(kept ?? {}, lines);
  return {
    pieces,
    setPieces: (lineId: string, count: number | null) => keep({ ...pieces, [lineId]: count }),
    setAllPieces: (more: Record<string, number>) => keep({ ...pieces, ...more }),
    forgetPieces: () => keep(null),
  };
}
