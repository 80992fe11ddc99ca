import type { DensityRow } from '../tables/densities';
import { referenceTo, type Table } from '../table';
import { gPerCm3FromLbPerIn3 } from '../units/density';
import type { Verdict } from '../verdict';
import type { Alloy } from './alloy';

/** `condition_decides`: the density differs with the condition, and none was given or the table has not this one. */
export type DensityRefusal = 'alloy_not_in_table' | 'condition_decides';

/**
 * Nominal density of an alloy in g/cm³, from the printed pounds per cubic inch.
 *
 * Nominal means for weighing and pricing, not for proving which alloy it is: many alloys share a density.
 *
 * @param material the condition matters for 17-4PH alone.
 * @example densityOf(DENSITIES, {alloy: '2024'}) is 2.768 g/cm³, from 0.100 lb/in³
 */
export function densityOf(
  table: Table<DensityRow>,
  material: { readonly alloy: Alloy; readonly condition?: string },
): Verdict<{ readonly gPerCm3: number }, DensityRefusal> {
  const rows = table.rows.filter(({ alloys }) => alloys.includes(material.alloy));
  const row = rows.find(
    ({ conditions }) => !conditions || (material.condition && conditions.includes(material.condition)),
  );
  if (!row)
    return rows[0]
      ? { ok: false, reason: 'condition_decides', source: rows[0].source }
      : { ok: false, reason: 'alloy_not_in_table' };
  return {
    ok: true,
    gPerCm3: gPerCm3FromLbPerIn3(row.lbPerIn3),
    source: row.source,
    readFrom: referenceTo(table),
  };
}
