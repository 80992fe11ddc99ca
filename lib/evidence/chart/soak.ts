import type { Limits } from './limits';

export interface CountedChannel {
  readonly values: Float64Array;
  readonly limits: Limits;
}

/** What each row says of the band, as bits. */
const NOT_YET = 1;
const BELOW = 2;
const ABOVE = 4;

export interface Soak {
  /** The first row at which all counted are at or above the lower limit. */
  readonly from: number;
  /** The first row after it at which any is below; the last row of the chart where none is. */
  readonly to: number;
  /** Whether a reading below the limit ends it; otherwise the chart does. */
  readonly ended: boolean;
}

export interface BandOverTime {
  readonly soak: Soak | null;
  /** Later windows, by the same rule. */
  readonly later: readonly Soak[];
  /** Whether any counted is above the upper limit, by row. */
  readonly isAbove: (row: number) => boolean;
}

/**
 * The soak by the coldest counted thermocouple: from the first row at which every one is at or above the lower limit to
 * the first later row at which any is below it. Above the upper limit does not end it. A missing reading changes nothing:
 * that thermocouple stays on the side on which it was.
 */
export function bandOverTime(rows: number, counted: readonly CountedChannel[]): BandOverTime {
  const states = new Uint8Array(rows);
  for (const { values, limits } of counted) markStates(states, values, limits);
  const windows: Soak[] = [];
  let from = -1;
  for (let row = 0; row < rows && counted.length > 0; row++) {
    const state = states[row] ?? 0;
    if (from < 0 && (state & NOT_YET) === 0) from = row;
    else if (from >= 0 && (state & BELOW) !== 0) {
      windows.push({ from, to: row, ended: true });
      from = -1;
    }
  }
  if (from >= 0) windows.push({ from, to: rows - 1, ended: false });
  const [soak, ...later] = windows;
  return { soak: soak ?? null, later, isAbove: (row) => ((states[row] ?? 0) & ABOVE) !== 0 };
}

function markStates(states: Uint8Array, values: Float64Array, { lower, upper }: Limits): void {
  let isIn = false;
  for (let row = 0; row < states.length; row++) {
    const value = values[row] ?? Number.NaN;
    let state = 0;
    if (value - value === 0) {
      isIn = value >= lower;
      if (!isIn) state = BELOW;
      else if (value > upper) state = ABOVE;
    }
    if (!isIn) state |= NOT_YET;
    if (state !== 0) states[row] = (states[row] ?? 0) | state;
  }
}

/** The first row at which one thermocouple is at or above its lower limit; -1 where it never is. */
export const firstInBand = ({ values, limits }: CountedChannel): number =>
  values.findIndex((value) => value >= limits.lower && value !== Number.POSITIVE_INFINITY);
