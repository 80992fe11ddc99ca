import type { ChartDrawing } from './drawing-of';

export interface Span {
  readonly from: number;
  readonly to: number;
}

/** All times of a chart. */
export function timeSpan({ seconds }: Pick<ChartDrawing, 'seconds'>): Span {
  const [from, to] = [seconds[0] ?? 0, seconds[seconds.length - 1] ?? 0];
  return { from, to: to > from ? to : from + 1 };
}

/** The band with as much again below it and above, wide enough for the highest reading of the counted. */
export function bandSpan({ band, channels }: Pick<ChartDrawing, 'band' | 'channels'>): Span {
  const width = band.upper - band.lower;
  return {
    from: band.lower - width,
    to: Math.max(band.upper + width * 0.8, Math.min(highest(channels), band.upper + width * 3) + width * 0.2),
  };
}

/** From nothing, or the coldest reading, to above everything. */
export function wholeSpan({ band, channels }: Pick<ChartDrawing, 'band' | 'channels'>): Span {
  const lowest = channels.reduce(
    (low, { values, excluded }) => (excluded === null ? extreme(values, low, -1) : low),
    0,
  );
  return { from: lowest, to: Math.max(highest(channels), band.upper) * 1.05 };
}

const highest = (channels: ChartDrawing['channels']): number =>
  channels.reduce((high, { values, excluded }) => (excluded === null ? extreme(values, high, 1) : high), 0);

function extreme(values: Float64Array, start: number, sign: 1 | -1): number {
  let found = start;
  for (let row = 0; row < values.length; row++) {
    const value = values[row] ?? Number.NaN;
    if (value * sign > found * sign && Number.isFinite(value)) found = value;
  }
  return found;
}
