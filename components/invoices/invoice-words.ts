import type { INVOICE_LINE_KINDS, INVOICE_STATES } from '@/lib/invoices/contract';

type State = (typeof INVOICE_STATES)[number];

/** What is to be done with it next, or what became of it. */
export const INVOICE_STATE_WORDS: Record<State, string> = {
  to_enter: 'to enter',
  to_clear: 'differences to clear',
  to_approve: 'to approve',
  second_approval: 'second approval',
  to_pay: 'to pay',
  paying: 'being paid',
  payment_failed: 'payment failed',
  paid: 'paid',
  refused: 'refused',
};

/** Does not meet, or did not happen: red oxide. */
export const STATES_IN_RED: readonly State[] = ['to_clear', 'payment_failed'];

export const LINE_KIND_WORDS: Record<(typeof INVOICE_LINE_KINDS)[number], string> = {
  pieces: 'Pieces',
  lot_minimum: 'Up to the lot minimum',
  certification: 'Papers',
  freight: 'Freight',
  tax: 'Tax',
  other: 'Something else',
};

export const invoiceName = ({ number }: { number: string | null }): string => number ?? 'not entered';
