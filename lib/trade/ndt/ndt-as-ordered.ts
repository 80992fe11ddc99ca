import { readDesignation } from '../finishes/read-designation';
import { referenceTo, type Table } from '../table';
import type { NdtDesignationRow } from '../tables/ndt-designations';
import type { Verdict } from '../verdict';

export interface NdtAsOrdered {
  readonly stated: readonly Pick<NdtDesignationRow, 'key' | 'value' | 'says'>[];
  /** What the processor cannot choose by itself and the order does not say. */
  readonly notStated: readonly NdtDesignationRow['key'][];
}

/**
 * What an order for penetrant or magnetic particle inspection states, and what it leaves open.
 *
 * A sensitivity level belongs to fluorescent penetrant; visible penetrant (type II) has none to state.
 * Worked example: penetrant `type I, level 3` leaves the method open: water washable or one of the emulsifiers.
 */
export function ndtAsOrdered(
  table: Table<NdtDesignationRow>,
  ordered: { readonly method: NdtDesignationRow['method']; readonly classType: string },
): Verdict<NdtAsOrdered, 'method_not_in_table'> {
  const rows = table.rows.filter(({ method }) => method === ordered.method);
  const [first] = rows;
  if (!first) return { ok: false, reason: 'method_not_in_table' };
  const typed = ordered.classType.toUpperCase();
  const { type, method, level } = readDesignation(ordered.classType);
  const called: Readonly<Partial<Record<NdtDesignationRow['key'], string>>> = {
    ...(type !== undefined && { type }),
    ...(method !== undefined && { method }),
    ...(level !== undefined && { level }),
  };
  const stated = rows.filter(({ key, value }) =>
    key === 'medium' ? typed.includes(value) : called[key] === value,
  );
  const open = [...new Set(rows.map(({ key }) => key))].filter(
    (key) => !stated.some((row) => row.key === key),
  );
  return {
    ok: true,
    stated: stated.map(({ key, value, says }) => ({ key, value, says })),
    notStated: type === 'II' ? open.filter((key) => key !== 'level') : open,
    source: first.source,
    readFrom: referenceTo(table),
  };
}
