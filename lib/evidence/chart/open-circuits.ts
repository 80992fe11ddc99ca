import type { Limits } from './limits';
import { FAULTY } from './row-scanner';
import { runsWhere, type Run } from './row-runs';

/** Numbers that recorders write instead of a reading, without sign and decimal sign: all nines, the ends of 16 bits. */
const CODES = /^(?:9{3,}|8{4,}|3276[678]|6553[56]|2147483647|429496729[56])$/;
/** No furnace of the trade and no cold store is beyond these, in either unit. */
const [HOTTEST, COLDEST] = [3000, -300];
/** An end of the scale is written again and again to the last digit. */
const REPEATS = 5;
/** A reading does not come this far from the one before it, in degrees of either unit. */
const A_JUMP = 50;

/**
 * Turns numbers that stand for an open circuit into `FAULTY`, in place: codes, impossible temperatures, and an end of
 * the scale to which a reading jumped and at which it stays to the last digit.
 */
export function markOpenCircuits(values: Float64Array, { lower, upper }: Limits): void {
  const suspect = Math.min(upper + A_JUMP, 998);
  let before = Number.NaN;
  for (let row = 0; row < values.length; row++) {
    const value = values[row] ?? Number.NaN;
    // Nearly all readings are plain ones.
    if (value > 1 && value < suspect) {
      before = value;
      continue;
    }
    if (!Number.isFinite(value)) continue;
    if (isOpen(values, row, before, { lower, upper })) values[row] = FAULTY;
    else before = value;
  }
}

function isOpen(values: Float64Array, row: number, before: number, { lower, upper }: Limits): boolean {
  const value = values[row] ?? 0;
  if (value > HOTTEST || value < COLDEST) return true;
  const jumped = !(Math.abs(value - before) < A_JUMP);
  if (!jumped) return false;
  if (CODES.test(String(Math.abs(value)).replace('.', ''))) return true;
  const beyond = value > upper + (upper - lower) + 2 * A_JUMP || value <= 0;
  return beyond && row + REPEATS <= values.length && repeats(values, row);
}

function repeats(values: Float64Array, row: number): boolean {
  for (let next = row; next < row + REPEATS; next++) if (values[next] !== values[row]) return false;
  return true;
}

/** Where the recorder could not measure. */
export const openRuns = (values: Float64Array): Run[] =>
  runsWhere(values.length, (row) => values[row] === FAULTY || values[row] === -FAULTY);
