import type { INVOICE_STATES } from './contract';

export type InvoiceState = (typeof INVOICE_STATES)[number];

export interface InvoiceFacts {
  refused: boolean;
  entered: boolean;
  openDifferences: number;
  approved: boolean;
  /** The sum is above the shop's limit. */
  needsSecond: boolean;
  secondApproved: boolean;
  balanceMinor: number;
  /** State of the last attempt to pay, or null. */
  lastPayment: 'pending' | 'succeeded' | 'failed' | 'refunded' | null;
}

/** What is to be done with an invoice next, from its facts alone. */
export function invoiceState(facts: InvoiceFacts): InvoiceState {
  if (facts.refused) return 'refused';
  if (!facts.entered) return 'to_enter';
  if (!facts.approved) return facts.openDifferences > 0 ? 'to_clear' : 'to_approve';
  if (facts.needsSecond && !facts.secondApproved) return 'second_approval';
  if (facts.balanceMinor <= 0) return 'paid';
  if (facts.lastPayment === 'pending') return 'paying';
  return facts.lastPayment === 'failed' ? 'payment_failed' : 'to_pay';
}
