import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { clearances, invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import type * as contract from './contract';
import { lockInvoice, type ReadInvoice } from './read-invoice';

/** Differences that no decision clears: the invoice itself must be entered again or refused. */
const ONLY_CORRECTED = ['currency_mismatch'];

/** Clears one difference. Accepting more than was agreed needs a reason; a later choice replaces an earlier one. */
export async function clearDifference(ctx: Ctx, input: z.output<(typeof contract.clearDifference)['input']>) {
  authorize(ctx, 'invoice.enter');
  const read = await lockInvoice(ctx, input, 'unapproved');
  const found = read.differences.find((one) => one.key === input.difference);
  if (!found) throw new AppError('not_found', 'This difference is not there any more. Look again.');
  if (ONLY_CORRECTED.includes(found.code))
    throw new AppError('conflict', `${found.sentence} Refuse it, or enter it again.`);
  if (input.choice === 'accept' && input.reason.length < 5)
    throw new AppError('bad_input', 'Give the reason for paying it.', {
      fields: [{ field: 'reason', message: 'Give the reason in a few words.' }],
    });

  const values = {
    choice: input.choice,
    amountMinor: found.overMinor,
    reason: input.reason,
    clearedBy: ctx.actor.name,
    clearedAt: ctx.now,
  };
  await ctx.tx
    .insert(clearances)
    .values({ ...values, shopId: shopOf(ctx), invoiceId: input.invoiceId, difference: input.difference })
    .onConflictDoUpdate({ target: [clearances.invoiceId, clearances.difference], set: values });
  return raise(ctx, read, 'invoice.clear', {
    difference: input.difference,
    choice: input.choice,
    amountMinor: found.overMinor,
    reason: input.reason,
  });
}

export async function undoClearance(ctx: Ctx, input: z.output<(typeof contract.undoClearance)['input']>) {
  authorize(ctx, 'invoice.enter');
  const read = await lockInvoice(ctx, input, 'unapproved');
  await ctx.tx
    .delete(clearances)
    .where(and(eq(clearances.invoiceId, input.invoiceId), eq(clearances.difference, input.difference)));
  return raise(ctx, read, 'invoice.undo_clear', { difference: input.difference });
}

async function raise(ctx: Ctx, { invoice }: ReadInvoice, action: string, after: Record<string, unknown>) {
  const version = invoice.version + 1;
  await ctx.tx.update(invoices).set({ version }).where(eq(invoices.id, invoice.id));
  await recordAudit(ctx, { action, entity: 'invoice', entityId: invoice.id, after });
  return { version };
}
