import { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import type { Fact } from '@/lib/evidence/fact';

interface FieldCorrection {
  field: string;
  corrected: string;
}

/**
 * The certificate as a person says it reads: each corrected field has the person's value in place of the machine's, and
 * is believed. What does not fit the field's kind is left as it was read.
 */
export const withCorrections = (
  stated: StatedCertificate,
  corrections: readonly FieldCorrection[],
): StatedCertificate =>
  corrections.reduce((before, correction) => withCorrection(before, correction) ?? before, stated);

/** Null where the words cannot stand in that field, or there is no such field. */
export function withCorrection(
  stated: StatedCertificate,
  { field, corrected }: FieldCorrection,
): StatedCertificate | null {
  const after = structuredClone(stated);
  const place = placeOf(after, field);
  if (!place) return null;
  for (const value of valuesOf(corrected)) {
    place.holder[place.last] = value;
    const checked = StatedCertificate.safeParse(after);
    if (checked.success)
      return { ...checked.data, facts: believed(checked.data.facts, { field, corrected }) };
  }
  return null;
}

export const hasField = (stated: StatedCertificate, field: string): boolean =>
  placeOf(stated, field) !== null;

type Holder = Record<string, unknown>;

/** Where a field stands: `lines[0].qty_accepted` is of lines, of 0, qty_accepted. Only what is the certificate's own. */
function placeOf(stated: StatedCertificate, field: string): { holder: Holder; last: string } | null {
  const steps = field.split(/[.[\]]+/).filter((step) => step !== '');
  const last = steps.pop();
  if (last === undefined || [...steps, last][0] === 'facts') return null;
  let holder: unknown = stated;
  for (const step of steps) holder = isOwn(holder, step) ? holder[step] : undefined;
  return isOwn(holder, last) ? { holder, last } : null;
}

/** What every object or list has by birth is none of the certificate's. */
const isOwn = (holder: unknown, step: string): holder is Holder =>
  typeof holder === 'object' &&
  holder !== null &&
  Object.hasOwn(holder, step) &&
  (!Array.isArray(holder) || /^\d+$/.test(step));

/** What the machine did not find is stated all the same once a person says so; it stands behind what the machine read. */
function believed(facts: StatedCertificate['facts'], { field, corrected }: FieldCorrection): Fact[] {
  const value = corrected === '' ? null : corrected;
  if (facts.some((fact) => fact.field === field))
    return facts.map((fact) => (fact.field === field ? { ...fact, value, confidence: 1 } : fact));
  const page = facts[0]?.page ?? 1;
  return value === null
    ? facts
    : [...facts, { field, value, raw: corrected, page, box: [0, 0, 0, 0], confidence: 1 }];
}

/** What the words may stand for, the strictest first; the shape of the field decides. */
function valuesOf(words: string): unknown[] {
  const number = Number(words.replace(',', '.'));
  return [
    ...(words === '' ? [null] : []),
    words,
    ...(words !== '' && Number.isFinite(number) ? [number] : []),
    ...(/^(yes|no)$/i.test(words) ? [/^yes$/i.test(words)] : []),
    words
      .split(/[;,\s]+/)
      .filter(Boolean)
      .map(Number),
  ];
}
