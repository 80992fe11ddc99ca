import { eq, sql } from 'drizzle-orm';

import { moneyEntries } from '@/db/schema/money';
import { shopOf, type Ctx } from '@/lib/auth/context';

export interface MoneyEntry {
  invoiceId: string;
  kind: 'invoiced' | 'withheld' | 'credited' | 'paid' | 'refunded';
  /** Positive raises what is owed, negative lowers it. */
  amountMinor: number;
  currency: string;
  /** What caused it; the same cause is entered once, whoever repeats it. */
  cause: string;
}

/**
 * The one way to change what is owed. An entry whose cause is there already is not entered again.
 *
 * @returns whether it was entered now.
 */
export async function enterMoney(ctx: Ctx, entry: MoneyEntry): Promise<boolean> {
  if (entry.amountMinor === 0) return false;
  const entered = await ctx.tx
    .insert(moneyEntries)
    .values({ ...entry, shopId: shopOf(ctx), enteredBy: ctx.actor.name, enteredAt: ctx.now })
    .onConflictDoNothing()
    .returning({ id: moneyEntries.id });
  return entered.length > 0;
}

/** What is owed for an invoice: the sum of its entries. */
export async function balanceOf(ctx: Pick<Ctx, 'tx'>, invoiceId: string): Promise<number> {
  const [row] = await ctx.tx
    .select({ sum: sql<number>`coalesce(sum(${moneyEntries.amountMinor}), 0)::int` })
    .from(moneyEntries)
    .where(eq(moneyEntries.invoiceId, invoiceId));
  return row?.sum ?? 0;
}
