import type { Spot } from '../../layout/passage';

/** One reading of a field, from one place of the document. */
export interface Candidate<Value> {
  readonly value: Value;
  readonly spot: Spot;
  /** 0 to 1: how far this place alone would be believed, before how well it can be read. */
  readonly trust: number;
  readonly unit?: string;
}

export interface Chosen<Value> extends Candidate<Value> {
  /** 0 to 1, after weighing those that agree and those that say otherwise. Not yet calibrated. */
  readonly belief: number;
}

/**
 * The reading that the places of a document speak most for. Places that agree strengthen one another; one that says
 * otherwise weakens it as far as it is to be believed.
 *
 * @param same whether two values are one thing.
 */
export function mostBelieved<Value>(
  candidates: readonly Candidate<Value>[],
  same: (a: Value, b: Value) => boolean = Object.is,
): Chosen<Value> | null {
  const groups: { first: Candidate<Value>; doubt: number }[] = [];
  for (const candidate of [...candidates].sort((a, b) => b.trust - a.trust)) {
    const trust = candidate.trust * (0.4 + 0.6 * candidate.spot.legible);
    const group = groups.find(({ first }) => same(first.value, candidate.value));
    // A second place that says the same was mostly copied from the first: half its word counts.
    if (group) group.doubt *= 1 - trust / 2;
    else groups.push({ first: candidate, doubt: 1 - trust });
  }
  groups.sort((a, b) => a.doubt - b.doubt);
  const [best, other] = groups;
  if (!best) return null;
  const against = other ? 1 - other.doubt : 0;
  return { ...best.first, belief: (1 - best.doubt) * (1 - 0.35 * against) };
}
