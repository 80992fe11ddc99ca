import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';

import type * as contract from './pay-contract';
import { queueRefusal } from './queue-refusal';
import { lockInvoice } from './read-invoice';

/** Refuses an invoice that is not approved. The processor is told why by mail; the number is free for a corrected copy. */
export async function refuseInvoice(ctx: Ctx, input: z.output<(typeof contract.refuseInvoice)['input']>) {
  authorize(ctx, 'invoice.approve');
  const { invoice } = await lockInvoice(ctx, input, 'unapproved');
  const version = invoice.version + 1;
  await ctx.tx
    .update(invoices)
    .set({ refusedAt: ctx.now, refusedReason: input.reason, version })
    .where(eq(invoices.id, invoice.id));
  await recordAudit(ctx, {
    action: 'invoice.refuse',
    entity: 'invoice',
    entityId: invoice.id,
    after: { number: invoice.number, reason: input.reason },
  });
  await refreshStanding(ctx, invoice.batchId);
  await queueRefusal(ctx, invoice, input.reason);
  return { version };
}
