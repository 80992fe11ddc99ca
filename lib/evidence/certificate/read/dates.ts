/** How a document writes a day in figures: the day or the month first. */
export type DayOrder = 'day_first' | 'month_first';

export interface FoundDay {
  readonly start: number;
  readonly end: number;
  /** `YYYY-MM-DD`; null where that reading is no day of the calendar. Both the same where the words say the month. */
  readonly dayFirst: string | null;
  readonly monthFirst: string | null;
  /** Which way of writing it shows of itself, named months and all. */
  readonly shows: DayOrder | null;
}

const MONTHS: readonly (readonly string[])[] = [
  ['jan', 'janv', 'januar', 'january', 'janvier', 'enero', 'ene', 'jän'],
  ['feb', 'februar', 'february', 'fevr', 'févr', 'février', 'fevrier', 'febrero'],
  ['mar', 'mär', 'märz', 'marz', 'march', 'mars', 'marzo', 'mrz'],
  ['apr', 'april', 'avr', 'avril', 'abril', 'abr'],
  ['may', 'mai', 'mayo'],
  ['jun', 'juni', 'june', 'juin', 'junio'],
  ['jul', 'juli', 'july', 'juil', 'juillet', 'julio'],
  ['aug', 'august', 'août', 'aout', 'agosto', 'ago'],
  ['sep', 'sept', 'september', 'septembre', 'septiembre'],
  ['oct', 'okt', 'oktober', 'october', 'octobre', 'octubre'],
  ['nov', 'november', 'novembre', 'noviembre'],
  ['dec', 'dez', 'dezember', 'december', 'déc', 'décembre', 'decembre', 'diciembre', 'dic'],
];
const MONTH_OF: ReadonlyMap<string, number> = new Map(
  MONTHS.flatMap((names, index) => names.map((name): [string, number] => [name, index + 1])),
);
const NAMES = [...MONTH_OF.keys()].sort((a, b) => b.length - a.length).join('|');

/** A figure, or a letter that print takes for one. */
const D = String.raw`[\dOoIl|]`;
const YEAR = String.raw`(?:[2Z]${D}${D}${D}|${D}${D})`;
const NOT_BEFORE = String.raw`(?<![\p{L}\d/]|\d[.,-])`;
const NOT_AFTER = String.raw`(?![\p{L}\d]|[-/]\d)`;

/** In the order in which they are tried at a place. */
const WRITINGS: readonly {
  readonly pattern: RegExp;
  readonly read: (groups: readonly string[]) => Reading;
}[] = [
  {
    // 2026-03-05, also at the front of a time: 2026-03-05T09:12.
    pattern: new RegExp(`${NOT_BEFORE}([2Z]${D}{3})([-./])(${D}{1,2})\\2(${D}{1,2})(?![\\d]|[-/]\\d)`, 'giu'),
    read: ([year = '', , month = '', day = '']) => named(year, number(month), day, null),
  },
  {
    // 5 March 2026, 05-MAR-26, 5. März 2026, 5th of March 2026
    pattern: new RegExp(
      `${NOT_BEFORE}(${D}{1,2})(?:st|nd|rd|th|\\.|er)?[\\s\\-/.]*(?:of\\s+|de\\s+)?(${NAMES})\\.?,?[\\s\\-/.']*(?:de\\s+)?(${YEAR})${NOT_AFTER}`,
      'giu',
    ),
    read: ([day = '', month = '', year = '']) =>
      named(year, MONTH_OF.get(month.toLowerCase()) ?? 0, day, 'day_first'),
  },
  {
    // March 5, 2026; MAR-05-2026; Mar 05 26
    pattern: new RegExp(
      `(?<![\\p{L}])(${NAMES})\\.?[\\s\\-/.]*(${D}{1,2})(?:st|nd|rd|th)?[\\s,\\-/.']+(${YEAR})${NOT_AFTER}`,
      'giu',
    ),
    read: ([month = '', day = '', year = '']) =>
      named(year, MONTH_OF.get(month.toLowerCase()) ?? 0, day, 'month_first'),
  },
  {
    pattern: new RegExp(
      `${NOT_BEFORE}(${D}{1,2})\\s?([-./])\\s?(${D}{1,2})\\s?\\2\\s?(${YEAR})${NOT_AFTER}`,
      'giu',
    ),
    read: ([first = '', sign = '', second = '', year = '']) => inFigures(first, second, year, sign),
  },
];

type Reading = Omit<FoundDay, 'start' | 'end'> | null;

/** Every day that a text names, whatever the order of its parts. */
export function daysIn(text: string): FoundDay[] {
  const found: FoundDay[] = [];
  for (const { pattern, read } of WRITINGS)
    for (const match of text.matchAll(pattern)) {
      const start = match.index;
      const end = start + match[0].length;
      if (found.some((other) => start < other.end && end > other.start)) continue;
      const reading = read(match.slice(1));
      if (reading) found.push({ start, end, ...reading });
    }
  return found.sort((a, b) => a.start - b.start);
}

/**
 * The day, when the document's way of writing is known.
 *
 * @returns `YYYY-MM-DD`; null where the two readings differ and nothing tells which.
 */
export function dayOf(found: FoundDay, order: DayOrder | null): string | null {
  if (found.dayFirst === found.monthFirst) return found.dayFirst;
  if (found.dayFirst === null || found.monthFirst === null) return found.dayFirst ?? found.monthFirst;
  if (order === null) return null;
  return order === 'day_first' ? found.dayFirst : found.monthFirst;
}

const number = (written: string): number => Number(figures(written));

/** Letters that stand for figures. */
export const figures = (written: string): string =>
  written
    .replace(/[Oo]/g, '0')
    .replace(/[Il|]/g, '1')
    .replace(/Z/g, '2')
    .replace(/S/g, '5')
    .replace(/B/g, '8');

function named(year: string, month: number, day: string, shows: DayOrder | null): Reading {
  const iso = calendarDay(number(year), month, number(day));
  return iso === null ? null : { dayFirst: iso, monthFirst: iso, shows };
}

function inFigures(first: string, second: string, year: string, sign: string): Reading {
  const [a, b, y] = [number(first), number(second), number(year)];
  const dayFirst = calendarDay(y, b, a);
  const monthFirst = calendarDay(y, a, b);
  if (dayFirst === null && monthFirst === null) return null;
  // Nobody parts month, day and year by full stops.
  if (sign === '.' && dayFirst !== null) return { dayFirst, monthFirst: dayFirst, shows: 'day_first' };
  if (dayFirst === monthFirst) return { dayFirst, monthFirst, shows: null };
  if (monthFirst === null) return { dayFirst, monthFirst, shows: 'day_first' };
  return { dayFirst, monthFirst, shows: dayFirst === null ? 'month_first' : null };
}

function calendarDay(year: number, month: number, day: number): string | null {
  const whole = year < 100 ? 2000 + year : year;
  const date = new Date(Date.UTC(whole, month - 1, day));
  const exists = date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
  return exists && whole >= 2000 && whole < 2100 ? date.toISOString().slice(0, 10) : null;
}
