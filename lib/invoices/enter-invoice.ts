import { and, eq, isNull, ne } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { clearances, invoiceLines, invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId } from '@/lib/ids';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

import type * as contract from './contract';
import { numberKey } from '@/lib/evidence/invoice/number-key';
import { lockInvoice } from './read-invoice';

/** Takes up an invoice that did not come through the processor's page. */
export async function addInvoice(
  ctx: Ctx,
  { batchId, fileId }: z.output<(typeof contract.addInvoice)['input']>,
) {
  authorize(ctx, 'invoice.enter');
  const batch = await lockSentBatch(ctx, batchId, 'Nothing is owed for it');
  if (fileId !== null) await requireVerifiedFile(ctx, { fileId, purpose: 'invoice' });
  const id = newId();
  const [order] = await ctx.tx
    .select({ currency: batches.currency })
    .from(batches)
    .where(eq(batches.id, batchId));
  await ctx.tx.insert(invoices).values({
    id,
    shopId: shopOf(ctx),
    processorId: batch.processorId,
    batchId,
    fileId,
    currency: order?.currency ?? 'USD',
    sentBy: ctx.actor.name,
    createdAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'invoice.add',
    entity: 'invoice',
    entityId: id,
    after: { batch: batch.number, fileId },
  });
  return { id };
}

/**
 * Enters what the invoice says. Entering again replaces it and takes all clearances back, because they were given to
 * other figures.
 *
 * @throws AppError `conflict` naming the invoice that has this number already, in whatever spelling.
 */
export async function enterInvoice(ctx: Ctx, input: z.output<(typeof contract.enterInvoice)['input']>) {
  authorize(ctx, 'invoice.enter');
  const { invoice, order } = await lockInvoice(ctx, input, 'unapproved');
  const key = numberKey(input.number);
  await refuseSameNumber(ctx, invoice, key);
  input.lines.forEach((line, at) => {
    if (line.lineId !== null && !order.lines.some((one) => one.lineId === line.lineId))
      throw new AppError('bad_input', 'A line is not of this order.', {
        fields: [{ field: `lines.${at}.lineId`, message: 'This line is not of this order.' }],
      });
  });

  await ctx.tx.delete(clearances).where(eq(clearances.invoiceId, invoice.id));
  await ctx.tx.delete(invoiceLines).where(eq(invoiceLines.invoiceId, invoice.id));
  await ctx.tx
    .insert(invoiceLines)
    .values(
      input.lines.map((line, at) => ({ ...line, shopId: shopOf(ctx), invoiceId: invoice.id, seq: at + 1 })),
    );
  const { number, datedOn, dueOn, currency, totalMinor } = input;
  const version = invoice.version + 1;
  await ctx.tx
    .update(invoices)
    .set({ number, numberKey: key, datedOn, dueOn, currency, totalMinor, enteredAt: ctx.now, version })
    .where(eq(invoices.id, invoice.id));
  await recordAudit(ctx, {
    action: 'invoice.enter',
    entity: 'invoice',
    entityId: invoice.id,
    before: { number: invoice.number, totalMinor: invoice.totalMinor },
    after: { number, datedOn, dueOn, currency, totalMinor, lines: input.lines },
  });
  return { version };
}

async function refuseSameNumber(
  ctx: Ctx,
  invoice: { id: string; processorId: string },
  key: string,
): Promise<void> {
  const [other] = await ctx.tx
    .select({ number: invoices.number, batch: batches.number })
    .from(invoices)
    .innerJoin(batches, eq(batches.id, invoices.batchId))
    .where(
      and(
        eq(invoices.processorId, invoice.processorId),
        eq(invoices.numberKey, key),
        isNull(invoices.refusedAt),
        ne(invoices.id, invoice.id),
      ),
    );
  if (other)
    throw new AppError(
      'conflict',
      `This processor’s invoice ${other.number ?? key} is entered already, for ${other.batch}. The same invoice is not paid twice.`,
      {
        fields: [
          { field: 'number', message: `Entered already as ${other.number ?? key}, for ${other.batch}.` },
        ],
      },
    );
}
