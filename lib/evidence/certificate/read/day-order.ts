import { dayOf, daysIn, type DayOrder } from './dates';
import type { DecimalSign } from './quantities';
import type { Sheet } from './sheet';

/** Signs of where a document was made. Each alone may mislead; what they say together decides. */
const AMERICAN = [
  /\b[A-Z]{2}\.?,?\s+\d{5}(?:-\d{4})?\b/,
  /°\s?F\b|deg\.?\s?F\b/,
  /\b(?:Inc|LLC|Corp)\b/,
  /\(\d{3}\)\s?\d{3}-\d{4}|\b\d{3}[-.]\d{3}[-.]\d{4}\b/,
  /\b(?:aluminum|center|color|authorized)\b/i,
  /\bU\.?S\.?A\.?\b/,
  /\d\s?F\b(?!\s*\d)/,
  /\b\d{1,2}:\d\d\s?[AP]M\b/,
  /\d\s+in\b(?!\s+\w)|\b\d+\s?lbs?\b/i,
  /\b(?:mils?|microinch(?:es)?|ksi)\b/i,
];
const EUROPEAN = [
  /\b(?:GmbH|AG|Ltd|Limited|plc|S\.?A\.?S?|S\.?r\.?l|B\.?V|Oy|AB|ApS|s\.?r\.?o)\b/,
  /°\s?C\b|deg\.?\s?C\b/,
  /\+\s?(?:3\d|4\d)[\s(\d]/,
  /\b(?:aluminium|centre|colour|authorised|organisation)\b/i,
  /\b[A-Z]{1,2}\d[A-Z\d]?\s+\d[A-Z]{2}\b/,
  /\b(?:Deutschland|Germany|France|England|United Kingdom|UK|Italia|Nederland|Schweiz|Austria)\b/,
  /[äöüßéèàçñ]/i,
  /\b(?:ordine|materiale|lotto|commande|mati[eè]re|pi[eè]ces?|bestellung|werkstoff|pedido|piezas?|lote|bestelling|ordrenummer|delenummer)\b/i,
];

/** The order, and whether the days themselves show it; else it follows from where the document seems to come from. */
export interface DecidedOrder {
  readonly order: DayOrder | null;
  readonly isShown: boolean;
}

/**
 * Whether days in figures have the day or the month first.
 *
 * A day that can be read in one way only decides; without one, what else shows where the document comes from, when it
 * speaks for one side clearly.
 *
 * @returns an order of null where nothing tells.
 */
export function dayOrderOf(text: string, sheets: readonly Sheet[], decimal: DecimalSign): DecidedOrder {
  const shown = daysIn(text).map(({ shows, dayFirst, monthFirst }) => ({
    shows,
    named: dayFirst === monthFirst,
  }));
  const count = (order: DayOrder, named: boolean): number =>
    shown.filter((day) => day.shows === order && day.named === named).length;
  const certain = count('day_first', false) - count('month_first', false);
  if (certain !== 0) return { order: certain > 0 ? 'day_first' : 'month_first', isShown: true };
  if (count('day_first', false) > 0) return { order: null, isShown: false };
  const close = closerTogether(text);
  if (close) return { order: close, isShown: true };
  const hits = (signs: readonly RegExp[]): number => signs.filter((sign) => sign.test(text)).length;
  const a4 = sheets.filter(({ width, height }) =>
    [842, 595, 1191].some((side) => Math.abs(Math.max(width, height) - side) < 4),
  ).length;
  const letter = sheets.filter(({ width, height }) => Math.abs(Math.max(width, height) - 792) < 4).length;
  const european =
    hits(EUROPEAN) + (decimal === ',' ? 2 : 0) + (a4 > 0 ? 1 : 0) + Math.min(1, count('day_first', true));
  const american = hits(AMERICAN) + (letter > 0 ? 1 : 0) + 2 * Math.min(1, count('month_first', true));
  const clear =
    Math.max(european, american) >= 2 &&
    // Clear means twice as much, not a majority of one.
    Math.max(european, american) >= 2 * Math.min(european, american);
  const likely = european > american ? 'day_first' : 'month_first';
  return { order: clear && european !== american ? likely : null, isShown: false };
}

const DAY_MS = 86_400_000;

/**
 * The order in which the days of the document lie together, as the days of one job do: within a month, when in the other
 * order they would lie over more than two.
 */
function closerTogether(text: string): DayOrder | null {
  const days = daysIn(text);
  const span = (order: DayOrder): number => {
    const times = days.flatMap((day) => {
      const iso = dayOf(day, order);
      return iso === null ? [] : [Date.parse(iso) / DAY_MS];
    });
    return Math.max(...times) - Math.min(...times);
  };
  if (days.length < 2) return null;
  const [dayFirst, monthFirst] = [span('day_first'), span('month_first')];
  if (monthFirst <= 31 && dayFirst > 62) return 'month_first';
  return dayFirst <= 31 && monthFirst > 62 ? 'day_first' : null;
}
