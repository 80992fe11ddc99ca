import type { Limits } from './limits';

/** Metal in a furnace follows its neighbours in time; over a longer step even a load may move far. */
const LONGEST_STEP_S = 90;
/** A reading is off the line between its neighbours by at least so many widths of half the band, and so many degrees. */
const BANDS = 4;
const DEGREES = 25;
/** The neighbours agree far better with each other. */
const AGREEMENT = 0.25;

/**
 * Rows in which one reading stands alone, far off both its neighbours, which agree: a glitch of the recorder and no
 * temperature. Two readings in a row, or one that is only a little off, are taken for real.
 */
export function spikesOf(seconds: Float64Array, values: Float64Array, { lower, upper }: Limits): number[] {
  const far = Math.max(DEGREES, ((upper - lower) / 2) * BANDS);
  const rows: number[] = [];
  for (let row = 1; row + 1 < values.length; row++) {
    const value = values[row] ?? Number.NaN;
    const before = values[row - 1] ?? Number.NaN;
    const rise = value - before;
    // NaN and infinity fail here too.
    if (!(rise > far || rise < -far)) continue;
    const after = values[row + 1] ?? Number.NaN;
    const fall = value - after;
    if (!(fall > far || fall < -far) || fall > 0 !== rise > 0 || !Number.isFinite(value)) continue;
    const agree = Math.abs(after - before) <= Math.min(Math.abs(rise), Math.abs(fall)) * AGREEMENT;
    const close = (seconds[row + 1] ?? 0) - (seconds[row - 1] ?? 0) <= 2 * LONGEST_STEP_S;
    if (agree && close) rows.push(row);
  }
  return rows;
}
