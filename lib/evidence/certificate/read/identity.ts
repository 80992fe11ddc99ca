import { fitting, type Answer } from './answers';
import type { Candidate } from './candidates';
import { codeIn, type Reading } from './codes';
import { daysIn } from './dates';
import type { LabelKey } from './labels';
import type { Paper } from './paper';
import { readingAt } from './codes';
import type { Passage } from '../../layout/passage';

/** A text that begins with a day of the calendar. */
export const beginsWithDay = (text: string): boolean => daysIn(text)[0]?.start === 0;

/** What a code is asked for by its label, and said in sentences. */
interface CodeField {
  readonly keys: readonly LabelKey[];
  /** Its group is the value. */
  readonly said: readonly RegExp[];
}

const CODE = String.raw`((?:[A-Z]{1,6}[-\s]?)?(?=[A-Z0-9./-]*\d)[A-Z0-9][A-Z0-9./-]*[A-Z0-9]|\d{3,})`;

export const CERTIFICATE_NUMBER: CodeField = {
  keys: ['certificate_number'],
  said: [
    new RegExp(
      String.raw`\b(?:certificates?|certification|cert\.?|report|c\s?of\s?c|coc)\s*(?:no\.?|nr\.?|number|#|ref\.?)\s*:?\s*${CODE}`,
      'giu',
    ),
    new RegExp(
      String.raw`\b(?:certificate|certification|certificat|cert|report|zeugnis)\b[^.:;\d]{0,50}\bno\.?\s*:?\s*${CODE}`,
      'giu',
    ),
    new RegExp(
      String.raw`\b(?:certificate|certification|cert|coc|certificate of (?:conformance|conformity|compliance|processing|treatment|heat treatment|analysis)|report)\.?\s+(?:[-–]\s+)?((?=[A-Z0-9./-]*\d)[A-Z]{1,5}-?[A-Z0-9./-]+|\d{2}-\d{3,}|\d{4,})`,
      'giu',
    ),
  ],
};

export const PURCHASE_ORDER: CodeField = {
  keys: ['purchase_order'],
  said: [
    new RegExp(
      String.raw`\b(?:p\.?\s?o\.?|purchase order|your order|customer order|(?<!\b(?:our|works?|shop|sales|job|unser\w*)\s+)order)\s*(?:no\.?|nr\.?|number|#)?\s*:?\s*${CODE}`,
      'giu',
    ),
    /(?<![\p{L}\d])(P\.?O\.?[-#]\s?\d[A-Z0-9-]*)/giu,
  ],
};

export const BATCH: CodeField = {
  keys: ['batch'],
  said: [
    new RegExp(
      String.raw`\b(?:(?:your|customer)\s+)?batch\s*(?:no\.?|nr\.?|number|#)?\s*:?\s*${CODE}`,
      'giu',
    ),
    // As the orders of this product number them.
    /(?<![\p{L}\d-])(B-\d{4})(?![\p{L}\d-])/gu,
  ],
};

/** A sum of money beside words of an order is no number of it. */
const AMOUNT = /^\d{1,3}(?:[.,]?\d{3})*[.,]\d{2}$/;

/** Every place that gives the code. */
export function codesFor(paper: Paper, field: CodeField): Candidate<string>[] {
  const asked = paper.answers.flatMap((answer) => fromAnswer(answer, field));
  const said = paper.paragraphs.flatMap((paragraph) =>
    field.said.flatMap((pattern) => inSentence(paragraph, pattern)),
  );
  return [...asked, ...said].filter(({ value }) => !AMOUNT.test(value));
}

function fromAnswer(answer: Answer, field: CodeField): Candidate<string>[] {
  if (answer.registered) return [];
  const turn = [answer.key, ...answer.also].findIndex((key) => field.keys.includes(key));
  if (turn < 0) return [];
  const found = fitting(answer, (passage) => readCode(passage));
  if (!found) return [];
  // A label that asks for two things has its second behind the stroke.
  const parts = answer.also.length > 0 ? found.value.split(/\s*\/\s*/) : [];
  const value = parts.length === answer.also.length + 1 ? (parts[turn] ?? found.value) : found.value;
  const far = found.how === 'right' || found.how === 'below' ? 0.98 : 1;
  return [
    {
      value: lettersOfOrder(value),
      spot: found.spot,
      trust: found.trust * far * (answer.marked ? 1 : 0.97),
    },
  ];
}

/** What the paper takes the place of is not what it is. */
const REPLACED =
  /\b(?:replac\w*|supersed\w*|voids?|cancel\w*|previous|ersetzt|remplace|sustituye)\b[^.;]{0,30}$/i;

/** No order begins with P0. */
const lettersOfOrder = (code: string): string => code.replace(/^P(?:0O|O0|0)(?=-?\d)/, 'PO');

const readCode = (passage: Passage): Reading<string> | null => codeIn(passage, beginsWithDay);

function inSentence(passage: Passage, pattern: RegExp): Candidate<string>[] {
  return [...passage.text.matchAll(pattern)].flatMap((match) => {
    const value = (match[1] ?? '').replace(/[.,/-]+$/, '').trim();
    const start = match.index + match[0].lastIndexOf(match[1] ?? '');
    if (!/\d/.test(value) || beginsWithDay(passage.text.slice(start))) return [];
    // A year alone is no number.
    if (/^20\d\d$/.test(value)) return [];
    if (REPLACED.test(passage.text.slice(0, match.index))) return [];
    const found = readingAt(passage, start, start + value.length, value);
    return found ? [{ ...found, value: lettersOfOrder(found.value), trust: 0.7 }] : [];
  });
}

/** Two spellings of one number: case, spaces and marks aside. */
export const sameCode = (a: string, b: string): boolean => bare(a) === bare(b);
const bare = (code: string): string => code.toUpperCase().replace(/[^A-Z0-9]/g, '');
