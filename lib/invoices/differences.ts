import { amountText } from '@/lib/money';

/** What the order says, what came back accepted, what the invoice asks. Sums in minor units of one currency. */
export interface OrderSide {
  currency: string;
  lotMinimumMinor: number;
  certificationFeeMinor: number;
  lines: readonly OrderLine[];
}

export interface OrderLine {
  lineId: string;
  lineNo: number;
  partNumber: string;
  ordered: number;
  unitPriceMinor: number;
  /** Pieces accepted by signature or authority. */
  accepted: number;
}

export interface InvoiceSide {
  currency: string;
  totalMinor: number;
  lines: readonly InvoiceLine[];
}

export interface InvoiceLine {
  seq: number;
  kind: 'pieces' | 'lot_minimum' | 'certification' | 'freight' | 'tax' | 'other';
  lineId: string | null;
  description: string;
  pieces: number | null;
  unitPriceMinor: number | null;
  amountMinor: number;
}

export type DifferenceCode =
  | 'currency_mismatch'
  | 'arithmetic'
  | 'line_arithmetic'
  | 'unit_price_mismatch'
  | 'quantity_above_accepted'
  | 'line_twice'
  | 'lot_minimum_mismatch'
  | 'fee_not_agreed'
  | 'not_on_order';

/** Each in short, where the figures it was named with are no longer at hand. */
export const DIFFERENCE_WORDS: Partial<Record<string, string>> = {
  currency_mismatch: 'Another currency than the order.',
  arithmetic: 'The total was not the sum of the lines.',
  line_arithmetic: 'Pieces at their price were not the amount of the line.',
  unit_price_mismatch: 'The price was over the order.',
  quantity_above_accepted: 'More pieces than were accepted.',
  line_twice: 'A line of the order was invoiced twice.',
  lot_minimum_mismatch: 'More than was missing to the lot minimum.',
  fee_not_agreed: 'More for the papers than was agreed.',
  not_on_order: 'Not on the order.',
} satisfies Record<DifferenceCode, string>;

/** One named difference. `overMinor` is what would not be paid if it is withheld; 0 where it can only be corrected. */
export interface Difference {
  /** Stable while the invoice is entered as it is: `quantity_above_accepted:3`. */
  key: string;
  code: DifferenceCode;
  seq: number | null;
  overMinor: number;
  sentence: string;
}

/**
 * Names every difference between an invoice, its order and the accepted pieces. What agrees, or asks for less than was
 * agreed, is no difference: nobody has to clear a saving.
 */
export function differencesOf(order: OrderSide, invoice: InvoiceSide): Difference[] {
  if (invoice.currency !== order.currency) {
    return [
      {
        key: 'currency_mismatch',
        code: 'currency_mismatch',
        seq: null,
        overMinor: 0,
        sentence: `The invoice is in ${invoice.currency}, the order in ${order.currency}.`,
      },
    ];
  }
  const sum = invoice.lines.reduce((total, line) => total + line.amountMinor, 0);
  const totalDiffers = sum !== invoice.totalMinor;
  return [
    ...invoice.lines.flatMap((line) => lineDifferences(order, invoice, line)),
    ...(totalDiffers
      ? [
          {
            key: 'arithmetic',
            code: 'arithmetic' as const,
            seq: null,
            overMinor: Math.max(0, invoice.totalMinor - sum),
            sentence: `The lines add up to ${amountText(sum)}, the invoice says ${amountText(invoice.totalMinor)}.`,
          },
        ]
      : []),
  ];
}

function lineDifferences(order: OrderSide, invoice: InvoiceSide, line: InvoiceLine): Difference[] {
  switch (line.kind) {
    case 'pieces':
      return pieceDifferences(order, invoice, line);
    case 'lot_minimum':
      return allowedUpTo(
        line,
        'lot_minimum_mismatch',
        allowedToMinimum(order, invoice),
        'to reach the lot minimum',
      );
    case 'certification':
      return allowedUpTo(line, 'fee_not_agreed', order.certificationFeeMinor, 'for the papers');
    case 'freight':
    case 'tax':
    case 'other':
      return line.amountMinor > 0
        ? [difference('not_on_order', line, line.amountMinor, 'Not on the order.')]
        : [];
  }
}

function pieceDifferences(order: OrderSide, invoice: InvoiceSide, line: InvoiceLine): Difference[] {
  const ordered = order.lines.find((one) => one.lineId === line.lineId);
  if (!ordered) return [difference('not_on_order', line, line.amountMinor, 'Not on the order.')];
  const earlier = invoice.lines.filter(
    (one) => one.kind === 'pieces' && one.lineId === line.lineId && one.seq < line.seq,
  );
  if (earlier.length > 0)
    return [
      difference(
        'line_twice',
        line,
        line.amountMinor,
        `Line ${ordered.lineNo} of the order is invoiced twice.`,
      ),
    ];

  const pieces = line.pieces ?? 0;
  const price = line.unitPriceMinor ?? 0;
  const found: Difference[] = [];
  const product = pieces * price;
  if (product !== line.amountMinor)
    found.push(
      difference(
        'line_arithmetic',
        line,
        Math.max(0, line.amountMinor - product),
        `${pieces} at ${amountText(price)} are ${amountText(product)}, not ${amountText(line.amountMinor)}.`,
      ),
    );
  // Price and pieces are told apart without counting any sum twice: the price over on accepted pieces, the pieces over at the invoiced price.
  const over = Math.max(0, pieces - ordered.accepted);
  const priceOver = price - ordered.unitPriceMinor;
  if (priceOver > 0 && pieces - over > 0)
    found.push(
      difference(
        'unit_price_mismatch',
        line,
        (pieces - over) * priceOver,
        `The price is ${amountText(priceOver)} a piece over the order.`,
      ),
    );
  if (over > 0)
    found.push(
      difference(
        'quantity_above_accepted',
        line,
        over * price,
        `${over} ${over === 1 ? 'piece is' : 'pieces are'} not accepted.`,
      ),
    );
  return found;
}

/** What may be charged to bring the accepted work up to the order's minimum. */
function allowedToMinimum(order: OrderSide, invoice: InvoiceSide): number {
  const work = invoice.lines
    .filter((line) => line.kind === 'pieces')
    .reduce((sum, line) => {
      const ordered = order.lines.find((one) => one.lineId === line.lineId);
      return sum + (ordered ? Math.min(line.pieces ?? 0, ordered.accepted) * ordered.unitPriceMinor : 0);
    }, 0);
  return Math.max(0, order.lotMinimumMinor - work);
}

function allowedUpTo(line: InvoiceLine, code: DifferenceCode, allowed: number, what: string): Difference[] {
  const over = line.amountMinor - allowed;
  return over > 0
    ? [
        difference(
          code,
          line,
          over,
          allowed === 0
            ? `The order allows nothing ${what}.`
            : `The order allows ${amountText(allowed)} ${what}.`,
        ),
      ]
    : [];
}

const difference = (
  code: DifferenceCode,
  line: InvoiceLine,
  overMinor: number,
  sentence: string,
): Difference => ({ key: `${code}:${line.seq}`, code, seq: line.seq, overMinor, sentence });

/** What is to be paid once the given differences are withheld; never below nothing. */
export const toPayMinor = (totalMinor: number, withheldMinor: readonly number[]): number =>
  Math.max(0, totalMinor - withheldMinor.reduce((sum, one) => sum + one, 0));
