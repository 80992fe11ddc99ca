import type { Source } from '@/lib/trade/source';
import { referenceTo, type Table } from '@/lib/trade/table';

/** What of a published table a shop's own edition stands in for. */
export type OwnTable = Pick<Table<unknown>, 'edition' | 'entry' | 'rows'>;
/** By the id of the published table. */
export type OwnTables = ReadonlyMap<string, OwnTable>;

/**
 * The tables in force: of a group of published tables, however deep it is, the same group with each table that the
 * shop has an edition of its own of replaced by it. Every row's source says which table and edition it stands in, so
 * that whatever is made of the row can record it.
 *
 * @param own whose rows are of the shape that the table of the same id has (`REPLACEABLE` says which).
 */
export function inForce<Group>(published: Group, own: OwnTables): Group {
  return standingIn(published, own) as Group;
}

function standingIn(value: unknown, own: OwnTables): unknown {
  if (Array.isArray(value)) return value.map((one) => standingIn(one, own));
  if (typeof value !== 'object' || value === null) return value;
  // A conversion table says more than its rows: that stays as it is published.
  if (isTable(value)) return naming({ ...value, ...own.get(value.id) });
  return Object.fromEntries(Object.entries(value).map(([key, one]) => [key, standingIn(one, own)]));
}

const isTable = (value: object): value is Table<unknown> =>
  'id' in value && 'edition' in value && 'rows' in value;

/** One source of several rows stays one: answers name each source once. */
function naming(table: Table<unknown>): Table<unknown> {
  const named = new Map<Source, Source>();
  const readFrom = referenceTo(table);
  const sourceIn = (source: Source): Source => {
    const known = named.get(source) ?? { ...source, readFrom };
    named.set(source, known);
    return known;
  };
  return {
    ...table,
    rows: table.rows.map((row) => ({ ...(row as object), source: sourceIn(row.source) })),
  };
}
