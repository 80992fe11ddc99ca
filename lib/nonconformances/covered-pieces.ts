import type { RaisedKind } from './kind';

/** Pieces of one line in quarantine, and how many of them a signature or an authority speaks for. */
export interface QuarantineStanding {
  inQuarantine: number;
  proved: number;
}

/**
 * How many of the pieces that go on hold were already proved; the hold takes that proof away.
 *
 * Papers or a requirement in doubt concern first what nobody signed for yet. Damage has no such preference, so the
 * proved pieces are taken first: more is to be proved again, never less.
 */
export function coveredPiecesOf(
  kind: RaisedKind,
  pieces: number,
  { inQuarantine, proved }: QuarantineStanding,
): number {
  const covered = Math.max(0, Math.min(inQuarantine, proved));
  if (kind === 'damaged') return Math.min(pieces, covered);
  return Math.max(0, pieces - (inQuarantine - covered));
}
