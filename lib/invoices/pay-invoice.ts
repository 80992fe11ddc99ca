import { eq } from 'drizzle-orm';

import { payments } from '@/db/schema/money';
import { processors, shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { enqueue } from '@/lib/jobs/queue';

import { needsSecondApproval } from './approve-invoice';
import { lastPaymentOf } from './last-payment';
import { balanceOf } from './money-ledger';
import { payInvoiceQueue } from './pay-invoice-queue';
import { lockInvoice, type StoredInvoice } from './read-invoice';

/**
 * Starts to pay what is left of an approved invoice. The attempt and the job that hands it to the payment service are
 * written together; whether money moved is believed only when the service says so.
 *
 * The invoice stays locked until the end, so that of two presses the second finds the first one's attempt; the unique
 * number of an attempt refuses it a second time.
 */
export async function payInvoice(ctx: Ctx, input: { invoiceId: string; version: number }) {
  authorize(ctx, 'invoice.pay');
  const { invoice } = await lockInvoice(ctx, input, 'approved');
  const paidBy = personOf(ctx.actor);
  if (paidBy === null) throw new AppError('not_allowed', 'A payment is started by a person.');
  if ((await needsSecondApproval(ctx, invoice.approvedMinor ?? 0)) && invoice.secondApprovedAt === null)
    throw new AppError('conflict', 'Above the shop’s limit a second person approves first.');
  const last = await lastPaymentOf(ctx, invoice.id);
  if (last?.state === 'pending') throw new AppError('conflict', 'It is being paid already.');
  const amountMinor = await balanceOf(ctx, invoice.id);
  if (amountMinor <= 0) throw new AppError('conflict', 'It is paid. Nothing is left to pay.');
  const { samePerson, ...way } = await wayToPay(ctx, invoice, paidBy);

  const id = newId();
  const attempt = (last?.attempt ?? 0) + 1;
  await ctx.tx.insert(payments).values({
    id,
    shopId: shopOf(ctx),
    invoiceId: invoice.id,
    attempt,
    amountMinor,
    currency: invoice.currency,
    paidBy,
    startedAt: ctx.now,
  });
  await enqueue(ctx, payInvoiceQueue, { shopId: shopOf(ctx), paymentId: id, ...way });
  await recordAudit(ctx, {
    action: 'invoice.pay',
    entity: 'invoice',
    entityId: invoice.id,
    after: {
      number: invoice.number,
      amountMinor,
      attempt,
      ...(samePerson ? { approvedAndPaidBySamePerson: true } : {}),
    },
  });
  return { paymentId: id };
}

/** From which method to which account; every reason against it is told in words. */
async function wayToPay(ctx: Ctx, invoice: StoredInvoice, paidBy: string) {
  const [shop] = await ctx.tx
    .select({
      policy: shops.approvalAndPayment,
      customer: shops.stripeCustomerId,
      paymentMethod: shops.stripePaymentMethodId,
    })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const samePerson = [invoice.approvedBy, invoice.secondApprovedBy].includes(paidBy);
  if (samePerson && shop?.policy === 'refuse')
    throw new AppError(
      'not_allowed',
      'You approved it. In this shop another person pays what one has approved.',
    );
  if (!shop?.customer || !shop.paymentMethod)
    throw new AppError(
      'conflict',
      'The shop has no way to pay yet. An admin saves one under Settings, Payments.',
    );
  const [processor] = await ctx.tx
    .select({ name: processors.name, account: processors.stripeAccountId, ready: processors.payoutsReady })
    .from(processors)
    .where(eq(processors.id, invoice.processorId));
  if (!processor?.account || !processor.ready)
    throw new AppError(
      'conflict',
      `${processor?.name ?? 'The processor'} cannot be paid yet: it has not said where its money goes. It does so on its own page, under Account.`,
    );
  return {
    samePerson,
    customer: shop.customer,
    paymentMethod: shop.paymentMethod,
    destinationAccount: processor.account,
  };
}
