/** At most two decimals, below 1 three figures, none that say nothing: 493.33, 38, 0.00035. */
export const sayNumber = (value: number): string =>
  String(Math.abs(value) < 1 ? Number(value.toPrecision(3)) : Math.round(value * 100) / 100);

const HOURS_FROM_MINUTES = 180;

/** Minutes below three hours, hours above: `38 min`, `96 h`. */
export const sayDuration = (minutes: number): string =>
  Math.abs(minutes) < HOURS_FROM_MINUTES ? `${sayNumber(minutes)} min` : `${sayNumber(minutes / 60)} h`;

export interface Range {
  readonly min?: number | null | undefined;
  readonly max?: number | null | undefined;
}

/** `63 to 80 HRB`, `≥ 63 HRB`, `≤ 80 HRB`. */
export function sayRange({ min, max }: Range, say: (value: number) => string): string {
  if (min != null && max != null) return min === max ? say(min) : `${say(min)} to ${say(max)}`;
  if (min != null) return `≥ ${say(min)}`;
  return max != null ? `≤ ${say(max)}` : 'any';
}

export const sayList = (values: readonly number[]): string => values.map(sayNumber).join(', ');

export const sayMinute = (time: string): string => time.replace('T', ' ');
