import { namesOrder } from '../certificate/match/same-order-number';
import type { Order } from '../order';
import { addsUp, chargesTaxAsStated } from './arithmetic-checks';
import { isNewInvoice, paysKnownAccount } from './earlier-checks';
import type { AcceptedPieces, InvoiceDiscrepancy, SeenInvoice, StatedInvoice } from './invoice';
import {
  chargesAgreedFees,
  chargesAgreedPrices,
  chargesLotMinimum,
  invoicesAcceptedPieces,
} from './price-checks';

export interface InvoiceInput {
  readonly stated: StatedInvoice;
  readonly order: Order | null;
  readonly accepted?: readonly AcceptedPieces[] | null;
  /** Received earlier. */
  readonly seen?: readonly SeenInvoice[];
}

/**
 * Compares an invoice with the order's price, the pieces accepted so far and the invoices received before; each cause
 * once. A sum below what was agreed is a discrepancy only where it is a price of a piece.
 */
export function compareInvoice({
  stated,
  order,
  accepted = null,
  seen = [],
}: InvoiceInput): InvoiceDiscrepancy[] {
  const duplicate = isNewInvoice(stated, seen);
  const other = order && otherOrder(stated, order);
  // Another order has other prices, another currency other numbers: nothing more is said of them.
  const isComparable = order !== null && !other?.length;
  const currency = isComparable ? otherCurrency(stated, order) : [];
  const hasPrices = isComparable && currency.length === 0;
  return [
    ...duplicate,
    ...(other ?? []),
    ...currency,
    ...(hasPrices ? [...chargesAgreedPrices(stated, order), ...chargesLotMinimum(stated, order)] : []),
    ...(hasPrices ? chargesAgreedFees(stated, order) : []),
    // A duplicate asks for pieces that the first one asked for: the same cause.
    ...(isComparable && duplicate.length === 0
      ? invoicesAcceptedPieces(stated, { order, accepted, seen })
      : []),
    ...addsUp(stated),
    ...chargesTaxAsStated(stated),
    ...paysKnownAccount(stated, order, seen),
  ];
}

function otherOrder({ purchase_order }: StatedInvoice, { po }: Order): InvoiceDiscrepancy[] {
  if (purchase_order === null || namesOrder(purchase_order, po)) return [];
  return [{ code: 'wrong_po', message: `The invoice names order ${purchase_order}, not ${po}.` }];
}

function otherCurrency({ currency }: StatedInvoice, { price }: Order): InvoiceDiscrepancy[] {
  if (!price || currency === null || currency === price.currency.toUpperCase()) return [];
  return [
    {
      code: 'currency_mismatch',
      message: `The invoice is in ${currency}, the order in ${price.currency}; the prices were not compared.`,
    },
  ];
}
