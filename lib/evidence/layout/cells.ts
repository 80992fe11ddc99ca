import type { Box } from '../page';
import { boxAround, centreOf, heightOf, sharedAcross, widthOf } from './box';
import type { Line, Segment } from './lines';
import { passageOf, type Passage, type PlacedWord } from './passage';

/** A column, as far as it matters where it stands. */
interface Placed {
  readonly box: Box;
}

/** The words of a line, each in the column it stands under. */
export function cellsOf(line: Line, columns: readonly Placed[]): Passage[][] {
  const cells = columns.map((): Passage[] => []);
  for (const segment of line.segments) {
    const under = columns.filter(({ box }) => sharedAcross(box, segment.box) > 0.35 * widthOf(box));
    if (under.length <= 1) cells[columnOf(segment.box, columns)]?.push(segment);
    else
      for (const part of atGaps(segment, under.length) ?? wordsByColumn(segment, columns))
        cells[part.column ?? columnOf(part.box, columns)]?.push(passageOf(part.words));
  }
  return cells;
}

interface Part {
  readonly words: readonly PlacedWord[];
  readonly box: Box;
  readonly column?: number;
}

/** A segment that runs through so many columns, cut at its widest gaps; null where none are wider than the others. */
function atGaps({ words }: Segment, columns: number): Part[] | null {
  const gaps = words
    .slice(1)
    .map((word, index) => ({ at: index + 1, wide: word.box[0] - (words[index]?.box[2] ?? 0) }))
    .sort((a, b) => b.wide - a.wide);
  const [last, next] = [gaps[columns - 2], gaps[columns - 1]];
  if (!last || (next && last.wide < 1.25 * Math.max(next.wide, 0.1))) return null;
  const cuts = gaps
    .slice(0, columns - 1)
    .map(({ at }) => at)
    .sort((a, b) => a - b);
  const edges = [0, ...cuts, words.length];
  return edges.slice(1).map((end, index) => {
    const part = words.slice(edges[index], end);
    return { words: part, box: boxAround(part.map(({ box }) => box)) };
  });
}

function wordsByColumn(segment: Segment, columns: readonly Placed[]): Part[] {
  const parts: { column: number; words: PlacedWord[] }[] = [];
  for (const word of segment.words) {
    const column = columnOf(word.box, columns);
    const last = parts[parts.length - 1];
    if (last?.column === column) last.words.push(word);
    else parts.push({ column, words: [word] });
  }
  return parts.map((part) => ({ ...part, box: boxAround(part.words.map(({ box }) => box)) }));
}

/** The column under whose heading a box stands, or whose heading it is nearest to at either edge or in the middle. */
function columnOf(box: Box, columns: readonly Placed[]): number {
  let best = { index: 0, far: Infinity };
  columns.forEach((column, index) => {
    const shared = sharedAcross(column.box, box);
    const far =
      shared > 0
        ? -shared / Math.min(widthOf(column.box), widthOf(box))
        : Math.min(
            Math.abs(column.box[0] - box[0]),
            Math.abs(column.box[2] - box[2]),
            Math.abs(centreOf(column.box) - centreOf(box)),
          ) +
          heightOf(box) * 0.01;
    if (far < best.far) best = { index, far };
  });
  return best.index;
}
