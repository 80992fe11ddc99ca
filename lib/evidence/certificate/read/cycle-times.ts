import type { Spot } from '../../layout/passage';
import type { Step } from './steps';

export interface ReadValue<Value> {
  readonly value: Value;
  readonly spot: Spot;
  readonly trust: number;
}

/** A cycle as far as it was read. */
export interface ReadCycle {
  readonly step: Step;
  temperature?: ReadValue<number>;
  unit?: 'F' | 'C';
  minutes?: ReadValue<number>;
  start?: ReadValue<string>;
  end?: ReadValue<string>;
  /** The end has a time of day only. */
  endsOnUnsaidDay?: true;
}

/** An end without a day of its own is as many days after the start as the stated time says. */
function onDayOf(
  start: string,
  end: ReadValue<string>,
  { minutes, endsOnUnsaidDay }: ReadCycle,
): ReadValue<string> {
  if (!endsOnUnsaidDay || !minutes) return end;
  const short = minutes.value - (Date.parse(`${end.value}Z`) - Date.parse(`${start}Z`)) / 60_000;
  const days = Math.round(short / 1440);
  if (days < 1 || Math.abs(short - days * 1440) > 30) return end;
  const later = new Date(Date.parse(`${end.value}Z`) + days * 86_400_000);
  return { ...end, value: later.toISOString().slice(0, 16) };
}

/**
 * From start to end, where the minutes are not stated, or where a decimal sign got lost on the way through a scanner: ten
 * times as long as the times are apart.
 */
export function completeTimes(cycle: ReadCycle): void {
  const { start, minutes } = cycle;
  if (!start || !cycle.end) return;
  cycle.end = onDayOf(start.value, cycle.end, cycle);
  const { end } = cycle;
  const between = (Date.parse(`${end.value}Z`) - Date.parse(`${start.value}Z`)) / 60_000;
  if (between <= 0) return;
  const spot = minutes?.spot ?? end.spot;
  const lost = minutes !== undefined && spot.legible < 1 && Math.abs(minutes.value / between - 10) < 0.05;
  const trust = Math.min(start.trust, end.trust) * (lost ? 0.7 : 0.95);
  if (!minutes || lost) cycle.minutes = { value: between, spot, trust };
}
