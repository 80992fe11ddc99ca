import type { HardnessScale, HardnessTable } from './hardness-table';

/**
 * Rows whose value breaks the order of its column although both neighbours keep it: most likely misprints.
 *
 * Reprints of conversion tables carry such errors, and a shop types its own edition from one. Example: HRA 69.4,
 * 58.9, 68.4 at HRC 38, 37, 36 gives the row of HRC 37.
 */
export function rowsOutOfOrder(
  { rows }: HardnessTable,
  column: HardnessScale | 'tensileKsi',
): { row: HardnessTable['rows'][number]; printed: number }[] {
  const printed = rows.flatMap((row) => {
    const value = row[column];
    return value === undefined ? [] : [{ row, printed: value }];
  });
  const isFalling = Math.sign((printed[0]?.printed ?? 0) - (printed.at(-1)?.printed ?? 0));
  return printed.filter(({ printed: value }, at) => {
    const before = printed[at - 1]?.printed;
    const after = printed[at + 1]?.printed;
    if (before === undefined || after === undefined) return false;
    const neighboursAgree = Math.sign(before - after) === isFalling;
    return neighboursAgree && (value > Math.max(before, after) || value < Math.min(before, after));
  });
}
