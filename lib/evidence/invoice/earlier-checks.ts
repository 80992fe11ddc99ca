import { z } from 'zod';

import { plainKey } from '../certificate/match/alike';
import { areSameCompany } from '../certificate/match/same-company';
import { namesOrder } from '../certificate/match/same-order-number';
import type { Order } from '../order';
import { BankDetails, type InvoiceDiscrepancy, type SeenInvoice, type StatedInvoice } from './invoice';
import { minorOf } from './minor';
import { isSameInvoiceNumber } from './same-invoice-number';

/** It was not received before, also under another number or another way of writing it. */
export function isNewInvoice(stated: StatedInvoice, seen: readonly SeenInvoice[]): InvoiceDiscrepancy[] {
  const own = seen.filter((one) => mayBeSameSender(stated, one));
  const sameNumber = own.find(
    ({ invoice_number, invoice_date }) =>
      !!invoice_number &&
      stated.invoice_number !== null &&
      isSameInvoiceNumber(
        invoice_number,
        stated.invoice_number,
        [invoice_date, stated.invoice_date].flatMap((day) => day ?? []),
      ),
  );
  if (sameNumber) return [duplicateOf(stated, sameNumber, 'the same number')];
  const sameWork = own.find((one) => isSameWork(stated, one));
  return sameWork ? [duplicateOf(stated, sameWork, 'the same order, day and total')] : [];
}

const mayBeSameSender = ({ processor }: StatedInvoice, seen: SeenInvoice): boolean =>
  processor === null || !seen.processor || areSameCompany(processor, seen.processor);

function isSameWork(stated: StatedInvoice, seen: SeenInvoice): boolean {
  const { purchase_order: po, total, invoice_date: day } = stated;
  if (po === null || total === null || day === null) return false;
  const isOrder = !!seen.purchase_order && namesOrder(po, seen.purchase_order);
  return isOrder && seen.total != null && minorOf(seen.total) === minorOf(total) && seen.invoice_date === day;
}

const duplicateOf = (stated: StatedInvoice, seen: SeenInvoice, why: string): InvoiceDiscrepancy => ({
  code: 'duplicate_invoice',
  message: `Invoice ${stated.invoice_number ?? ''} was received before as ${seen.invoice_number ?? 'another'}: ${why}.`,
});

const KnownAccount = z.looseObject({ bank: BankDetails.partial() });
const KEYS = ['iban', 'account', 'routing', 'swift'] as const;

/** It asks for the money where it went before: another account is how invoices are forged. */
export function paysKnownAccount(
  { bank, processor }: StatedInvoice,
  order: Order | null,
  seen: readonly SeenInvoice[],
): InvoiceDiscrepancy[] {
  const named = KnownAccount.safeParse(order?.processor);
  const earlier = seen.filter(
    (one) => !processor || !one.processor || areSameCompany(processor, one.processor),
  );
  const known = [...(named.success ? [named.data.bank] : []), ...earlier.map(bankOf)];
  const changed = KEYS.find((key) => {
    const before = known.flatMap((one) => one[key] ?? []);
    const now = bank[key];
    return now !== null && before.length > 0 && !before.some((one) => plainKey(one) === plainKey(now));
  });
  if (!changed) return [];
  const before = known.flatMap((one) => one[changed] ?? [])[0] ?? '';
  return [
    {
      code: 'bank_details_changed',
      message: `The invoice asks for payment to ${changed === 'iban' ? 'IBAN' : changed} ${bank[changed]}; before it was ${before}. Ask the processor by a number that you know.`,
    },
  ];
}

/** Earlier invoices carry their account among their facts. */
function bankOf({ facts }: SeenInvoice): Partial<BankDetails> {
  const entries = (facts ?? []).flatMap(({ field, value }) => {
    const key = KEYS.find((one) => field === `bank_${one}`);
    return key && typeof value === 'string' ? [[key, value] as const] : [];
  });
  return Object.fromEntries(entries);
}
