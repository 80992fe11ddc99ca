import type { Box } from '../../page';
import { xOf, yOf, type Matrix } from './matrix';

type Point = readonly [number, number];
export interface FlatPath {
  readonly lines: readonly (readonly Point[])[];
  readonly curves: number;
  readonly box: Box;
}

/** pdf.js's own coding of a path. */
const MOVE = 0;
const LINE = 1;
const CURVE = 2;
const STEPS_OF_A_CURVE = 6;
/** Beyond this a path is artwork; its box is all that is of use. */
const MOST_NUMBERS = 60_000;

/** Turns pdf.js's coded path into lines of points on the page; curves become short straight pieces. */
export function flattenPath(data: ArrayLike<number>, matrix: Matrix): FlatPath {
  const lines: Point[][] = [];
  let line: Point[] = [];
  let curves = 0;
  const at = (i: number): Point => {
    const x = data[i] ?? 0;
    const y = data[i + 1] ?? 0;
    return [xOf(matrix, x, y), yOf(matrix, x, y)];
  };
  const end = Math.min(data.length, MOST_NUMBERS);
  for (let i = 0; i < end;) {
    const operator = data[i++];
    if (operator === MOVE) {
      line = [at(i)];
      lines.push(line);
      i += 2;
    } else if (operator === LINE) {
      line.push(at(i));
      i += 2;
    } else if (operator === CURVE) {
      const start = line.at(-1) ?? at(i);
      addCurve(line, [start, at(i), at(i + 2), at(i + 4)]);
      curves++;
      i += 6;
    } else {
      const start = line[0];
      if (start) {
        line.push(start);
        line = [start];
        lines.push(line);
      }
    }
  }
  const kept = lines.filter((points) => points.length > 1);
  return { lines: kept, curves, box: boxOf(kept) };
}

function addCurve(line: Point[], [p0, p1, p2, p3]: readonly [Point, Point, Point, Point]): void {
  for (let step = 1; step <= STEPS_OF_A_CURVE; step++) {
    const t = step / STEPS_OF_A_CURVE;
    const u = 1 - t;
    const [a, b, c, d] = [u * u * u, 3 * u * u * t, 3 * u * t * t, t * t * t];
    line.push([a * p0[0] + b * p1[0] + c * p2[0] + d * p3[0], a * p0[1] + b * p1[1] + c * p2[1] + d * p3[1]]);
  }
}

function boxOf(lines: readonly (readonly Point[])[]): Box {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const points of lines) {
    for (const [x, y] of points) {
      left = Math.min(left, x);
      right = Math.max(right, x);
      top = Math.min(top, y);
      bottom = Math.max(bottom, y);
    }
  }
  return [left, top, right, bottom];
}

/** Square points enclosed by the lines, holes taken off when they run the other way round. */
export function areaEnclosed(lines: readonly (readonly Point[])[]): number {
  let twice = 0;
  for (const points of lines) {
    for (let i = 0; i < points.length; i++) {
      const [x0, y0] = points[i] as Point;
      const [x1, y1] = points[(i + 1) % points.length] as Point;
      twice += x0 * y1 - x1 * y0;
    }
  }
  return Math.abs(twice) / 2;
}
