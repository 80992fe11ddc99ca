import { z } from 'zod';

import { likeness } from '../certificate/match/alike';
import { namesOrder } from '../certificate/match/same-order-number';
import type { Order, OrderLine } from '../order';
import type { AcceptedPieces, InvoiceDiscrepancy, InvoiceLine, SeenInvoice, StatedInvoice } from './invoice';
import { minorOf, productMinor, sayMinor, sumMinor } from './minor';

const OwnPrice = z.looseObject({ unit_price: z.number() });

const isPart = (written: string, ordered: string): boolean => {
  const how = likeness(written, ordered);
  return how === 'same' || how === 'lookalike';
};

const orderedLine = ({ part_number }: InvoiceLine, { lines }: Order): OrderLine | undefined => {
  if (part_number === null) return lines.length === 1 ? lines[0] : undefined;
  return lines.find((ordered) => isPart(part_number, ordered.part_number));
};

/** A line of the order may have a price of its own. */
const agreedPrice = (order: Order, line: OrderLine | undefined): number | null => {
  const own = OwnPrice.safeParse(line);
  return own.success ? own.data.unit_price : (order.price?.unit_price ?? null);
};

/** Each piece at the price of the order; parts that were not ordered. */
export function chargesAgreedPrices({ lines }: StatedInvoice, order: Order): InvoiceDiscrepancy[] {
  return lines.flatMap((line): InvoiceDiscrepancy[] => {
    const ordered = orderedLine(line, order);
    const name = line.part_number ?? 'A line';
    if (line.part_number !== null && !ordered)
      return [{ code: 'not_on_order', message: `${name} is not on order ${order.po}.` }];
    const agreed = agreedPrice(order, ordered);
    const asked = priceOf(line);
    if (agreed === null || asked === null || isPriced(line, agreed, asked)) return [];
    return [
      {
        code: 'unit_price_mismatch',
        message: `${name} is invoiced at ${sayPrice(asked)} a piece; the order says ${sayPrice(agreed)}.`,
      },
    ];
  });
}

const sayPrice = (price: number): string => String(Math.round(price * 10_000) / 10_000);

const priceOf = ({ qty, unit_price, amount }: InvoiceLine): number | null =>
  unit_price ?? (qty && amount !== null ? amount / qty : null);

/** Without a printed price the amount says it, to the cent. */
const isPriced = ({ unit_price, qty, amount }: InvoiceLine, agreed: number, asked: number): boolean =>
  unit_price === null
    ? minorOf(amount ?? 0) === productMinor(qty ?? 0, agreed)
    : Math.abs(asked - agreed) < 0.00005;

/** What fills the work up to the lot minimum is what is missing to it, and nothing where the work reaches it. */
export function chargesLotMinimum(
  { lines, lot_minimum_adjustment: adjustment }: StatedInvoice,
  order: Order,
): InvoiceDiscrepancy[] {
  const asked = adjustment === null ? 0 : minorOf(adjustment);
  if (asked === 0) return [];
  const least = minorOf(order.price?.lot_minimum ?? 0);
  const missing = (work: number) => Math.max(0, least - work);
  const canReckon = lines.length > 0 && lines.every(({ amount }) => amount !== null);
  if (least > 0 && !canReckon) return [];
  const asInvoiced = missing(sumMinor(lines.map(({ amount }) => amount)));
  const asAgreed = missing(
    lines.reduce(
      (sum, line) => sum + productMinor(line.qty ?? 0, agreedPrice(order, orderedLine(line, order)) ?? 0),
      0,
    ),
  );
  // With a wrong price either reckoning is right for the minimum; the price is told by itself.
  if (asked === asInvoiced || asked === asAgreed) return [];
  const reason =
    least === 0
      ? 'the order has no lot minimum'
      : `${sayMinor(asInvoiced)} is missing to the lot minimum of ${sayMinor(least)}`;
  return [
    { code: 'lot_minimum_mismatch', message: `${sayMinor(asked)} is charged as lot minimum; ${reason}.` },
  ];
}

const Freight = z.looseObject({ freight: z.number() });

/**
 * Fees that the order names, up to what it names; others were not agreed. Freight is passed on at cost, and compared
 * only where the order limits it.
 */
export function chargesAgreedFees(stated: StatedInvoice, { price }: Order): InvoiceDiscrepancy[] {
  if (!price) return [];
  const freight = Freight.safeParse(price);
  const fees: readonly (readonly [string, number | null, number])[] = [
    ['certification', stated.certification_fee, price.certification_fee ?? 0],
    ...(freight.success ? [['freight', stated.freight, freight.data.freight] as const] : []),
    ...stated.other_charges.map(({ description, amount }) => [description, amount, 0] as const),
  ];
  return fees.flatMap(([name, asked, agreed]): InvoiceDiscrepancy[] =>
    asked === null || minorOf(asked) <= minorOf(agreed)
      ? []
      : [
          {
            code: 'fee_not_agreed',
            message: `${sayMinor(minorOf(asked))} is charged for ${name}; the order agrees ${agreed === 0 ? 'nothing' : sayMinor(minorOf(agreed))}.`,
          },
        ],
  );
}

interface Sent {
  readonly order: Order;
  readonly accepted: readonly AcceptedPieces[] | null;
  readonly seen: readonly SeenInvoice[];
}

/** A line of this invoice or of an earlier one, of which less may be known. */
interface Invoiced {
  readonly part_number?: string | null | undefined;
  readonly qty?: number | null | undefined;
}

/** No more pieces than were accepted, those of earlier invoices counted; where nothing is said, than were ordered. */
export function invoicesAcceptedPieces(
  { lines }: StatedInvoice,
  { order, accepted, seen }: Sent,
): InvoiceDiscrepancy[] {
  const numbers = [...new Set(order.lines.map(({ part_number }) => part_number))];
  const earlier = seen
    .filter(({ purchase_order }) => !!purchase_order && namesOrder(purchase_order, order.po))
    .flatMap((one) => one.lines ?? []);
  return numbers.flatMap((number): InvoiceDiscrepancy[] => {
    const pieces = (all: readonly Invoiced[]) =>
      all.filter((line) => belongsTo(line, number, order)).reduce((sum, { qty }) => sum + (qty ?? 0), 0);
    const most = accepted
      ? countOf(
          accepted.map((one) => ({ number: one.part_number, qty: one.qty_accepted })),
          number,
        )
      : countOf(
          order.lines.map((line) => ({ number: line.part_number, qty: line.qty })),
          number,
        );
    const [here, before] = [pieces(lines), pieces(earlier)];
    if (here === 0 || here + before <= most) return [];
    const invoiced = before > 0 ? `${here} pieces after ${before} on earlier invoices` : `${here} pieces`;
    return [
      {
        code: 'quantity_above_accepted',
        message: `${number}: ${invoiced} are invoiced; ${most} were ${accepted ? 'accepted' : 'ordered'}.`,
      },
    ];
  });
}

/** A line without a part number is of the only part ordered. */
const belongsTo = ({ part_number }: Invoiced, number: string, { lines }: Order): boolean =>
  part_number == null
    ? new Set(lines.map((line) => line.part_number)).size === 1
    : isPart(part_number, number);

const countOf = (all: readonly { number: string; qty: number }[], number: string): number =>
  all.filter((one) => isPart(one.number, number)).reduce((sum, { qty }) => sum + qty, 0);
