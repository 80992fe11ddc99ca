import { and, eq, sql } from 'drizzle-orm';

import { auditEntries } from '@/db/schema/audit';
import { batches } from '@/db/schema/batches';
import { balances } from '@/db/schema/lots';
import type { Ctx } from '@/lib/auth/context';
import type { Place } from '@/lib/stock/places';

/** How many pieces of a lot are in each place, places without any left out. */
export async function placesOf(ctx: Ctx, lotId: string): Promise<Partial<Record<Place, number>>> {
  const rows = await ctx.tx
    .select({ place: balances.place, pieces: sql<number>`sum(${balances.pieces})::int` })
    .from(balances)
    .where(and(eq(balances.lotId, lotId), sql`${balances.pieces} > 0`))
    .groupBy(balances.place);
  return Object.fromEntries(rows.map((row) => [row.place, row.pieces]));
}

export async function stageNow(ctx: Ctx, batchId: string) {
  const [batch] = await ctx.tx.select({ stage: batches.stage }).from(batches).where(eq(batches.id, batchId));
  return batch?.stage;
}

/** The last thing the audit trail says of an action, or undefined. */
export async function lastAudit(ctx: Ctx, action: string) {
  const [entry] = await ctx.tx
    .select()
    .from(auditEntries)
    .where(eq(auditEntries.action, action))
    .orderBy(sql`seq desc`)
    .limit(1);
  return entry;
}
