import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { Verdict } from '../verdict';

import type { Authority, Coverage, LineageEvent, LineageEventKind, Successor } from './lineage-event';

export interface SuccessorFound extends Successor {
  /** What it follows: the number asked for, or a successor of it. */
  readonly after: string;
  readonly by: Authority;
  readonly event: LineageEventKind;
  /** As exactly as it is known; null where no date was found. */
  readonly on: string | null;
  readonly source: Source;
  /** Nothing is known to follow it. */
  readonly last: boolean;
}

/**
 * What took the place of a specification, followed to the end. One number may have become several, by product: then the
 * number alone does not say which one applies.
 *
 * @param covers what the order is for; null keeps every branch.
 * @returns the successors in the order in which they are met, those of the number asked for first; `forks` where more
 *   than one is left at the end. Alternatives are no successors. Refused as `not_known` or `none_known`.
 * @example MIL-H-6088 for parts: AMS-H-6088 (1997-07), then AMS2770 (2000-07).
 */
export function successorsOf(
  table: Table<LineageEvent>,
  number: string,
  covers: Coverage | null,
): Verdict<{ successors: readonly SuccessorFound[]; forks: boolean }, 'not_known' | 'none_known'> {
  const [known] = table.rows.filter((row) => row.number === number);
  if (!known) return { ok: false, reason: 'not_known' };
  const seen = new Set([number]);
  const found: SuccessorFound[] = [];
  let after = [number];
  while (after.length > 0) {
    const next = after
      .flatMap((one) => directSuccessors(table, one, covers))
      .filter((one) => !seen.has(one.number));
    const fresh = next.filter((one, index) => next.findIndex((same) => same.number === one.number) === index);
    for (const one of fresh) seen.add(one.number);
    found.push(...fresh);
    after = fresh.map((one) => one.number);
  }
  const [first] = found;
  if (!first) return { ok: false, reason: 'none_known', source: known.source };
  const forks = found.filter(({ last }) => last).length > 1;
  return { ok: true, successors: found, forks, source: first.source, readFrom: referenceTo(table) };
}

/** A later issue of the same number is no other document; it is found by `issueInForce`. */
function directSuccessors(
  table: Table<LineageEvent>,
  number: string,
  covers: Coverage | null,
): SuccessorFound[] {
  return table.rows
    .filter((row) => row.number === number && row.event !== 'alternative')
    .flatMap(({ successors = [], event, on, by, source }) =>
      successors
        .filter((one) => one.number !== number)
        .filter((one) => covers === null || one.covers === undefined || one.covers === covers)
        .map((one) => ({
          ...one,
          after: number,
          event,
          on: on ?? null,
          by: by ?? 'publisher',
          source,
          last: !table.rows.some((row) => row.number === one.number && hasOther(row, covers)),
        })),
    );
}

const hasOther = ({ number, event, successors = [] }: LineageEvent, covers: Coverage | null): boolean =>
  event !== 'alternative' &&
  successors.some(
    (one) => one.number !== number && (covers === null || one.covers === undefined || one.covers === covers),
  );

/**
 * What is used in place of a specification without having succeeded it. It gives no authority to substitute.
 *
 * @returns refused as `none_known`.
 * @example AMS-QQ-A-250/5 names AMS4461 for O and F, AMS4462 for T3 and T351, and others.
 */
export function alternativesTo(
  table: Table<LineageEvent>,
  number: string,
): Verdict<{ alternatives: readonly Successor[] }, 'none_known'> {
  const rows = table.rows.filter((row) => row.number === number && row.event === 'alternative');
  const [first] = rows;
  if (!first) return { ok: false, reason: 'none_known' };
  return {
    ok: true,
    alternatives: rows.flatMap(({ successors = [] }) => successors),
    source: first.source,
    readFrom: referenceTo(table),
  };
}
