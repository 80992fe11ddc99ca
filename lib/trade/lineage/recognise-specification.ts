import { revisionAfter } from './revision-after';

/** Who gives the numbers out; decides how an issue is written. */
export type SpecificationBody =
  'AMS' | 'MIL' | 'DOD' | 'FED' | 'AN' | 'NAS' | 'ASTM' | 'ISO' | 'EN' | 'ANSI' | 'BS' | 'DTD';

export interface SpecificationReference {
  readonly body: SpecificationBody;
  /** Written one way, without its issue: AMS2770, AMS2759/5, MIL-DTL-5541, AMS-QQ-P-416, ASTM B633, NAS 410, BS L72. */
  readonly number: string;
  /** Letter, number or (ASTM, ISO, EN, ANSI) year as written: R, 4, 19, 98(2009). Null where none is named. */
  readonly revision: string | null;
  /** What follows: type, class, amendment. */
  readonly rest: string;
}

export interface FoundSpecification extends SpecificationReference {
  /** Where in the text it begins, and how long the number with its issue is. */
  readonly at: number;
  readonly length: number;
}

interface Spelling {
  readonly body: SpecificationBody;
  readonly pattern: RegExp;
  /** From the groups of the pattern to the one way of writing; an issue that stands before the number comes first. */
  readonly number: (groups: readonly string[]) => string;
  readonly revision?: (groups: readonly string[]) => string;
}

const sheet = (slash: string | undefined): string => (slash ? `/${slash}` : '');

/** Longer spellings before those they contain. Marks between the parts of a number may be hyphens, spaces or missing. */
const SPELLINGS: readonly Spelling[] = [
  {
    body: 'AMS',
    pattern: /(?:SAE[\s-]*)?AMS[\s-]*(QQ|WW|TT)[\s-]*([A-Z])[\s-]*(\d{1,4})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([prefix, letter, digits, slash]) => `AMS-${prefix}-${letter}-${digits}${sheet(slash)}`,
  },
  {
    body: 'AMS',
    pattern: /(?:SAE[\s-]*)?AMS[\s-]*(STD|[A-Z])[\s-]*(\d{4,6})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([prefix, digits, slash]) => `AMS-${prefix}-${digits}${sheet(slash)}`,
  },
  {
    body: 'AMS',
    pattern: /(?:SAE[\s-]*)?AMS[\s-]*(\d{4})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([digits, slash]) => `AMS${digits}${sheet(slash)}`,
  },
  {
    body: 'MIL',
    pattern: /MIL[\s-]*(DTL|PRF|STD|HDBK)[\s-]*(\d{1,6})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([prefix, digits, slash]) => `MIL-${prefix}-${digits}${sheet(slash)}`,
  },
  {
    body: 'MIL',
    pattern: /MIL[\s-]*([A-Z])[\s-]*(\d{3,6})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([prefix, digits, slash]) => `MIL-${prefix}-${digits}${sheet(slash)}`,
  },
  {
    body: 'DOD',
    pattern: /DOD[\s-]*(STD|[A-Z])[\s-]*(\d{3,6})/iy,
    number: ([prefix, digits]) => `DOD-${prefix}-${digits}`,
  },
  {
    body: 'FED',
    pattern: /(QQ|TT|WW)[\s-]*([A-Z])[\s-]*(\d{1,4})(?:\/(\d{1,3})(?!\d))?/iy,
    number: ([prefix, letter, digits, slash]) => `${prefix}-${letter}-${digits}${sheet(slash)}`,
  },
  {
    body: 'FED',
    pattern: /FED[\s-]*STD[\s-]*(\d{1,4})/iy,
    number: ([digits]) => `FED-STD-${digits}`,
  },
  {
    // Hyphens are asked for: "an A 12" is plain English.
    body: 'AN',
    pattern: /AN-(QQ-)?([A-Z])-(\d{1,4})/iy,
    number: ([prefix, letter, digits]) => `AN-${prefix ?? ''}${letter}-${digits}`,
  },
  { body: 'NAS', pattern: /NAS[\s-]*(\d{3,5})/iy, number: ([digits]) => `NAS ${digits}` },
  {
    body: 'ASTM',
    pattern: /ASTM[\s-]*([A-G])[\s-]*(\d{1,4})(?:\/[A-G]?\s?\d{1,4}M|M)?/iy,
    number: ([letter, digits]) => `ASTM ${letter}${digits}`,
  },
  {
    body: 'EN',
    pattern: /(?:BS[\s-]*)?EN[\s-]*(\d{3,5})(-\d{1,2})?(?!\d)/iy,
    number: ([digits, part]) => `EN ${digits}${part ?? ''}`,
  },
  {
    body: 'ISO',
    pattern: /ISO(?:\/IEC)?[\s-]*(\d{3,5})(-\d{1,2})?(?!\d)/iy,
    number: ([digits, part]) => `ISO ${digits}${part ?? ''}`,
  },
  {
    // The society has dropped a letter; the standard is the same.
    body: 'ANSI',
    pattern: /ANSI\/(ASQC?|NCSL)[\s-]*(Z\d{1,3}(?:\.\d+)?)(-\d(?!\d))?/iy,
    number: ([society, digits, part]) =>
      `ANSI/${society === 'ASQC' ? 'ASQ' : society} ${digits}${part ?? ''}`,
  },
  { body: 'DTD', pattern: /DTD[\s-]*(\d{1,4})/iy, number: ([digits]) => `DTD ${digits}` },
  {
    // The issue stands before the letter: S28, 2S28, 3S28.
    body: 'BS',
    pattern: /BS[\s-]*(\d{1,2})?[\s-]*(L|S|T|TA|HR)[\s-]*(\d{1,3})/iy,
    number: ([, series, digits]) => `BS ${series}${digits}`,
    revision: ([issue]) => issue ?? '',
  },
];

/** Hyphens and dashes of print, each one character as before, so that places in the text stay. */
const plain = (text: string): string => text.replace(/[\u2010-\u2015\u2212\u00ad]/g, '-').replace(/\s/g, ' ');

/**
 * A specification as a person, an order or a certificate writes it, at the beginning of a text.
 *
 * @returns the reference; null where the text does not begin with one.
 * @example `AMS 2770, Revision R` is AMS2770 issue R; `ASTM B633-19` is ASTM B633 of 19; `QQ-P-416F Type II Class 2` is
 * QQ-P-416 issue F with "Type II Class 2" after it.
 */
export function recogniseSpecification(text: string): SpecificationReference | null {
  const start = text.length - text.trimStart().length;
  const found = referenceAt(plain(text), start);
  if (!found) return null;
  const { body, number, revision, at, length } = found;
  return { body, number, revision, rest: trimmed(text.slice(at + length)) };
}

/**
 * Every specification in a longer text, in its order. What follows each runs to the next one, to a semicolon or to the
 * end of the line.
 *
 * @example `per MIL-DTL-5541F Class 3; inspect to ASTM E1417` finds MIL-DTL-5541 with "Class 3", and ASTM E1417.
 */
export function findSpecifications(text: string): FoundSpecification[] {
  const searched = plain(text);
  const places: Omit<FoundSpecification, 'rest'>[] = [];
  let at = 0;
  while (at < searched.length) {
    const found = referenceAt(searched, at);
    if (found) places.push(found);
    at += found ? found.length : 1;
  }
  return places.map((place, index) => {
    const end = place.at + place.length;
    const following = text.slice(end, places[index + 1]?.at).split(/[;\r\n]/)[0] ?? '';
    return { ...place, rest: trimmed(following) };
  });
}

/** The reference written one way; `recogniseSpecification` reads it back as the same. */
export function writeSpecification({ body, number, revision, rest }: SpecificationReference): string {
  const written = revision === null ? number : withRevision(body, number, revision);
  return rest === '' ? written : `${written} ${rest}`;
}

function withRevision(body: SpecificationBody, number: string, revision: string): string {
  if (body === 'BS') return number.replace(' ', ` ${revision}`);
  if (body === 'ASTM' || body === 'ANSI') return `${number}-${revision}`;
  if (body === 'ISO' || body === 'EN') return `${number}:${revision}`;
  return body !== 'NAS' && /^[A-Z]+$/.test(revision) ? `${number}${revision}` : `${number} Rev ${revision}`;
}

const trimmed = (following: string): string => following.replace(/^[\s,;:/-]+/, '').replace(/[\s,;]+$/, '');

/** Not in the middle of a word or number. */
const BEFORE = /[A-Z0-9]/i;

function referenceAt(text: string, at: number): Omit<FoundSpecification, 'rest'> | null {
  if (BEFORE.test(text.charAt(at - 1))) return null;
  for (const { body, pattern, number, revision } of SPELLINGS) {
    pattern.lastIndex = at;
    const match = pattern.exec(text);
    if (!match) continue;
    const [whole, ...groups] = match;
    const parts = groups.map((group: string | undefined) => group?.toUpperCase() ?? '');
    const end = at + whole.length;
    const before = revision?.(parts) ?? '';
    const after = before === '' ? revisionAfter(text, end, body) : null;
    // More digits than any number of this kind has: something else.
    if (!after && /\d/.test(text.charAt(end))) continue;
    return {
      body,
      number: number(parts),
      revision: before || (after?.revision ?? null),
      at,
      length: (after?.end ?? end) - at,
    };
  }
  return null;
}
