/** Issues of one document as they follow each other; null where it is no letter, number or year. */
interface Place {
  readonly kind: 'letter' | 'number' | 'year';
  readonly at: readonly (number | string)[];
}

const PIVOT = 70;

function placeOf(written: string, isYear: boolean): Place | null {
  const revision = written.trim().toUpperCase();
  // A reapproval and an editorial change leave the text as it was.
  const [, digits, letter = ''] = /^(\d{2}|\d{4})([A-Z]?)(?:\(\d{4}\)|R\d{4})?(?:E\d)?$/.exec(revision) ?? [];
  if (isYear && digits !== undefined) {
    const century = Number(digits) >= PIVOT ? 1900 : 2000;
    return { kind: 'year', at: [digits.length === 2 ? century + Number(digits) : Number(digits), letter] };
  }
  if (/^[A-Z]{1,2}$/.test(revision)) return { kind: 'letter', at: [revision.length, revision] };
  return /^\d+$/.test(revision) ? { kind: 'number', at: [Number(revision)] } : null;
}

/**
 * How one issue of a specification stands to another: letters run A to Z and then AA, numbers and years upwards; `19`
 * and `2019` are one year.
 *
 * @param isYear the body writes issues as years (ASTM, ISO, EN, ANSI).
 * @returns `differs` where they are not the same and cannot be put in order.
 * @example revisionOrder('P', 'R', false) is earlier; revisionOrder('2019', '19', true) is same
 */
export function revisionOrder(
  one: string,
  other: string,
  isYear: boolean,
): 'same' | 'earlier' | 'later' | 'differs' {
  const clean = (written: string) => written.trim().toUpperCase();
  if (clean(one) === clean(other)) return 'same';
  const [a, b] = [placeOf(one, isYear), placeOf(other, isYear)];
  if (!a || !b || a.kind !== b.kind) return 'differs';
  for (const [index, part] of a.at.entries()) {
    const against = b.at[index];
    if (against === undefined || part === against) continue;
    return part < against ? 'earlier' : 'later';
  }
  return 'same';
}
