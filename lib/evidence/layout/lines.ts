import type { Box, Mark, Page, Word } from '../page';
import { boxAround, heightOf, middleOf, sharedDown, widthOf } from './box';
import { passageOf, type Passage } from './passage';
import { besideOneAnother } from './side-column';
import { tickedOnly } from './ticked';

/** Words that stand together on a line, apart from what stands further along it: a cell, a label, a value. */
export interface Segment extends Passage {
  readonly box: Box;
  /** Index of its line among the page's lines. */
  readonly line: number;
}

export interface Line {
  readonly page: number;
  readonly box: Box;
  /** Height of the letters, in points: of the line's usual word. */
  readonly height: number;
  readonly segments: readonly Segment[];
}

/**
 * The lines of a page from top to bottom, each cut where there is more than a space between two words or a ruled line
 * stands between them.
 */
export function linesOf(page: Page): Line[] {
  const upright = page.words.filter(({ text }) => text.trim() !== '');
  const rows = besideOneAnother(upright, page.width).flatMap((part) =>
    tickedOnly(rowsOf(part)).filter((row) => !row.every(({ text }) => DRAWN.test(text))),
  );
  const fences = page.marks.filter(({ kind, box }) => kind === 'rule' && heightOf(box) > widthOf(box));
  return rows.map((words, index) => {
    const height = usualHeight(words);
    const box = boxAround(words.map((word) => word.box));
    const segments = cutApart(words, height, fences).map((part) => {
      const placed = part.map((word) => ({ ...word, page: page.number }));
      return { ...passageOf(placed), box: boxAround(part.map((word) => word.box)), line: index };
    });
    return { page: page.number, box, height, segments };
  });
}

/** Lines and borders made of signs. */
const DRAWN = /^(?:[+|¦=\-–—*#~_]{2,}|[|¦+])$/;
/** The border between two cells, where a table is made of signs. */
const BORDER = /^[|¦│║]$/;

/** Middle of the heights that have letters in them: a dash or a dot is as high as nothing. */
function usualHeight(words: readonly Word[]): number {
  const heights = words
    .filter(({ text }) => /[\p{L}\p{N}]/u.test(text))
    .map(({ box }) => heightOf(box))
    .sort((a, b) => a - b);
  return heights[Math.floor(heights.length / 2)] ?? Math.max(1, ...words.map(({ box }) => heightOf(box)));
}

/**
 * Words of one line. A word joins the line whose last word to its left it shares most of its height with, so that a page
 * that is slightly skewed or curved keeps its lines.
 */
function rowsOf(words: readonly Word[]): Word[][] {
  const rows: Word[][] = [];
  const fromLeft = [...words].sort((a, b) => a.box[0] - b.box[0] || a.box[1] - b.box[1]);
  for (const word of fromLeft) {
    let best: { row: Word[]; shared: number } | null = null;
    for (const row of rows) {
      const last = row[row.length - 1];
      if (!last || overlapsIt(last, word)) continue;
      const shared = sameLine(last, word);
      if (shared > 0 && (!best || shared > best.shared)) best = { row, shared };
    }
    if (best) best.row.push(word);
    else rows.push([word]);
  }
  return rows
    .map((row) => row.sort((a, b) => a.box[0] - b.box[0]))
    .sort((a, b) => lineMiddle(a) - lineMiddle(b));
}

const lineMiddle = (row: readonly Word[]): number =>
  row.reduce((sum, { box }) => sum + middleOf(box), 0) / Math.max(1, row.length);

/** One stands above the other in the same columns: never one line. */
const overlapsIt = (last: Word, word: Word): boolean =>
  word.box[0] < last.box[2] - 0.5 * Math.min(widthOf(last.box), widthOf(word.box)) &&
  Math.abs(middleOf(last.box) - middleOf(word.box)) > 0.25 * Math.max(heightOf(last.box), heightOf(word.box));

/** Share of the lower word's height that both have; 0 where they do not stand on one line. */
function sameLine(last: Word, word: Word): number {
  const lower = Math.min(heightOf(last.box), heightOf(word.box));
  const higher = Math.max(heightOf(last.box), heightOf(word.box));
  const shared = sharedDown(last.box, word.box) / Math.max(lower, 0.1);
  // Small print beside a headline is on its line only when both stand on one foot.
  const foot = Math.abs(last.box[3] - word.box[3]);
  if (shared < 0.5 || (higher > 2.2 * lower && lower > 3 && foot > 0.6 * lower)) return 0;
  return shared - Math.abs(middleOf(last.box) - middleOf(word.box)) / higher;
}

function cutApart(words: readonly Word[], height: number, fences: readonly Mark[]): Word[][] {
  const parts: Word[][] = [];
  let bordered = words.filter(({ text }) => BORDER.test(text)).length > 1;
  const isTable = bordered;
  for (const word of words) {
    if (isTable && BORDER.test(word.text)) {
      bordered = true;
      continue;
    }
    const part = parts[parts.length - 1];
    const last = part?.[part.length - 1];
    if (part && last && !bordered && !standsApart(last, word, height, fences)) part.push(word);
    else parts.push([word]);
    bordered = false;
  }
  return parts;
}

/** A space is a third of the letters' height, on a typewriter six tenths; a column begins after clearly more. */
function standsApart(last: Word, word: Word, height: number, fences: readonly Mark[]): boolean {
  const gap = word.box[0] - last.box[2];
  const letters = Math.max(height, Math.min(heightOf(last.box), heightOf(word.box)));
  if (gap > spaceOf(last, word, letters)) return true;
  const middle = middleOf(word.box);
  return fences.some(
    ({ box }) =>
      (box[0] + box[2]) / 2 > last.box[2] - 1.5 &&
      (box[0] + box[2]) / 2 < word.box[0] + 1.5 &&
      box[1] < middle &&
      box[3] > middle,
  );
}

/** The widest gap that is still a space. Broad letters, as of a typewriter, have a broad space. */
function spaceOf(last: Word, word: Word, height: number): number {
  const letters = last.text.length + word.text.length;
  const broad = (widthOf(last.box) + widthOf(word.box)) / Math.max(1, letters);
  return Math.max(0.85 * height, Math.min(1.3 * height, 1.6 * broad));
}
