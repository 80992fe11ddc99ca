import { issueInForce, type IssueBasis } from '@/lib/trade/lineage/issue-in-force';
import type { Authority, Coverage, LineageEvent, LineageEventKind } from '@/lib/trade/lineage/lineage-event';
import { standingOn } from '@/lib/trade/lineage/standing-on';
import { successorsOf } from '@/lib/trade/lineage/successors-of';
import type { Table } from '@/lib/trade/table';

/** What became of a document; it goes after its number. */
export const EVENT_WORDS: Record<LineageEventKind, string> = {
  issued: 'was issued',
  amended: 'was amended',
  reaffirmed: 'was reaffirmed',
  adopted: 'was adopted',
  listed_active: 'is listed as active',
  current: 'is current',
  noncurrent: 'was made noncurrent',
  stabilized: 'was stabilized',
  revived: 'was revived',
  renamed: 'was renamed',
  superseded: 'was superseded',
  withdrawn: 'was withdrawn',
  cancelled: 'was cancelled',
  alternative: 'has alternatives',
  successor_not_found: 'has no successor that could be found',
};

export const AUTHORITY_WORDS: Record<Authority, string> = {
  publisher: 'its publisher',
  government_index: 'the government’s index',
};

export const COVERAGE_WORDS: Record<Coverage, string> = {
  parts: 'parts',
  raw_material: 'raw material',
  castings: 'castings',
  general_work: 'general work',
  industrial_work: 'industrial work',
};

export const BASIS_WORDS: Record<IssueBasis, string> = {
  named_on_order: 'it is named',
  in_force_on_date: 'it was in force',
  last_issue_of_ended_document: 'it was the last one; unless a successor is named, it applies',
};

const ENDED: readonly LineageEventKind[] = ['renamed', 'superseded', 'withdrawn', 'cancelled'];
/** Not ended, and yet to be looked at before it is called on a new drawing. */
const FADING: readonly LineageEventKind[] = ['noncurrent', 'stabilized'];

export interface Asked {
  readonly number: string;
  readonly revision: string | null;
  /** `YYYY-MM-DD`. */
  readonly on: string;
  /** Null for whatever it is used for. */
  readonly covers: Coverage | null;
}

/** How a specification stands, in a few words; null where nothing is recorded of it by its publisher. */
export function standingReply(
  table: Table<LineageEvent>,
  { number, on, covers }: Asked,
): { good: boolean | null; says: string; rest: string } | null {
  const stands = standingOn(table, number, { on, by: 'publisher' });
  if (!stands.ok) return null;
  const { standing, since, revision } = stands;
  const next = successorsOf(table, number, covers);
  const words = `${EVENT_WORDS[standing]} ${whenWords(since)}`;
  if (!ENDED.includes(standing))
    return {
      good: FADING.includes(standing) ? null : true,
      says: `${number} ${words}`,
      rest: FADING.includes(standing) ? 'not ended; ask before a new drawing calls it' : 'no end is recorded',
    };
  if (next.ok) {
    const last = [...new Set(next.successors.filter((one) => one.last).map((one) => one.number))];
    return {
      good: false,
      says: `${number} ${words}`,
      rest: `${last.join(' or ')} ${last.length === 1 ? 'stands' : 'stand'} in its place`,
    };
  }
  // Then only an issue of it ended, and a later one took over.
  if (standing === 'superseded' && revision !== null)
    return {
      good: null,
      says: `Issue ${revision} of ${number} ${words}`,
      rest: 'a later issue of the same document',
    };
  return { good: false, says: `${number} ${words}`, rest: 'what stands in its place is not recorded' };
}

/** Which issue an order invokes, in a sentence; null where no issue is recorded. */
export function issueReply(table: Table<LineageEvent>, { number, revision, on }: Asked): string | null {
  const issue = issueInForce(table, { number, revision }, on);
  if (!issue.ok) return null;
  const perhaps =
    issue.perhaps.length > 0 ? ` Issue ${issue.perhaps.join(', ')} may have been out by then.` : '';
  return `Issue ${issue.revision} applies: ${BASIS_WORDS[issue.basis]}.${perhaps}`;
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** `1997`, `Jul 1997`, `1 Jul 1997`: as exactly as it is known. */
export function dateWords(on: string): string {
  const [year = '', month, day] = on.split('-');
  return [
    ...(day === undefined ? [] : [String(Number(day))]),
    ...(month === undefined ? [] : [MONTHS[Number(month) - 1] ?? month]),
    year,
  ].join(' ');
}

/** `in 1997`, `in Jul 1997`, `on 1 Jul 1997`. */
export const whenWords = (on: string): string => `${on.length > 7 ? 'on' : 'in'} ${dateWords(on)}`;
