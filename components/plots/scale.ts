import { scaleLinear, scaleLog, type ScaleContinuousNumeric } from 'd3-scale';

/** One axis: its span, its ticks in words, and whether equal steps are equal ratios. */
export interface Axis {
  from: number;
  to: number;
  ticks: readonly { at: number; says?: string }[];
  /** What is measured and in what, said once: "thickness, in". */
  says: string;
  by?: 'difference' | 'ratio';
}

/** From a value to its place in the picture. */
export function placeOf(axis: Axis, [start, end]: readonly [number, number]): (value: number) => number {
  const scale: ScaleContinuousNumeric<number, number> = axis.by === 'ratio' ? scaleLog() : scaleLinear();
  return scale.domain([axis.from, axis.to]).range([start, end]);
}

/** Round ticks for a span, written as they are read. */
export function ticksOf(from: number, to: number, count = 6): { at: number; says: string }[] {
  return scaleLinear()
    .domain([from, to])
    .ticks(count)
    .map((at) => ({ at, says: String(at) }));
}
