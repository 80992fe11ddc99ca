import type { BatchTables } from '@/lib/reference/batch-tables';

import { groupedBy } from './grouped-by';
import { loadsOfBatch, type LoadLine, type LoadOfLines } from './loads-of-batch';

type SettableLine = LoadLine & { readonly loadNo: number | null };
export type NumberedLoad<Line> = LoadOfLines<Line> & { readonly number: number };

/**
 * The loads in which lines lie: as the lead set them, and as planned where none is set. What was set in one load but
 * cannot share a cycle is several, which then bear the same number.
 */
export function loadsAsSet<Line extends SettableLine>(
  tables: BatchTables,
  lines: readonly Line[],
): NumberedLoad<Line>[] {
  const set = lines.filter(({ loadNo }) => loadNo !== null);
  if (set.length === 0)
    return (loadsOfBatch(tables, lines)?.loads ?? []).map((load, at) => ({ ...load, number: at + 1 }));
  return [...groupedBy(set, ({ loadNo }) => loadNo ?? 0)]
    .sort(([one], [other]) => one - other)
    .flatMap(([number, together]) =>
      (loadsOfBatch(tables, together)?.loads ?? []).map((load) => ({ ...load, number })),
    );
}
