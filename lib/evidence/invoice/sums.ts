import type { Paper } from '../certificate/read/paper';
import type { Spot } from '../layout/passage';
import { asksForPayment, chargeKind } from './charge-kinds';
import { chargesOn, type Charge } from './charges';
import type { StatedInvoice } from './invoice';
import { minorOf } from './minor';
import { unaccented } from './unaccented';
import { piecesOnLine, tablesOn, type FoundPieces } from './piece-lines';

export interface Sums {
  readonly stated: Pick<
    StatedInvoice,
    | 'lines'
    | 'lot_minimum_adjustment'
    | 'certification_fee'
    | 'freight'
    | 'tax'
    | 'tax_rate'
    | 'other_charges'
    | 'subtotal'
    | 'total'
  >;
  readonly lines: readonly FoundPieces[];
  readonly charges: readonly { readonly field: string; readonly value: number; readonly spot: Spot }[];
}

const NAMED = ['lot_minimum_adjustment', 'certification_fee', 'freight', 'tax'] as const;

/** Pieces, charges and totals of an invoice over all its pages. */
export function sumsOf({ sheets, decimal, text }: Paper): Sums {
  const lines: FoundPieces[] = [];
  const charges: Charge[] = [];
  for (const sheet of sheets) {
    const tables = tablesOn(sheet.lines, decimal);
    const isInTable = (index: number) => tables.some(({ from, to }) => index >= from && index < to);
    const outside = sheet.lines.filter((_, index) => !isInTable(index));
    const pieces = outside.map((line) => ({
      line,
      found: tables.length > 0 ? null : piecesOnLine(line, decimal),
    }));
    lines.push(...tables.flatMap((table) => table.pieces), ...pieces.flatMap(({ found }) => found ?? []));
    charges.push(
      ...tables
        .flatMap((table) => table.charges)
        .map((one) => ({ ...one, kind: chargeKind(one.words) ?? ('other' as const) })),
      ...chargesOn(
        pieces.filter(({ found }) => found === null).map(({ line }) => line),
        decimal,
      ),
    );
  }
  const of = (kind: Charge['kind']) => charges.filter((charge) => charge.kind === kind);
  const subtotal = of('subtotal')[0] ?? null;
  const total = totalOf(of('total'));
  const named = Object.fromEntries(NAMED.map((kind) => [kind, addedUp(of(kind))]));
  const others = of('other').filter(({ amount }) => minorOf(amount) !== 0);
  return {
    stated: {
      lines: lines.map(({ line }) => line),
      lot_minimum_adjustment: named['lot_minimum_adjustment'] ?? 0,
      certification_fee: named['certification_fee'] ?? 0,
      freight: named['freight'] ?? 0,
      tax: named['tax'] ?? 0,
      tax_rate: taxRateIn(text),
      other_charges: others.map(({ words, amount }) => ({ description: words, amount })),
      subtotal: subtotal?.amount ?? null,
      total: total?.amount ?? null,
    },
    lines,
    charges: [
      ...NAMED.flatMap((kind) => of(kind).map(({ amount, spot }) => ({ field: kind, value: amount, spot }))),
      ...others.map(({ amount, spot }, index) => ({
        field: `other_charges[${index}].amount`,
        value: amount,
        spot,
      })),
      ...(subtotal ? [{ field: 'subtotal', value: subtotal.amount, spot: subtotal.spot }] : []),
      ...(total ? [{ field: 'total', value: total.amount, spot: total.spot }] : []),
    ],
  };
}

/** The same charge may stand in the table and again under it; two different ones are added. */
const addedUp = (charges: readonly Charge[]): number => {
  const different = charges.filter(
    (one, index) => charges.findIndex((other) => minorOf(other.amount) === minorOf(one.amount)) === index,
  );
  return different.reduce((sum, { amount }) => sum + minorOf(amount), 0) / 100;
};

/** What is to be paid; of several plain totals the last, which has everything in it. */
const totalOf = (totals: readonly Charge[]): Charge | null =>
  totals.findLast(({ words }) => asksForPayment(words)) ?? totals.at(-1) ?? null;

const RATE =
  /(?:tax|vat|mws?st|ust|tva|gst|hst|iva|btw)[^\n%]{0,30}?(\d{1,2}(?:[.,]\d{1,3})?)\s?%|(\d{1,2}(?:[.,]\d{1,3})?)\s?%\s*(?:\p{L}+\s)?(?:sales\s+)?(?:tax|vat|mws?st|ust|tva|gst|hst|iva|btw)/iu;

function taxRateIn(text: string): number | null {
  const [, behind, before] = RATE.exec(unaccented(text)) ?? [];
  const written = behind ?? before;
  return written === undefined ? null : Number(written.replace(',', '.'));
}
