import type { CountedChannel, Soak } from './soak';

/**
 * The transfer from furnace to quench, as the counted thermocouples show it: from the last row before they begin to fall
 * (the door is open) to the last row before the plunge (the load is in the liquid).
 */
export interface Quench {
  readonly fallsFrom: number;
  readonly plungesFrom: number;
  /** Where the fall is the plunge: the length of that step, since the transfer took at most as long. Null where that is too short for any transfer, so that the thermocouples did not show it. */
  readonly delayS: number | null;
  /** Seconds between the rows there: the delay is known no better than that. */
  readonly stepS: number;
}

/** How long after the soak's end the plunge is looked for. */
const SEARCHED_S = 1800;
/** A plunge is at least so many degrees a second (°F; a third less in °C matters little), over so many degrees. */
const PLUNGE_RATE = 2.5;
const PLUNGE_DEPTH = 120;
/** It begins where the fall reaches this share of its steepest rate; a transfer through air is far slower. */
const SHARE_OF_STEEPEST = 0.25;
/** A fall and a plunge within one longer step of the recorder show no delay at all. */
const COARSEST_S = 60;
/** Nobody moves a load from a furnace into a tank in less. */
const QUICKEST_S = 3;
/** Rows and seconds before the plunge in which the beginning of the fall is looked for. */
const [WINDOW_ROWS, WINDOW_S] = [90, 420];

/**
 * Finds the quench behind a soak and its delay. The door opens for all at once, so the fall begins at the median of what
 * the thermocouples show, or where the furnace's own begin to fall before; the delay ends when the last of them plunges.
 *
 * @param furnace readings of thermocouples that are not counted and stay in the furnace.
 * @param windows the soak and, where the load came back into the band, what followed.
 * @returns null where the chart shows no quench: slow cooling, or an end before it.
 */
export function quenchAfter(
  seconds: Float64Array,
  counted: readonly CountedChannel[],
  { windows, furnace }: { windows: readonly Soak[]; furnace: readonly Float64Array[] },
): Quench | null {
  for (const [at, window] of windows.entries()) {
    // A load that falls out of the band and comes back was not quenched between.
    const before = windows[at + 1]?.from ?? seconds.length;
    const found = window.ended ? quenchBehind(seconds, counted, { soak: window, before, furnace }) : null;
    if (found) return found;
  }
  return null;
}

function quenchBehind(
  seconds: Float64Array,
  counted: readonly CountedChannel[],
  { soak, before, furnace }: { soak: Soak; before: number; furnace: readonly Float64Array[] },
): Quench | null {
  const plunges = counted
    .map(({ values }) => ({ values, row: plungeRow(seconds, values, soak, before) }))
    .filter(({ row }) => row >= 0);
  if (plunges.length === 0 || plunges.length * 2 <= counted.length) return null;
  const falls = plunges
    .map(({ values, row }) => fallRow(seconds, values, row, soak.from))
    .toSorted((one, other) => one - other);
  const plungesFrom = Math.max(...plunges.map(({ row }) => row));
  const ofLoad = falls[Math.floor((falls.length - 1) / 2)] ?? plungesFrom;
  const ofFurnace = furnace.map((values) => fallRow(seconds, values, plungesFrom, soak.from));
  const fallsFrom = Math.min(ofLoad, plungesFrom, ...ofFurnace);
  const at = (row: number) => seconds[row] ?? 0;
  const stepS = at(Math.min(plungesFrom + 1, seconds.length - 1)) - at(plungesFrom);
  const seenS = at(plungesFrom) - at(fallsFrom);
  const withinS = stepS >= QUICKEST_S && stepS <= COARSEST_S ? stepS : null;
  return { fallsFrom, plungesFrom, delayS: seenS > 0 ? seenS : withinS, stepS };
}

/** The last row before the steep fall, -1 where there is none. */
function plungeRow(seconds: Float64Array, values: Float64Array, soak: Soak, before: number): number {
  const from = Math.max(soak.from, soak.to - 1);
  const until = (seconds[soak.to] ?? 0) + SEARCHED_S;
  let [steepest, last] = [0, from];
  for (let row = from; row + 1 < before && (seconds[row] ?? 0) <= until; row++) {
    steepest = Math.max(steepest, fallRate(seconds, values, row));
    last = row + 1;
  }
  if (steepest < PLUNGE_RATE) return -1;
  for (let row = from; row < last; row++) {
    if (fallRate(seconds, values, row) < steepest * SHARE_OF_STEEPEST) continue;
    const end = lowestWithin(seconds, values, row, 120);
    return (values[row] ?? 0) - end >= PLUNGE_DEPTH ? row : -1;
  }
  return -1;
}

function fallRate(seconds: Float64Array, values: Float64Array, row: number): number {
  const step = (seconds[row + 1] ?? 0) - (seconds[row] ?? 0);
  const rate = ((values[row] ?? 0) - (values[row + 1] ?? 0)) / step;
  return Number.isFinite(rate) ? rate : 0;
}

function lowestWithin(seconds: Float64Array, values: Float64Array, from: number, forS: number): number {
  let lowest = Number.POSITIVE_INFINITY;
  for (let row = from; row < values.length && (seconds[row] ?? 0) - (seconds[from] ?? 0) <= forS; row++) {
    const value = values[row] ?? Number.NaN;
    if (value < lowest) lowest = value;
  }
  return lowest;
}

/**
 * The last row before the fall that ends in the plunge: where a line with one bend fits the readings best. One with its
 * bend before the first fall or behind it leaves more over.
 */
function fallRow(seconds: Float64Array, values: Float64Array, plunge: number, soakFrom: number): number {
  let first = plunge;
  while (
    first > soakFrom &&
    plunge - first < WINDOW_ROWS &&
    (seconds[plunge] ?? 0) - (seconds[first - 1] ?? 0) <= WINDOW_S &&
    Number.isFinite(values[first - 1])
  ) {
    first--;
  }
  if (plunge - first < 3) return plunge;
  let [best, least] = [plunge, Number.POSITIVE_INFINITY];
  for (let bend = first + 1; bend < plunge; bend++) {
    const fit = bentLine(seconds, values, { first, bend, last: plunge });
    if (fit.left < least) {
      least = fit.left;
      best = fit.slopeAfter < 0 && fit.fall > fit.scatter * 4 ? bend : plunge;
    }
  }
  return best;
}

/** Least squares of a line from `first` to `last` that bends at `bend`. */
function bentLine(
  seconds: Float64Array,
  values: Float64Array,
  { first, bend, last }: { first: number; bend: number; last: number },
) {
  const [origin, zero] = [seconds[bend] ?? 0, values[bend] ?? 0];
  // Level at the bend, slope before, slope after: the normal equations of the three.
  const sums = new Float64Array(9);
  const at = (index: number) => sums[index] ?? 0;
  for (let row = first; row <= last; row++) {
    const time = (seconds[row] ?? 0) - origin;
    const value = (values[row] ?? 0) - zero;
    const [before, after] = time < 0 ? [time, 0] : [0, time];
    [
      1,
      before,
      after,
      before * before,
      after * after,
      value,
      value * before,
      value * after,
      value * value,
    ].forEach((term, index) => (sums[index] = at(index) + term));
  }
  const [n, b, a, bb, aa, v, vb, va, vv] = Array.from({ length: 9 }, (_, index) => at(index)) as [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const rest = n - (b * b) / (bb || 1) - (a * a) / (aa || 1);
  const level = (v - (b * vb) / (bb || 1) - (a * va) / (aa || 1)) / (rest || 1);
  const slopeBefore = (vb - level * b) / (bb || 1);
  const slopeAfter = (va - level * a) / (aa || 1);
  const left = Math.max(0, vv - level * v - slopeBefore * vb - slopeAfter * va);
  const scatter = Math.sqrt(left / n);
  return { left, slopeAfter, scatter, fall: level + zero - (values[last] ?? 0) };
}
