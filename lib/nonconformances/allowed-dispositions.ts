import type { Place } from '@/lib/stock/places';

import type { Disposition } from './disposition';
import type { NonconformanceKind } from './kind';

/** What a disposition asks for beside a reason, and where the pieces go; null: they stay where they are. */
export interface DispositionRule {
  /** Who may allow it: the engineer or the customer, by name and paper. */
  authority: boolean;
  /** The paper itself. */
  file: boolean;
  to: Place | null;
}

const HELD: Record<Disposition, DispositionRule> = {
  use_as_is: { authority: true, file: false, to: 'quarantine' },
  reprocess: { authority: false, file: false, to: 'making' },
  return_to_processor: { authority: false, file: false, to: 'at_processor' },
  scrap: { authority: false, file: false, to: 'scrapped' },
  concession: { authority: true, file: true, to: 'quarantine' },
};

/** Short pieces are in nobody's hands: they are still to come, or they are written off. */
const SHORT: Partial<Record<Disposition, DispositionRule>> = {
  return_to_processor: { authority: false, file: false, to: null },
  scrap: { authority: false, file: false, to: 'lost' },
};

/** What is over was never the shop's. It only goes back. */
const OVER: Partial<Record<Disposition, DispositionRule>> = {
  return_to_processor: { authority: false, file: false, to: null },
};

export function allowedDispositions(kind: NonconformanceKind): Disposition[] {
  return Object.keys(rulesOf(kind)) as Disposition[];
}

/** The rule of a disposition for a kind, null where that kind does not know it. */
export function ruleOf(kind: NonconformanceKind, disposition: Disposition): DispositionRule | null {
  return rulesOf(kind)[disposition] ?? null;
}

function rulesOf(kind: NonconformanceKind): Partial<Record<Disposition, DispositionRule>> {
  if (kind === 'short') return SHORT;
  return kind === 'over' ? OVER : HELD;
}
