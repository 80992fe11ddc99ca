import type { Source } from '../source';
import type { Verdict } from '../verdict';

/** How often a test is made, as the tables of intervals say it. */
export const INTERVALS = [
  'weekly',
  'biweekly',
  'monthly',
  'bimonthly',
  'quarterly',
  'semiannual',
  'annual',
] as const;
export type Interval = (typeof INTERVALS)[number];

export const INTERVAL_RULE: Source = {
  document: 'AMS 2750E 2.2.25',
  confidence: 'read',
  certainty: 'high',
  address:
    'https://elsmar.com/elsmarqualityforum/threads/ams-2750e-system-accuracy-test-sat-frequency.70128/',
};

const DAYS: Partial<Record<Interval, number>> = { weekly: 7, biweekly: 14 };
const MONTHS: Partial<Record<Interval, number>> = {
  monthly: 1,
  bimonthly: 2,
  quarterly: 3,
  semiannual: 6,
  annual: 12,
};

/**
 * The last day on which the next test is still in time. Weeks end on the same day of the week; months on the same day
 * number, or on the month's last day where it has no such day.
 *
 * @param on the day of the last test, `YYYY-MM-DD`.
 * @returns the day, `YYYY-MM-DD`; refused as `not_a_date`.
 * @example monthly after 2026-01-31 is 2026-02-28; quarterly after 2025-11-30 is 2026-02-28.
 */
export function nextDue(on: string, interval: Interval): Verdict<{ dueOn: string }, 'not_a_date'> {
  const day = readDay(on);
  if (!day) return { ok: false, reason: 'not_a_date' };
  const dueOn = writeDay(addMonths(addDays(day, DAYS[interval] ?? 0), MONTHS[interval] ?? 0));
  return { ok: true, dueOn, source: INTERVAL_RULE };
}

/** Whether a text is a day of the calendar, `YYYY-MM-DD`. Days compare as texts. */
export const isDay = (text: string): boolean => readDay(text) !== null;

interface Day {
  year: number;
  /** January is 0. */
  month: number;
  day: number;
}

function readDay(text: string): Day | null {
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text) ?? [];
  const read = { year: Number(year), month: Number(month) - 1, day: Number(day) };
  // What the calendar would carry into the next month was no day.
  return year !== undefined && writeDay(read) === text ? read : null;
}

const writeDay = ({ year, month, day }: Day): string =>
  new Date(Date.UTC(year, month, day)).toISOString().slice(0, 10);

const addDays = ({ year, month, day }: Day, days: number): Day => {
  const later = new Date(Date.UTC(year, month, day + days));
  return { year: later.getUTCFullYear(), month: later.getUTCMonth(), day: later.getUTCDate() };
};

const addMonths = ({ year, month, day }: Day, months: number): Day => {
  const lastDay = new Date(Date.UTC(year, month + months + 1, 0)).getUTCDate();
  const first = new Date(Date.UTC(year, month + months, 1));
  return { year: first.getUTCFullYear(), month: first.getUTCMonth(), day: Math.min(day, lastDay) };
};
