import { StatedCertificate } from '@/lib/evidence/certificate/certificate';

/** Steps of a field's name: `lines[0].qty_accepted` is lines, 0, qty_accepted. */
const stepsOf = (field: string): string[] => field.split(/[.[\]]+/).filter((step) => step !== '');

/**
 * The certificate as a person says it reads: each corrected field has the person's value in place of the machine's.
 * What does not fit the field's kind is left as it was read.
 */
export function withCorrections(
  stated: StatedCertificate,
  corrections: readonly { field: string; corrected: string }[],
): StatedCertificate {
  return corrections.reduce((before, { field, corrected }) => {
    const after = structuredClone(before) as Record<string, unknown>;
    const steps = stepsOf(field);
    const last = steps.pop();
    let holder: unknown = after;
    for (const step of steps) holder = isHolder(holder) ? holder[step] : undefined;
    if (last === undefined || !isHolder(holder) || !(last in holder)) return before;
    for (const value of valuesOf(corrected)) {
      holder[last] = value;
      const checked = StatedCertificate.safeParse(after);
      if (checked.success) return checked.data;
    }
    return before;
  }, stated);
}

const isHolder = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

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
