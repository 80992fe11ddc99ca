import { spotIn, type Passage, type Spot } from '../../layout/passage';
import { heightOf, widthOf } from '../../layout/box';
import type { Box } from '../../page';
import { figures } from './dates';
import { labelAtStart } from './find-labels';
import { numberFrom, type DecimalSign } from './quantities';

export interface Reading<Value> {
  readonly value: Value;
  readonly spot: Spot;
}

/** What was matched of a passage, as a value with its place. */
export function readingAt<Value>(
  passage: Passage,
  start: number,
  end: number,
  value: Value,
): Reading<Value> | null {
  const spot = spotIn(passage, start, end);
  return spot && { value, spot };
}

const CODE = /[A-Z0-9][A-Z0-9./_\-–\\+]*/giu;

/** Words that stand where a number may and are none. */
const NO_CODE =
  /^(?:n\/?a|none|nil|tbd|see|no|nr|rev|page|date|of|and|the|per|pcs?|ea|inc|llc|qty|[ap]\.?m)$|^\d{1,2}:\d\d/i;

/**
 * A number in the wide sense: of a certificate, an order, a lot. Letters, figures and marks, at least one figure; a prefix of
 * letters may stand a space before it.
 *
 * @param isDate what is a day of the calendar is no number.
 */
export function codeIn(passage: Passage, isDate: (text: string) => boolean): Reading<string> | null {
  const text = passage.text.replace(/–/g, '-');
  const found = [...text.matchAll(CODE)];
  for (const [index, match] of found.entries()) {
    const token = trimmedCode(match[0]);
    if (!token || NO_CODE.test(token)) continue;
    const next = found[index + 1];
    if (/\d/.test(token)) {
      if (isDate(text.slice(match.index, match.index + 12))) return null;
      // "5001- 2": one number that the reader has cut.
      const cut =
        /-$/.test(match[0]) && next?.index === match.index + match[0].length + 1 && /^\d/.test(next[0]);
      const end = cut ? next.index + next[0].length : match.index + token.length;
      return readingAt(passage, match.index, end, cut ? `${match[0]}${trimmedCode(next[0])}` : token);
    }
    if (
      next &&
      !SMALL_WORD.test(match[0]) &&
      /^[A-Z]{1,6}-?$/.test(match[0]) &&
      /^\d/.test(next[0]) &&
      isNear(match, next)
    ) {
      const end = next.index + trimmedCode(next[0]).length;
      const start = match.index;
      return readingAt(
        passage,
        start,
        end,
        `${token}${/-$/.test(match[0]) ? '-' : ' '}${trimmedCode(next[0])}`,
      );
    }
    // A sentence, not a number.
    if (index >= 1) return null;
  }
  return null;
}

const SMALL_WORD = /^(?:at|to|in|on|by|of|for|per|and|the|from|with)$/i;

const isNear = (match: RegExpExecArray, next: RegExpExecArray): boolean =>
  next.index - (match.index + match[0].length) <= 2;

const trimmedCode = (token: string): string => token.replace(/^[./_\-\\+]+|[./_\-\\,]+$/g, '');

const REVISION =
  /(?:[\s,;(/]|^)\(?(?:rev(?:ision)?|issue|iss|ind(?:ex|ice)?|chg)\b[.:\s]*(?:level\s*)?["“]?([A-Z]{1,2}|\d{1,2}|-|N\/?C)["”]?\)?(?![\p{L}\d])/iu;
const SHORT_REVISION = /^\s*(?:\/\s*|\(\s*)([A-Z]{1,2})\)?(?![\p{L}\d])|^\s+([A-Z])\s*$/u;

export interface PartRead {
  readonly part: string;
  readonly rev: string | null;
}

/**
 * A part number and, where it stands with it, the revision of its drawing.
 *
 * @example `10-200 Rev. A`, `10-200/A` and `10-200 (A)` are part 10-200 revision A
 */
export function partIn(passage: Passage, isDate: (text: string) => boolean): Reading<PartRead> | null {
  const code = answersOther(passage.text) ? null : codeIn(passage, isDate);
  if (!code) return null;
  const at = passage.text.replace(/–/g, '-').indexOf(code.spot.raw.replace(/–/g, '-'));
  const glued = /^(.{3,}[\dA-Z])(?:\/|-?rev\.?)([A-Z])$/i.exec(code.value);
  const part = glued?.[1] ?? code.value;
  // 3 characters: less is a line's number.
  if (part.replace(/[^A-Z0-9]/gi, '').length < 3) return null;
  const after = passage.text.slice(at + code.spot.raw.length);
  const [, said] = REVISION.exec(after) ?? [];
  const [, stroke, apart] = SHORT_REVISION.exec(after) ?? [];
  return {
    value: { part, rev: glued?.[2]?.toUpperCase() ?? said?.toUpperCase() ?? stroke ?? apart ?? null },
    spot: code.spot,
  };
}

/** It begins with another label, and so answers that one. */
function answersOther(text: string): boolean {
  const label = labelAtStart(text);
  return label !== null && label.key !== 'part_number' && label.key !== 'own_number';
}

/** The letter or number of a revision. */
export function revisionIn(passage: Passage): Reading<string> | null {
  const match =
    /^[\s"“(/]*(?:(?:rev(?:ision)?|issue|iss)\b[.:\s]*)?([A-Z]{1,2}|\d{1,3}|-|N\/?C|NEW)[\s"”).,;]*$/i.exec(
      passage.text,
    );
  const value = match?.[1]?.toUpperCase();
  if (!value || value === '-' || /^n\/?a$/i.test(value)) return null;
  const [word] = passage.words;
  return readingAt(
    passage,
    0,
    passage.text.length,
    word && isOneLetterWide(word.box) ? value.replace(/^(.)\1$/, '$1') : value,
  );
}

/** A single letter that was recognised twice is not as wide as two are. */
const isOneLetterWide = (box: Box): boolean => widthOf(box) < 1.15 * heightOf(box);

const COUNT =
  /^[^\p{L}\d]*(?:(?:qty|quantity)\.?:?\s*)?([\dOoIl|SB]{1,3}(?:[,.' ]\d{3})+|[\dOoIl|SB]{1,6})(?![\d.,/:%\-]*\d)(?!\s*[\p{L}]*\s*(?:°|%))\s*(?:\([^)]*\))?\s*(?:pcs?|pieces?|parts?|ea(?:ch)?|stk|stück|st|units?|each|of\s+\d+|total)?\.?/iu;

/**
 * A count of pieces, with or without its unit. Letters that print takes for figures are read as such.
 *
 * @returns whole pieces; "none" and "nil" are 0, a dash is nothing.
 */
export function countIn(passage: Passage, sign: DecimalSign): Reading<number> | null {
  const none = /^\s*\(?(?:none|nil|zero|keine|aucune?|ninguna)\b/i.exec(passage.text);
  if (none) return readingAt(passage, 0, none[0].length, 0);
  const match = COUNT.exec(passage.text);
  const written = match?.[1];
  if (!match || written === undefined) return null;
  if (!/\d/.test(written) && !/^[OoIl|]$/.test(written)) return null;
  if (
    /^\s*[\p{L}]/u.test(passage.text.slice(match[0].length)) &&
    !/[\s,;]$/.test(match[0]) &&
    !/(?:pcs?|pieces?|parts?|ea|each|units?)\.?$/i.test(match[0])
  )
    return null;
  const plain = figures(written).replace(/[' ]/g, '');
  const value = numberFrom(/^\d{1,3}[.,]\d{3}$/.test(plain) ? plain.replace(/[.,]/, '') : plain, sign);
  return Number.isInteger(value) ? readingAt(passage, 0, match[0].length, value) : null;
}

/** Words as they stand, without what belongs to the form. */
export function wordsIn(passage: Passage): Reading<string> | null {
  const value = passage.text
    .replace(/^[\s:.\-_|]+|[\s:_|,;]+$/g, '')
    .replace(/_{2,}/g, '')
    .trim();
  if (!/[\p{L}\p{N}]/u.test(value) || /^(?:n\/?a|none|-+)$/i.test(value)) return null;
  return readingAt(passage, 0, passage.text.length, value);
}

/** No temper is nought: 2024-0 is 2024-O. */
export const annealed = (material: string): string =>
  material.replace(/(?<![\d-])([1-8]\d{3})-0(?![\d.])/g, '$1-O');
