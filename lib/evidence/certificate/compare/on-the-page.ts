import type { Page } from '../../page';
import { likeness, lookalikeKey } from '../match/alike';

/** A number may be cut by spaces. */
const WORDS_OF_A_NUMBER = 3;
const SHORTEST = 4;

/**
 * Whether a number stands anywhere among the words that a person can see, whole or in up to three words that follow each
 * other. What stands there and was not read where it belongs is for people to look at, and is not missing.
 *
 * @param number with four letters or digits and more; shorter ones stand on every page by chance.
 */
export function isOnThePage(number: string, pages: readonly Pick<Page, 'words'>[]): boolean {
  const key = lookalikeKey(number);
  if (key.length < SHORTEST) return false;
  return pages.some(({ words }) => {
    const keys = words.map(({ text }) => lookalikeKey(text));
    return keys.some((_, at) => {
      let run = '';
      for (const next of keys.slice(at, at + WORDS_OF_A_NUMBER)) {
        run += next;
        if (run === key) return true;
        if (!key.startsWith(run)) return false;
      }
      return false;
    });
  });
}

/**
 * A word on the pages that is a number with two characters exchanged, and none of the others.
 *
 * @param others numbers that may stand there for themselves.
 */
export function transposedOnThePage(
  number: string,
  others: readonly string[],
  pages: readonly Pick<Page, 'words'>[],
): string | null {
  const words = pages.flatMap((page) => page.words.map(({ text }) => text.replace(/[^A-Z0-9]+$/i, '')));
  return (
    words.find(
      (word) =>
        likeness(word, number) === 'transposed' && !others.some((other) => likeness(word, other) === 'same'),
    ) ?? null
  );
}

/**
 * Whether a step is spoken of on the pages, by its name and by one of its numbers: then it is stated, although it was not
 * read as what it is.
 */
export const speaksOf = (
  name: RegExp,
  numbers: readonly number[],
  pages: readonly Pick<Page, 'words'>[],
): boolean => {
  const words = pages.flatMap((page) => page.words.map(({ text }) => text));
  const figures = new Set(words.flatMap((word) => word.match(/\d+(?:\.\d+)?/g) ?? []).map(Number));
  return words.some((word) => name.test(word)) && numbers.some((number) => figures.has(number));
};
