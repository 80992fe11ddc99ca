import { referenceTo, type Table } from '../table';
import type { MeasuringRuleRow } from '../tables/measuring-rules';
import { mpaFromKsi } from '../units/stress';
import type { Verdict } from '../verdict';

/**
 * A rough tensile strength in MPa of a wrought aluminium alloy from its Brinell number (500 kgf, 30 to 160), to tell
 * alloys apart. It accepts nothing.
 *
 * Worked example: HB 135 is about 75.6 ksi, 521 MPa.
 */
export function roughTensileOfAluminium(
  table: Table<MeasuringRuleRow>,
  hb500: number,
): Verdict<
  { readonly tensileMpa: number; readonly isRough: true },
  'outside_brinell_range' | 'rule_not_in_table'
> {
  const row = table.rows.find((candidate) => candidate.rule === 'rough_tensile');
  if (!row) return { ok: false, reason: 'rule_not_in_table' };
  const [low, high] = row.hb500Range;
  if (!(hb500 >= low && hb500 <= high))
    return { ok: false, reason: 'outside_brinell_range', source: row.source };
  const tensileMpa = mpaFromKsi(hb500 * row.ksiPerHb500);
  return { ok: true, tensileMpa, isRough: true, source: row.source, readFrom: referenceTo(table) };
}
