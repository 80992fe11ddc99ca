import { and, desc, eq, isNotNull, ne } from 'drizzle-orm';

import { batches, batchLines } from '@/db/schema/batches';
import { invoices } from '@/db/schema/money';
import { readings } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { compareInvoice } from '@/lib/evidence/invoice/compare-invoice';
import type { SeenInvoice, StatedInvoice } from '@/lib/evidence/invoice/invoice';
import { KeptInvoice, type KeptPage } from '@/lib/readings/kept-reading';
import { readBatchOrder } from '@/lib/readings/orders-of-batch';

import type { InvoiceReading } from './reading-contract';

const NOTHING: InvoiceReading = {
  state: null,
  fault: null,
  number: null,
  datedOn: null,
  dueOn: null,
  currency: null,
  totalMinor: null,
  lines: [],
  facts: [],
  pages: [],
  discrepancies: [],
};
/** Enough to find a second copy in; older ones are found when the number is entered. */
const MOST_EARLIER = 200;

const minor = (amount: number | null): number | null => (amount === null ? null : Math.round(amount * 100));

/** What the machine read on an invoice, each line beside the line of the order that it is for. */
export async function getInvoiceReading(
  ctx: Ctx,
  { invoiceId }: { invoiceId: string },
): Promise<InvoiceReading> {
  authorize(ctx, 'invoice.read');
  const [found] = await ctx.tx
    .select({ invoice: invoices, reading: readings })
    .from(invoices)
    .leftJoin(readings, eq(readings.fileId, invoices.fileId))
    .where(eq(invoices.id, invoiceId));
  if (!found) throw notFound('invoice');
  const { invoice, reading } = found;
  if (!reading) return NOTHING;
  const head = { ...NOTHING, state: reading.state, fault: reading.fault };
  const kept = KeptInvoice.safeParse(reading.content);
  if (reading.state !== 'read' || !kept.success) return head;
  const stated = kept.data.invoice;
  const order = await readBatchOrder(ctx, invoice.batchId);
  return {
    ...head,
    number: stated.invoice_number,
    datedOn: stated.invoice_date,
    dueOn: stated.due_date,
    currency: stated.currency,
    totalMinor: minor(stated.total),
    facts: stated.facts,
    pages: reading.pages as KeptPage[],
    lines: [...pieceLines(stated, await orderedLines(ctx, invoice.batchId)), ...charges(stated)],
    discrepancies: compareInvoice({
      stated,
      // Prices and pieces are compared line by line once it is entered; here the paper itself is looked at.
      order: order && { ...order.order, price: null },
      seen: await earlier(ctx, invoice),
    }),
  };
}

type OrderedLine = { id: string; partNumber: string };

async function orderedLines(ctx: Ctx, batchId: string): Promise<OrderedLine[]> {
  const lines = await ctx.tx
    .select({ id: batchLines.id, frozen: batchLines.frozen })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId));
  return lines.map(({ id, frozen }) => ({ id, partNumber: frozen?.partNumber ?? '' }));
}

const pieceLines = (stated: StatedInvoice, ordered: readonly OrderedLine[]): InvoiceReading['lines'] =>
  stated.lines.map(({ part_number, qty, unit_price, amount }, at) => ({
    kind: 'pieces',
    field: `lines[${at}]`,
    lineId: ordered.find(({ partNumber }) => partNumber === part_number)?.id ?? null,
    description: part_number ?? 'as printed',
    pieces: qty !== null && Number.isInteger(qty) ? qty : null,
    unitPriceMinor: minor(unit_price),
    amountMinor: minor(amount),
  }));

function charges(stated: StatedInvoice): InvoiceReading['lines'] {
  const charge = (
    kind: InvoiceReading['lines'][number]['kind'],
    { field, description = field, amount }: { field: string; description?: string; amount: number | null },
  ): InvoiceReading['lines'] =>
    amount === 0
      ? []
      : [
          {
            kind,
            lineId: null,
            field,
            description,
            pieces: null,
            unitPriceMinor: null,
            amountMinor: minor(amount),
          },
        ];
  return [
    ...charge('lot_minimum', {
      field: 'lot_minimum_adjustment',
      description: 'to the lot minimum',
      amount: stated.lot_minimum_adjustment,
    }),
    ...charge('certification', {
      field: 'certification_fee',
      description: 'certification',
      amount: stated.certification_fee,
    }),
    ...charge('freight', { field: 'freight', amount: stated.freight }),
    ...charge('tax', { field: 'tax', amount: stated.tax }),
    ...stated.other_charges.flatMap((one, at) => charge('other', { field: `other_charges[${at}]`, ...one })),
  ];
}

/** Invoices of the same processor as they were entered or read, for finding a second copy of one. */
async function earlier(
  ctx: Ctx,
  { id, processorId }: { id: string; processorId: string },
): Promise<SeenInvoice[]> {
  const rows = await ctx.tx
    .select({
      number: invoices.number,
      datedOn: invoices.datedOn,
      totalMinor: invoices.totalMinor,
      order: batches.orderNumber,
      content: readings.content,
    })
    .from(invoices)
    .innerJoin(batches, eq(batches.id, invoices.batchId))
    .leftJoin(readings, eq(readings.fileId, invoices.fileId))
    .where(and(eq(invoices.processorId, processorId), ne(invoices.id, id), isNotNull(invoices.number)))
    .orderBy(desc(invoices.id))
    .limit(MOST_EARLIER);
  return rows.map((row) => {
    const kept = KeptInvoice.safeParse(row.content);
    return {
      // Where the money was to go stands among its facts.
      ...(kept.success && { facts: kept.data.invoice.facts }),
      invoice_number: row.number,
      invoice_date: row.datedOn,
      purchase_order: row.order,
      total: row.totalMinor === null ? null : row.totalMinor / 100,
    };
  });
}
