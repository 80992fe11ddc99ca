import type { Ctx } from '@/lib/auth/context';
import { queueMail } from '@/lib/mail/queue-mail';
import { Currency } from '@/lib/money';
import { batchForMail } from '@/lib/portal/batch-for-mail';
import { openBatchUrl } from '@/lib/portal/open-batch-url';
import { ofBatchProps } from '@/lib/portal/queue-batch-mail';

import type { StoredInvoice } from './read-invoice';

/** Queues the mail that tells the processor which invoice is refused and why; answers reach whoever refused it. */
export async function queueRefusal(ctx: Ctx, invoice: StoredInvoice, reason: string): Promise<void> {
  const batch = await batchForMail(ctx, invoice.batchId);
  await queueMail(ctx, {
    template: 'invoice-refused',
    to: batch.deskEmail,
    props: {
      ...ofBatchProps(ctx, batch),
      stage: batch.stage,
      invoiceNumber: invoice.number,
      invoiceDatedOn: invoice.datedOn,
      currency: Currency.parse(invoice.currency),
      totalMinor: invoice.totalMinor,
      reason,
      url: await openBatchUrl(ctx, batch),
    },
  });
}
