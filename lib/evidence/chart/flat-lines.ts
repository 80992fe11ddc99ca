import { joined, type Run } from './row-runs';

/** A reading that stands still for at least so many rows and so long is looked at. */
const ROWS = 20;
const SECONDS = 300;
/** The others move so far, in steps of the channel and in degrees, while a dead one does not. */
const STEPS = 20;
const DEGREES = 20;
/** A living reading changes its last digit at least in this share of the rows. */
const LIVELY = 0.4;

/**
 * Where a thermocouple repeats one reading to the last digit although it should move: the others heat up or cool down by
 * far more than a step, or all of them, it too at other times, never stand still for long.
 */
export function flatLines(
  seconds: Float64Array,
  values: Float64Array,
  step: number,
  others: readonly Float64Array[],
): Run[] {
  const still = stillRuns(seconds, values);
  if (still.length === 0) return [];
  const [first] = still;
  if (others.length === 0) return first && first.to - first.from === values.length ? still : [];
  return joined(
    still.filter((run) => othersMove(run, step, others) || standsOut(run, values, others)),
    3,
  );
}

function stillRuns(seconds: Float64Array, values: Float64Array): Run[] {
  const runs: Run[] = [];
  let from = 0;
  for (let row = 1; row <= values.length; row++) {
    const value = values[from] ?? Number.NaN;
    if (row < values.length && values[row] === value) continue;
    const long = row - from >= ROWS && (seconds[row - 1] ?? 0) - (seconds[from] ?? 0) >= SECONDS;
    if (long && Number.isFinite(value)) runs.push({ from, to: row });
    from = row;
  }
  return runs;
}

/** Whether most others pass through many degrees meanwhile. */
function othersMove({ from, to }: Run, step: number, others: readonly Float64Array[]): boolean {
  const far = Math.max(DEGREES, STEPS * step);
  const moving = others.filter((values) => {
    let [lowest, highest] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
    for (let row = from; row < to; row++) {
      const value = values[row] ?? Number.NaN;
      if (!Number.isFinite(value)) continue;
      if (value < lowest) lowest = value;
      if (value > highest) highest = value;
    }
    return highest - lowest >= far;
  });
  return moving.length * 2 > others.length;
}

/** Whether the others are lively meanwhile, and it was itself outside of these rows. */
function standsOut(run: Run, values: Float64Array, others: readonly Float64Array[]): boolean {
  const outside = Math.max(
    livelinessOf(values, Math.max(0, run.from - 200), run.from),
    livelinessOf(values, run.to, run.to + 200),
  );
  return outside >= LIVELY && others.every((other) => livelinessOf(other, run.from, run.to) >= LIVELY);
}

function livelinessOf(values: Float64Array, from: number, to: number): number {
  let [changes, pairs] = [0, 0];
  for (let row = Math.max(1, from + 1); row < Math.min(to, values.length); row++) {
    pairs++;
    if (values[row] !== values[row - 1]) changes++;
  }
  return pairs < ROWS / 2 ? 0 : changes / pairs;
}
