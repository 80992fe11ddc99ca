import type { InvoiceDiscrepancy, InvoiceLine, StatedInvoice } from './invoice';
import { minorOf, productMinor, sayMinor, sumMinor } from './minor';

/** Pieces at their price are the line's amount, and the lines and charges the total. */
export function addsUp(stated: StatedInvoice): InvoiceDiscrepancy[] {
  const lines = stated.lines.filter((line) => !multiplies(line));
  return [
    ...lines.map((line): InvoiceDiscrepancy => {
      const product = productMinor(line.qty ?? 0, line.unit_price ?? 0);
      return {
        code: 'arithmetic',
        message: `${line.part_number ?? 'A line'}: ${line.qty} at ${line.unit_price} are ${sayMinor(product)}, not ${sayMinor(minorOf(line.amount ?? 0))}.`,
      };
    }),
    ...totalOutcome(stated),
  ];
}

const multiplies = ({ qty, unit_price, amount }: InvoiceLine): boolean =>
  qty === null ||
  unit_price === null ||
  amount === null ||
  // A price printed with two decimals may have been rounded from more: half a cent a piece.
  Math.abs(productMinor(qty, unit_price) - minorOf(amount)) <= roundingOf(unit_price, qty);

const roundingOf = (price: number, qty: number): number =>
  Math.abs(price * 100 - Math.round(price * 100)) > 1e-6 ? Math.ceil(qty / 200) : 0;

const chargesOf = (stated: StatedInvoice): number =>
  sumMinor([
    stated.lot_minimum_adjustment,
    stated.certification_fee,
    stated.freight,
    stated.tax,
    ...stated.other_charges.map(({ amount }) => amount),
  ]);

function totalOutcome(stated: StatedInvoice): InvoiceDiscrepancy[] {
  const { lines, total } = stated;
  const isUnread =
    total === null ||
    lines.length === 0 ||
    lines.some(({ amount }) => amount === null) ||
    [stated.lot_minimum_adjustment, stated.certification_fee, stated.freight, stated.tax].includes(null);
  if (isUnread) return [];
  const sum = sumMinor(lines.map(({ amount }) => amount)) + chargesOf(stated);
  const multiplied =
    lines.reduce(
      (all, line) =>
        all +
        (multiplies(line) ? minorOf(line.amount ?? 0) : productMinor(line.qty ?? 0, line.unit_price ?? 0)),
      0,
    ) + chargesOf(stated);
  const says = minorOf(total);
  const withRightTax = taxesByRate(stated).map((tax) => sum - minorOf(stated.tax ?? 0) + tax);
  // A line that is multiplied wrongly and a tax that is not its rate are told by themselves.
  if ([sum, multiplied, ...withRightTax].includes(says)) return [];
  return [
    {
      code: 'arithmetic',
      message: `The lines and charges add up to ${sayMinor(sum)}; the invoice says ${sayMinor(says)}.`,
    },
  ];
}

/** The tax is the printed rate of what may be taxed: the work with or without fees and freight. */
export function chargesTaxAsStated(stated: StatedInvoice): InvoiceDiscrepancy[] {
  const { tax, tax_rate: rate } = stated;
  if (tax === null || rate === null) return [];
  const asked = minorOf(tax);
  const right = taxesByRate(stated);
  if (right.some((one) => Math.abs(one - asked) <= 1)) return [];
  return [
    {
      code: 'tax_mismatch',
      message: `${sayMinor(asked)} is charged as tax; ${rate} % of what is charged is ${sayMinor(Math.max(...right))}.`,
    },
  ];
}

function taxesByRate(stated: StatedInvoice): number[] {
  const rate = stated.tax_rate;
  if (rate === null) return [];
  const work = sumMinor([...stated.lines.map(({ amount }) => amount), stated.lot_minimum_adjustment]);
  const fees = sumMinor([stated.certification_fee, ...stated.other_charges.map(({ amount }) => amount)]);
  const freight = sumMinor([stated.freight]);
  const bases = [
    ...[work, work + fees, work + freight, work + fees + freight],
    ...(stated.subtotal === null ? [] : [minorOf(stated.subtotal)]),
  ];
  return bases.map((base) => Math.round((base * rate) / 100));
}
