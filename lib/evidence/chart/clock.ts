import { isElapsedHeading, type ClockColumns } from './clock-columns';
import type { ChartCorrections } from './corrections';
import { dateOrderOf } from './date-order';
import type { Layout } from './layout';
import type { ScannedRows } from './scan-rows';
import { startOf, statedDates, type StatedStart } from './stated-start';
import { SLOT, type DateWriting, type TimeShape } from './time-shape';
import { timeWords } from './time-words';
import { DAY_S, dayOf } from './written-time';

/** When each row was written. */
export interface Clock {
  /** Seconds since 1970 in the local time of the recorder, since midnight, or since the start. */
  readonly seconds: Float64Array;
  readonly counts: 'date_and_time' | 'time_of_day' | 'elapsed';
  readonly words: string;
  /** Guesses, for a person to look at. */
  readonly notes: readonly string[];
  /** Guesses on which the length of the soak itself rests. */
  readonly doubts: readonly string[];
}

/** Turns what the clock's columns hold into seconds. The rows may still be out of order. */
export function clockOf(scanned: ScannedRows, layout: Layout, corrections: ChartCorrections): Clock {
  const stated = startOf(layout.preamble, corrections);
  return layout.clock.kind === 'numbers'
    ? countedClock(scanned, layout.clock, stated, corrections)
    : writtenClock(scanned, layout, stated, corrections);
}

const SECONDS_OF = {
  ms: 0.001,
  s: 1,
  min: 60,
  h: 3600,
  epoch_s: 1,
  epoch_ms: 0.001,
  spreadsheet_days: DAY_S,
} as const;
/** Days of a spreadsheet between its first and 1970. */
const SPREADSHEET_1970 = 25_569;

function countedClock(
  { seconds }: ScannedRows,
  { counts, stated: isStated }: Extract<ClockColumns, { kind: 'numbers' }>,
  stated: StatedStart,
  corrections: ChartCorrections,
): Clock {
  const factor = SECONDS_OF[counts];
  const before = counts === 'spreadsheet_days' ? SPREADSHEET_1970 : 0;
  // To the millisecond: a day's fraction in a spreadsheet is rounded.
  for (let row = 0; row < seconds.length; row++) {
    seconds[row] = Math.round(((seconds[row] ?? 0) - before) * factor * 1000) / 1000;
  }
  if (counts === 'epoch_s' || counts === 'epoch_ms' || counts === 'spreadsheet_days') {
    const words = {
      epoch_s: 'seconds since 1970',
      epoch_ms: 'ms since 1970',
      spreadsheet_days: 'spreadsheet days',
    };
    const notes = counts === 'spreadsheet_days' ? [] : ['The times are in UTC: the file counts since 1970.'];
    return { seconds, counts: 'date_and_time', words: words[counts], notes, doubts: [] };
  }
  const doubts =
    isStated || corrections.elapsedUnit
      ? []
      : ['The file does not say in what its time counts; seconds were taken.'];
  return { ...sinceStart(seconds, stated), words: `elapsed ${counts}`, notes: [], doubts };
}

/** Elapsed times become times of the day where the file says when it began. */
function sinceStart(
  seconds: Float64Array,
  { day, seconds: started }: StatedStart,
): Pick<Clock, 'seconds' | 'counts'> {
  if (day === null || started === null) return { seconds, counts: 'elapsed' };
  for (let row = 0; row < seconds.length; row++) seconds[row] = (seconds[row] ?? 0) + day + started;
  return { seconds, counts: 'date_and_time' };
}

function writtenClock(
  scanned: ScannedRows,
  layout: Layout,
  stated: StatedStart,
  corrections: ChartCorrections,
): Clock {
  const { clock } = layout;
  if (clock.kind !== 'written') throw new Error('Not a written clock.');
  const { seconds, dates } = scanned;
  const shape = clock.date?.shape ?? clock.time.shape;
  if (dates && shape.date !== null) {
    const hints = hintsOf(layout, shape, shape.date);
    const distinct = distinctOf(dates);
    const { order, sure } = corrections.dateOrder
      ? { order: corrections.dateOrder, sure: true }
      : dateOrderOf(distinct, shape.date, hints);
    addDays(seconds, dates, (groups) => dayOf(groups, shape.date ?? 'year_first', order));
    const time = timeWords(clock.time.shape, order);
    const words = clock.date ? `${timeWords(clock.date.shape, order)} ${time}` : time;
    const notes = sure ? [] : [`Day and month of the dates could be exchanged; they were read as ${words}.`];
    return { seconds, counts: 'date_and_time', words, notes, doubts: [] };
  }
  const doubts: string[] = [];
  if (isElapsed(scanned, layout, corrections)) {
    const minutes = isMinutesAndSeconds(scanned, layout);
    if (minutes) for (let row = 0; row < seconds.length; row++) seconds[row] = (seconds[row] ?? 0) / 60;
    const words = minutes ? 'mm:ss' : timeWords(clock.time.shape, 'YMD');
    return { ...sinceStart(seconds, stated), words: `elapsed ${words}`, notes: [], doubts };
  }
  overMidnight(seconds, clock.time.shape);
  const words = timeWords(clock.time.shape, 'YMD');
  if (stated.day === null)
    return { seconds, counts: 'time_of_day', words, notes: ['The file gives no date.'], doubts };
  for (let row = 0; row < seconds.length; row++) seconds[row] = (seconds[row] ?? 0) + stated.day;
  return { seconds, counts: 'date_and_time', words, notes: [], doubts };
}

const hintsOf = (layout: Layout, shape: TimeShape, writing: DateWriting) => ({
  others: statedDates(layout.preamble, writing),
  separator: /<[012]\d>([-/. ])<[012]\d>/.exec(shape.template)?.[1] ?? '',
  decimalComma: layout.decimal === ',',
  halfDays:
    layout.clock.kind === 'written' && (layout.clock.halfDay !== null || layout.clock.time.shape.halfDays),
  words: [
    ...layout.preamble,
    layout.clockHeading?.words ?? '',
    ...layout.values.map(({ words }) => words),
  ].join(' '),
});

function distinctOf(dates: Int32Array): number[] {
  const distinct: number[] = [];
  const seen = new Set<number>();
  for (let row = 0; row < dates.length; row++) {
    const date = dates[row] ?? 0;
    if (row > 0 && date === dates[row - 1]) continue;
    if (!seen.has(date)) distinct.push(date);
    seen.add(date);
  }
  return distinct;
}

function addDays(seconds: Float64Array, dates: Int32Array, dayOfGroups: (groups: number) => number): void {
  let [last, day] = [-1, 0];
  for (let row = 0; row < seconds.length; row++) {
    const groups = dates[row] ?? 0;
    if (groups !== last) [last, day] = [groups, dayOfGroups(groups)];
    seconds[row] = (seconds[row] ?? 0) + day;
  }
}

/** Whether times without a date count from the start: the file says so, they pass 24 hours, or they begin at zero. */
function isElapsed({ seconds }: ScannedRows, layout: Layout, { elapsed }: ChartCorrections): boolean {
  if (elapsed !== undefined) return elapsed;
  if (layout.clock.kind !== 'written' || layout.clock.time.shape.halfDays || layout.clock.halfDay !== null)
    return false;
  if (layout.clock.time.shape.slots.includes(SLOT.days) || isElapsedHeading(layout.clockHeading)) return true;
  const [first, second] = [seconds[0] ?? 0, seconds[1] ?? 0];
  if ((seconds[seconds.length - 1] ?? 0) >= DAY_S) return true;
  // A run that begins on the stroke of midnight is rarer than one that counts from zero.
  return first <= second - first;
}

/** Two groups since the start are hours and minutes unless the heading or a number above a day says otherwise. */
function isMinutesAndSeconds({ seconds }: ScannedRows, { clock, clockHeading }: Layout): boolean {
  if (clock.kind !== 'written' || clock.time.shape.slots.includes(SLOT.second60)) return false;
  const words = clockHeading?.words ?? '';
  if (/\bh+:m+/i.test(words)) return false;
  return /\bm+:s+/i.test(words) || (seconds[seconds.length - 1] ?? 0) >= 100 * 3600;
}

const HALF_DAY_S = DAY_S / 2;

/** A clock that starts again at midnight, or at noon where it shows twelve hours without saying which. */
function overMidnight(seconds: Float64Array, { halfDays }: TimeShape): void {
  let [lowest, highest] = [Number.POSITIVE_INFINITY, 0];
  for (let row = 0; row < seconds.length; row++) {
    lowest = Math.min(lowest, seconds[row] ?? 0);
    highest = Math.max(highest, seconds[row] ?? 0);
  }
  const twelveHours = !halfDays && lowest >= 3600 && highest < HALF_DAY_S + 3600;
  const round = twelveHours ? HALF_DAY_S : DAY_S;
  let [rounds, before] = [0, seconds[0] ?? 0];
  for (let row = 0; row < seconds.length; row++) {
    const now = seconds[row] ?? 0;
    // Newest first falls back a little at each row; only a fall of most of a round is the clock starting again.
    if (before - now > round * 0.5) rounds++;
    else if (now - before > round * 0.5 && rounds > 0) rounds--;
    before = now;
    seconds[row] = now + rounds * round;
  }
}
