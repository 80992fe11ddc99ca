import type { Word } from '../page';
import { heightOf, middleOf } from './box';

/** Share of the page's width that a column beside the text may take. */
const NARROW = 0.36;

/**
 * The words of a page, apart where a narrow column of its own runs down beside the text: a list of approvals, an address.
 * The lines of such a column are not those of the text; where they are, the page has one body of words.
 */
export function besideOneAnother(words: readonly Word[], width: number): Word[][] {
  for (const cut of guttersOf(words, width)) {
    const left = words.filter(({ box }) => box[2] <= cut);
    const right = words.filter(({ box }) => box[0] >= cut);
    const [side, body] = cut < width / 2 ? [left, right] : [right, left];
    // What stands above and below both, a title or the foot, belongs to the body.
    const crossing = words.filter(({ box }) => box[0] < cut && box[2] > cut);
    if (crossing.length > 0 || !isColumn(side, body)) continue;
    return [body, side];
  }
  return [[...words]];
}

/** Places from left to right that no word crosses, as far from words as they can be. */
function guttersOf(words: readonly Word[], width: number): number[] {
  const ends = [...words].sort((a, b) => a.box[0] - b.box[0]);
  const cuts: number[] = [];
  let right = ends[0]?.box[2] ?? 0;
  for (const { box } of ends) {
    const middle = (right + box[0]) / 2;
    if (box[0] - right > 8 && (middle < NARROW * width || middle > (1 - NARROW) * width)) cuts.push(middle);
    right = Math.max(right, box[2]);
  }
  return cuts;
}

/** Many lines, over most of the height, and few of them level with those of the body. */
function isColumn(side: readonly Word[], body: readonly Word[]): boolean {
  const lines = middles(side);
  const others = middles(body);
  if (lines.length < 6 || others.length < 6) return false;
  const level = lines.filter((one) => others.some((other) => Math.abs(one - other) < 1.2)).length;
  const [first = 0, last = 0] = [lines[0], lines[lines.length - 1]];
  const tall = (others[others.length - 1] ?? 0) - (others[0] ?? 0);
  return level < 0.5 * lines.length && last - first > 0.3 * tall;
}

function middles(words: readonly Word[]): number[] {
  const all = words.map(({ box }) => middleOf(box)).sort((a, b) => a - b);
  const height = Math.max(1, ...words.slice(0, 50).map(({ box }) => heightOf(box) / 2));
  return all.filter((one, index) => index === 0 || one - (all[index - 1] ?? 0) > height * 0.6);
}
