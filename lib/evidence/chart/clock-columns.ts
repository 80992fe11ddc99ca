import type { Column } from './columns';
import { isCounting, isGrowing, isOfNumbers, isOfTimes } from './columns';
import type { ChartCorrections, ElapsedUnit } from './corrections';
import { TIME_WORD, type Heading } from './heading';
import { SLOT, type TimeShape } from './time-shape';

/** Which columns say when, and how. */
export type ClockColumns =
  | {
      readonly kind: 'written';
      readonly time: { readonly column: number; readonly shape: TimeShape };
      readonly date: { readonly column: number; readonly shape: TimeShape } | null;
      /** A column of its own with AM and PM. */
      readonly halfDay: number | null;
    }
  | {
      readonly kind: 'numbers';
      readonly column: number;
      readonly counts: ElapsedUnit | 'epoch_s' | 'epoch_ms' | 'spreadsheet_days';
      /** Whether the file says so. */
      readonly stated: boolean;
    };

/**
 * Finds the columns of a clock: written times, with the day in the same or in another column, or numbers that grow.
 *
 * @returns null where there is none.
 */
export function clockColumnsOf(
  columns: readonly Column[],
  headings: readonly Heading[],
  corrections: ChartCorrections,
): ClockColumns | null {
  const { timeColumn, dateColumn, elapsedUnit } = corrections;
  const candidates = timeColumn === undefined ? columns : columns.filter(({ at }) => at === timeColumn);
  const written = candidates.filter(isOfTimes);
  const dates = columns.filter(
    (column) => isOfTimes(column) && column.shape?.date !== null && column.shape?.hasTime === false,
  );
  // Two clocks, one of the day and one since the start: the day's says more, and it does not begin at zero.
  const time =
    written.find(({ shape }) => shape?.hasTime === true && shape.date !== null) ??
    written.find(({ at, shape }) => shape?.hasTime === true && !isElapsedHeading(headings[at])) ??
    written.find(({ shape }) => shape?.hasTime === true) ??
    oddTime(candidates, headings, dates);
  if (time?.shape) {
    const date = dates.find(({ at }) => at !== time.at && (dateColumn === undefined || at === dateColumn));
    const halfDay = columns.find(
      ({ filled, halfDays, at }) => at !== time.at && filled > 0 && halfDays >= filled * 0.9,
    );
    return {
      kind: 'written',
      time: { column: time.at, shape: time.shape },
      date: date?.shape && time.shape.date === null ? { column: date.at, shape: date.shape } : null,
      halfDay: halfDay?.at ?? null,
    };
  }
  return numbersClock(candidates, headings, elapsedUnit, timeColumn !== undefined);
}

/** A time of the day beside a column of dates that looks like something else: `08.15.30` like a date, `081530` a number. */
function oddTime(
  candidates: readonly Column[],
  headings: readonly Heading[],
  dates: readonly Column[],
): Column | undefined {
  const [date] = dates;
  if (!date) return undefined;
  const beside = candidates.filter(({ at }) => at !== date.at && TIME_WORD.test(headings[at]?.words ?? ''));
  const pointed = beside.find(({ shape, shaped }) => shape?.date === 'short' && shaped > 0);
  if (pointed?.shape) {
    const template = ['h', 'm', 's'].reduce(
      (text, letter, slot) => text.replace(`<${slot}`, `<${letter}`),
      pointed.shape.template,
    );
    const slots = [SLOT.hour, SLOT.minute, SLOT.second60];
    return { ...pointed, shape: { slots, date: null, hasTime: true, halfDays: false, template } };
  }
  const joined = beside.find(
    ({ values }) =>
      values.length > 1 &&
      values.every((value) => value < 240_000 && value % 100 < 60 && Math.trunc(value / 100) % 100 < 60),
  );
  const shape = { slots: [SLOT.compactTime], date: null, hasTime: true, halfDays: false, template: 'HHmmss' };
  return joined && { ...joined, shape };
}

export const isElapsedHeading = (heading: Heading | undefined): boolean =>
  /elapsed|duration|since|relative|run ?time|laufzeit|dauer|verstrichen|écoul|ecoul|durée|transcurrid|trascorso|verlopen|into run|\bt\+/i.test(
    heading?.words ?? '',
  );

function numbersClock(
  candidates: readonly Column[],
  headings: readonly Heading[],
  asked: ElapsedUnit | undefined,
  chosen: boolean,
): ClockColumns | null {
  const growing = candidates.filter((column) => isOfNumbers(column) && isGrowing(column));
  const named = growing.filter(({ at }) => TIME_WORD.test(headings[at]?.words ?? ''));
  const [column] = [...named, ...growing.filter((one) => chosen || one.at === 0 || !isCounting(one))].filter(
    (one) => chosen || named.includes(one) || one.at <= 1,
  );
  if (!column) return null;
  const unit = asked ?? countedIn(column, headings[column.at]?.words ?? '');
  return { kind: 'numbers', column: column.at, counts: unit ?? 's', stated: unit !== null };
}

/** What a column of growing numbers counts, by its size or by its heading; null where neither says. */
function countedIn(
  { values }: Column,
  words: string,
): Extract<ClockColumns, { kind: 'numbers' }>['counts'] | null {
  const first = values[0] ?? 0;
  if (first > 8e8 && first < 5e9) return 'epoch_s';
  if (first > 8e11 && first < 5e12) return 'epoch_ms';
  const last = values[values.length - 1] ?? first;
  if (first > 30_000 && first < 80_000 && last - first < 400 && values.some((value) => value % 1 !== 0)) {
    return 'spreadsheet_days';
  }
  if (/\bms\b|millis|msec/i.test(words)) return 'ms';
  if (/\bmin(?:s|ute[ns]?|uten|uti|utos)?\b|_min\b/i.test(words)) return 'min';
  if (/\b(?:s|sec|secs|sek|seconds?|sekunden|secondes?|segundos|secondi)\b|_s(?:ec)?\b/i.test(words))
    return 's';
  if (/\b(?:h|hr|hrs|hours?|std|stunden|heures?|horas|ore)\b|_h(?:r|ours?)?\b/i.test(words)) return 'h';
  return null;
}
