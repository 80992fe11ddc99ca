import type { Table } from '../table';
import { referenceTo } from '../table';
import type { HardnessTestRoomRow } from '../tables/hardness-test-room';
import type { Verdict } from '../verdict';

export interface TestRoom {
  readonly thicknessMm: number;
  readonly fromEdgeMm: number;
  readonly betweenMm: number;
}

/**
 * The least metal that a hardness indentation needs under it, to the edge and to the next one, in mm.
 *
 * Depth and diameter of the indentation in mm, both above zero. On a curved surface the reading is corrected besides.
 * Worked example: 0.1 mm deep and 0.5 mm across needs 1 mm of thickness, 1.25 mm to the edge, 1.5 mm to the next.
 */
export function hardnessTestRoom(
  table: Table<HardnessTestRoomRow>,
  indentation: { readonly depthMm: number; readonly diameterMm: number },
): Verdict<TestRoom, 'indentation_not_positive' | 'need_not_in_table'> {
  if (!(indentation.depthMm > 0 && indentation.diameterMm > 0))
    return { ok: false, reason: 'indentation_not_positive' };
  const mmOf = (need: HardnessTestRoomRow['need']): number | undefined => {
    const row = table.rows.find((candidate) => candidate.need === need);
    return row && row.times * (row.of === 'depth' ? indentation.depthMm : indentation.diameterMm);
  };
  const thicknessMm = mmOf('thickness');
  const fromEdgeMm = mmOf('from_edge');
  const betweenMm = mmOf('between_indentations');
  const source = table.rows[0]?.source;
  if (thicknessMm === undefined || fromEdgeMm === undefined || betweenMm === undefined || !source)
    return { ok: false, reason: 'need_not_in_table' };
  return { ok: true, thicknessMm, fromEdgeMm, betweenMm, source, readFrom: referenceTo(table) };
}
