/** A moment as the device's field gives it, `2026-12-01T14:10`, or null. Read as the clock on the wall, without a zone. */
export function readMoment(typed: string): Date | null {
  const at = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/.test(typed) ? new Date(`${typed.slice(0, 16)}Z`) : null;
  return at && Number.isFinite(at.getTime()) ? at : null;
}

const DAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'];
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** `Tue 1 Dec 2026, 18:10`, by the same clock on the wall. */
export const momentWords = (at: Date): string =>
  `${DAYS[at.getUTCDay()]} ${at.getUTCDate()} ${MONTHS[at.getUTCMonth()]} ${at.getUTCFullYear()}, ${at.toISOString().slice(11, 16)}`;

const MIN_PER_HOUR = 60;
const MIN_PER_DAY = 24 * MIN_PER_HOUR;

/** `5 min`, `2 h 30 min`, `30 days`. */
export function spanWords(minutes: number): string {
  const [days, hours, rest] = [
    Math.floor(minutes / MIN_PER_DAY),
    Math.floor((minutes % MIN_PER_DAY) / MIN_PER_HOUR),
    Math.round(minutes % MIN_PER_HOUR),
  ];
  const parts = [
    ...(days > 0 ? [`${days} ${days === 1 ? 'day' : 'days'}`] : []),
    ...(hours > 0 ? [`${hours} h`] : []),
    ...(rest > 0 ? [`${rest} min`] : []),
  ];
  return parts.join(' ') || '0 min';
}

/** `12:05` of minutes and seconds under an hour, `2 h 30 min`, `29 days 4 h` above it. Seconds are rounded up. */
export function countdownWords(ms: number): string {
  const seconds = Math.ceil(ms / 1000);
  if (seconds >= 3600) return spanWords(Math.floor(seconds / 60));
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;
}

const MS_PER_MIN = 60_000;

/** A moment as the clock on the wall shows it where people are so many minutes east of UTC; read like `readMoment`. */
export const onTheWall = (at: Date, zoneMin: number): Date => new Date(at.getTime() + zoneMin * MS_PER_MIN);

/** A moment on the wall as the device's field takes it: `2026-12-01T14:10`. The minute it lies in, never a later one. */
export const fieldMoment = (at: Date): string => at.toISOString().slice(0, 16);

/** `UTC-5`, `UTC+5:30`. */
export function zoneWords(zoneMin: number): string {
  const [hours, minutes] = [Math.floor(Math.abs(zoneMin) / 60), Math.abs(zoneMin) % 60];
  const past = minutes === 0 ? '' : `:${String(minutes).padStart(2, '0')}`;
  return `UTC${zoneMin < 0 ? '−' : '+'}${hours}${past}`;
}
