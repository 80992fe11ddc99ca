import { referenceTo, type Table } from '../table';
import type { Grounds, Verdict } from '../verdict';

import type { OrderFact, OrderItem } from './order-item';
import { orderingChecklist, type ChecklistItem, type OrderingRow } from './ordering-checklist';

/** What orders leave out, by how often it is said. */
export interface MissingItemRow {
  /** 1 is left out most often. */
  readonly rank: number;
  readonly items: readonly OrderItem[];
  /** How many sources say so. */
  readonly saidBy: number;
}

export interface StatedOnOrder {
  readonly stated: readonly OrderItem[];
  /** What is so of this order. */
  readonly facts: readonly OrderFact[];
}

/**
 * What an order to a specification leaves out: items that are missing, and items for which a default then applies,
 * each commonest first.
 *
 * @param tables the ordering information, and what orders leave out most often.
 * @param number as `recogniseSpecification` writes it.
 * @returns `missing` must be asked for before the work starts; `defaulted` says what applies instead. Refused as
 *   `not_known`.
 * @example an order to MIL-DTL-5541 that states only the specification and the quantity misses type and class.
 */
export function missingItems(
  tables: { ordering: Table<OrderingRow>; commonest: Table<MissingItemRow> },
  number: string,
  { stated, facts }: StatedOnOrder,
): Verdict<{ missing: readonly ChecklistItem[]; defaulted: readonly ChecklistItem[] }, 'not_known'> {
  const checklist = orderingChecklist(tables.ordering, number, facts);
  if (!checklist.ok) return checklist;
  const { items, ...answer } = checklist;
  const rank = (item: OrderItem) =>
    tables.commonest.rows.find((row) => row.items.includes(item))?.rank ?? Infinity;
  const open = items
    .filter(({ item }) => !stated.includes(item))
    .toSorted((one, other) => compare(rank(one.item), rank(other.item)));
  const hasDefault = ({ kind, otherwise }: ChecklistItem) =>
    kind === 'default' || (kind === 'state_or_default' && otherwise !== undefined);
  return {
    ...answer,
    missing: open.filter((item) => !hasDefault(item)),
    defaulted: open.filter(hasDefault),
  };
}

/** Infinity less infinity is no number. */
const compare = (one: number, other: number): number => (one === other ? 0 : one - other);

/**
 * What orders of any kind leave out most often and this one does too, commonest first.
 *
 * @example an order without a piece count: `quantity`, which three sources name.
 */
export function commonlyMissing(
  table: Table<MissingItemRow>,
  stated: readonly OrderItem[],
): ({ rank: number; saidBy: number; items: readonly OrderItem[] } & Grounds)[] {
  return table.rows
    .map(({ rank, saidBy, items, source }) => ({
      rank,
      saidBy,
      items: items.filter((item) => !stated.includes(item)),
      source,
      readFrom: referenceTo(table),
    }))
    .filter(({ items }) => items.length > 0)
    .toSorted((one, other) => one.rank - other.rank);
}
