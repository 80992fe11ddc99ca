'use client';

import { useRead } from '@/components/api/use-api';
import type { OutputOf } from '@/lib/api/endpoint';
import { getTablesInForce } from '@/lib/reference/contract';
import { inForce } from '@/lib/reference/in-force';
import { ownTables } from '@/lib/reference/own-table';
import { PART_TABLES, type PartTables } from '@/lib/reference/published-tables';

type Own = OutputOf<typeof getTablesInForce>['own'];

/** Many fields of one page read them; they are put together once. */
const TOGETHER = new WeakMap<Own, PartTables>();

/** The tables that a part is answered from in this shop: its own editions, the published ones else. The page prefetches. */
export function useTables(): PartTables {
  const { own } = useRead(getTablesInForce, {}).data;
  if (own.length === 0) return PART_TABLES;
  const known = TOGETHER.get(own) ?? inForce(PART_TABLES, ownTables(own));
  TOGETHER.set(own, known);
  return known;
}
