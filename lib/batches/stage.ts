/** The words of a batch's way, in order; `held` and `cancelled` stand beside it. */
export const STAGES = [
  'building',
  'dispatched',
  'at_processor',
  'returned',
  'proved',
  'settled',
  'stocked',
  'held',
  'cancelled',
] as const;
export type Stage = (typeof STAGES)[number];

/** What is known of one batch, read from its records and from the ledger of pieces. */
export interface BatchFacts {
  cancelled: boolean;
  dispatched: boolean;
  acknowledged: boolean;
  openNonconformances: number;
  /** Pieces still on the way out, at the processor or on the way back. */
  piecesAway: number;
  /** Pieces counted in at any receipt. */
  piecesBack: number;
  /** Pieces in quarantine that no signed coverage speaks for. */
  piecesUnproved: number;
  /** Pieces in quarantine or on hold. */
  piecesInCare: number;
  /** Nothing is owed: the invoice is paid, waived, or the order asks for no money. */
  paid: boolean;
}

/**
 * The stage of a batch, from its facts alone.
 *
 * `held` outranks the way, because a person must decide before anything moves on. A batch counts as returned only when
 * nothing of it is away: a part delivery is shown as pieces back, not as a stage.
 */
export function stageOf(facts: BatchFacts): Stage {
  if (facts.cancelled) return 'cancelled';
  if (!facts.dispatched) return 'building';
  if (facts.openNonconformances > 0) return 'held';
  if (facts.piecesAway > 0) return facts.acknowledged || facts.piecesBack > 0 ? 'at_processor' : 'dispatched';
  if (facts.piecesUnproved > 0) return 'returned';
  if (!facts.paid) return 'proved';
  return facts.piecesInCare > 0 ? 'settled' : 'stocked';
}
