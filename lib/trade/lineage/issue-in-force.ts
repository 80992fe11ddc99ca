import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import { cameBy, type LineageEvent } from './lineage-event';

/** Why it is this issue. */
export type IssueBasis = 'named_on_order' | 'in_force_on_date' | 'last_issue_of_ended_document';

export interface IssueInForce {
  readonly revision: string;
  readonly basis: IssueBasis;
  /** Later issues of the same year or month, which may or may not have been out on that day. */
  readonly perhaps: readonly string[];
}

/**
 * The issue of a specification that an order invokes: the one it names; else the one in force on the order's date. Of
 * a document that had ended by then the last issue applies, unless a successor is named.
 *
 * @param asked `revision` as the order names it, or null. @param on the order's date, `YYYY-MM-DD`.
 * @returns refused as `not_known` (no issue is recorded) or `not_issued_by_then`. What is recorded may lack issues:
 *   compare with the publisher's list before relying on it.
 * @example AMS2750 without a letter on an order of 2021-03-01: F. With "Rev E": E.
 */
export function issueInForce(
  table: Table<LineageEvent>,
  asked: { number: string; revision: string | null },
  on: string,
): Verdict<IssueInForce, 'not_known' | 'not_issued_by_then'> {
  const rows = table.rows.filter((row) => row.number === asked.number);
  const issues = rows
    .filter(({ event, revision }) => event === 'issued' && revision !== undefined)
    .toSorted((one, other) => (one.on ?? '').localeCompare(other.on ?? ''));
  const [first] = issues;
  if (!first) return { ok: false, reason: 'not_known' };
  const readFrom = referenceTo(table);
  if (asked.revision !== null) {
    const named = issues.find(({ revision }) => revision === asked.revision);
    const { source } = named ?? first;
    return { ok: true, revision: asked.revision, basis: 'named_on_order', perhaps: [], source, readFrom };
  }
  const last = issues.filter((row) => cameBy(row.on, on) === 'yes').at(-1);
  const perhaps = issues
    .filter((row) => cameBy(row.on, on) === 'perhaps')
    .flatMap(({ revision }) => revision ?? []);
  if (last?.revision === undefined) return { ok: false, reason: 'not_issued_by_then', source: first.source };
  const basis = hadEnded(rows, on) ? 'last_issue_of_ended_document' : 'in_force_on_date';
  return { ok: true, revision: last.revision, basis, perhaps, source: last.source, readFrom };
}

/** Cancelled, withdrawn, renamed or superseded by another number, and not revived since. */
function hadEnded(rows: readonly LineageEvent[], on: string): boolean {
  const past = rows
    .filter((row) => cameBy(row.on, on) === 'yes' && (row.by ?? 'publisher') === 'publisher')
    .toSorted((one, other) => (one.on ?? '').localeCompare(other.on ?? ''));
  const last = past
    .filter(({ event, number, successors = [] }) => {
      const bySameNumber = successors.some((one) => one.number === number);
      return event === 'revived' || (ENDS.has(event) && !bySameNumber);
    })
    .at(-1);
  return last !== undefined && last.event !== 'revived';
}

const ENDS = new Set<LineageEvent['event']>(['cancelled', 'withdrawn', 'renamed', 'superseded']);
