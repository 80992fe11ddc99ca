import { eq } from 'drizzle-orm';

import { invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { readAgain } from '@/lib/readings/request-reading';

/** Has an invoice read once more, or for the first time. */
export async function readInvoiceAgain(ctx: Ctx, { invoiceId }: { invoiceId: string }) {
  authorize(ctx, 'invoice.enter');
  const [invoice] = await ctx.tx
    .select({ fileId: invoices.fileId })
    .from(invoices)
    .where(eq(invoices.id, invoiceId));
  if (!invoice) throw notFound('invoice');
  const { fileId } = invoice;
  if (fileId === null)
    throw new AppError('conflict', 'This invoice came without a file, so there is nothing to read.');
  await readAgain(ctx, { fileId, kind: 'invoice' });
  await recordAudit(ctx, {
    action: 'invoice.read_again',
    entity: 'invoice',
    entityId: invoiceId,
    after: { file: fileId },
  });
  return { state: 'waiting' as const };
}
