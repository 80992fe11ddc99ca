import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import { ORDER_FACTS, type OrderFact, type OrderItem } from './order-item';

/** How firmly a specification asks. `default` only tells what applies when the order says nothing. */
export type OrderingKind = 'must_state' | 'must_be_agreed' | 'should_state' | 'state_or_default' | 'default';

export interface OrderingAsk {
  readonly item: OrderItem;
  /** Asked only where this is so; left out: always. */
  readonly when?: OrderFact;
  /** What applies when the order says nothing, in words of the trade. */
  readonly otherwise?: string;
}

/** One paragraph of a specification, or what is recalled of it. */
export interface OrderingRow {
  readonly specifications: readonly string[];
  /** The issue it was read in; other issues may ask differently. */
  readonly issue?: string;
  readonly paragraph?: string;
  readonly kind: OrderingKind;
  readonly asks: readonly OrderingAsk[];
}

export interface ChecklistItem extends OrderingAsk {
  readonly kind: OrderingKind;
  readonly issue: string | null;
  readonly paragraph: string | null;
  readonly source: Source;
}

/**
 * What the purchaser must, should or may state when a specification is ordered. A slash sheet asks what its family
 * asks. Where an item is asked twice, the firmer and better sourced asking stands, with any default that is known.
 *
 * @param number as `recogniseSpecification` writes it. @param facts what is so of this order.
 * @returns each item once; refused as `not_known`: nothing is recorded, which does not mean that nothing is asked.
 * @example MIL-DTL-5541: type and class, and what applies without a type: Type I.
 */
export function orderingChecklist(
  table: Table<OrderingRow>,
  number: string,
  facts: readonly OrderFact[],
): Verdict<{ items: readonly ChecklistItem[] }, 'not_known'> {
  const rows = rowsFor(table, number);
  const [first] = rows;
  if (!first) return { ok: false, reason: 'not_known' };
  const items = new Map<OrderItem, ChecklistItem>();
  for (const { asks, kind, issue = null, paragraph = null, source } of rows)
    for (const ask of asks) {
      if (ask.when !== undefined && !facts.includes(ask.when)) continue;
      const one = { ...ask, kind, issue, paragraph, source };
      items.set(ask.item, firmer(items.get(ask.item), one));
    }
  return { ok: true, items: [...items.values()], source: first.source, readFrom: referenceTo(table) };
}

/** What would make the specification ask for more, or otherwise: to be said of an order before its list is whole. */
export const factsAskedFor = (table: Table<OrderingRow>, number: string): OrderFact[] => {
  const asks = rowsFor(table, number).flatMap((row) => row.asks);
  return ORDER_FACTS.filter((fact) => asks.some(({ when }) => when === fact));
};

function rowsFor(table: Table<OrderingRow>, number: string) {
  const family = number.replace(/(^AMS\d+)\/.*/, '$1');
  return table.rows.filter(({ specifications }) =>
    specifications.some((one) => one === number || one === family),
  );
}

const FIRMNESS: readonly OrderingKind[] = [
  'must_state',
  'must_be_agreed',
  'should_state',
  'state_or_default',
  'default',
];

function firmer(one: ChecklistItem | undefined, other: ChecklistItem): ChecklistItem {
  if (!one) return other;
  // What was read for a fact of this order is nearer to it than the general rule.
  const near = ({ when, otherwise }: ChecklistItem) => (when === undefined ? undefined : otherwise);
  const otherwise = near(one) ?? near(other) ?? one.otherwise ?? other.otherwise;
  const rank = ({ kind, source }: ChecklistItem) =>
    2 * FIRMNESS.indexOf(kind) + (source.confidence === 'memory' ? 1 : 0);
  const stands = rank(other) < rank(one) ? other : one;
  return { ...stands, ...(otherwise !== undefined && { otherwise }) };
}
