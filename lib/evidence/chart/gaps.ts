import { runsWhere, type Run } from './row-runs';

/** Two rows are missing, and more than a moment. */
const STEPS = 2.5;
const MOMENT_S = 4;
/** The usual step is that of so many steps around. */
const AROUND = 10;

/** The usual step between rows, in seconds: the median of up to a thousand of them. */
export function usualStep(seconds: Float64Array): number | null {
  const stride = Math.max(1, Math.floor(seconds.length / 1000));
  const steps: number[] = [];
  for (let row = 1; row < seconds.length; row += stride) {
    const step = (seconds[row] ?? 0) - (seconds[row - 1] ?? 0);
    if (step > 0) steps.push(step);
  }
  return steps.length === 0 ? null : medianOf(steps);
}

const medianOf = (numbers: readonly number[]): number =>
  numbers.toSorted((one, other) => one - other)[Math.floor(numbers.length / 2)] ?? 0;

/**
 * Where the recorder wrote nothing: the time jumps, or no counted thermocouple has a reading.
 *
 * @returns runs whose `from` is the last row before and whose `to` is the first one after it.
 */
export function gapsOf(seconds: Float64Array, counted: readonly Float64Array[]): Run[] {
  const usual = usualStep(seconds);
  if (usual === null) return [];
  const gaps: Run[] = [];
  const shortest = Math.min(usual * STEPS, usual + MOMENT_S);
  for (let row = 1; row < seconds.length; row++) {
    const step = (seconds[row] ?? 0) - (seconds[row - 1] ?? 0);
    if (step > shortest && step > stepAround(seconds, row) * STEPS && step > MOMENT_S)
      gaps.push({ from: row - 1, to: row });
  }
  return counted.length === 0 ? gaps : [...gaps, ...emptyRuns(seconds, counted, usual)];
}

/** A recorder that turns slower for a while has no gap in each of its steps. */
function stepAround(seconds: Float64Array, row: number): number {
  const steps: number[] = [];
  for (let near = Math.max(1, row - AROUND); near <= Math.min(seconds.length - 1, row + AROUND); near++) {
    if (near !== row) steps.push((seconds[near] ?? 0) - (seconds[near - 1] ?? 0));
  }
  return medianOf(steps);
}

function emptyRuns(seconds: Float64Array, counted: readonly Float64Array[], usual: number): Run[] {
  const [first] = counted;
  if (!first) return [];
  return runsWhere(
    seconds.length,
    (row) => !Number.isFinite(first[row]) && counted.every((values) => !Number.isFinite(values[row])),
  )
    .map(({ from, to }) => ({ from: Math.max(0, from - 1), to: Math.min(seconds.length - 1, to) }))
    .filter(({ from, to }) => (seconds[to] ?? 0) - (seconds[from] ?? 0) > Math.max(usual * STEPS, MOMENT_S));
}

/**
 * Where one thermocouple has no reading although the recorder went on, up to the end of the chart. One that is written
 * in every other row only has none.
 *
 * @returns runs whose `from` is its last reading before and whose `to` is the first one after it.
 */
export function readingGaps(seconds: Float64Array, values: Float64Array): Run[] {
  const empty = runsWhere(values.length, (row) => Number.isNaN(values[row])).filter(({ from }) => from > 0);
  if (empty.length === 0) return [];
  const [usual, first] = [usualStep(seconds) ?? 0, values.findIndex((value) => !Number.isNaN(value))];
  // Mostly empty columns were written less often, not lost.
  const filled = values.length - empty.reduce((sum, { from, to }) => sum + to - from, 0);
  const own = usual * Math.max(1, Math.round(values.length / Math.max(1, filled)));
  return empty
    .filter(({ from }) => from > first)
    .map(({ from, to }) => ({ from: from - 1, to: Math.min(to, values.length - 1) }))
    .filter(({ from, to }) => (seconds[to] ?? 0) - (seconds[from] ?? 0) > Math.max(own * STEPS, MOMENT_S));
}
