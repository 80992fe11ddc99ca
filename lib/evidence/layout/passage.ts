import type { Box, Word } from '../page';
import { boxAround } from './box';

/** Words read one after another, joined by spaces, each knowing where in the text it begins. */
export interface Passage {
  readonly text: string;
  readonly page: number;
  readonly words: readonly PlacedWord[];
}

export interface PlacedWord extends Word {
  readonly at: number;
  readonly page: number;
}

/** Words of a page and where they stand. */
export interface Spot {
  readonly raw: string;
  readonly page: number;
  readonly box: Box;
  /** 0 to 1, of the worst word. */
  readonly legible: number;
}

export function passageOf(words: readonly (Word & { readonly page: number })[]): Passage {
  let at = 0;
  const placed = words.map((word) => {
    const here = { ...word, at };
    at += word.text.length + 1;
    return here;
  });
  return { text: words.map(({ text }) => text).join(' '), page: words[0]?.page ?? 1, words: placed };
}

/** Passages one after another as one; it counts as standing on the page on which it begins. */
export const joined = (passages: readonly Passage[]): Passage =>
  passageOf(passages.flatMap(({ words }) => words));

/**
 * What stands from one place of a passage's text to another.
 *
 * @returns null where no word stands there. Words on a later page than the first are read and not boxed.
 */
export function spotIn(passage: Passage, start: number, end: number): Spot | null {
  const touched = passage.words.filter(({ at, text }) => at < end && at + text.length > start);
  const [first] = touched;
  if (!first) return null;
  const here = touched.filter(({ page }) => page === first.page);
  return {
    raw: passage.text.slice(start, end).trim(),
    page: first.page,
    box: boxAround(here.map(({ box }) => box)),
    legible: Math.min(...here.map(({ confidence }) => confidence)),
  };
}

/** A passage without its first letters, to which a label belonged. Cuts a word in two where label and value are glued. */
export function passageFrom(passage: Passage, start: number, end = passage.text.length): Passage {
  const words = passage.words.flatMap((word) => {
    const from = Math.max(0, start - word.at);
    const to = Math.min(word.text.length, end - word.at);
    if (from >= word.text.length || to <= 0 || from >= to) return [];
    return [{ ...word, text: word.text.slice(from, to), box: sliceOf(word, from, to) }];
  });
  return passageOf(words);
}

function sliceOf({ box, text }: Word, from: number, to: number): Box {
  const [left, top, right, bottom] = box;
  const each = (right - left) / text.length;
  return [left + from * each, top, left + to * each, bottom];
}
