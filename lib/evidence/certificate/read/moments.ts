import { daysIn, figures, type FoundDay } from './dates';

/** A point of time as far as a text gives it: a day, a time of day, or both together. */
export interface FoundMoment {
  readonly start: number;
  readonly end: number;
  readonly day: FoundDay | null;
  /** `HH:MM`. */
  readonly time: string | null;
}

const D = String.raw`[\dOoIl|]`;
const CLOCK = new RegExp(
  String.raw`(?<![\d:.,])(?:(${D}{1,2})\s?[:h]\s?(${D}{2})(?!\s*min)(?::${D}{2})?\s*([ap])?(?:\.?m\.?)?(?:\s*(?:hrs?\b|h\b|uhr\b))?|(${D}{1,2})\s*([ap])\.?m\.?\b|([012]${D})([0-5]${D})\s*(?:hrs?\b|h\b|uhr\b)|kl\.?\s*(\d{1,2})[.:](\d{2}))(?![\d:])`,
  'giu',
);

/** Only where a time is asked for: 0912, 09.12. */
const BARE_CLOCK = new RegExp(
  String.raw`^\s*([012]?${D})[.\s]?([0-5]${D})\s*(?:h|hrs?|uhr)?\s*([ap]\.?m\.?)?\s*[*†]?\s*$`,
  'iu',
);

interface FoundTime {
  readonly start: number;
  readonly end: number;
  readonly time: string;
}

/**
 * Times of day, 24 hours or with am and pm.
 *
 * @example `9:12 PM` is 21:12; `0912 hrs` is 09:12.
 */
export function timesIn(text: string): FoundTime[] {
  return [...text.matchAll(CLOCK)].flatMap((match) => {
    const [whole, h1, m1, half1, h2, half2, h3, m3, h4, m4]: (string | undefined)[] = match;
    const time = clock(h1 ?? h2 ?? h3 ?? h4 ?? '', m1 ?? m3 ?? m4 ?? '00', half1 ?? half2);
    return time === null
      ? []
      : [{ start: match.index, end: match.index + (whole ?? '').trimEnd().length, time }];
  });
}

function clock(hours: string, minutes: string, half: string | undefined): string | null {
  const h = Number(figures(hours));
  const m = Number(figures(minutes));
  const late = half?.toLowerCase().startsWith('p') ?? false;
  if (!Number.isInteger(h) || !Number.isInteger(m) || m > 59 || h > 24) return null;
  if (half !== undefined && (h < 1 || h > 12)) return null;
  const hour = half === undefined ? h : (h % 12) + (late ? 12 : 0);
  if (hour > 23) return null;
  return `${String(hour).padStart(2, '0')}:${String(m).padStart(2, '0')}`;
}

/** What may stand between a day and its time, in either order. */
const TOGETHER = /^(?:T|\s*(?:,|-|–|@|at|on|um|am|le|à|a las|kl\.?|\/|\|)?\s*)$/i;

/**
 * Days with their times, and those of either that stand alone.
 *
 * @param asked a time is what the text is asked for, so that four figures alone are one.
 */
export function momentsIn(text: string, asked = false): FoundMoment[] {
  const days = daysIn(text);
  let times = timesIn(text).filter(
    ({ start, end }) => !days.some((day) => start < day.end && end > day.start),
  );
  if (asked && times.length === 0) times = bareTime(text, days);
  times = [...times, ...timesBehindDays(text, days)].filter(
    (one, index, all) => all.findIndex(({ end }) => end === one.end) === index,
  );
  const taken = new Set<FoundTime>();
  const whole = days.map((day): FoundMoment => {
    const time = times.find(
      (one) =>
        !taken.has(one) &&
        ((one.start >= day.end && TOGETHER.test(text.slice(day.end, one.start))) ||
          (one.end <= day.start && TOGETHER.test(text.slice(one.end, day.start)))),
    );
    if (!time) return { start: day.start, end: day.end, day, time: null };
    taken.add(time);
    const start = Math.min(day.start, time.start);
    return { start, end: Math.max(day.end, time.end), day, time: time.time };
  });
  const alone = times
    .filter((time) => !taken.has(time))
    .map(({ start, end, time }): FoundMoment => ({ start, end, day: null, time }));
  return [...whole, ...alone].sort((a, b) => a.start - b.start);
}

/** Four figures right behind a day, with nothing that makes them a quantity. */
const BEHIND_DAY =
  /^(?:\s+|\s*[@,/]\s*|\s+at\s+)([01]\d|2[0-3])([0-5]\d)(?![\d.,/°%-]|\s*(?:pcs|pieces|ea)\b)/i;

function timesBehindDays(text: string, days: readonly FoundDay[]): FoundTime[] {
  return days.flatMap(({ end }) => {
    const [whole = '', hours = '', minutes = ''] = BEHIND_DAY.exec(text.slice(end)) ?? [];
    const time = whole === '' ? null : clock(hours, minutes, undefined);
    if (time === null || /^\s*(?:h(?:rs?)?|uhr)\b/i.test(text.slice(end + whole.length))) return [];
    return [{ start: end + whole.length - 4, end: end + whole.length, time }];
  });
}

function bareTime(text: string, days: readonly FoundDay[]): FoundTime[] {
  const [day] = days;
  const start = day ? day.end : 0;
  const rest = text.slice(start);
  const [, hours, minutes, half] = BARE_CLOCK.exec(rest) ?? [];
  const time = hours === undefined || minutes === undefined ? null : clock(hours, minutes, half);
  const lead = /^\s*/.exec(rest)?.[0].length ?? 0;
  return time === null ? [] : [{ start: start + lead, end: text.trimEnd().length, time }];
}
