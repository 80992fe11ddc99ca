import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { amountText } from '@/lib/money';

import type * as contract from './pay-contract';
import { lastPaymentOf } from './last-payment';
import { balanceOf, enterMoney } from './money-ledger';
import { numberKey } from '@/lib/evidence/invoice/number-key';
import { lockInvoice } from './read-invoice';

/** A credit of the processor: lowers what is still to be paid of an approved invoice, each credit once. */
export async function creditInvoice(ctx: Ctx, input: z.output<(typeof contract.creditInvoice)['input']>) {
  authorize(ctx, 'invoice.approve');
  const { invoice } = await lockInvoice(ctx, input, 'approved');
  // The sum of a payment stands once it is started; a credit beside it would pay too much.
  if ((await lastPaymentOf(ctx, invoice.id))?.state === 'pending')
    throw new AppError('conflict', 'It is being paid just now. Enter the credit when the payment has ended.');
  const balance = await balanceOf(ctx, invoice.id);
  if (input.amountMinor > balance) {
    const message =
      balance > 0
        ? `${amountText(balance)} is left to pay. Enter ${amountText(balance)} or less.`
        : 'Nothing is left to pay, so there is nothing to take off.';
    throw new AppError('bad_input', message, { fields: [{ field: 'amountMinor', message }] });
  }
  const entered = await enterMoney(ctx, {
    invoiceId: invoice.id,
    kind: 'credited',
    amountMinor: -input.amountMinor,
    currency: invoice.currency,
    cause: `credit:${numberKey(input.reference)}`,
  });
  if (!entered) {
    const message = `Credit ${input.reference} is entered already.`;
    throw new AppError('conflict', message, { fields: [{ field: 'reference', message }] });
  }
  const version = invoice.version + 1;
  await ctx.tx.update(invoices).set({ version }).where(eq(invoices.id, invoice.id));
  await recordAudit(ctx, {
    action: 'invoice.credit',
    entity: 'invoice',
    entityId: invoice.id,
    after: { number: invoice.number, credit: input.reference, amountMinor: input.amountMinor },
  });
  await refreshStanding(ctx, invoice.batchId);
  return { version };
}
