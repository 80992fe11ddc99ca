import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { payments } from '@/db/schema/money';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { newId } from '@/lib/ids';
import { approveInvoice } from '@/lib/invoices/approve-invoice';
import { clearDifference } from '@/lib/invoices/clear-difference';
import { enterInvoice } from '@/lib/invoices/enter-invoice';
import { balanceOf, enterMoney } from '@/lib/invoices/money-ledger';
import { readInvoice } from '@/lib/invoices/read-invoice';

import { invoiceLinesOf, invoiceNumber } from './batch-papers';
import { addDays, dayOf } from './organisations';

interface Paying {
  batchId: string;
  invoiceId: string;
  extra?: { description: string; amountMinor: number } | undefined;
  /** Also clear, approve and pay it; otherwise it is only entered. */
  pay: boolean;
  datedOn: string;
}

/** The office enters the invoice and, where the plot says so, clears, approves and pays it. Payments of the past left no trace at the payment service, so they are recorded as ended. */
export async function payThrough(
  ctx: Ctx,
  { batchId, invoiceId, extra, pay, datedOn }: Paying,
): Promise<void> {
  const read = await readInvoice(ctx, invoiceId);
  if (read.invoice.enteredAt === null) {
    const [batch] = await ctx.tx
      .select({ number: batches.number })
      .from(batches)
      .where(eq(batches.id, batchId));
    const lines = invoiceLinesOf(
      read.order.lines.map((line) => ({
        id: line.lineId,
        partNumber: line.partNumber,
        partRevision: line.partRevision,
        pieces: line.ordered,
        unitPriceMinor: line.unitPriceMinor,
      })),
      read.order,
      extra,
    );
    await enterInvoice(ctx, {
      invoiceId,
      version: read.invoice.version,
      number: invoiceNumber(batch?.number ?? ''),
      datedOn,
      dueOn: dayOf(addDays(ctx.now, 30)),
      currency: 'USD',
      totalMinor: lines.reduce((sum, line) => sum + line.amountMinor, 0),
      lines,
    });
  }
  if (!pay) return;
  let current = await readInvoice(ctx, invoiceId);
  for (const difference of current.differences) {
    await clearDifference(ctx, {
      invoiceId,
      version: current.invoice.version,
      difference: difference.key,
      choice: 'withhold',
      reason: '',
    });
    current = await readInvoice(ctx, invoiceId);
  }
  await approveInvoice(ctx, { invoiceId, version: current.invoice.version });
  const owed = await balanceOf(ctx, invoiceId);
  if (owed > 0) await recordPaid(ctx, { invoiceId, owed });
  await refreshStanding(ctx, batchId);
}

async function recordPaid(ctx: Ctx, { invoiceId, owed }: { invoiceId: string; owed: number }): Promise<void> {
  const id = newId();
  await ctx.tx.insert(payments).values({
    id,
    shopId: shopOf(ctx),
    invoiceId,
    attempt: 1,
    amountMinor: owed,
    currency: 'USD',
    state: 'succeeded',
    intentId: `told_${id}`,
    paidBy: personOf(ctx.actor) ?? id,
    startedAt: ctx.now,
    endedAt: ctx.now,
  });
  await enterMoney(ctx, {
    invoiceId,
    kind: 'paid',
    amountMinor: -owed,
    currency: 'USD',
    cause: `payment:${id}`,
  });
}
