import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id } from '@/lib/api/shapes';
import { InvoiceDiscrepancy } from '@/lib/evidence/invoice/invoice';
import { Fact } from '@/lib/evidence/fact';
import { KeptPage } from '@/lib/readings/kept-reading';
import { READING_STATES } from '@/lib/readings/reading-state';

import { INVOICE_LINE_KINDS } from './contract';

/** What the machine read on an invoice, in the form it is entered in. The office enters; this only saves the typing. */
export const InvoiceReading = z.object({
  state: z.enum(READING_STATES).nullable(),
  fault: z.string().nullable(),
  number: z.string().nullable(),
  datedOn: z.string().nullable(),
  dueOn: z.string().nullable(),
  currency: z.string().nullable(),
  totalMinor: z.int().nullable(),
  lines: z.array(
    z.object({
      kind: z.enum(INVOICE_LINE_KINDS),
      lineId: Id.nullable(),
      description: z.string(),
      pieces: z.int().nullable(),
      unitPriceMinor: z.int().nullable(),
      amountMinor: z.int().nullable(),
      /** What its facts are called: `lines[0]` with what stands in that row, or the charge itself. */
      field: z.string(),
    }),
  ),
  /** Where each thing stands. */
  facts: z.array(Fact),
  pages: z.array(KeptPage),
  discrepancies: z.array(InvoiceDiscrepancy),
});
export type InvoiceReading = z.output<typeof InvoiceReading>;

export const getInvoiceReading = declare({
  id: 'getInvoiceReading',
  method: 'get',
  path: '/invoices/{invoiceId}/reading',
  summary: 'What the machine read on an invoice',
  side: 'shop',
  permission: 'invoice.read',
  input: z.object({ invoiceId: Id }),
  response: InvoiceReading,
});

export const readInvoiceAgain = declare({
  id: 'readInvoiceAgain',
  method: 'post',
  path: '/invoices/{invoiceId}/read-again',
  summary: 'Have the machine read an invoice once more',
  side: 'shop',
  permission: 'invoice.enter',
  input: z.object({ invoiceId: Id }),
  response: z.object({ state: z.enum(READING_STATES) }),
});
