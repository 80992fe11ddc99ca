import type { Disposition } from '@/lib/nonconformances/disposition';
import type { NonconformanceKind } from '@/lib/nonconformances/kind';

interface Choice {
  says: string;
  /** What becomes of the pieces. */
  note: string;
}

const HELD: Record<Disposition, Choice> = {
  use_as_is: { says: 'Use as is', note: 'back to quarantine, proved by the authority you name' },
  reprocess: { says: 'Reprocess', note: 'they wait for the same step again, for a new batch' },
  return_to_processor: {
    says: 'Return to the processor',
    note: 'they go back with this batch and are counted in again',
  },
  scrap: { says: 'Scrap', note: 'they leave the count for good' },
  concession: { says: 'Concession', note: 'back to quarantine, with the paper the customer grants' },
};

const SHORT: Partial<Record<Disposition, Choice>> = {
  return_to_processor: { says: 'Still to come', note: 'the processor has them, or sends them after' },
  scrap: { says: 'Write off', note: 'nobody has them; they are lost' },
};

export function choiceOf(kind: NonconformanceKind, disposition: Disposition): Choice {
  return (kind === 'short' ? SHORT[disposition] : undefined) ?? HELD[disposition];
}

/** What the button says, with the pieces. */
export function buttonWords(kind: NonconformanceKind, disposition: Disposition, pieces: string): string {
  if (kind === 'short') return disposition === 'scrap' ? `Write off ${pieces}` : `Leave ${pieces} to come`;
  const verbs: Record<Disposition, string> = {
    use_as_is: `Use ${pieces} as is`,
    reprocess: `Reprocess ${pieces}`,
    return_to_processor: `Return ${pieces}`,
    scrap: `Scrap ${pieces}`,
    concession: `Accept ${pieces} by concession`,
  };
  return verbs[disposition];
}

/** What was decided, as a word in the record. */
export const doneWords = (kind: NonconformanceKind, disposition: Disposition): string =>
  choiceOf(kind, disposition).says.toLowerCase();
