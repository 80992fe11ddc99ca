import { eq } from 'drizzle-orm';

import { invoices } from '@/db/schema/money';
import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';

import { enterMoney } from './money-ledger';
import { lockInvoice } from './read-invoice';

interface Input {
  invoiceId: string;
  version: number;
}

/** Approves what is to be paid, once every difference is cleared. From here on the ledger of money says what is owed. */
export async function approveInvoice(ctx: Ctx, input: Input) {
  authorize(ctx, 'invoice.approve');
  const read = await lockInvoice(ctx, input, 'unapproved');
  const { invoice, differences } = read;
  if (invoice.enteredAt === null || invoice.totalMinor === null || read.toPayMinor === null)
    throw new AppError('conflict', 'Enter what the invoice says first.');
  const open = differences.filter((one) => one.clearance === null).length;
  if (open > 0)
    throw new AppError(
      'conflict',
      `${open} ${open === 1 ? 'difference is' : 'differences are'} not cleared yet.`,
    );

  const version = invoice.version + 1;
  await ctx.tx
    .update(invoices)
    .set({ approvedAt: ctx.now, approvedBy: personOf(ctx.actor), approvedMinor: read.toPayMinor, version })
    .where(eq(invoices.id, invoice.id));
  const entry = { invoiceId: invoice.id, currency: invoice.currency };
  await enterMoney(ctx, { ...entry, kind: 'invoiced', amountMinor: invoice.totalMinor, cause: 'approved' });
  await enterMoney(ctx, {
    ...entry,
    kind: 'withheld',
    amountMinor: read.toPayMinor - invoice.totalMinor,
    cause: 'withheld',
  });
  await recordAudit(ctx, {
    action: 'invoice.approve',
    entity: 'invoice',
    entityId: invoice.id,
    after: { number: invoice.number, toPayMinor: read.toPayMinor },
  });
  await refreshStanding(ctx, invoice.batchId);
  return { version };
}

/** The second approval that the shop asks for above its limit, by another person. */
export async function approveInvoiceSecond(ctx: Ctx, input: Input) {
  authorize(ctx, 'invoice.approve_second');
  const { invoice } = await lockInvoice(ctx, input, 'approved');
  if (!(await needsSecondApproval(ctx, invoice.approvedMinor ?? 0)))
    throw new AppError('conflict', 'This sum needs no second approval.');
  if (invoice.secondApprovedAt !== null)
    throw new AppError('conflict', 'It is approved a second time already.');
  if (invoice.approvedBy === personOf(ctx.actor))
    throw new AppError('not_allowed', 'You approved it first. The second approval is another person’s.');
  const version = invoice.version + 1;
  await ctx.tx
    .update(invoices)
    .set({ secondApprovedAt: ctx.now, secondApprovedBy: personOf(ctx.actor), version })
    .where(eq(invoices.id, invoice.id));
  await recordAudit(ctx, {
    action: 'invoice.approve_second',
    entity: 'invoice',
    entityId: invoice.id,
    after: { number: invoice.number, toPayMinor: invoice.approvedMinor },
  });
  return { version };
}

/** Whether a sum is above the shop's limit for one person's approval. */
export async function needsSecondApproval(ctx: Ctx, amountMinor: number): Promise<boolean> {
  const [shop] = await ctx.tx
    .select({ above: shops.secondApprovalAboveMinor })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return shop?.above !== null && shop?.above !== undefined && amountMinor > shop.above;
}
