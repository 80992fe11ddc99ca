import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { Currency, Minor } from '@/lib/money';

export const INVOICE_LINE_KINDS = [
  'pieces',
  'lot_minimum',
  'certification',
  'freight',
  'tax',
  'other',
] as const;
/** Which of them a list shows: what asks for something, what is done with. */
export const INVOICE_VIEWS = ['open', 'paid', 'refused', 'all'] as const;
export type InvoiceView = (typeof INVOICE_VIEWS)[number];
/** What is to be done with it next; follows from its records by `invoiceState`. */
export const INVOICE_STATES = [
  'to_enter',
  'to_clear',
  'to_approve',
  'second_approval',
  'to_pay',
  'paying',
  'payment_failed',
  'paid',
  'refused',
] as const;

export const InvoiceLineInput = z
  .object({
    kind: z.enum(INVOICE_LINE_KINDS),
    lineId: Id.nullable(),
    description: z.string().trim().min(1, 'Say what it is for.').max(200),
    pieces: z.int('Enter a whole number of pieces.').min(0).max(1_000_000).nullable(),
    unitPriceMinor: Minor.nullable(),
    amountMinor: Minor,
  })
  .refine((line) => line.kind !== 'pieces' || (line.pieces !== null && line.unitPriceMinor !== null), {
    message: 'Enter pieces and price.',
    path: ['pieces'],
  });
export type InvoiceLineInput = z.output<typeof InvoiceLineInput>;

export const InvoiceRow = z.object({
  id: Id,
  number: z.string().nullable(),
  state: z.enum(INVOICE_STATES),
  processor: z.string(),
  batchId: Id,
  batchNumber: z.string(),
  stage: z.enum(STAGES),
  orderNumber: z.string(),
  datedOn: z.string().nullable(),
  dueOn: z.string().nullable(),
  currency: z.string(),
  totalMinor: z.int().nullable(),
  balanceMinor: z.int(),
  createdAt: Moment,
});
export type InvoiceRow = z.output<typeof InvoiceRow>;

export const listInvoices = declare({
  id: 'listInvoices',
  method: 'get',
  path: '/invoices',
  summary: 'Invoices, newest first',
  side: 'shop',
  permission: 'invoice.read',
  input: PageQuery.extend({
    after: Id.optional(),
    batchId: Id.optional(),
    show: z.enum(INVOICE_VIEWS).default('all'),
  }),
  response: pageOf(InvoiceRow),
});

export const InvoiceDifference = z.object({
  key: z.string(),
  code: z.string(),
  seq: z.int().nullable(),
  overMinor: z.int(),
  sentence: z.string(),
  clearance: z
    .object({ choice: z.enum(['accept', 'withhold']), reason: z.string(), by: z.string(), at: Moment })
    .nullable(),
});
export type InvoiceDifference = z.output<typeof InvoiceDifference>;

const Approval = z.object({ by: z.string(), at: Moment, byMe: z.boolean() });

export const InvoiceDetail = InvoiceRow.extend({
  version: z.int(),
  /** The page as it was received. */
  file: z.object({ id: Id, name: z.string(), size: z.int(), mediaType: z.string() }).nullable(),
  sentBy: z.string(),
  refusedReason: z.string().nullable(),
  /** Null until the invoice is entered. */
  toPayMinor: z.int().nullable(),
  withheldMinor: z.int(),
  approved: Approval.nullable(),
  secondApproved: Approval.nullable(),
  secondApprovalAboveMinor: z.int().nullable(),
  lines: z.array(
    z.object({
      seq: z.int(),
      kind: z.enum(INVOICE_LINE_KINDS),
      lineId: Id.nullable(),
      description: z.string(),
      pieces: z.int().nullable(),
      unitPriceMinor: z.int().nullable(),
      amountMinor: z.int(),
    }),
  ),
  order: z.object({
    currency: z.string(),
    lotMinimumMinor: z.int(),
    certificationFeeMinor: z.int(),
    expectedMinor: z.int(),
    lines: z.array(
      z.object({
        lineId: Id,
        lineNo: z.int(),
        partNumber: z.string(),
        partRevision: z.string(),
        partName: z.string(),
        ordered: z.int(),
        unitPriceMinor: z.int(),
        accepted: z.int(),
      }),
    ),
  }),
  differences: z.array(InvoiceDifference),
  /** Signed certificates of the batch, with the pieces they cover. */
  papers: z.array(z.object({ id: Id, number: z.string().nullable(), pieces: z.int() })),
  seenBefore: z.array(
    z.object({
      id: Id,
      number: z.string().nullable(),
      batchNumber: z.string(),
      why: z.enum(['same_number', 'same_order', 'same_total', 'same_file']),
    }),
  ),
  payments: z.array(
    z.object({
      id: Id,
      attempt: z.int(),
      amountMinor: z.int(),
      state: z.enum(['pending', 'succeeded', 'failed', 'refunded']),
      failure: z.string().nullable(),
      handedOver: z.boolean(),
      by: z.string(),
      startedAt: Moment,
      endedAt: Moment.nullable(),
    }),
  ),
  entries: z.array(
    z.object({
      kind: z.enum(['invoiced', 'withheld', 'credited', 'paid', 'refunded']),
      amountMinor: z.int(),
      by: z.string(),
      at: Moment,
    }),
  ),
  /** What paying needs besides the approval. `otherHands`: the shop refuses that who approved also pays, and I approved. */
  payable: z.object({ methodSaved: z.boolean(), processorReady: z.boolean(), otherHands: z.boolean() }),
});
export type InvoiceDetail = z.output<typeof InvoiceDetail>;

/** Which invoice, and as of which version it was seen. */
export const OfInvoice = z.object({ invoiceId: Id, version: z.int() });
export const Changed = z.object({ version: z.int() });

export const getInvoice = declare({
  id: 'getInvoice',
  method: 'get',
  path: '/invoices/{invoiceId}',
  summary: 'One invoice against its order and the accepted pieces',
  side: 'shop',
  permission: 'invoice.read',
  input: z.object({ invoiceId: Id }),
  response: InvoiceDetail,
});

export const addInvoice = declare({
  id: 'addInvoice',
  method: 'post',
  path: '/invoices',
  summary: 'Take up an invoice that came on paper or by mail',
  side: 'shop',
  permission: 'invoice.enter',
  input: z.object({ batchId: Id, fileId: Id.nullable() }),
  response: z.object({ id: Id }),
});

export const enterInvoice = declare({
  id: 'enterInvoice',
  method: 'put',
  path: '/invoices/{invoiceId}',
  summary: 'Enter what the invoice says',
  side: 'shop',
  permission: 'invoice.enter',
  input: OfInvoice.extend({
    number: z.string().trim().min(1, 'Enter the number of the invoice.').max(60),
    datedOn: Day,
    dueOn: Day.nullable(),
    currency: Currency,
    totalMinor: Minor.min(0, 'Enter the total of the invoice.'),
    lines: z.array(InvoiceLineInput).min(1, 'Enter at least one line.').max(500),
  }),
  response: Changed,
});

export const clearDifference = declare({
  id: 'clearDifference',
  method: 'post',
  path: '/invoices/{invoiceId}/clear',
  summary: 'Clear one difference: pay it as invoiced, or pay without it',
  side: 'shop',
  permission: 'invoice.enter',
  input: OfInvoice.extend({
    difference: z.string().max(80),
    choice: z.enum(['accept', 'withhold']),
    reason: z.string().trim().max(500).default(''),
  }),
  response: Changed,
});

export const undoClearance = declare({
  id: 'undoClearance',
  method: 'post',
  path: '/invoices/{invoiceId}/undo-clear',
  summary: 'Take a clearance back',
  side: 'shop',
  permission: 'invoice.enter',
  input: OfInvoice.extend({ difference: z.string().max(80) }),
  response: Changed,
});
