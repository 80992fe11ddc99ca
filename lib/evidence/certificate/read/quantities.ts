/** Whether a document writes 28,5 for twenty-eight and a half. */
export type DecimalSign = '.' | ',';

/**
 * A number as written.
 *
 * A sign before exactly three figures sets thousands apart when it is not the document's decimal sign; a comma before any
 * other count of figures is a decimal sign in either kind of document.
 *
 * @returns NaN where it is no number.
 * @example `28,5` is 28.5 in every document; `1,200` is 1200, and 1.2 where commas are decimal.
 */
export function numberFrom(written: string, sign: DecimalSign): number {
  const plain = written.replace(/\s/g, '');
  if (sign === ',') {
    if (/^\d{1,3}(?:\.\d{3})+(?:,\d+)?$/.test(plain) && !/^0\./.test(plain))
      return Number(plain.replace(/\./g, '').replace(',', '.'));
    return Number(plain.replace(',', '.'));
  }
  if (/^[1-9]\d{0,2}(?:,\d{3})+(?:\.\d+)?$/.test(plain)) return Number(plain.replace(/,/g, ''));
  return Number(plain.replace(',', '.'));
}

/**
 * Which decimal sign a document uses, from the numbers in it.
 *
 * @param text all that stands in it.
 */
export function decimalSignOf(text: string): DecimalSign {
  const commas = text.match(/(?<![\d,.])\d{1,4},\d{1,2}(?![\d,])/g)?.length ?? 0;
  // A time may be written with a full stop.
  const points =
    text
      .replace(/(?:kl\.?|uhr|\d{4}-\d\d-\d\d|\d\d\.\d\d\.\d{4})\s+\d{1,2}\.\d{2}(?!\d)/gi, ' ')
      .match(/(?<![\d,./])\d{1,4}\.\d{1,2}(?![\d,.])/g)?.length ?? 0;
  // Who parts the day by full stops has a comma before decimals.
  const dotted = /(?<!\d)\d{1,2}\.\d{1,2}\.(?:20)?\d{2}(?!\d)/.test(text);
  return commas > points || (dotted && commas > 0) ? ',' : '.';
}

export interface FoundQuantity {
  readonly start: number;
  readonly end: number;
  readonly value: number;
}

export interface FoundTemperature extends FoundQuantity {
  readonly unit: 'F' | 'C' | null;
}

const TEMPERATURE =
  /(?<![\d.,/]|\d[-–])(\d{2,4}(?:[.,]\d)?|[1-2][.,]\d{3}(?![\d])|\d{4}0(?=\s?[FC]\b))\s*(?:(?:[+/]*[±+][/\-]*|\+\s*\/\s*-)\s*\d{1,3}(?:[.,]\d)?\s*)?(?:[°º˚*'"”’o]|deg(?:rees?|\.)?)?\s*(F(?:ahrenheit)?|C(?:elsius|entigrade)?)(?![\p{L}\d]|\s+of\b)/giu;

/** Temperatures with their unit; the tolerance that may stand between is passed over. */
export function temperaturesIn(text: string, sign: DecimalSign): FoundTemperature[] {
  return [...text.matchAll(TEMPERATURE)].map((match) => {
    const [whole, written = '', unit = '']: (string | undefined)[] = match;
    const read = numberFrom(written, sign);
    const scale = unit.toUpperCase().startsWith('F') ? 'F' : 'C';
    // A degree sign that was recognised as a nought: 9200F.
    const value = read > 2500 && read % 10 === 0 ? read / 10 : read;
    return { start: match.index, end: match.index + (whole ?? '').length, value, unit: scale };
  });
}

const HOURS = String.raw`hours?|hrs?\.?|h|stunden|std\.?|heures?|horas?`;
const MINUTES = String.raw`minutes?|mins?\.?|minuten|minutos?|m(?=\s*\d*\s*s\b)|['′]`;
const SECONDS = String.raw`seconds?|secs?\.?|s|sekunden|sek\.?|secondes?|segundos?`;
const AMOUNT = String.raw`\d+(?:[.,]\d+)?|\d+\s+\d\/\d|[¼½¾]`;
const DURATION = new RegExp(
  String.raw`(?<![\d.,:]|\d\/)(?:(${AMOUNT})\s*-?\s*(?:${HOURS})(?![\p{L}\d]|-\d)(?:\s*(?:and|,|&)?\s*(${AMOUNT})\s*-?\s*(?:${MINUTES})(?![\p{L}]))?|(${AMOUNT})\s*-?\s*(?:${MINUTES})(?![\p{L}\d])(?:\s*(\d{1,2})\s*(?:${SECONDS})(?![\p{L}\d]))?|(\d{1,3}):(\d\d)\s*(?:${HOURS})(?![\p{L}\d])|(\d+(?:[.,]\d+)?)\s*-?\s*(?:${SECONDS})(?![\p{L}\d])|(\d{1,2})h(\d{2})(?![\d]))`,
  'giu',
);

/** Lengths of time, in minutes. */
export function durationsIn(text: string, sign: DecimalSign): FoundQuantity[] {
  return [...text.matchAll(DURATION)].map((match) => {
    const [whole, hours, more, minutes, extra, clockHours, clockMinutes, seconds, h, hm]: (
      string | undefined
    )[] = match;
    const amount = (written: string | undefined): number =>
      written === undefined ? 0 : amountOf(written, sign);
    const value =
      amount(hours ?? h) * 60 +
      amount(more ?? hm) +
      amount(minutes) +
      amount(extra) / 60 +
      amount(clockHours) * 60 +
      amount(clockMinutes) +
      amount(seconds) / 60;
    return {
      start: match.index,
      end: match.index + (whole ?? '').length,
      value: Math.round(value * 1e6) / 1e6,
    };
  });
}

const FRACTIONS: Readonly<Record<string, number>> = { '¼': 0.25, '½': 0.5, '¾': 0.75 };

function amountOf(written: string, sign: DecimalSign): number {
  const fraction = FRACTIONS[written];
  if (fraction !== undefined) return fraction;
  const [, whole, above, below] = /^(\d+)\s+(\d)\/(\d)$/.exec(written) ?? [];
  if (whole !== undefined) return Number(whole) + Number(above) / Number(below);
  return numberFrom(written, sign);
}
