import { isDay } from '../pyrometry/next-due';
import type { Source } from '../source';
import type { Verdict } from '../verdict';

/** A finishing house's published rule for its lead times. */
const LEAD_TIME_RULE: Source = {
  document: 'Published lead-time rule of a finishing house',
  confidence: 'read',
  certainty: 'high',
};

const DAY_MS = 86_400_000;

/**
 * The day on which work is due, counted in work days from the day after parts and all papers are there.
 *
 * @param receivedOn the day the parts came, `YYYY-MM-DD`. @param completeOn the day the last paper came.
 * @param workDays whole days from 1. @param closed days on which nobody works, besides Saturday and Sunday.
 * @returns the day, `YYYY-MM-DD`, without transit; refused as `not_a_date` or `days_not_whole`.
 * @example received on a Monday, three work days: Thursday.
 */
export function promisedOn(asked: {
  receivedOn: string;
  completeOn: string;
  workDays: number;
  closed: readonly string[];
}): Verdict<{ dueOn: string }, 'not_a_date' | 'days_not_whole'> {
  const { receivedOn, completeOn, workDays, closed } = asked;
  if (!Number.isSafeInteger(workDays) || workDays < 1 || workDays > 1000)
    return { ok: false, reason: 'days_not_whole' };
  if (![receivedOn, completeOn].every(isDay)) return { ok: false, reason: 'not_a_date' };
  const start = receivedOn > completeOn ? receivedOn : completeOn;
  let day = Date.parse(`${start}T00:00:00Z`);
  for (let left = workDays; left > 0;) {
    day += DAY_MS;
    if (isWorkDay(day, closed)) left -= 1;
  }
  return { ok: true, dueOn: written(day), source: LEAD_TIME_RULE };
}

/**
 * Work days of several processes one after the other: from the sixth on, each takes one day off the sum.
 *
 * @param workDays of each process, whole days from 1.
 * @returns refused as `days_not_whole`.
 * @example seven processes of one day: 5 work days.
 */
export function workDaysTogether(
  workDays: readonly number[],
): Verdict<{ workDays: number }, 'days_not_whole'> {
  if (!workDays.every((days) => Number.isSafeInteger(days) && days >= 1))
    return { ok: false, reason: 'days_not_whole' };
  const sum = workDays.reduce((total, days) => total + days, 0);
  return { ok: true, workDays: sum - Math.max(0, workDays.length - 5), source: LEAD_TIME_RULE };
}

const written = (day: number): string => new Date(day).toISOString().slice(0, 10);

const isWorkDay = (day: number, closed: readonly string[]): boolean => {
  const weekday = new Date(day).getUTCDay();
  return weekday !== 0 && weekday !== 6 && !closed.includes(written(day));
};
