import type { Cycle } from '../certificate';
import { sayDuration, sayMinute } from './say';

const MS_PER_MINUTE = 60_000;

/** Minutes from one local time to another, negative where the other is earlier. No clock changes are known. */
export const minutesBetween = (from: string, to: string): number =>
  (Date.parse(`${to}Z`) - Date.parse(`${from}Z`)) / MS_PER_MINUTE;

/** What a certificate says of how long something took: in minutes, and by a start and an end. */
export interface Duration {
  readonly stated: number | null;
  readonly byTimes: number | null;
  readonly words: string;
}

/** Minutes that are so many times what the times say are misread, not miscounted. */
const MISREAD = 5;

export function durationOf({
  minutes,
  soak_start,
  soak_end,
}: Omit<Cycle, 'step' | 'set_temp' | 'unit'>): Duration {
  // One time for start and end is one that stands for both.
  const hasTimes = soak_start !== null && soak_end !== null && soak_start !== soak_end;
  const byTimes = hasTimes ? minutesBetween(soak_start, soak_end) : null;
  const isMisread = minutes !== null && byTimes !== null && byTimes > 0 && minutes >= MISREAD * byTimes;
  const stated = isMisread ? null : minutes;
  const times = hasTimes ? `${sayMinute(soak_start)} to ${sayMinute(soak_end)}` : '';
  const parts = [stated === null ? '' : sayDuration(stated), times].filter((part) => part !== '');
  return { stated, byTimes, words: parts.join(', ') };
}

/** Both ways of saying it that are there, the shorter first. */
export const saidMinutes = ({ stated, byTimes }: Duration): number[] =>
  [stated, byTimes].filter((value): value is number => value !== null).toSorted((a, b) => a - b);

const LONG = 120;
const HALF_HOUR = 30;

/**
 * Whether the minutes and the times say different things. Printed times are whole minutes; what is long is printed in
 * hours or half hours.
 */
export function contradictsItself({ stated, byTimes }: Duration): boolean {
  if (byTimes !== null && byTimes < 0) return true;
  if (stated === null || byTimes === null) return false;
  const allowed = stated >= LONG && stated % HALF_HOUR === 0 ? HALF_HOUR : 1;
  return Math.abs(stated - byTimes) > allowed;
}
