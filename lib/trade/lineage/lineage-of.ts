import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import type { LineageEvent } from './lineage-event';

export type SourcedEvent = LineageEvent & { readonly source: Source };

/**
 * All that is known to have happened to a specification, by date; what has no date comes first.
 *
 * @param number as `recogniseSpecification` writes it.
 * @returns refused as `not_known`: nothing is recorded, which says nothing about its standing.
 * @example MIL-H-6088: F issued 1981-07-21, G issued 1991-04-01, superseded 1997-07 by AMS-H-6088.
 */
export function lineageOf(
  table: Table<LineageEvent>,
  number: string,
): Verdict<{ events: readonly SourcedEvent[] }, 'not_known'> {
  const events = table.rows
    .filter((row) => row.number === number)
    .toSorted((one, other) => (one.on ?? '').localeCompare(other.on ?? ''));
  const [first] = events;
  if (!first) return { ok: false, reason: 'not_known' };
  return { ok: true, events, source: first.source, readFrom: referenceTo(table) };
}
