import { findSpecifications } from '@/lib/trade/lineage/recognise-specification';

import { daysIn } from '../certificate/read/dates';
import type { DecimalSign } from '../certificate/read/quantities';
import type { Line } from '../layout/lines';
import { joined, spotIn, type Passage, type Spot } from '../layout/passage';
import { tablesOf, type Row, type Table } from '../layout/tables';
import { chargeKind, type ChargeKind } from './charge-kinds';
import type { InvoiceLine } from './invoice';
import { invoiceLabelAt } from './labels';
import { productMinor, minorOf } from './minor';
import { unaccented } from './unaccented';
import { lastSum, moneyIn, type FoundMoney } from './money-in';

type Heading = 'part' | 'description' | 'qty' | 'price' | 'amount' | 'aside';

/** In small letters without marks; the first that fits decides. */
const HEADINGS: readonly (readonly [Heading, RegExp])[] = [
  [
    'aside',
    /^(?:line|ln|pos|seq|nr|no|#|uom|u ?m|unit|units|per|rev|revision|lot|lot no|date|po|p o|po no|order|job|job no|wo|tax|vat|mwst|disc|discount|einheit|cert|cert no|taxable|t|backorder|b o|ordered|qty ordered|order qty)$/,
  ],
  [
    'part',
    /^(?:(?:your |customer |cust )?(?:part|p n|item|article|drawing|dwg|product)(?: ?(?:no|number|nr|num|code|id|rev))*|teile? ?(?:nr|nummer)?|artikel ?(?:nr|nummer)?|sach ?(?:nr|nummer)|zeichnung(?:s ?nr)?|reference|reference|ref|ref|part number rev)$/,
  ],
  [
    'qty',
    /^(?:qty|q ty|quantity|pcs|pieces|qte|quantite|menge|anzahl|stuck|stk|(?:qty|quantity|pcs) ?(?:shipped|invoiced|billed|accepted|processed|pcs|ea)?|(?:ship(?:ped)?|inv(?:oiced)?|billed|acc(?:epted)?)(?: (?:qty|quantity|pcs))?|cantidad)$/,
  ],
  [
    'price',
    /^(?:unit ?(?:price|cost|rate|net)|price ?(?:each|ea|unit|per piece|per unit|pc|pce)?|each|ea|rate|cost(?: each)?|einzel ?preis|e ?preis|stuckpreis|preis ?(?:stuck|stk|einheit)?|prix(?: unitaire| unit)?|p ?u(?: ht)?|precio(?: unitario)?|list price)$/,
  ],
  [
    'amount',
    /^(?:amount|amt|ext(?:ended|ension)?(?: ?(?:price|amount|amt|cost))?|line (?:total|amount|value)|total(?: ?(?:price|amount|ht|net|value))?|net (?:amount|price|value)|betrag|gesamt(?: ?preis| ?betrag)?|summe|montant(?: ht)?|importe|value)$/,
  ],
  [
    'description',
    /^(?:description|desc|item description|service|services|work|process|operation|details|particulars|bezeichnung|beschreibung|leistung|designation|designation|descripcion|nomenclature|part description|description of (?:work|services?))$/,
  ],
];

const CURRENCY = /\(?\b(?:usd|eur|gbp|cad|aud|chf)\b\)?|[$€£]/g;

function headingOf(text: string): Heading | null {
  if (/\d/.test(text)) return null;
  const plain = unaccented(text)
    .replace(CURRENCY, ' ')
    .replace(/[^\p{L}#]+/gu, ' ')
    .trim();
  return HEADINGS.find(([, pattern]) => pattern.test(plain))?.[0] ?? null;
}

/** A line with the places of its numbers, for the facts. */
export interface FoundPieces {
  readonly line: InvoiceLine;
  readonly spots: Readonly<Partial<Record<keyof InvoiceLine, Spot>>>;
}

export interface FoundCharge {
  readonly words: string;
  readonly amount: number;
  readonly spot: Spot;
}

export interface TableOfInvoice {
  readonly pieces: readonly FoundPieces[];
  /** Rows with a sum and no parts. */
  readonly charges: readonly FoundCharge[];
  /** Lines of the page that were read as its heading and rows. */
  readonly from: number;
  readonly to: number;
}

/** Tables with a column of prices or amounts. */
export function tablesOn(lines: readonly Line[], sign: DecimalSign): TableOfInvoice[] {
  const tables = tablesOf<Heading>(lines, {
    read: headingOf,
    holds: () => true,
    endsTable: (segment) => endsTable(segment, lines),
    anchors: (heading) => heading === 'amount',
  });
  return tables
    .filter(({ columns }) => columns.some(({ heading }) => heading === 'amount' || heading === 'price'))
    .map((table) => {
      const rows = table.rows.map((row) => ({ pieces: piecesIn(table, row, sign), row }));
      return {
        pieces: rows.flatMap(({ pieces }) => pieces ?? []),
        charges: rows.flatMap(({ pieces, row }) => (pieces ? [] : chargeIn(row, sign))),
        from: table.from,
        to: table.to,
      };
    });
}

/** Longer is no label. */
const SHORT = 40;
const SUMS: ReadonlySet<ChargeKind | null> = new Set(['subtotal', 'total', 'tax', 'paid'] as const);

/** The sums under the table and what stands beside them are not its rows. */
function endsTable({ text, line }: { text: string; line: number }, lines: readonly Line[]): boolean {
  const label = invoiceLabelAt(text);
  const words = text.slice(0, /\d/.exec(text)?.index ?? text.length);
  const isSum = words.length < SHORT && SUMS.has(chargeKind(words));
  // The heading of a column may be called so too.
  const isHeading =
    (lines[line]?.segments ?? []).filter((segment) => headingOf(segment.text) !== null).length > 1;
  return !isHeading && ((label !== null && label.label !== 'date' && text.length < SHORT) || isSum);
}

const cellsUnder = (table: Table<Heading>, row: Row, heading: Heading): Passage[] =>
  row.cells.flatMap((cell, index) =>
    cell !== null && table.columns[index]?.heading === heading ? [cell] : [],
  );

interface Found<Value> {
  readonly value: Value;
  readonly spot: Spot;
}

function piecesIn(table: Table<Heading>, row: Row, sign: DecimalSign): FoundPieces | null {
  const numberIn = (heading: Heading): Found<number> | null => {
    const [cell] = cellsUnder(table, row, heading);
    const [money] = cell ? moneyIn(cell.text, sign) : [];
    const spot = cell && money ? spotIn(cell, money.start, money.end) : null;
    return money && spot ? { value: money.value, spot } : null;
  };
  const [price, amount] = [numberIn('price'), numberIn('amount')];
  const words = [...cellsUnder(table, row, 'part'), ...cellsUnder(table, row, 'description')];
  const hasCount = table.columns.some(({ heading }) => heading === 'qty');
  const qty = hasCount ? numberIn('qty') : countIn(words);
  const kind = chargeKind(words.map(({ text }) => text).join(' '));
  const part = partIn(table, row);
  if (amount === null && (qty === null || price === null)) return null;
  if (kind !== null && (part === null || (qty?.value ?? 1) === 1)) return null;
  if (part === null && qty === null) return null;
  return foundPieces({ part, qty, price, amount });
}

const COUNT = /(?<![\d.,-])(\d{1,6})\s*(?:pcs?|pieces?|parts?|ea|off|stk|stuck)\b|\bqty\.?:?\s*(\d{1,6})/;

/** Pieces among the words of a description, where no column counts them. */
function countIn(cells: readonly Passage[]): Found<number> | null {
  for (const cell of cells) {
    const match = COUNT.exec(unaccented(cell.text));
    const written = match?.[1] ?? match?.[2];
    if (!match || written === undefined) continue;
    const start = match.index + match[0].indexOf(written);
    const spot = spotIn(cell, start, start + written.length);
    if (spot) return { value: Number(written), spot };
  }
  return null;
}

interface Cells {
  readonly part: Found<string> | null;
  readonly qty: Found<number> | null;
  readonly price: Found<number> | null;
  readonly amount: Found<number> | null;
}

const foundPieces = ({ part, qty, price, amount }: Cells): FoundPieces => ({
  line: {
    part_number: part?.value ?? null,
    qty: qty?.value ?? null,
    unit_price: price?.value ?? null,
    amount: amount?.value ?? null,
  },
  spots: {
    ...(part && { part_number: part.spot }),
    ...(qty && { qty: qty.spot }),
    ...(price && { unit_price: price.spot }),
    ...(amount && { amount: amount.spot }),
  },
});

function partIn(table: Table<Heading>, row: Row): Found<string> | null {
  // A column "Item" may count the lines or name the part.
  for (const cell of [...cellsUnder(table, row, 'part'), ...cellsUnder(table, row, 'description')]) {
    const found = partNumberIn(cell);
    if (found) return found;
  }
  return null;
}

const TOKEN = /[A-Z0-9][A-Z0-9./_-]*[A-Z0-9]/gi;

/** The first number with a figure in it that is no specification, no day, no sum and no count. */
function partNumberIn(passage: Passage): Found<string> | null {
  const { text } = passage;
  const taken = [
    ...findSpecifications(text).map(({ at, length }) => ({ start: at, end: at + length })),
    ...daysIn(text),
  ];
  for (const match of text.matchAll(TOKEN)) {
    const [token] = match;
    const [start, end] = [match.index, match.index + token.length];
    const isTaken = taken.some((other) => start < other.end && end > other.start);
    const isNumber =
      /\d/.test(token) && token.replace(/[^A-Z0-9]/gi, '').length >= 3 && !/^\d+[.,]\d{2}$/.test(token);
    if (isTaken || !isNumber || /^(?:po|p\.o\.|so|wo|job)\b/i.test(token)) continue;
    const before = text.slice(0, start).toLowerCase();
    if (/(?:rev|lot|p\.?o\.?|order|job|cert|type|class|per|heat|batch)\.?\s*(?:no\.?|#|:)?\s*$/.test(before))
      continue;
    // A revision may be glued to it: 10-200/A.
    const value = token.replace(/\/[A-Z]$/, '');
    const spot = spotIn(passage, start, start + value.length);
    if (spot) return { value, spot };
  }
  return null;
}

function chargeIn(row: Row, sign: DecimalSign): FoundCharge[] {
  const passage = joined(row.cells.flatMap((cell) => cell ?? []));
  const sum = lastSum(passage.text, sign);
  const spot = sum && spotIn(passage, sum.start, sum.end);
  const words = withoutNumbers(passage.text, sign);
  return sum && spot && /\p{L}{2}/u.test(words) ? [{ words, amount: sum.value, spot }] : [];
}

function withoutNumbers(text: string, sign: DecimalSign): string {
  const numbers = moneyIn(text, sign);
  const parts = [...numbers, null].map((next, index) =>
    text.slice(numbers[index - 1]?.end ?? 0, next?.start),
  );
  return parts.join(' ').replace(/\s+/g, ' ').trim();
}

/**
 * Pieces of a line outside any table whose numbers say what they are: a count, a price and their product, in that order
 * and behind or before a part number.
 *
 * @example `11 pcs 10-200 @ 2.40 = 26.40`
 */
export function piecesOnLine(line: Line, sign: DecimalSign): FoundPieces | null {
  const passage = joined(line.segments);
  const part = partNumberIn(passage);
  const numbers = moneyIn(passage.text, sign);
  const amount = numbers.at(-1);
  if (!part || !amount?.isSum) return null;
  for (const price of numbers.slice(0, -1).toReversed())
    for (const qty of numbers.filter((one) => one !== price && one !== amount && Number.isInteger(one.value)))
      if (qty.value > 0 && productMinor(qty.value, price.value) === minorOf(amount.value)) {
        const found = ({ value, start, end }: FoundMoney) => {
          const spot = spotIn(passage, start, end);
          return spot && { value, spot };
        };
        return foundPieces({ part, qty: found(qty), price: found(price), amount: found(amount) });
      }
  return null;
}
