import { timeWordsAt } from './moments';
import type { Recording } from './recording';

export interface Tick {
  readonly at: number;
  readonly says: string;
}

/** Round values between two, about so many. */
export function degreeTicks(from: number, to: number, count: number): Tick[] {
  const rough = (to - from) / Math.max(1, count);
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= rough) ?? 10) * power;
  return stepsOf(from, to, step).map((at) => ({ at, says: String(at) }));
}

const TIME_STEPS = [
  1, 2, 5, 10, 30, 60, 120, 300, 600, 900, 1800, 3600, 7200, 10_800, 21_600, 43_200, 86_400, 604_800,
];

/** Round times between two, about so many. */
export function timeTicks(from: number, to: number, count: number, counts: Recording['counts']): Tick[] {
  const rough = (to - from) / Math.max(1, count);
  const step = TIME_STEPS.find((one) => one >= rough) ?? 2_592_000;
  return stepsOf(from, to, step).map((at) => ({
    at,
    says: timeTickWords(at, counts),
  }));
}

/** A time on an axis, which says once for all what it counts from. */
export const timeTickWords = (at: number, counts: Recording['counts']): string =>
  timeWordsAt(at, counts).replace(' after the start', '');

const stepsOf = (from: number, to: number, step: number): number[] => {
  const first = Math.ceil(from / step);
  const length = Math.max(0, Math.floor(to / step) - first + 1);
  return Array.from({ length: Math.min(length, 60) }, (_, at) => Math.round((first + at) * step * 1e6) / 1e6);
};
