import { materialOf, type MaterialOf, type TypedMaterial } from '@/lib/parts/material-of';
import type { BatchTables } from '@/lib/reference/batch-tables';

/** Every check of every line asks it; a batch has few metals. */
const KNOWN = new WeakMap<BatchTables, Map<string, MaterialOf>>();

/** The material of a part from its typed words, read once for each spelling. */
export function metalOf(tables: BatchTables, { alloy, form, clad }: TypedMaterial): MaterialOf {
  const known = KNOWN.get(tables) ?? new Map<string, MaterialOf>();
  KNOWN.set(tables, known);
  const words = `${alloy}\n${form}\n${clad}`;
  const found = known.get(words) ?? materialOf(tables.material, { alloy, form, clad });
  // Words are the shop's own, so there is no end of them.
  if (known.size > MOST_KEPT) known.clear();
  known.set(words, found);
  return found;
}

const MOST_KEPT = 1000;
