/** Rows in the order of time, with what had to be done for it. */
export interface OrderedRows {
  readonly notes: readonly string[];
  /** Why the times themselves are in doubt. */
  readonly doubts: readonly string[];
}

const HOUR_S = 3600;

/**
 * Brings rows into the order of time, in place: newest first is turned around, a clock that was set back by an hour goes
 * on, rows of one minute without seconds are spread over it, anything else out of order is sorted.
 */
export function bringInOrder(seconds: Float64Array, values: readonly Float64Array[]): OrderedRows {
  const notes: string[] = [];
  const doubts: string[] = [];
  let { backward, forward } = stepsOf(seconds);
  if (backward > forward) {
    seconds.reverse();
    for (const column of values) column.reverse();
    notes.push('The file runs from the newest row to the oldest; it was turned around.');
    ({ backward, forward } = stepsOf(seconds));
  }
  if (backward === 1 && setBack(seconds)) {
    doubts.push('The clock was set back during the run; it was taken to have gone on.');
    backward = 0;
  }
  if (backward > 0) {
    sortRows(seconds, values);
    doubts.push('Rows stood out of order of time; they were sorted.');
  }
  if (spread(seconds)) notes.push('Several rows carry the same time; they were spread evenly over it.');
  return { notes, doubts };
}

function stepsOf(seconds: Float64Array): { backward: number; forward: number } {
  let [backward, forward] = [0, 0];
  for (let row = 1; row < seconds.length; row++) {
    const step = (seconds[row] ?? 0) - (seconds[row - 1] ?? 0);
    if (step < 0) backward++;
    else if (step > 0) forward++;
  }
  return { backward, forward };
}

function setBack(seconds: Float64Array): boolean {
  const at = seconds.findIndex((now, row) => row > 0 && now < (seconds[row - 1] ?? 0));
  const back = (seconds[at - 1] ?? 0) - (seconds[at] ?? 0);
  if (at < 1 || back > HOUR_S || back < HOUR_S * 0.9) return false;
  for (let row = at; row < seconds.length; row++) seconds[row] = (seconds[row] ?? 0) + HOUR_S;
  return true;
}

function sortRows(seconds: Float64Array, values: readonly Float64Array[]): void {
  const order = Uint32Array.from(seconds.keys()).sort(
    (one, other) => (seconds[one] ?? 0) - (seconds[other] ?? 0) || one - other,
  );
  for (const column of [seconds, ...values]) {
    const before = column.slice();
    order.forEach((from, to) => (column[to] = before[from] ?? Number.NaN));
  }
}

/** Where most rows share their time with another one, the clock is coarser than the recorder. */
function spread(seconds: Float64Array): boolean {
  let same = 0;
  for (let row = 1; row < seconds.length; row++) if (seconds[row] === seconds[row - 1]) same++;
  if (same < seconds.length * 0.3) return false;
  const resolution = seconds.every((second) => second % 60 === 0) ? 60 : 1;
  const lengths: number[] = [];
  eachRun(seconds, (from, to) => lengths.push(to - from));
  let run = 0;
  eachRun(seconds, (from, to) => {
    // The first minute and the last one may be cut; there the rows stand as close as in the minute beside it.
    const [isFirst, isLast] = [run === 0, run === lengths.length - 1];
    const own = lengths[run] ?? 1;
    const full = Math.max(own, isFirst ? (lengths[1] ?? own) : 0, isLast ? (lengths[run - 1] ?? own) : 0);
    const late = isFirst ? full - own : 0;
    for (let row = from; row < to; row++) {
      seconds[row] = (seconds[row] ?? 0) + ((row - from + late) * resolution) / full;
    }
    run++;
  });
  return true;
}

function eachRun(seconds: Float64Array, each: (from: number, to: number) => void): void {
  let from = 0;
  for (let row = 1; row <= seconds.length; row++) {
    if (row < seconds.length && seconds[row] === seconds[from]) continue;
    each(from, row);
    from = row;
  }
}
