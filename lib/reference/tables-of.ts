import { and, isNull } from 'drizzle-orm';

import { referenceTables } from '@/db/schema/reference';
import type { Ctx } from '@/lib/auth/context';
import { PUBLISHED, type ComparisonTables } from '@/lib/evidence/certificate/compare/tables';

import { BATCH_TABLES, type BatchTables } from './batch-tables';
import { inForce } from './in-force';
import { ownTables, type OwnEntry } from './own-table';

/** The tables that answers for a shop are read from: its own editions where it entered them, the published ones else. */
export async function tablesOf(ctx: Ctx): Promise<BatchTables> {
  const own = await readOwnEntries(ctx);
  return own.length === 0 ? BATCH_TABLES : inForce(BATCH_TABLES, ownTables(own));
}

/** What certificates of the shop are compared by. */
export async function comparisonTablesOf(ctx: Ctx): Promise<ComparisonTables> {
  const own = await readOwnEntries(ctx);
  return own.length === 0 ? PUBLISHED : inForce(PUBLISHED, ownTables(own));
}

/** The shop's own editions that are in force. */
export const readOwnEntries = (ctx: Ctx): Promise<OwnEntry[]> =>
  ctx.tx
    .select({
      id: referenceTables.id,
      tableId: referenceTables.tableId,
      title: referenceTables.title,
      edition: referenceTables.edition,
      clause: referenceTables.clause,
      enteredByName: referenceTables.enteredByName,
      rows: referenceTables.rows,
    })
    .from(referenceTables)
    .where(and(isNull(referenceTables.supersededAt), isNull(referenceTables.withdrawnAt)));
