import { desc, eq } from 'drizzle-orm';

import { payments } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';

/** The latest attempt to pay an invoice, or null. */
export async function lastPaymentOf(ctx: Pick<Ctx, 'tx'>, invoiceId: string) {
  const [payment] = await ctx.tx
    .select({ id: payments.id, attempt: payments.attempt, state: payments.state })
    .from(payments)
    .where(eq(payments.invoiceId, invoiceId))
    .orderBy(desc(payments.attempt))
    .limit(1);
  return payment ?? null;
}
