import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { TypicalRow } from '../tables/typical-properties';
import type { Verdict } from '../verdict';

export interface TypicalValue {
  readonly percentIacs?: number;
  readonly hb500?: number;
  readonly source: Source;
}

/**
 * Usual conductivity (% IACS) and Brinell hardness (500 kgf) of an alloy in a condition, one value per source.
 * Never a limit: for that see `acceptanceOf`.
 *
 * Worked example: 2024-T3 has 30 % IACS by one source and HB 120 by another.
 */
export function typicalPropertiesOf(
  table: Table<TypicalRow>,
  asked: { readonly alloy: string; readonly condition: string },
): Verdict<{ readonly values: readonly TypicalValue[] }, 'not_in_table'> {
  const rows = table.rows.filter(
    ({ alloy, condition }) => alloy === asked.alloy && condition === asked.condition,
  );
  const [first] = rows;
  if (!first) return { ok: false, reason: 'not_in_table' };
  const values = rows.map(({ iacs, hb500, source }) => ({
    ...(iacs !== undefined && { percentIacs: iacs }),
    ...(hb500 !== undefined && { hb500 }),
    source,
  }));
  return { ok: true, values, source: first.source, readFrom: referenceTo(table) };
}
