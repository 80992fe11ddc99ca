import { aliasedTable, and, asc, desc, eq, inArray, isNull, lt, or, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { certificates, coverage } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { invoices, moneyEntries, payments } from '@/db/schema/money';
import { processors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { expectedPrice } from '@/lib/batches/expected-price';
import { notFound } from '@/lib/errors';
import { fileRefColumns } from '@/lib/files/queries';

import type { listInvoices as listDeclaration, InvoiceView } from './contract';
import { invoiceState } from './invoice-state';
import { readInvoice, readInvoices, type ReadInvoice } from './read-invoice';
import { seenBefore } from './seen-before';

const balance = sql<number>`coalesce((select sum(m.amount_minor) from money_entries m where m.invoice_id = ${invoices.id}), 0)::int`;
const lastPayment = sql<
  'pending' | 'succeeded' | 'failed' | 'refunded' | null
>`(select p.state from payments p where p.invoice_id = ${invoices.id} order by p.attempt desc limit 1)`;

const rowColumns = {
  id: invoices.id,
  number: invoices.number,
  processor: processors.name,
  batchId: invoices.batchId,
  batchNumber: batches.number,
  stage: batches.stage,
  orderNumber: batches.orderNumber,
  datedOn: invoices.datedOn,
  dueOn: invoices.dueOn,
  currency: invoices.currency,
  totalMinor: invoices.totalMinor,
  balanceMinor: balance,
  createdAt: invoices.createdAt,
};
const stateColumns = {
  entered: sql<boolean>`${invoices.enteredAt} is not null`,
  refused: sql<boolean>`${invoices.refusedAt} is not null`,
  approvedMinor: invoices.approvedMinor,
  secondApprovedAt: invoices.secondApprovedAt,
  lastPayment,
};

/** Newest first; ids are time-ordered, so the id is the key of the page. */
export async function listInvoices(
  ctx: Ctx,
  { after, limit, batchId, show }: z.output<(typeof listDeclaration)['input']>,
) {
  authorize(ctx, 'invoice.read');
  const conditions = [
    after === undefined ? undefined : lt(invoices.id, after),
    batchId === undefined ? undefined : eq(invoices.batchId, batchId),
    shown(show),
  ];
  const rows = await selectRows(ctx, and(...conditions))
    .orderBy(desc(invoices.id))
    .limit(limit + 1);
  const above = await secondApprovalAbove(ctx);
  const undecided = rows
    .filter((row) => row.entered && !row.refused && row.approvedMinor === null)
    .map((row) => row.id);
  const read = await readInvoices(ctx, undecided);
  return toPage(
    rows.map((row) => ({ ...row, state: stateOf(row, above, read.get(row.id)) })),
    limit,
    (row) => row.id,
  );
}

function shown(show: InvoiceView): SQL | undefined {
  switch (show) {
    case 'open':
      return and(isNull(invoices.refusedAt), or(isNull(invoices.approvedAt), sql`${balance} > 0`));
    case 'paid':
      return and(isNull(invoices.refusedAt), sql`${invoices.approvedAt} is not null`, sql`${balance} <= 0`);
    case 'refused':
      return sql`${invoices.refusedAt} is not null`;
    case 'all':
      return undefined;
  }
}

const selectRows = (ctx: Ctx, where: SQL | undefined) =>
  ctx.tx
    .select({ ...rowColumns, ...stateColumns })
    .from(invoices)
    .innerJoin(batches, eq(batches.id, invoices.batchId))
    .innerJoin(processors, eq(processors.id, invoices.processorId))
    .where(where);

type Row = Awaited<ReturnType<typeof selectRows>>[number];

const openDifferences = (read: ReadInvoice | undefined): number =>
  (read?.differences ?? []).filter((one) => one.clearance === null).length;

function stateOf(row: Row, secondApprovalAboveMinor: number | null, read: ReadInvoice | undefined) {
  return invoiceState({
    refused: row.refused,
    entered: row.entered,
    openDifferences: openDifferences(read),
    approved: row.approvedMinor !== null,
    needsSecond: isAbove(row.approvedMinor, secondApprovalAboveMinor),
    secondApproved: row.secondApprovedAt !== null,
    balanceMinor: row.balanceMinor,
    lastPayment: row.lastPayment,
  });
}

const isAbove = (minor: number | null, above: number | null): boolean =>
  minor !== null && above !== null && minor > above;

async function secondApprovalAbove(ctx: Ctx): Promise<number | null> {
  const [shop] = await ctx.tx
    .select({ above: shops.secondApprovalAboveMinor })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return shop?.above ?? null;
}

export async function getInvoice(ctx: Ctx, { invoiceId }: { invoiceId: string }) {
  authorize(ctx, 'invoice.read');
  const [row] = await selectRows(ctx, eq(invoices.id, invoiceId));
  if (!row) throw notFound('invoice');
  const read = await readInvoice(ctx, invoiceId);
  const { invoice, order, differences } = read;
  const [file] =
    invoice.fileId === null
      ? []
      : await ctx.tx.select(fileRefColumns).from(files).where(eq(files.id, invoice.fileId));
  const above = await secondApprovalAbove(ctx);
  return {
    ...row,
    state: stateOf(row, above, read),
    version: invoice.version,
    file: file ?? null,
    sentBy: invoice.sentBy,
    refusedReason: invoice.refusedReason,
    toPayMinor: read.toPayMinor,
    withheldMinor: read.withheldMinor,
    ...(await readApprovals(ctx, read)),
    secondApprovalAboveMinor: above,
    lines: read.lines,
    order: {
      ...order,
      expectedMinor: expectedPrice({
        ...order,
        lines: order.lines.map((line) => ({ pieces: line.ordered, unitPriceMinor: line.unitPriceMinor })),
      }).totalMinor,
    },
    differences: differences.map(({ clearance, ...one }) => ({
      ...one,
      clearance: clearance && {
        choice: clearance.choice === 'accept' ? ('accept' as const) : ('withhold' as const),
        reason: clearance.reason,
        by: clearance.clearedBy,
        at: clearance.clearedAt,
      },
    })),
    papers: await readPapers(ctx, invoice.batchId),
    seenBefore: await seenBefore(ctx, invoice),
    payments: await readPayments(ctx, invoiceId),
    entries: await ctx.tx
      .select({
        kind: moneyEntries.kind,
        amountMinor: moneyEntries.amountMinor,
        by: moneyEntries.enteredBy,
        at: moneyEntries.enteredAt,
      })
      .from(moneyEntries)
      .where(eq(moneyEntries.invoiceId, invoiceId))
      .orderBy(asc(moneyEntries.id)),
    payable: await readPayable(ctx, read),
  };
}

async function readApprovals(ctx: Ctx, { invoice }: ReadInvoice) {
  const ids = [invoice.approvedBy, invoice.secondApprovedBy].filter((id) => id !== null);
  const names =
    ids.length === 0
      ? []
      : await ctx.tx.select({ id: users.id, name: users.name }).from(users).where(inArray(users.id, ids));
  const me = personOf(ctx.actor);
  const approval = (at: Date | null, by: string | null) =>
    at && { at, by: names.find((one) => one.id === by)?.name ?? 'somebody', byMe: by !== null && by === me };
  return {
    approved: approval(invoice.approvedAt, invoice.approvedBy),
    secondApproved: approval(invoice.secondApprovedAt, invoice.secondApprovedBy),
  };
}

const readPapers = (ctx: Ctx, batchId: string) =>
  ctx.tx
    .select({
      id: certificates.id,
      number: certificates.number,
      pieces: sql<number>`sum(${coverage.pieces})::int`,
    })
    .from(coverage)
    .innerJoin(certificates, eq(certificates.id, coverage.certificateId))
    .where(eq(certificates.batchId, batchId))
    .groupBy(certificates.id, certificates.number)
    .orderBy(asc(certificates.id));

async function readPayments(ctx: Ctx, invoiceId: string) {
  const payer = aliasedTable(users, 'payer');
  return ctx.tx
    .select({
      id: payments.id,
      attempt: payments.attempt,
      amountMinor: payments.amountMinor,
      state: payments.state,
      failure: payments.failure,
      handedOver: sql<boolean>`${payments.intentId} is not null`,
      by: sql<string>`coalesce(${payer.name}, 'somebody')`,
      startedAt: payments.startedAt,
      endedAt: payments.endedAt,
    })
    .from(payments)
    .leftJoin(payer, eq(payer.id, payments.paidBy))
    .where(eq(payments.invoiceId, invoiceId))
    .orderBy(desc(payments.attempt));
}

async function readPayable(ctx: Ctx, { invoice }: ReadInvoice) {
  const [shop] = await ctx.tx
    .select({ policy: shops.approvalAndPayment, paymentMethod: shops.stripePaymentMethodId })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const [processor] = await ctx.tx
    .select({ account: processors.stripeAccountId, ready: processors.payoutsReady })
    .from(processors)
    .where(eq(processors.id, invoice.processorId));
  const me = personOf(ctx.actor);
  const iApproved = me !== null && [invoice.approvedBy, invoice.secondApprovedBy].includes(me);
  return {
    methodSaved: (shop?.paymentMethod ?? null) !== null,
    processorReady: processor?.ready === true && processor.account !== null,
    otherHands: iApproved && shop?.policy === 'refuse',
  };
}
