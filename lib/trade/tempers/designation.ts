import { referenceTo, type Table } from '../table';
import type { ColdWork, MadeBy, TemperRow } from '../tables/tempers';
import type { Verdict } from '../verdict';
import type { Temper } from './temper';

/**
 * Who can make a temper, what cold work it needs, and what it is called when a user made it.
 *
 * @example designationOf(TEMPER_DESIGNATIONS, 'T4') is made by the mill by name; made by a user it is T42
 */
export function designationOf(
  table: Table<TemperRow>,
  temper: Temper,
): Verdict<
  { readonly madeBy: MadeBy; readonly coldWork?: ColdWork; readonly madeByUserIs?: Temper },
  'temper_not_in_table'
> {
  const row = table.rows.find((designation) => designation.temper === temper);
  if (!row) return { ok: false, reason: 'temper_not_in_table' };
  return {
    ok: true,
    madeBy: row.madeBy,
    ...(row.coldWork && { coldWork: row.coldWork }),
    ...(row.madeByUserIs && { madeByUserIs: row.madeByUserIs }),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
