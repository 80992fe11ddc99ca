import type { Box } from '../page';

/** The smallest box around all of them; there must be at least one. */
export function boxAround(boxes: readonly Box[]): Box {
  return [
    Math.min(...boxes.map(([left]) => left)),
    Math.min(...boxes.map(([, top]) => top)),
    Math.max(...boxes.map(([, , right]) => right)),
    Math.max(...boxes.map(([, , , bottom]) => bottom)),
  ];
}

export const heightOf = ([, top, , bottom]: Box): number => bottom - top;
export const widthOf = ([left, , right]: Box): number => right - left;
export const middleOf = ([, top, , bottom]: Box): number => (top + bottom) / 2;
export const centreOf = ([left, , right]: Box): number => (left + right) / 2;

/** Points that two boxes share from left to right; negative: the gap between them. */
export const sharedAcross = (a: Box, b: Box): number => Math.min(a[2], b[2]) - Math.max(a[0], b[0]);

/** Points that two boxes share from top to bottom; negative: the gap between them. */
export const sharedDown = (a: Box, b: Box): number => Math.min(a[3], b[3]) - Math.max(a[1], b[1]);
