import { numberKey } from './number-key';

const YEAR = /(?:^|[-/.\s])((?:20)?\d{2})(?=$|[-/.\s])/g;

interface Parts {
  readonly prefix: string;
  readonly digits: string;
  readonly year: string | null;
}

/** The number with and without each of its parts that may be a year. Two digits are one only where they are known as one. */
function readings(written: string, known: readonly string[]): Parts[] {
  const years = [...written.matchAll(YEAR)]
    .filter(({ 1: year = '' }) => year.length === 4 || known.includes(year))
    .map(({ 0: whole, 1: year = '', index }) => ({
      year: year.slice(-2),
      rest: `${written.slice(0, index)}-${written.slice(index + whole.length)}`,
    }));
  return [{ year: null, rest: written }, ...years].flatMap(({ year, rest }) => {
    const [, prefix = '', digits = ''] = /^([A-Z]*?)0*(\d.*)$/.exec(numberKey(rest)) ?? [];
    return digits === '' ? [] : [{ prefix, digits, year }];
  });
}

/**
 * Whether two invoice numbers are one number in two formats: without the word invoice, leading zeros and marks, and with
 * or without the year and a prefix that only one of them has.
 *
 * @param days dates of the invoices, `YYYY-MM-DD`: their years may stand in the number with two digits.
 * @example `INV-00123`, `123` and `Inv 123/26` are one on a day of 2026; `123/26` and `123/25` are two, `A-123` and `B-123` too
 */
export function isSameInvoiceNumber(one: string, other: string, days: readonly string[] = []): boolean {
  const known = days.map((day) => day.slice(2, 4));
  if (numberKey(one) === numberKey(other)) return true;
  return readings(one, known).some((a) =>
    readings(other, known).some(
      (b) =>
        a.digits === b.digits &&
        (a.prefix === b.prefix || a.prefix === '' || b.prefix === '') &&
        // A year is left out of one side only; with one on both sides it has to be the same.
        (a.year === b.year || (a.year === null) !== (b.year === null)),
    ),
  );
}
