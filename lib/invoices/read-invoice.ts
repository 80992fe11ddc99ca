import { asc, eq, inArray, sql } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { clearances, invoiceLines, invoices } from '@/db/schema/money';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import {
  DIFFERENCE_WORDS,
  differencesOf,
  toPayMinor,
  type Difference,
  type InvoiceLine,
  type OrderSide,
} from './differences';

export type StoredInvoice = typeof invoices.$inferSelect;
type Clearance = typeof clearances.$inferSelect;
export type OrderRow = OrderSide['lines'][number] & { partRevision: string; partName: string };
export type InvoiceOrder = Omit<OrderSide, 'lines'> & { lines: OrderRow[] };

export interface ReadInvoice {
  invoice: StoredInvoice;
  lines: InvoiceLine[];
  order: InvoiceOrder;
  differences: (Difference & { clearance: Clearance | null })[];
  withheldMinor: number;
  toPayMinor: number | null;
}

/**
 * An invoice with its order, the accepted pieces and what differs.
 *
 * @param lock holds it until the transaction ends, for verbs that change it.
 */
export async function readInvoice(
  ctx: Pick<Ctx, 'tx'>,
  invoiceId: string,
  { lock = false } = {},
): Promise<ReadInvoice> {
  const query = ctx.tx.select().from(invoices).where(eq(invoices.id, invoiceId));
  const [invoice] = await (lock ? query.for('update') : query);
  if (!invoice) throw notFound('invoice');
  const [read] = await compareAll(ctx, [invoice]);
  if (!read) throw notFound('batch');
  return read;
}

/** Several at once, in a few statements however many there are. */
export async function readInvoices(
  ctx: Pick<Ctx, 'tx'>,
  invoiceIds: readonly string[],
): Promise<Map<string, ReadInvoice>> {
  if (invoiceIds.length === 0) return new Map();
  const found = await ctx.tx
    .select()
    .from(invoices)
    .where(inArray(invoices.id, [...invoiceIds]));
  return new Map((await compareAll(ctx, found)).map((read) => [read.invoice.id, read]));
}

async function compareAll(ctx: Pick<Ctx, 'tx'>, found: readonly StoredInvoice[]): Promise<ReadInvoice[]> {
  const ids = found.map((invoice) => invoice.id);
  const lines = await ctx.tx
    .select({
      invoiceId: invoiceLines.invoiceId,
      seq: invoiceLines.seq,
      kind: invoiceLines.kind,
      lineId: invoiceLines.lineId,
      description: invoiceLines.description,
      pieces: invoiceLines.pieces,
      unitPriceMinor: invoiceLines.unitPriceMinor,
      amountMinor: invoiceLines.amountMinor,
    })
    .from(invoiceLines)
    .where(inArray(invoiceLines.invoiceId, ids))
    .orderBy(asc(invoiceLines.seq));
  const orders = await readOrders(ctx, [...new Set(found.map((invoice) => invoice.batchId))]);
  const cleared = await ctx.tx.select().from(clearances).where(inArray(clearances.invoiceId, ids));
  return found.flatMap((invoice) => {
    const order = orders.get(invoice.batchId);
    const own = lines
      .filter((line) => line.invoiceId === invoice.id)
      .map(({ invoiceId: _, ...line }) => line);
    return order ? [compare(invoice, order, own, cleared)] : [];
  });
}

function compare(
  invoice: StoredInvoice,
  order: InvoiceOrder,
  lines: InvoiceLine[],
  cleared: readonly Clearance[],
): ReadInvoice {
  const { totalMinor, currency } = invoice;
  const entered = invoice.enteredAt !== null && totalMinor !== null;
  const live = entered ? differencesOf(order, { currency, totalMinor, lines }) : [];
  const own = cleared.filter((row) => row.invoiceId === invoice.id);
  const differences =
    invoice.approvedAt === null
      ? live.map((one) => ({ ...one, clearance: clearanceOf(one, own) }))
      : asApproved(own, live);
  const withheld = differences
    .filter((one) => one.clearance?.choice === 'withhold')
    .map((one) => one.overMinor);
  const payable = entered ? toPayMinor(totalMinor, withheld) : null;
  return {
    invoice,
    lines,
    order,
    differences,
    withheldMinor: withheld.reduce((sum, one) => sum + one, 0),
    toPayMinor: invoice.approvedMinor ?? payable,
  };
}

/** A choice holds for the sum it was made about; when pieces are accepted or refused afterwards, the difference is open again. */
const clearanceOf = (one: Difference, own: readonly Clearance[]): Clearance | null =>
  own.find((row) => row.difference === one.key && row.amountMinor === one.overMinor) ?? null;

/** What was approved does not change with pieces that are accepted later: the choices stand as they were made. */
function asApproved(own: readonly Clearance[], live: readonly Difference[]): ReadInvoice['differences'] {
  return own.map((clearance) => {
    const [code = '', seq] = clearance.difference.split(':');
    const known = live.find(
      (one) => one.key === clearance.difference && one.overMinor === clearance.amountMinor,
    );
    const named = {
      key: clearance.difference,
      code: code as Difference['code'],
      seq: seq === undefined ? null : Number(seq),
      overMinor: clearance.amountMinor,
    };
    return {
      ...named,
      sentence: known?.sentence ?? DIFFERENCE_WORDS[named.code] ?? 'Differs from the order.',
      clearance,
    };
  });
}

async function readOrders(
  ctx: Pick<Ctx, 'tx'>,
  batchIds: readonly string[],
): Promise<Map<string, InvoiceOrder>> {
  const found = await ctx.tx
    .select({
      id: batches.id,
      currency: batches.currency,
      lotMinimumMinor: batches.lotMinimumMinor,
      certificationFeeMinor: batches.certificationFeeMinor,
    })
    .from(batches)
    .where(inArray(batches.id, [...batchIds]));
  const { rows } = await ctx.tx.execute<OrderRow & { batchId: string } & Record<string, unknown>>(sql`
    select l.batch_id as "batchId", l.id as "lineId", l.line_no as "lineNo", coalesce(l.frozen->>'partNumber', a.number) as "partNumber", coalesce(l.frozen->>'partRevision', a.revision) as "partRevision",
      coalesce(l.frozen->>'partName', a.name) as "partName", l.pieces as ordered, l.unit_price_minor::int as "unitPriceMinor",
      least(l.pieces, coalesce((select sum(c.pieces) from coverage c where c.line_id = l.id), 0)
        + coalesce((select sum(d.pieces) from dispositions d join nonconformances n on n.id = d.nonconformance_id where n.line_id = l.id and d.disposition in ('use_as_is', 'concession')), 0)
        - coalesce((select sum(n.covered_pieces) from nonconformances n where n.line_id = l.id), 0))::int as accepted
    from batch_lines l join lots o on o.id = l.lot_id join parts a on a.id = o.part_id
    where ${inArray(sql`l.batch_id`, [...batchIds])} order by l.batch_id, l.line_no`);
  return new Map(
    found.map(({ id, ...terms }) => [
      id,
      { ...terms, lines: rows.filter((row) => row.batchId === id).map(({ batchId: _, ...row }) => row) },
    ]),
  );
}

/** Locks an invoice that may still be changed, at the version the person saw. */
export async function lockInvoice(
  ctx: Pick<Ctx, 'tx'>,
  { invoiceId, version }: { invoiceId: string; version: number },
  wanted: 'unapproved' | 'approved',
): Promise<ReadInvoice> {
  const read = await readInvoice(ctx, invoiceId, { lock: true });
  const { invoice } = read;
  if (invoice.version !== version)
    throw new AppError(
      'conflict',
      'Not saved: the invoice was changed meanwhile. Look at what it is now, then decide again.',
    );
  if (invoice.refusedAt !== null)
    throw new AppError('conflict', 'This invoice was refused. A corrected one is entered anew.');
  if (wanted === 'unapproved' && invoice.approvedAt !== null)
    throw new AppError('conflict', 'This invoice is approved. What was approved does not change.');
  if (wanted === 'approved' && invoice.approvedAt === null)
    throw new AppError('conflict', 'This invoice is not approved yet.');
  return read;
}
