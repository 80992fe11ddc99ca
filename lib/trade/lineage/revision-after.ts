import type { SpecificationBody } from './recognise-specification';

/** Said in words: "Rev R", ", Revision R", "(Rev. F)", "Issue 2". */
const IN_WORDS = /[\s,(-]*(?:revision|rev|issue)\b[.:\s]*["']?([A-Z]{1,2}|\d{1,4})(?![A-Z0-9])["']?\)?/iy;

/** A letter right behind the number, with or without a hyphen: AMS2770R, AMS2770-R. */
const BEHIND = /-?([A-Z]{1,2})(?![A-Z0-9])/iy;

/** A capital after a space is an issue only where nothing else can follow; "AMS 2404 A" before a word may be anything. */
const APART =
  / ([A-Z])(?=\s*(?:$|[,;()])|\s+(?:type|class|grade|method|amd|amdt|amendment|notice|change|cl|ty|gr)\b)/iy;

/** A year behind a hyphen, with a letter, reapproval or editorial mark: -19, -22a, -98(2009), -98R2009, -17e1. */
const YEAR = /\s?-\s?(\d{4}|\d{2})([A-Z]?)(?:\((\d{4})\)|R(\d{4}))?(e\d)?(?![A-Z0-9])/iy;

/** A year behind a colon. */
const COLON_YEAR = /:(\d{4})(?!\d)/y;

interface Revision {
  readonly revision: string;
  readonly end: number;
}

/**
 * The issue that follows a specification number.
 *
 * @param text with plain hyphens. @param end where the number ends.
 * @returns the issue and where it ends; null where none is named.
 */
export function revisionAfter(text: string, end: number, body: SpecificationBody): Revision | null {
  switch (body) {
    case 'ASTM':
    case 'ANSI':
      return yearAt(text, end) ?? letterAt(IN_WORDS, text, end);
    case 'ISO':
    case 'EN':
      return letterAt(COLON_YEAR, text, end) ?? letterAt(IN_WORDS, text, end);
    case 'NAS':
      return letterAt(IN_WORDS, text, end);
    default:
      return letterAt(IN_WORDS, text, end) ?? letterAt(BEHIND, text, end) ?? capitalApart(text, end);
  }
}

function capitalApart(text: string, end: number): Revision | null {
  const found = letterAt(APART, text, end);
  return found?.revision === text.charAt(end + 1) ? found : null;
}

function letterAt(pattern: RegExp, text: string, end: number): Revision | null {
  pattern.lastIndex = end;
  const [whole, revision] = pattern.exec(text) ?? [];
  return whole === undefined || revision === undefined
    ? null
    : { revision: revision.toUpperCase(), end: end + whole.length };
}

/** Letters of a year are small, as they are printed: 22a, 17e1; a reapproval is written in brackets. */
function yearAt(text: string, end: number): Revision | null {
  YEAR.lastIndex = end;
  const match = YEAR.exec(text);
  if (!match) return null;
  const [whole, year, letter, inBrackets, afterR, editorial]: (string | undefined)[] = match;
  const reapproved = inBrackets ?? afterR;
  const again = reapproved === undefined ? '' : `(${reapproved})`;
  const revision = `${year}${letter?.toLowerCase() ?? ''}${again}${editorial?.toLowerCase() ?? ''}`;
  return { revision, end: end + (whole?.length ?? 0) };
}
