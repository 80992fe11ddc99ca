import { asc, eq, sql } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { clearances, invoiceLines, invoices } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import { differencesOf, toPayMinor, type Difference, type InvoiceLine, type OrderSide } from './differences';

export type StoredInvoice = typeof invoices.$inferSelect;
export type OrderRow = OrderSide['lines'][number] & { partRevision: string; partName: string };

export interface ReadInvoice {
  invoice: StoredInvoice;
  lines: InvoiceLine[];
  order: Omit<OrderSide, 'lines'> & { lines: OrderRow[] };
  differences: (Difference & { clearance: typeof clearances.$inferSelect | null })[];
  withheldMinor: number;
  toPayMinor: number | null;
}

/**
 * An invoice with its order, the accepted pieces and what differs.
 *
 * @param lock holds it until the transaction ends, for verbs that change it.
 */
export async function readInvoice(ctx: Pick<Ctx, 'tx'>, invoiceId: string, { lock = false } = {}): Promise<ReadInvoice> {
  const query = ctx.tx.select().from(invoices).where(eq(invoices.id, invoiceId));
  const [invoice] = await (lock ? query.for('update') : query);
  if (!invoice) throw notFound('invoice');
  const lines = await ctx.tx
    .select({ seq: invoiceLines.seq, kind: invoiceLines.kind, lineId: invoiceLines.lineId, description: invoiceLines.description, pieces: invoiceLines.pieces, unitPriceMinor: invoiceLines.unitPriceMinor, amountMinor: invoiceLines.amountMinor })
    .from(invoiceLines)
    .where(eq(invoiceLines.invoiceId, invoiceId))
    .orderBy(asc(invoiceLines.seq));
  const order = await readOrder(ctx, invoice.batchId);
  const cleared = await ctx.tx.select().from(clearances).where(eq(clearances.invoiceId, invoiceId));
  const entered = invoice.enteredAt !== null && invoice.totalMinor !== null;
  const differences = (entered ? differencesOf(order, { currency: invoice.currency, totalMinor: invoice.totalMinor ?? 0, lines }) : []).map((one) => ({ ...one, clearance: cleared.find((row) => row.difference === one.key) ?? null }));
  const withheld = differences.filter((one) => one.clearance?.choice === 'withhold').map((one) => one.overMinor);
  return { invoice, lines, order, differences, withheldMinor: withheld.reduce((sum, one) => sum + one, 0), toPayMinor: entered ? toPayMinor(invoice.totalMinor ?? 0, withheld) : null };
}

async function readOrder(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<ReadInvoice['order']> {
  const [batch] = await ctx.tx.select({ currency: batches.currency, lotMinimumMinor: batches.lotMinimumMinor, certificationFeeMinor: batches.certificationFeeMinor }).from(batches).where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const { rows } = await ctx.tx.execute<OrderRow & Record<string, unknown>>(sql`
    select l.id as "lineId", l.line_no as "lineNo", coalesce(l.frozen->>'partNumber', a.number) as "partNumber", coalesce(l.frozen->>'partRevision', a.revision) as "partRevision",
      coalesce(l.frozen->>'partName', a.name) as "partName", l.pieces as ordered, l.unit_price_minor::int as "unitPriceMinor",
      least(l.pieces, coalesce((select sum(c.pieces) from coverage c where c.line_id = l.id), 0)
        + coalesce((select sum(d.pieces) from dispositions d join nonconformances n on n.id = d.nonconformance_id where n.line_id = l.id and d.disposition in ('use_as_is', 'concession')), 0)
        - coalesce((select sum(n.covered_pieces) from nonconformances n where n.line_id = l.id), 0))::int as accepted
    from batch_lines l join lots o on o.id = l.lot_id join parts a on a.id = o.part_id where l.batch_id = ${batchId} order by l.line_no`);
  return { ...batch, lines: rows };
}

/** Locks an invoice that may still be changed, at the version the person saw. */
export async function lockInvoice(ctx: Pick<Ctx, 'tx'>, { invoiceId, version }: { invoiceId: string; version: number }, wanted: 'unapproved' | 'approved'): Promise<ReadInvoice> {
  const read = await readInvoice(ctx, invoiceId, { lock: true });
  const { invoice } = read;
  if (invoice.version !== version) throw new AppError('conflict', 'Not saved: the invoice was changed meanwhile. Look at what it is now, then decide again.');
  if (invoice.refusedAt !== null) throw new AppError('conflict', 'This invoice was refused. A corrected one is entered anew.');
  if (wanted === 'unapproved' && invoice.approvedAt !== null) throw new AppError('conflict', 'This invoice is approved. What was approved does not change.');
  if (wanted === 'approved' && invoice.approvedAt === null) throw new AppError('conflict', 'This invoice is not approved yet.');
  return read;
}
