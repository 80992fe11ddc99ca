import { daysUntil, type Clock } from '@/lib/day-words';
import type { PortalRow } from '@/lib/portal/contract';

export interface WorkGroup {
  says: string;
  rows: PortalRow[];
}

/** The work list in the order of what presses: late, to count, with us by promised day, without a day, away. */
export function workGroups(rows: readonly PortalRow[], clock: Clock): WorkGroup[] {
  const groups: Record<GroupName, PortalRow[]> = {
    late: [],
    count: [],
    soon: [],
    later: [],
    undated: [],
    away: [],
  };
  for (const row of rows) groups[groupOf(row, clock)].push(row);
  const byDay = (one: PortalRow, other: PortalRow) =>
    (one.promisedOn ?? '').localeCompare(other.promisedOn ?? '');
  groups.late.sort(byDay);
  groups.soon.sort(byDay);
  groups.later.sort(byDay);
  return (Object.keys(WORDS) as GroupName[])
    .map((name) => ({ says: WORDS[name], rows: groups[name] }))
    .filter((group) => group.rows.length > 0);
}

const WORDS = {
  late: 'Late',
  count: 'To acknowledge',
  soon: 'This week and next',
  later: 'Later',
  undated: 'No day promised yet',
  away: 'Away from you, papers or money open',
} as const;
type GroupName = keyof typeof WORDS;

const SOON_DAYS = 14;

export const isAway = (row: PortalRow): boolean =>
  ['returned', 'proved', 'held'].includes(row.stage) && row.piecesBack >= row.pieces;

function groupOf(row: PortalRow, clock: Clock): GroupName {
  if (isAway(row)) return 'away';
  if (row.promisedOn !== null && daysUntil(row.promisedOn, clock) < 0 && row.shippedAt === null)
    return 'late';
  if (row.acknowledgedAt === null && row.piecesBack === 0) return 'count';
  if (row.shippedAt !== null) return 'away';
  if (row.promisedOn === null) return 'undated';
  return daysUntil(row.promisedOn, clock) <= SOON_DAYS ? 'soon' : 'later';
}

/** What stands open about a batch, in a few words, and the word for going there. */
export function openOf(row: PortalRow): { says: string; verb: string } {
  if (row.asksMe) return { says: 'the shop asks', verb: 'Answer' };
  if (row.acknowledgedAt === null && row.piecesBack === 0) return { says: '', verb: 'Count' };
  if (row.answered) return { says: 'question answered', verb: 'Read' };
  if (row.certificates === 0)
    return { says: row.shippedAt === null && !isAway(row) ? '' : 'certificate wanted', verb: 'Send papers' };
  if (row.invoices === 0) return { says: 'invoice wanted', verb: 'Send invoice' };
  return { says: '', verb: 'Open' };
}
