import type { Box, Mark } from '../../page';
import { areaOf, joinNear } from '../box';
import { areaEnclosed } from './draw-path';
import type { Drawn, DrawnPath } from './drawn';

type Points = DrawnPath['lines'][number];

/** What a signature measures, in points. */
const SHORTEST_STROKE = 14;
const LONGEST_STROKE = 320;
const HIGHEST_STROKE = 130;
const LOWEST_STROKE = 4;
const THICKEST_STROKE = 6;
const THICKEST_RULE = 3;
const SHORTEST_RULE = 8;
/** Strokes this near belong to one hand. */
const SAME_HAND = 10;
const SMALLEST_PICTURE = 8;
/** A drawing with more rules than this is a plot or a map, not a form. */
const MOST_RULES = 3000;

/** Sorts what was drawn and is not text: rules of forms, pictures, and lines that look drawn by hand. */
export function findMarks(drawn: Drawn, page: Box): Mark[] {
  const rules: Mark[] = [];
  const strokes: Box[] = [];
  for (const path of drawn.paths) {
    if (looksHandDrawn(path)) strokes.push(path.box);
    else if (rules.length < MOST_RULES) rules.push(...rulesOf(path));
  }
  const pictures = drawn.pictures
    .filter(
      ({ box, visible }) =>
        visible && box[2] - box[0] > SMALLEST_PICTURE && box[3] - box[1] > SMALLEST_PICTURE,
    )
    .filter(({ box }) => areaOf(box) < 0.8 * areaOf(page))
    .map(({ box }): Mark => ({ kind: 'picture', box }));
  return [
    ...rules,
    ...pictures,
    ...joinNear(strokes, SAME_HAND).map((box): Mark => ({ kind: 'stroke', box })),
  ];
}

/**
 * Whether a path looks drawn by hand: within the size of a signature, longer than its box is wide, bending often,
 * neither a closed outline (circles, rounded boxes) nor made of upright and level lines.
 */
function looksHandDrawn(path: DrawnPath): boolean {
  const [width, height] = [path.box[2] - path.box[0], path.box[3] - path.box[1]];
  if (Math.max(width, height) < SHORTEST_STROKE || width > LONGEST_STROKE) return false;
  if (height < LOWEST_STROKE || height > HIGHEST_STROKE) return false;
  if (path.filled && !path.stroked) return isInkOutline(path, width, height);
  if (path.lineWidth > THICKEST_STROKE || path.filled) return false;
  return path.lines.some((points) => isScribble(points, path.curves > 0));
}

/** A pen's line that was turned into an outline: much edge, little area, and a form no logo has. */
function isInkOutline(path: DrawnPath, width: number, height: number): boolean {
  if (path.curves < 16 || width < 30 || width < height) return false;
  const longest = path.lines.reduce((a, b) => (b.length > a.length ? b : a), path.lines[0] ?? []);
  const length = lengthOf(longest);
  return length > 3 * (width + height) && areaEnclosed(path.lines) < 0.22 * width * height;
}

function isScribble(points: Points, curved: boolean): boolean {
  const length = lengthOf(points);
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last || length < SHORTEST_STROKE) return false;
  const bends = bendsOf(points);
  const closed = Math.hypot(first[0] - last[0], first[1] - last[1]) < 0.02 * length;
  if (closed) return bends.turns >= 4;
  if (curved) return bends.turns >= 1 || bends.turned > Math.PI * 0.75;
  // Straight pieces: a recorder's trace runs forward only and in small steps, a hand goes to and fro.
  return points.length > 8 && bends.level < 0.5 && bends.turns >= 4 && bends.backward > 0.05;
}

function lengthOf(points: Points): number {
  let length = 0;
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1], points[i]];
    if (a && b) length += Math.hypot(b[0] - a[0], b[1] - a[1]);
  }
  return length;
}

/**
 * How a line bends: `turns` counts changes between bending left and right, `turned` sums all bending in radians,
 * `level` is the share of its length that is level or upright, `backward` the share that runs to the left.
 */
function bendsOf(points: Points): { turns: number; turned: number; level: number; backward: number } {
  let [turns, turned, level, backward, length, side, heading] = [0, 0, 0, 0, 0, 0, NaN];
  for (let i = 1; i < points.length; i++) {
    const [a, b] = [points[i - 1], points[i]];
    if (!a || !b) continue;
    const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
    const step = Math.hypot(dx, dy);
    if (step < 0.05) continue;
    length += step;
    if (Math.min(Math.abs(dx), Math.abs(dy)) < 0.02 * step) level += step;
    if (dx < 0) backward += step;
    const next = Math.atan2(dy, dx);
    if (!Number.isNaN(heading)) {
      const bend = Math.atan2(Math.sin(next - heading), Math.cos(next - heading));
      turned += Math.abs(bend);
      if (Math.abs(bend) > 0.06) {
        if (side !== 0 && Math.sign(bend) !== side) turns++;
        side = Math.sign(bend);
      }
    }
    heading = next;
  }
  return { turns, turned, level: level / (length || 1), backward: backward / (length || 1) };
}

function rulesOf(path: DrawnPath): Mark[] {
  const [width, height] = [path.box[2] - path.box[0], path.box[3] - path.box[1]];
  if (path.filled && !path.stroked) {
    const thin = Math.min(width, height) <= THICKEST_RULE && Math.max(width, height) >= SHORTEST_RULE;
    return thin ? [{ kind: 'rule', box: path.box }] : [];
  }
  if (!path.stroked) return [];
  const rules: Mark[] = [];
  const half = Math.min(path.lineWidth, THICKEST_RULE) / 2;
  for (const points of path.lines) {
    for (let i = 1; i < points.length; i++) {
      const [a, b] = [points[i - 1], points[i]];
      if (!a || !b) continue;
      const [dx, dy] = [Math.abs(b[0] - a[0]), Math.abs(b[1] - a[1])];
      if (Math.max(dx, dy) < SHORTEST_RULE || Math.min(dx, dy) > 0.5) continue;
      rules.push({
        kind: 'rule',
        box: [
          Math.min(a[0], b[0]) - (dx > dy ? 0 : half),
          Math.min(a[1], b[1]) - (dx > dy ? half : 0),
          Math.max(a[0], b[0]) + (dx > dy ? 0 : half),
          Math.max(a[1], b[1]) + (dx > dy ? half : 0),
        ],
      });
    }
  }
  return rules;
}
