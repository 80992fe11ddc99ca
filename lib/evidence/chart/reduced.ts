import { extremesBetween, type Extremes } from './extremes';

/** Points to draw: the same times for all channels, null where a channel has no reading. */
export interface Reduced {
  readonly seconds: readonly number[];
  readonly channels: readonly (readonly (number | null)[])[];
}

/**
 * The readings between two times for a drawing so many columns wide: at most two for a column, its lowest and its
 * highest, so that no peak is lost at any zoom. Where fewer rows than that are in view, they are given as they are, with
 * the one before and the one behind, so that the lines reach the edges.
 */
export function reduced(
  seconds: Float64Array,
  channels: readonly Extremes[],
  { from, to, columns }: { from: number; to: number; columns: number },
): Reduced {
  const first = Math.max(0, rowAt(seconds, from) - 1);
  const last = Math.min(seconds.length, rowAt(seconds, to) + 1);
  if (last - first <= columns * 2) return plain(seconds, channels, first, last);
  const width = (to - from) / columns;
  const edges = Array.from({ length: columns + 1 }, (_, column) => rowAt(seconds, from + column * width));
  edges[columns] = Math.min(seconds.length, rowAt(seconds, to) + 1);
  return {
    seconds: edges
      .slice(0, columns)
      .flatMap((_, column) => [from + (column + 0.25) * width, from + (column + 0.75) * width]),
    channels: channels.map((channel) => pairs(channel, edges)),
  };
}

function pairs(channel: Extremes, edges: readonly number[]): (number | null)[] {
  const points: (number | null)[] = [];
  const range = { low: 0, high: 0 };
  for (let column = 0; column + 1 < edges.length; column++) {
    const [from, to] = [edges[column] ?? 0, edges[column + 1] ?? 0];
    extremesBetween(channel, from, to, range);
    if (range.low > range.high) points.push(null, null);
    // In the order in which it went, so that a rising line rises within its column too.
    else if ((channel.values[from] ?? 0) <= (channel.values[to - 1] ?? 0)) points.push(range.low, range.high);
    else points.push(range.high, range.low);
  }
  return points;
}

const plain = (
  seconds: Float64Array,
  channels: readonly Extremes[],
  first: number,
  last: number,
): Reduced => ({
  seconds: Array.from(seconds.subarray(first, last)),
  channels: channels.map(({ values }) =>
    Array.from(values.subarray(first, last), (value) => (Number.isFinite(value) ? value : null)),
  ),
});

/** The first row at or behind a time. */
export function rowAt(seconds: Float64Array, time: number): number {
  let [low, high] = [0, seconds.length];
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((seconds[middle] ?? 0) < time) low = middle + 1;
    else high = middle;
  }
  return low;
}
