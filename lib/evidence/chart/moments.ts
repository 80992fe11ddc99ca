import type { Recording } from './recording';

/** When a row was written, as the contract prints moments. */
export function momentOf({ seconds, counts }: Pick<Recording, 'seconds' | 'counts'>, row: number): string {
  return momentAt(seconds[row] ?? 0, counts);
}

export function momentAt(seconds: number, counts: Recording['counts']): string {
  const whole = Math.round(seconds);
  if (counts === 'date_and_time') return new Date(whole * 1000).toISOString().slice(0, 19);
  const ofDay = counts === 'time_of_day' ? ((whole % 86_400) + 86_400) % 86_400 : whole;
  const [hours, minutes] = [Math.floor(ofDay / 3600), Math.floor(ofDay / 60) % 60];
  return [hours, minutes, ofDay % 60].map((part) => String(part).padStart(2, '0')).join(':');
}

/** Only the time of the day, for sentences: `14:17`, with seconds where there are any. */
export function timeWordsAt(seconds: number, counts: Recording['counts']): string {
  const moment = momentAt(seconds, counts);
  const time = moment.slice(moment.indexOf('T') + 1);
  return counts === 'elapsed' ? `${time} after the start` : time.replace(/:00$/, '');
}

/** A length of time: `42 min 36 s`, `8 s`, `35 min`, `23 h 10 min`. */
export function durationWords(seconds: number): string {
  const whole = Math.round(seconds);
  const [hours, minutes, rest] = [Math.floor(whole / 3600), Math.floor(whole / 60) % 60, whole % 60];
  const parts = [hours > 0 && `${hours} h`, minutes > 0 && `${minutes} min`, rest > 0 && `${rest} s`];
  return parts.filter((part) => part !== false).join(' ') || '0 s';
}
