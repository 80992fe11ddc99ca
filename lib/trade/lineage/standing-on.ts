import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import { cameBy, type Authority, type LineageEvent, type LineageEventKind } from './lineage-event';

/** Events after which a document stands differently. */
const STANDINGS: readonly LineageEventKind[] = [
  'issued',
  'adopted',
  'listed_active',
  'current',
  'noncurrent',
  'stabilized',
  'revived',
  'renamed',
  'superseded',
  'withdrawn',
  'cancelled',
];

/**
 * How a document stood on a day in the eyes of one authority: its last dated event until then. A standing can move
 * backwards (cancelled, later revived), and two authorities can disagree for years.
 *
 * @param on the day, `YYYY-MM-DD`. @param by whose list is asked.
 * @returns the event and its date; `perhaps` holds what may have happened by then, its date being known only roughly
 *   or not at all. Refused as `not_known`, or `nothing_by_then`.
 * @example AMS-C-26074 was cancelled on 2012-01-01 and stabilized on 2014-01-01.
 */
export function standingOn(
  table: Table<LineageEvent>,
  number: string,
  { on, by }: { on: string; by: Authority },
): Verdict<
  {
    standing: LineageEventKind;
    since: string;
    revision: string | null;
    perhaps: readonly LineageEventKind[];
  },
  'not_known' | 'nothing_by_then'
> {
  const rows = table.rows.filter((row) => row.number === number && (row.by ?? 'publisher') === by);
  const [known] = rows;
  if (!known) return { ok: false, reason: 'not_known' };
  const changes = rows.filter(({ event }) => STANDINGS.includes(event));
  const [last] = changes
    .filter((row) => cameBy(row.on, on) === 'yes')
    // Of two on one date the later in the table is the later.
    .toSorted((one, other) => (one.on ?? '').localeCompare(other.on ?? ''))
    .slice(-1);
  if (last?.on === undefined) return { ok: false, reason: 'nothing_by_then', source: known.source };
  return {
    ok: true,
    standing: last.event,
    since: last.on,
    revision: last.revision ?? null,
    perhaps: changes.filter((row) => cameBy(row.on, on) === 'perhaps').map(({ event }) => event),
    source: last.source,
    readFrom: referenceTo(table),
  };
}
