/** Letters that tired eyes, typists and recognition take for digits. */
const LOOKS_LIKE: Readonly<Record<string, string>> = { O: '0', I: '1', L: '1', S: '5', B: '8' };

/** Letters and digits only, capitals: what two spellings of one number have in common. */
export const plainKey = (written: string): string => written.toUpperCase().replace(/[^A-Z0-9]/g, '');

/** The same with O, I, L, S and B as the digits that they look like. */
export const lookalikeKey = (written: string): string =>
  plainKey(written).replace(/[OILSB]/g, (letter) => LOOKS_LIKE[letter] ?? letter);

/**
 * How two numbers resemble each other, the nearest first: `same` apart from spaces, dashes and capitals; `lookalike`
 * where O and 0, I and 1, S and 5, B and 8 are taken for each other; `transposed` where two characters changed places;
 * `near` where one character differs, is missing or is too many.
 */
export type Likeness = 'same' | 'lookalike' | 'transposed' | 'near';
export const LIKENESSES: readonly Likeness[] = ['same', 'lookalike', 'transposed', 'near'];

/**
 * @returns null where they have nothing in common that says one was meant by the other; numbers with fewer than four
 *   characters are only the same or not.
 * @example likeness('10-200', '10200') is same, ('10-200', 'IO-2OO') lookalike, ('10-200', '10-020') transposed
 */
export function likeness(one: string, other: string): Likeness | null {
  const [a, b] = [plainKey(one), plainKey(other)];
  if (a === '' || b === '') return null;
  if (a === b) return 'same';
  if (lookalikeKey(one) === lookalikeKey(other)) return 'lookalike';
  if (Math.min(a.length, b.length) < 4) return null;
  if (areTransposed(a, b)) return 'transposed';
  return areNear(a, b) ? 'near' : null;
}

/**
 * Whether recognition alone may make one of two near numbers of the other: a sign that it saw twice or not at all, or a
 * letter for a figure. It does not take one figure for another.
 */
export function mayBeMisread(one: string, other: string): boolean {
  const [a, b] = [plainKey(one), plainKey(other)];
  if (!areNear(a, b)) return false;
  if (a.length !== b.length) return true;
  const at = [...a].findIndex((sign, place) => sign !== b.charAt(place));
  return at < 0 || /\D/.test(a.charAt(at) + b.charAt(at));
}

function areTransposed(a: string, b: string): boolean {
  if (a.length !== b.length) return false;
  const places = [...a].flatMap((letter, at) => (letter === b.charAt(at) ? [] : [at]));
  const [first, second] = places;
  if (places.length !== 2 || first === undefined || second === undefined) return false;
  return a.charAt(first) === b.charAt(second) && a.charAt(second) === b.charAt(first);
}

function areNear(a: string, b: string): boolean {
  const [short, long] = a.length <= b.length ? [a, b] : [b, a];
  if (long.length - short.length > 1) return false;
  let from = 0;
  while (from < short.length && short.charAt(from) === long.charAt(from)) from += 1;
  // What follows the one place that differs is the same; of equally long ones that place is left out of both.
  return short.slice(long.length === short.length ? from + 1 : from) === long.slice(from + 1);
}
