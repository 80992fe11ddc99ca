import { referenceTo, type Table } from '../table';
import type { FilmControlRow } from '../tables/film-control';
import type { Verdict } from '../verdict';

const MS_PER_DAY = 86_400_000;

/**
 * The last day on which a processor's next check of its chemical film line is in time.
 *
 * Corrosion and adhesion tests are monthly, and never more than 35 days apart.
 * Worked example: panels of 2 March are good for parts until 6 April.
 */
export function filmCheckDue(
  table: Table<FilmControlRow>,
  check: FilmControlRow['check'],
  lastAt: Date,
): Verdict<{ readonly dueBy: Date }, 'check_not_in_table'> {
  const row = table.rows.find((candidate) => candidate.check === check);
  if (!row) return { ok: false, reason: 'check_not_in_table' };
  const dueBy = new Date(lastAt.getTime() + row.mostDays * MS_PER_DAY);
  return { ok: true, dueBy, source: row.source, readFrom: referenceTo(table) };
}
