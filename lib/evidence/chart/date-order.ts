import { DATE_ORDERS, type DateOrder } from './corrections';
import type { DateWriting } from './time-shape';
import { DAY_S, dayOf } from './written-time';

/** What beside the rows hints at how their dates are written. */
export interface DateHints {
  /** Other dates of the file in the same writing. */
  readonly others: readonly number[];
  readonly separator: string;
  readonly decimalComma: boolean;
  readonly halfDays: boolean;
  /** Words of the headings and of the preamble. */
  readonly words: string;
}

const [EARLIEST, LATEST] = [Date.UTC(1995, 0, 1) / 1000, Date.UTC(2080, 0, 1) / 1000];

/**
 * In which order day, month and year stand, decided over all dates of the file: an order in which one of them is no day
 * is out; of two that are left, the one in which the days follow each other; then by the habits of the country.
 *
 * @param dates the different dates of the rows, in their order.
 */
export function dateOrderOf(
  dates: readonly number[],
  writing: DateWriting,
  hints: DateHints,
): { order: DateOrder; sure: boolean } {
  if (writing === 'year_first' || writing === 'named') return { order: 'YMD', sure: true };
  const possible = DATE_ORDERS.filter((order) => writing === 'short' || order !== 'YMD');
  const holds = (order: DateOrder) =>
    [...dates, ...hints.others].every((date) => {
      const day = dayOf(date, writing, order);
      return day >= EARLIEST && day < LATEST;
    });
  const left = possible.filter(holds);
  const [only] = left;
  if (only && left.length === 1) return { order: only, sure: true };
  const spans = left.map((order) => ({ order, span: spanOf(dates, writing, order) }));
  const [nearest, next] = spans.toSorted((one, other) => one.span - other.span);
  if (nearest && next && dates.length > 1 && nearest.span * 2 < next.span) {
    return { order: nearest.order, sure: true };
  }
  const habit = habitOf(hints);
  return { order: left.length === 0 || left.includes(habit) ? habit : (only ?? habit), sure: false };
}

/** Days from each date to the next, added up. */
const spanOf = (dates: readonly number[], writing: DateWriting, order: DateOrder): number =>
  dates.reduce(
    (sum, date, at) =>
      at === 0
        ? 0
        : sum + Math.abs(dayOf(date, writing, order) - dayOf(dates[at - 1] ?? date, writing, order)) / DAY_S,
    0,
  );

const OTHER_LANGUAGES =
  /datum|zeit|uhr|heure|temps|fecha|hora|tempo|\bora\b|ofen|charge|regler|soll|\bist\b|four|horno|forno|tijd/i;

function habitOf({ separator, decimalComma, halfDays, words }: DateHints): DateOrder {
  if (halfDays) return 'MDY';
  if (separator === '.' || decimalComma || OTHER_LANGUAGES.test(words)) return 'DMY';
  return separator === '/' ? 'MDY' : 'DMY';
}
