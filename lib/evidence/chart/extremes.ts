/** Lowest and highest reading of each block of rows, and of blocks of blocks: what a drawing needs at any zoom. */
export interface Extremes {
  readonly values: Float64Array;
  /** From the finest; each entry of one stands for `FOLD` of the one before. */
  readonly levels: readonly { readonly lowest: Float64Array; readonly highest: Float64Array }[];
}

const FOLD = 16;

/** Built once for a channel; takes a seventh of its memory. Readings that are none are passed over. */
export function extremesOf(values: Float64Array): Extremes {
  const levels: { lowest: Float64Array; highest: Float64Array }[] = [];
  let [lowest, highest] = [values, values];
  while (lowest.length > FOLD * 4) {
    const level = folded(lowest, highest);
    levels.push(level);
    ({ lowest, highest } = level);
  }
  return { values, levels };
}

function folded(lowest: Float64Array, highest: Float64Array) {
  const blocks = Math.ceil(lowest.length / FOLD);
  const [low, high] = [new Float64Array(blocks), new Float64Array(blocks)];
  for (let block = 0; block < blocks; block++) {
    const range = { low: Number.POSITIVE_INFINITY, high: Number.NEGATIVE_INFINITY };
    spread(range, lowest, highest, [block * FOLD, Math.min(lowest.length, (block + 1) * FOLD)]);
    low[block] = range.low > range.high ? Number.NaN : range.low;
    high[block] = range.low > range.high ? Number.NaN : range.high;
  }
  return { lowest: low, highest: high };
}

interface Range {
  low: number;
  high: number;
}

function spread(
  range: Range,
  lowest: Float64Array,
  highest: Float64Array,
  [from, to]: readonly [number, number],
): void {
  for (let at = from; at < to; at++) {
    const low = lowest[at] ?? Number.NaN;
    const high = highest[at] ?? Number.NaN;
    // NaN is in no order; infinity is a fault of the recorder.
    if (low < range.low && low > Number.NEGATIVE_INFINITY) range.low = low;
    if (high > range.high && high < Number.POSITIVE_INFINITY) range.high = high;
  }
}

/**
 * The lowest and highest reading of rows `from` up to, not with, `to`, into `range`, in a time that hardly grows with
 * their number. Without a reading `low` stays above `high`.
 */
export function extremesBetween({ values, levels }: Extremes, from: number, to: number, range: Range): void {
  range.low = Number.POSITIVE_INFINITY;
  range.high = Number.NEGATIVE_INFINITY;
  let [lowest, highest, first, last, level] = [values, values, from, to, 0];
  for (;;) {
    const coarser = levels[level++];
    const [start, end] = [Math.ceil(first / FOLD), Math.floor(last / FOLD)];
    if (!coarser || start >= end) {
      spread(range, lowest, highest, [first, last]);
      return;
    }
    spread(range, lowest, highest, [first, start * FOLD]);
    spread(range, lowest, highest, [end * FOLD, last]);
    [lowest, highest, first, last] = [coarser.lowest, coarser.highest, start, end];
  }
}
