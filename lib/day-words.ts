/** A day of the calendar, `2026-04-16`: the same day wherever it is read. */
export type CalendarDay = string;

/** Whose clock: the shop's zone, and the moment the words are made. */
export interface Clock {
  zone: string;
  now: Date;
}

const MS_PER_DAY = 86_400_000;
const DAY_ONLY = /^(\d{4})-(\d{2})-(\d{2})$/;

/** `Thu 16 Apr`; with the year when it is not this one. */
export function dayWords(when: Date | CalendarDay, clock: Clock): string {
  const { weekday, day, month, year } = partsOf(when, clock.zone);
  return `${weekday} ${day} ${month}${yearUnlessThis(year, clock)}`;
}

/** `16 Apr`: in columns and beside names. */
export function shortDayWords(when: Date | CalendarDay, clock: Clock): string {
  const { day, month, year } = partsOf(when, clock.zone);
  return `${day} ${month}${yearUnlessThis(year, clock)}`;
}

/** `08:40` */
export function timeWords(when: Date, zone: string): string {
  const { hour, minute } = partsOf(when, zone);
  return `${hour}:${minute}`;
}

/** `Wed 15 Apr 16:40` */
export function momentWords(when: Date, clock: Clock): string {
  return `${dayWords(when, clock)} ${timeWords(when, clock.zone)}`;
}

/** The day it is in a zone. */
export function calendarDay(when: Date, zone: string): CalendarDay {
  const { year, monthNumber, day } = partsOf(when, zone);
  return `${year}-${monthNumber}-${day.padStart(2, '0')}`;
}

/** Whole days from one day to another; negative where `to` is earlier. */
export const daysBetween = (from: CalendarDay, to: CalendarDay): number =>
  Math.round((midnightUtc(to) - midnightUtc(from)) / MS_PER_DAY);

/** Whole days from today until then; negative when it is past. */
export const daysUntil = (when: CalendarDay, { zone, now }: Clock): number =>
  daysBetween(calendarDay(now, zone), when);

/** `6 d late`, `today`, `in 5 d`. */
export function untilWords(when: CalendarDay, clock: Clock): string {
  const days = daysUntil(when, clock);
  if (days === 0) return 'today';
  return days < 0 ? `${-days} d late` : `in ${days} d`;
}

/** From 0, Sunday, to 6. */
export const weekdayOf = (when: CalendarDay): number => new Date(midnightUtc(when)).getUTCDay();

export function addDays(when: CalendarDay, days: number): CalendarDay {
  return new Date(midnightUtc(when) + days * MS_PER_DAY).toISOString().slice(0, 10);
}

interface DayParts {
  weekday: string;
  day: string;
  month: string;
  monthNumber: string;
  year: string;
  hour: string;
  minute: string;
}

function partsOf(when: Date | CalendarDay, zone: string): DayParts {
  if (typeof when === 'string') return partsOfDay(when);
  const found = new Map(
    formatIn(zone)
      .formatToParts(when)
      .map((part) => [part.type, part.value]),
  );
  const text = (type: Intl.DateTimeFormatPartTypes) => found.get(type) ?? '';
  const monthNumber = text('month');
  return {
    weekday: text('weekday'),
    day: text('day'),
    month: MONTHS[Number(monthNumber) - 1] ?? '',
    monthNumber,
    year: text('year'),
    hour: text('hour'),
    minute: text('minute'),
  };
}

/** A day needs no zone, and a drawing asks for hundreds of them. */
function partsOfDay(day: CalendarDay): DayParts {
  const [year = '', monthNumber = '', date = ''] = day.split('-');
  return {
    weekday: WEEKDAYS[weekdayOf(day)] ?? '',
    day: String(Number(date)),
    month: MONTHS[Number(monthNumber) - 1] ?? '',
    monthNumber,
    year,
    hour: '00',
    minute: '00',
  };
}

const WEEKDAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'];
/** Named here because locales disagree on "Sep" and "Sept", and a column of days must line up. */
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

const formats = new Map<string, Intl.DateTimeFormat>();

/** Making a format costs more than using it a hundred times. */
function formatIn(zone: string): Intl.DateTimeFormat {
  const known = formats.get(zone);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-US', {
    timeZone: zone,
    weekday: 'short',
    day: 'numeric',
    month: '2-digit',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  formats.set(zone, made);
  return made;
}

function midnightUtc(day: CalendarDay): number {
  const [, year, month, date] = DAY_ONLY.exec(day) ?? [];
  if (!year || !month || !date) throw new RangeError(`Not a day: ${day}`);
  return Date.UTC(Number(year), Number(month) - 1, Number(date));
}

function yearUnlessThis(year: string, clock: Clock): string {
  const thisYear = thisYears.get(clock) ?? partsOf(clock.now, clock.zone).year;
  thisYears.set(clock, thisYear);
  return year === thisYear ? '' : ` ${year}`;
}

/** A column of days asks one clock again and again. */
const thisYears = new WeakMap<Clock, string>();
