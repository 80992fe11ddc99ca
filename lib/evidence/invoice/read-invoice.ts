import { mostBelieved } from '../certificate/read/candidates';
import { codeIn } from '../certificate/read/codes';
import { dayOf, daysIn } from '../certificate/read/dates';
import { beginsWithDay, codesFor, PURCHASE_ORDER, sameCode } from '../certificate/read/identity';
import { paperOf, type Paper } from '../certificate/read/paper';
import { processors } from '../certificate/read/processor';
import type { Fact } from '../fact';
import { sharedAcross } from '../layout/box';
import type { Line } from '../layout/lines';
import { joined, passageFrom, spotIn, type Passage, type Spot } from '../layout/passage';
import type { OpenedFile } from '../page';
import { askedOn, type InvoiceAnswer } from './asked';
import { accountsIn } from './bank';
import { currencyOf } from './currency';
import { dayAfter, daysToPay } from './due-date';
import type { StatedInvoice } from './invoice';
import type { InvoiceLabel } from './labels';
import { sumsOf, type Sums } from './sums';

interface Found<Value> {
  readonly value: Value;
  readonly spot: Spot;
}

/**
 * What an invoice states, from the words of its pages. What is not there or cannot be read is null; a charge that is not
 * there is 0.
 */
export function readInvoice(opened: OpenedFile): StatedInvoice {
  const paper = paperOf(opened.pages);
  const lines = paper.sheets.flatMap((sheet) => sheet.lines);
  const asked = askedOn(lines);
  const number = numberIn(asked, lines);
  const date = dayFor(asked, ['invoice_date', 'date'], paper) ?? dayAlone(paper);
  const order = mostBelieved(codesFor(paper, PURCHASE_ORDER), sameCode);
  const due = dayFor(asked, ['due_date'], paper) ?? dueByTerms(paper, date?.value ?? null);
  const processor = mostBelieved(processors(paper));
  const currency = currencyOf(paper.text);
  const accounts = accountsIn(paper.paragraphs);
  const sums = sumsOf(paper);
  const bank = { iban: null, account: null, routing: null, swift: null };
  const fact = factOf(opened);
  return {
    processor: processor?.value ?? null,
    invoice_number: number?.value ?? null,
    invoice_date: date?.value ?? null,
    purchase_order: order?.value ?? null,
    currency,
    ...sums.stated,
    due_date: due?.value ?? null,
    bank: { ...bank, ...Object.fromEntries(accounts.map(({ key, value }) => [key, value])) },
    facts: [
      ...fact('processor', processor),
      ...fact('invoice_number', number),
      ...fact('invoice_date', date),
      ...fact('purchase_order', order),
      ...fact('due_date', due),
      ...sumFacts(sums, fact),
      ...accounts.flatMap(({ key, ...found }) => fact(`bank_${key}`, found)),
    ],
  };
}

type FactMaker = (field: string, found: Found<string | number | null> | null) => Fact[];

/** How far what was read is believed: the letters as recognised, less where the words are from a picture. */
const factOf =
  ({ recognised }: OpenedFile): FactMaker =>
  (field, found) =>
    found === null
      ? []
      : [
          {
            field,
            value: found.value,
            raw: found.spot.raw,
            page: found.spot.page,
            box: [...found.spot.box],
            confidence: Math.round(found.spot.legible * (recognised ? 0.9 : 0.97) * 100) / 100,
          },
        ];

const sumFacts = ({ lines, charges }: Sums, fact: FactMaker): Fact[] => [
  ...lines.flatMap(({ line, spots }, index) =>
    (['part_number', 'qty', 'unit_price', 'amount'] as const).flatMap((key) => {
      const spot = spots[key];
      return spot ? fact(`lines[${index}].${key}`, { value: line[key], spot }) : [];
    }),
  ),
  ...charges.flatMap(({ field, value, spot }) => fact(field, { value, spot })),
];

const passagesFor = (asked: readonly InvoiceAnswer[], label: InvoiceLabel): Passage[] =>
  asked.filter((one) => one.label === label).flatMap(({ values }) => values);

const HEADLINE =
  /\b(?:invoice|rechnung|facture)\s*(?:no\.?|nr\.?|number|#)?\s*:?\s*([A-Z]{0,5}[-/]?\d[A-Z0-9/-]*)/i;

const TITLE = /^(?:(?:tax|commercial)\s+)?(?:invoice|rechnung|facture)$/i;
const ALONE = /^[A-Z0-9]*[-/]?\d[A-Z0-9/-]*$/i;
const BARE_LABEL = /^(?:no|nr|number|num|#)[.:#\s]/i;

/** Under the word invoice: `No. 5512`, or the number alone in its column. */
function underTitle(lines: readonly Line[]): Found<string> | null {
  for (const [index, line] of lines.entries()) {
    const title = line.segments.find(({ text }) => TITLE.test(text.trim()));
    if (!title) continue;
    const below = lines.slice(index + 1, index + 3).flatMap(({ segments }) => segments);
    const labelled = [...line.segments, ...below].find(({ text }) => BARE_LABEL.test(text));
    const alone = below.find(({ text, box }) => ALONE.test(text) && sharedAcross(box, title.box) > 0);
    const value = labelled ? passageFrom(labelled, BARE_LABEL.exec(labelled.text)?.[0].length ?? 0) : alone;
    const code = value && codeIn(value, beginsWithDay);
    if (code) return code;
  }
  return null;
}

function numberIn(asked: readonly InvoiceAnswer[], lines: readonly Line[]): Found<string> | null {
  for (const passage of passagesFor(asked, 'invoice_number')) {
    const code = codeIn(passage, beginsWithDay);
    if (code) return code;
  }
  const under = underTitle(lines);
  if (under) return under;
  for (const line of lines.map(({ segments }) => joined(segments))) {
    const [whole, value] = HEADLINE.exec(line.text) ?? [];
    if (whole === undefined || value === undefined || beginsWithDay(value)) continue;
    const start = line.text.indexOf(whole) + whole.lastIndexOf(value);
    const spot = spotIn(line, start, start + value.length);
    if (spot) return { value, spot };
  }
  return null;
}

function dayFor(
  asked: readonly InvoiceAnswer[],
  labels: readonly InvoiceLabel[],
  paper: Paper,
): Found<string> | null {
  for (const passage of labels.flatMap((label) => passagesFor(asked, label))) {
    const [found] = daysIn(passage.text);
    const value = found && dayOf(found, paper.dayOrder);
    const spot = found && spotIn(passage, found.start, found.end);
    if (value && spot) return { value, spot };
  }
  return null;
}

/** A day that stands by itself, as in a letter, perhaps behind a place: `Dayton, 14 March 2026`; or is said to be its date. */
function dayAlone({ sheets: [first], dayOrder }: Paper): Found<string> | null {
  for (const segment of (first?.lines ?? []).flatMap(({ segments }) => segments)) {
    const [found] = daysIn(segment.text);
    if (!found) continue;
    const before = segment.text.slice(0, found.start);
    const isAlone = /^(?:[\p{L}\s]{2,30},\s*)?$/u.test(before) && segment.text.length - found.end < 3;
    const value = isAlone || /\binvoice\b.*\bdated\s*$/i.test(before) ? dayOf(found, dayOrder) : null;
    const spot = spotIn(segment, found.start, found.end);
    if (value && spot) return { value, spot };
  }
  return null;
}

/** `Net 30` from the invoice's date. */
function dueByTerms({ paragraphs }: Paper, date: string | null): Found<string> | null {
  if (date === null) return null;
  for (const paragraph of paragraphs) {
    if (!/\b(?:net(?:to)?|terms|due|pay(?:able|ment)?|zahlbar|zahlung|jours|n\/\d)/i.test(paragraph.text))
      continue;
    const days = daysToPay(paragraph.text);
    const spot = days === null ? null : spotIn(paragraph, 0, paragraph.text.length);
    if (days !== null && spot) return { value: dayAfter(date, days), spot };
  }
  return null;
}
