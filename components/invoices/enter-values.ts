import { z } from 'zod';

import { optionalNumberField } from '@/components/ui/form-fields';
import type { InvoiceDetail, InvoiceLineInput, INVOICE_LINE_KINDS } from '@/lib/invoices/contract';
import { enterInvoice } from '@/lib/invoices/contract';
import type { InvoiceReading } from '@/lib/invoices/reading-contract';

import { amountField, optionalAmountField, typedAmount } from './amount-field';
import { LINE_KIND_WORDS } from './invoice-words';

const shape = enterInvoice.input.shape;
type Kind = (typeof INVOICE_LINE_KINDS)[number];

const Line = z
  .object({
    /** A line of the order by its id, or the kind of a charge. */
    what: z.string(),
    description: z.string().trim().min(1, 'Say what it is for.').max(200, 'Write 200 characters or less.'),
    pieces: optionalNumberField({ name: 'Pieces', example: '41' }).pipe(
      z
        .int('Enter a whole number of pieces.')
        .min(0, 'Pieces cannot be below 0.')
        .max(1_000_000, 'Enter 1,000,000 or less.')
        .nullable(),
    ),
    unitPriceMinor: optionalAmountField({ name: 'The price' }),
    amountMinor: amountField({ name: 'The amount', mayBeNegative: true }),
  })
  .superRefine((line, issues) => {
    if (kindOf(line.what) !== 'pieces') return;
    if (line.pieces === null)
      issues.addIssue({ code: 'custom', path: ['pieces'], message: 'Enter the pieces.' });
    if (line.unitPriceMinor === null)
      issues.addIssue({ code: 'custom', path: ['unitPriceMinor'], message: 'Enter the price.' });
  });

/** What is typed of an invoice, under the names that the server uses for its own refusals. */
export const EnterValues = z.object({
  number: shape.number,
  datedOn: shape.datedOn,
  dueOn: z.union([z.literal('').transform(() => null), shape.dueOn]),
  currency: shape.currency,
  totalMinor: amountField({ name: 'The total' }),
  lines: z.array(Line).min(1, 'Enter at least one line.'),
});
export type EnterIn = z.input<typeof EnterValues>;
export type EnterOut = z.output<typeof EnterValues>;

const PIECES = 'pieces:';
/** Pieces that no line of the order is for. */
export const OTHER_PIECES = PIECES;
export const whatOf = (lineId: string): string => `${PIECES}${lineId}`;
/** What a line that was read is for, as it is chosen in the form. */
export const whatRead = ({
  kind,
  lineId,
}: Pick<InvoiceReading['lines'][number], 'kind' | 'lineId'>): string =>
  kind === 'pieces' ? whatOf(lineId ?? '') : kind;
export const kindOf = (what: string): Kind => (what.startsWith(PIECES) ? 'pieces' : (what as Kind));

/** A charge has neither pieces nor a price of each. */
export function linesOf(lines: EnterOut['lines']): InvoiceLineInput[] {
  return lines.map(({ what, pieces, unitPriceMinor, ...line }) => {
    const kind = kindOf(what);
    const lineId = what.slice(PIECES.length);
    return kind === 'pieces'
      ? { ...line, kind, lineId: lineId === '' ? null : lineId, pieces, unitPriceMinor }
      : { ...line, kind, lineId: null, pieces: null, unitPriceMinor: null };
  });
}

/** As it was entered before; else as the order has it, so that only what is different is typed. */
export function startingValues(invoice: InvoiceDetail): EnterIn {
  const { lines, order } = invoice;
  const asEntered = lines.map((line) => ({
    what: line.kind === 'pieces' ? whatOf(line.lineId ?? '') : line.kind,
    description: line.description,
    pieces: line.pieces === null ? '' : String(line.pieces),
    unitPriceMinor: typedAmount(line.unitPriceMinor),
    amountMinor: typedAmount(line.amountMinor),
  }));
  return {
    number: invoice.number ?? '',
    datedOn: invoice.datedOn ?? '',
    dueOn: invoice.dueOn ?? '',
    currency: (invoice.totalMinor === null ? order.currency : invoice.currency) as EnterIn['currency'],
    totalMinor: typedAmount(invoice.totalMinor),
    lines: asEntered.length > 0 ? asEntered : asOrdered(order),
  };
}

function asOrdered(order: InvoiceDetail['order']): EnterIn['lines'] {
  const work = order.lines.map((line) => ({
    what: whatOf(line.lineId),
    description: orderLineWords(line),
    pieces: String(line.ordered),
    unitPriceMinor: typedAmount(line.unitPriceMinor),
    amountMinor: typedAmount(line.ordered * line.unitPriceMinor),
  }));
  const toMinimum =
    order.expectedMinor -
    order.certificationFeeMinor -
    order.lines.reduce((sum, line) => sum + line.ordered * line.unitPriceMinor, 0);
  const charges = [
    { kind: 'lot_minimum' as const, minor: toMinimum },
    { kind: 'certification' as const, minor: order.certificationFeeMinor },
  ].filter((one) => one.minor > 0);
  return [...work, ...charges.map(({ kind, minor }) => emptyLine(kind, typedAmount(minor)))];
}

export const orderLineWords = (line: InvoiceDetail['order']['lines'][number]): string =>
  `${line.partNumber} ${line.partRevision}, ${line.partName}`;

export const emptyLine = (kind: Exclude<Kind, 'pieces'>, amountMinor = ''): EnterIn['lines'][number] => ({
  what: kind,
  description: kind === 'other' ? '' : LINE_KIND_WORDS[kind],
  pieces: '',
  unitPriceMinor: '',
  amountMinor,
});
