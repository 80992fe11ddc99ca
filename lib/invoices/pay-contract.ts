import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id } from '@/lib/api/shapes';
import { Minor } from '@/lib/money';

import { Changed, OfInvoice } from './contract';

const Reason = z
  .string()
  .trim()
  .min(5, 'Give the reason in a few words.')
  .max(500, 'Write 500 characters or less.');

export const approveInvoice = declare({
  id: 'approveInvoice',
  method: 'post',
  path: '/invoices/{invoiceId}/approve',
  summary: 'Approve what is to be paid',
  side: 'shop',
  permission: 'invoice.approve',
  input: OfInvoice,
  response: Changed,
});

export const approveInvoiceSecond = declare({
  id: 'approveInvoiceSecond',
  method: 'post',
  path: '/invoices/{invoiceId}/approve-second',
  summary: 'Approve a second time, above the shop’s limit',
  side: 'shop',
  permission: 'invoice.approve_second',
  input: OfInvoice,
  response: Changed,
});

export const refuseInvoice = declare({
  id: 'refuseInvoice',
  method: 'post',
  path: '/invoices/{invoiceId}/refuse',
  summary: 'Refuse an invoice; its number is free for a corrected one',
  side: 'shop',
  permission: 'invoice.approve',
  input: OfInvoice.extend({ reason: Reason }),
  response: Changed,
});

export const creditInvoice = declare({
  id: 'creditInvoice',
  method: 'post',
  path: '/invoices/{invoiceId}/credit',
  summary: 'Record a credit of the processor on an approved invoice',
  side: 'shop',
  permission: 'invoice.approve',
  input: OfInvoice.extend({
    amountMinor: Minor.min(1, 'Enter the amount of the credit.'),
    reference: z.string().trim().min(1, 'Enter the number of the credit.').max(60),
  }),
  response: Changed,
});

export const payInvoice = declare({
  id: 'payInvoice',
  method: 'post',
  path: '/invoices/{invoiceId}/pay',
  summary: 'Pay an approved invoice, once',
  side: 'shop',
  permission: 'invoice.pay',
  input: OfInvoice,
  response: z.object({ paymentId: Id }),
});

export const waivePayment = declare({
  id: 'waivePayment',
  method: 'post',
  path: '/batches/{batchId}/waive-payment',
  summary: 'Let pieces pass the gate without payment, with a reason',
  side: 'shop',
  permission: 'payment.waive',
  input: z.object({ batchId: Id, reason: Reason }),
  response: Done,
});
