import { eq } from 'drizzle-orm';

import { moneyEntries } from '@/db/schema/money';
import { users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { queueMail } from '@/lib/mail/queue-mail';
import { Currency } from '@/lib/money';
import { batchForMail } from '@/lib/portal/batch-for-mail';
import { ofBatchProps } from '@/lib/portal/queue-batch-mail';

import { paymentReference } from './payment-reference';
import { readInvoice } from './read-invoice';
import { remittanceOf } from './remittance';

/** Queues the mail that says what was paid, for what, and what not; answers reach whoever paid. */
export async function queueRemittance(
  ctx: Ctx,
  { invoiceId, paidMinor, paidBy }: { invoiceId: string; paidMinor: number; paidBy: string },
): Promise<void> {
  const { invoice, lines, differences } = await readInvoice(ctx, invoiceId);
  const batch = await batchForMail(ctx, invoice.batchId);
  const entries = await ctx.tx
    .select({ kind: moneyEntries.kind, amountMinor: moneyEntries.amountMinor })
    .from(moneyEntries)
    .where(eq(moneyEntries.invoiceId, invoiceId));
  const [payer] = await ctx.tx.select({ email: users.email }).from(users).where(eq(users.id, paidBy));
  const invoiceNumber = invoice.number ?? 'without a number';
  await queueMail(ctx, {
    template: 'remittance',
    to: batch.deskEmail,
    ...(payer ? { replyTo: payer.email } : {}),
    props: {
      ...ofBatchProps(ctx, batch),
      stage: batch.stage,
      invoiceNumber,
      invoiceDatedOn: invoice.datedOn,
      currency: Currency.parse(invoice.currency),
      ...remittanceOf({ lines, differences, entries, paidMinor }),
      paidMinor,
      paidAt: ctx.now,
      reference: paymentReference({ invoiceNumber, orderNumber: batch.orderNumber }),
    },
  });
}
