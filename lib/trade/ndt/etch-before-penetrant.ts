import { referenceTo, type Table } from '../table';
import type { EtchBeforePenetrantRow, MetalSurface } from '../tables/etch-before-penetrant';
import type { Verdict } from '../verdict';

/**
 * Whether a surface is etched before penetrant. Machined, ground or smeared metal is etched where the drawing or the
 * customer requires it; where neither says so the answer is to ask, because etching takes metal off.
 *
 * Worked example: a machined face with nothing said: ask.
 */
export function etchBeforePenetrant(
  table: Table<EtchBeforePenetrantRow>,
  part: { readonly surface: MetalSurface; readonly isRequired?: boolean },
): Verdict<{ readonly etch: 'etch_then_neutralise' | 'ask' | 'no_etch' }, 'rule_not_in_table'> {
  const [row] = table.rows;
  if (!row) return { ok: false, reason: 'rule_not_in_table' };
  const grounds = { source: row.source, readFrom: referenceTo(table) };
  if (part.isRequired) return { ok: true, etch: 'etch_then_neutralise', ...grounds };
  const isSmeared = row.surfaces.includes(part.surface);
  return { ok: true, etch: isSmeared && part.isRequired === undefined ? 'ask' : 'no_etch', ...grounds };
}
