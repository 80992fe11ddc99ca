import type { Box } from '../page';
import { xOf, yOf, type Matrix } from './pdf/matrix';
import { project, type Projection } from './picture/projection';

export const areaOf = (box: Box) => Math.max(0, box[2] - box[0]) * Math.max(0, box[3] - box[1]);

export const union = (a: Box, b: Box): Box => [
  Math.min(a[0], b[0]),
  Math.min(a[1], b[1]),
  Math.max(a[2], b[2]),
  Math.max(a[3], b[3]),
];

/** What two boxes share; empty (right ≤ left or bottom ≤ top) when they do not meet. */
export const intersection = (a: Box, b: Box): Box => [
  Math.max(a[0], b[0]),
  Math.max(a[1], b[1]),
  Math.min(a[2], b[2]),
  Math.min(a[3], b[3]),
];

/** 0 to 1: how much of `inner` lies within `outer`. A box without area is judged by its middle. */
export function shareWithin(inner: Box, outer: Box): number {
  const area = areaOf(inner);
  if (area > 0) return areaOf(intersection(inner, outer)) / area;
  return holds(outer, (inner[0] + inner[2]) / 2, (inner[1] + inner[3]) / 2) ? 1 : 0;
}

export const holds = (box: Box, x: number, y: number) =>
  x >= box[0] && x <= box[2] && y >= box[1] && y <= box[3];

/** The upright box around a box that was moved by `matrix`. */
export function boxThrough(matrix: Matrix, [left, top, right, bottom]: Box): Box {
  const xs = [
    xOf(matrix, left, top),
    xOf(matrix, right, top),
    xOf(matrix, left, bottom),
    xOf(matrix, right, bottom),
  ];
  const ys = [
    yOf(matrix, left, top),
    yOf(matrix, right, top),
    yOf(matrix, left, bottom),
    yOf(matrix, right, bottom),
  ];
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}

/** The upright box around a box that was carried by a projection. */
export function boxThroughProjection(projection: Projection, [left, top, right, bottom]: Box): Box {
  const corners = [
    project(projection, left, top),
    project(projection, right, top),
    project(projection, right, bottom),
    project(projection, left, bottom),
  ];
  const xs = corners.map(([x]) => x);
  const ys = corners.map(([, y]) => y);
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}

/** Boxes that come as near as `reach` to each other become one. */
export function joinNear(boxes: readonly Box[], reach: number): Box[] {
  const near = (a: Box, b: Box) =>
    a[0] - reach < b[2] && b[0] - reach < a[2] && a[1] - reach < b[3] && b[1] - reach < a[3];
  let joined = [...boxes];
  for (let changed = true; changed;) {
    changed = false;
    const next: Box[] = [];
    for (const box of joined) {
      const at = next.findIndex((other) => near(box, other));
      const other = next[at];
      if (other) {
        next[at] = union(other, box);
        changed = true;
      } else {
        next.push(box);
      }
    }
    joined = next;
  }
  return joined;
}
