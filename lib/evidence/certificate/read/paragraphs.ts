import type { Line } from '../../layout/lines';
import { joined, type Passage } from '../../layout/passage';
import { labelAtStart } from './find-labels';

/** Lines that run on in the next one. A line runs on when it is a sentence's and reaches as far right as its neighbours. */
export const paragraphsOf = (lines: readonly Line[]): Passage[] =>
  paragraphLines(lines).map((part) => joined(part.flatMap(({ segments }) => segments)));

export function paragraphLines(lines: readonly Line[]): Line[][] {
  const paragraphs: Line[][] = [];
  const right = Math.max(0, ...lines.map(({ box }) => box[2]));
  const left = Math.min(right, ...lines.map(({ box }) => box[0]));
  const full = left + 0.8 * (right - left);
  for (const line of lines) {
    const open = paragraphs[paragraphs.length - 1];
    const last = open?.[open.length - 1];
    if (open && last && runsOn(last, line, full)) open.push(line);
    else paragraphs.push([line]);
  }
  return paragraphs;
}

/** A line that ends so is not at its end. */
const GOES_ON = /(?:[,;:–-]|\b(?:and|or|of|the|to|at|on|in|by|per|under|its|our|your|no\.?))$/i;

/** @param full how far right a line of a text reaches at least, unless it is its last. */
function runsOn(last: Line, line: Line, full: number): boolean {
  const words = last.segments.reduce((sum, { words }) => sum + words.length, 0);
  const close = line.box[1] - last.box[3] < 1.1 * Math.max(last.height, line.height);
  const level = Math.abs(line.box[0] - last.box[0]) < 3 * last.height;
  const wide = last.box[2] - last.box[0] > 22 * last.height || words > 8;
  const prose = last.segments.length <= 2 && words >= 5;
  const [first] = line.segments;
  const label = first ? labelAtStart(first.text) : null;
  const before = labelAtStart(last.segments[0]?.text ?? '');
  // Fields and items of a list, each with a label before it.
  const end = last.segments[last.segments.length - 1]?.text ?? '';
  if (label && before && !GOES_ON.test(end)) {
    // Fields and items of a list: each with the same label before it, or shorter than the lines of a text.
    if (label.words === before.words && label.key === before.key) return false;
    if (last.box[2] < full) return false;
  }
  if (label && /[.!]$/.test(end) && last.box[2] < full) return false;
  if (line.segments.length > 2) return false;
  const listed = /^\s*(?:[-–•*·]|\d{1,2}[.)])\s/.test(first?.text ?? '');
  return (
    close &&
    level &&
    wide &&
    prose &&
    !listed &&
    !(label?.marked ?? false) &&
    !(label?.whole && line.segments.length > 1)
  );
}
