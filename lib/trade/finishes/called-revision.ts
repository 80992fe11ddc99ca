/** Issues of a document that a rule holds for: revision letters, or years in the number, or all of them. */
export type Revisions =
  { readonly letters: readonly string[] } | { readonly fromYear?: number; readonly toYear?: number } | 'any';

export interface CalledDocument {
  readonly specification: string;
  readonly revision?: string | null | undefined;
}

/**
 * The revision with which an order calls a document, if it is this document: empty where none is said, null where it
 * is another document. The revision may stand in its own field or at the end of the number, as people type it.
 *
 * Worked examples: `QQ-P-416F` calls `QQ-P-416` at `F`; `ASTM B633-19` calls `ASTM B633` at `19`; `AMS 2759/9` is not
 * `AMS 2759`.
 */
export function calledRevision(document: string, called: CalledDocument): string | null {
  const rest = restOf(called.specification, document);
  if (rest === null) return null;
  const atEnd = /^(?:\s*(?:REV\.?\s*)?([A-Z])(?![A-Z])|\s*[-:]\s*(\d{2,4}))/.exec(rest);
  if (rest.trim() !== '' && !atEnd) return null;
  return revisionIn(called.revision ?? '') || (atEnd?.[1] ?? atEnd?.[2] ?? '');
}

/** Whether a rule for some issues covers the one that is called. */
export function coversRevision(revisions: Revisions, revision: string): boolean {
  if (revisions === 'any') return true;
  if ('letters' in revisions) return revisions.letters.includes(revision);
  const year = yearOf(revision);
  return year !== null && year >= (revisions.fromYear ?? -Infinity) && year <= (revisions.toYear ?? Infinity);
}

/** What is typed after the number, if it begins with that number; spaces and dashes are typed in many ways. */
function restOf(typed: string, document: string): string | null {
  const text = typed.toUpperCase();
  const wanted = lettersOf(document);
  let at = 0;
  for (const letter of wanted) {
    while (SEPARATORS.has(text.charAt(at))) at += 1;
    if (text.charAt(at) !== letter) return null;
    at += 1;
  }
  return text.slice(at);
}

const SEPARATORS: ReadonlySet<string> = new Set([' ', '\t', '\u00a0', '.', '‐', '–', '-']);

/** Documents are those of the tables, asked for again with every step. */
const LETTERS = new Map<string, string>();

function lettersOf(document: string): string {
  const known = LETTERS.get(document);
  if (known !== undefined) return known;
  const letters = [...document.toUpperCase()].filter((letter) => !SEPARATORS.has(letter)).join('');
  LETTERS.set(document, letters);
  return letters;
}

/** `F`, `rev F`, `F Amdt 2`, `19`, `2019`. */
function revisionIn(typed: string): string {
  const text = typed
    .trim()
    .toUpperCase()
    .replace(/^REV(ISION)?\b\.?\s*/, '');
  const [letter] = /^[A-Z](?![A-Z])|^\d{2,4}/.exec(text) ?? [];
  return letter ?? text;
}

/** Practices name their year with two digits: `B633-98` is of 1998, `B633-19` of 2019. */
function yearOf(revision: string): number | null {
  if (!/^\d{2}(\d{2})?$/.test(revision)) return null;
  const year = Number(revision);
  if (revision.length === 4) return year;
  return year >= FIRST_YEAR_OF_LAST_CENTURY ? 1900 + year : 2000 + year;
}

const FIRST_YEAR_OF_LAST_CENTURY = 50;
