import { z } from 'zod';

import { Fact } from '../fact';
import { Day } from '../order';

/** Sums are in the invoice's currency, as printed. */
export const InvoiceLine = z.object({
  part_number: z.string().nullable(),
  qty: z.number().nullable(),
  unit_price: z.number().nullable(),
  amount: z.number().nullable(),
});
export type InvoiceLine = z.output<typeof InvoiceLine>;

/** A charge that is none of the named ones: `Rush`, `Environmental surcharge`. */
export const OtherCharge = z.object({ description: z.string(), amount: z.number() });
export type OtherCharge = z.output<typeof OtherCharge>;

/** Numbers of an account as printed, each null where it is not. */
export const BankDetails = z.object({
  iban: z.string().nullable(),
  account: z.string().nullable(),
  routing: z.string().nullable(),
  swift: z.string().nullable(),
});
export type BankDetails = z.output<typeof BankDetails>;

/** What an invoice states. A charge that is not on it is 0, one that is and cannot be read null. */
export const StatedInvoice = z.object({
  processor: z.string().nullable(),
  invoice_number: z.string().nullable(),
  invoice_date: Day.nullable(),
  purchase_order: z.string().nullable(),
  /** ISO 4217. */
  currency: z.string().nullable(),
  lines: z.array(InvoiceLine),
  lot_minimum_adjustment: z.number().nullable(),
  certification_fee: z.number().nullable(),
  freight: z.number().nullable(),
  tax: z.number().nullable(),
  /** In percent, where it is printed. */
  tax_rate: z.number().nullable(),
  other_charges: z.array(OtherCharge),
  subtotal: z.number().nullable(),
  total: z.number().nullable(),
  due_date: Day.nullable(),
  bank: BankDetails,
  facts: z.array(Fact),
});
export type StatedInvoice = z.output<typeof StatedInvoice>;

export const INVOICE_CODES = [
  'unit_price_mismatch',
  'quantity_above_accepted',
  'duplicate_invoice',
  'lot_minimum_mismatch',
  'fee_not_agreed',
  'tax_mismatch',
  'arithmetic',
  'wrong_po',
  'bank_details_changed',
  'currency_mismatch',
  'not_on_order',
] as const;

export const InvoiceDiscrepancy = z.object({ code: z.enum(INVOICE_CODES), message: z.string() });
export type InvoiceDiscrepancy = z.output<typeof InvoiceDiscrepancy>;

/** The document that `read:invoice` prints. */
export const ReadInvoice = StatedInvoice.pick({
  invoice_number: true,
  invoice_date: true,
  purchase_order: true,
  currency: true,
  lines: true,
  lot_minimum_adjustment: true,
  certification_fee: true,
  freight: true,
  tax: true,
  total: true,
  due_date: true,
  facts: true,
}).extend({ discrepancies: z.array(InvoiceDiscrepancy) });
export type ReadInvoice = z.output<typeof ReadInvoice>;

/** An invoice received earlier, in the shape that is printed; what is absent is not known. */
export const SeenInvoice = z.looseObject({
  invoice_number: z.string().nullish(),
  invoice_date: z.string().nullish(),
  processor: z.string().nullish(),
  purchase_order: z.string().nullish(),
  lines: z.array(InvoiceLine.partial()).nullish(),
  total: z.number().nullish(),
  facts: z.array(z.looseObject({ field: z.string(), value: z.unknown() })).nullish(),
});
export type SeenInvoice = z.output<typeof SeenInvoice>;

/** Pieces accepted so far. */
export const AcceptedPieces = z.object({ part_number: z.string(), qty_accepted: z.number() });
export type AcceptedPieces = z.output<typeof AcceptedPieces>;
