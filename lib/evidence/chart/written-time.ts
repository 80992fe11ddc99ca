import type { DateOrder } from './corrections';
import { RowScanner } from './row-scanner';
import { SLOT, timeShapeOf, type DateWriting } from './time-shape';

export const DAY_S = 86_400;

/** Seconds of the day, or since the start, in the groups of a written time; NaN where they are no time. */
export function secondsIn(groups: Float64Array, afternoon: number): number {
  const compact = compactTime(groups);
  const hour = compact >= 0 ? Math.trunc(compact / 10_000) : (groups[SLOT.hour] ?? 0);
  const minute = compact >= 0 ? Math.trunc(compact / 100) % 100 : (groups[SLOT.minute] ?? 0);
  const second = compact >= 0 ? compact % 100 : (groups[SLOT.second60] ?? 0);
  if (minute > 59 || second > 60) return Number.NaN;
  const hours = afternoon < 0 ? hour : (hour % 12) + afternoon;
  const days = groups[SLOT.days] ?? 0;
  return days * DAY_S + hours * 3600 + minute * 60 + second + (groups[SLOT.fraction] ?? 0);
}

const compactTime = (groups: Float64Array): number => {
  if ((groups[SLOT.compact] ?? 0) > 0) return (groups[SLOT.compact] ?? 0) % 1_000_000;
  return groups[SLOT.compactTime] ?? -1;
};

/** The three groups of a date as 10,000, 100 and 1. */
export function dateIn(groups: Float64Array): number {
  if ((groups[SLOT.compact] ?? 0) > 0) return Math.trunc((groups[SLOT.compact] ?? 0) / 1_000_000);
  if ((groups[SLOT.compactDate] ?? 0) > 0) return groups[SLOT.compactDate] ?? 0;
  return (groups[SLOT.first] ?? 0) * 10_000 + (groups[SLOT.second] ?? 0) * 100 + (groups[SLOT.third] ?? 0);
}

/**
 * The day that the groups of a date mean, in seconds since 1970.
 *
 * @returns NaN where there is no such day in the calendar.
 */
export function dayOf(groups: number, writing: DateWriting, order: DateOrder): number {
  const [first, second, third] = [Math.trunc(groups / 10_000), Math.trunc(groups / 100) % 100, groups % 100];
  const [year, month, day] = partsOf([first, second, third], writing, order);
  const full = year < 100 ? 2000 + year : year;
  const seconds = Date.UTC(full, month - 1, day) / 1000;
  return new Date(seconds * 1000).getUTCMonth() === month - 1 && day >= 1 ? seconds : Number.NaN;
}

function partsOf(
  [first, second, third]: readonly [number, number, number],
  writing: DateWriting,
  order: DateOrder,
): readonly [year: number, month: number, day: number] {
  if (writing === 'year_last') return order === 'DMY' ? [first, third, second] : [first, second, third];
  if (writing === 'short' && order === 'DMY') return [third, second, first];
  if (writing === 'short' && order === 'MDY') return [third, first, second];
  return [first, second, third];
}

export interface WrittenTime {
  /** Null where the text holds no date. */
  readonly date: { readonly groups: number; readonly writing: DateWriting } | null;
  /** Null where it holds no time of the day. */
  readonly seconds: number | null;
}

/** The time or the date that a text is, or ends with: `Start 05.03.2026 08:00`; null where there is none. */
export function writtenTimeIn(text: string): WrittenTime | null {
  const from = text.search(/\d/);
  for (const cell of from < 0 ? [] : [text.trim(), text.slice(from).trim()]) {
    const shape = timeShapeOf(cell);
    if (!shape) continue;
    const bytes = new TextEncoder().encode(cell);
    const textOf = (start: number, end: number) => new TextDecoder().decode(bytes.subarray(start, end));
    const scanner = new RowScanner({ bytes, encoding: 'utf-8', textOf }, '|', '.');
    if (!scanner.time(shape.slots, shape.date === 'named')) continue;
    return {
      date: shape.date === null ? null : { groups: dateIn(scanner.groups), writing: shape.date },
      seconds: shape.hasTime ? secondsIn(scanner.groups, scanner.afternoon) : null,
    };
  }
  return null;
}
