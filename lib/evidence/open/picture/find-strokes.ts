import { joinNear } from '../box';
import type { Component } from './find-components';
import type { PixelBox } from './grey';

/** In inches. */
const SMALLEST = 0.3;
const LOWEST = 0.07;
const LARGEST = 4;
const HIGHEST = 1.8;
const SAME_HAND = 0.12;
/** Handwriting fills little of its box. */
const FULLEST = 0.3;

/**
 * Ink that looks written by hand: larger than a letter, thin, filling little of its box.
 *
 * `taken` are boxes of what is otherwise explained: recognised words and stamps. Rules must have been wiped before.
 */
export function findStrokes(
  components: readonly Component[],
  taken: readonly PixelBox[],
  dpi: number,
): PixelBox[] {
  const strokes = components.filter(
    (component) => looksWritten(component, dpi) && !isTaken(component.box, taken),
  );
  return joinNear(
    strokes.map(({ box }) => box),
    SAME_HAND * dpi,
  );
}

function looksWritten({ box, area }: Component, dpi: number): boolean {
  const [width, height] = [box[2] - box[0], box[3] - box[1]];
  if (Math.max(width, height) < SMALLEST * dpi || height < LOWEST * dpi) return false;
  if (width > LARGEST * dpi || height > HIGHEST * dpi) return false;
  const fullness = area / (width * height);
  // A straight line at a slant fills even less, but its ink is no longer than its box's diagonal.
  const pen = 0.012 * dpi;
  return fullness < FULLEST && area > 1.15 * pen * Math.hypot(width, height) * 0.6;
}

function isTaken(box: PixelBox, taken: readonly PixelBox[]): boolean {
  const area = (box[2] - box[0]) * (box[3] - box[1]);
  return taken.some((other) => {
    const width = Math.min(box[2], other[2]) - Math.max(box[0], other[0]);
    const height = Math.min(box[3], other[3]) - Math.max(box[1], other[1]);
    return width > 0 && height > 0 && width * height > 0.6 * area;
  });
}
