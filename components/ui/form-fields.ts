import { z } from 'zod';

/*
 * A form hands over text, and the ready-made coercions read it wrongly: '' becomes 0, 'false' becomes true, and a key
 * that is there twice loses its first value. These read it as a person meant it.
 */

interface NumberWords {
  /** The field in words, as it begins a sentence: "Thickness". */
  name: string;
  /** What a right answer looks like. */
  example?: string;
}

/** A number that must be there; limits follow with `.pipe(z.number().max(41, 'The lot has 41. Enter 41 or less.'))`. */
export function numberField(words: NumberWords) {
  return z.union([z.string(), z.number()], `${words.name} is missing.`).transform((typed, issues) => {
    const read = readNumber(typed);
    if (read === undefined)
      issues.addIssue({ code: 'custom', message: `${words.name} is missing. Enter a number.` });
    if (read !== null && read !== undefined) return read;
    if (read === null) issues.addIssue({ code: 'custom', message: notANumber(words) });
    return z.NEVER;
  });
}

/** A number that may be left empty; empty is `null`, never 0. */
export function optionalNumberField(words: NumberWords) {
  return z.union([z.string(), z.number(), z.null(), z.undefined()]).transform((typed, issues) => {
    const read = typed == null ? undefined : readNumber(typed);
    if (read !== null) return read ?? null;
    issues.addIssue({ code: 'custom', message: notANumber(words) });
    return z.NEVER;
  });
}

/** Pieces are whole and never below nothing. */
export function piecesField(name = 'Pieces') {
  return numberField({ name, example: '41' }).pipe(
    z
      .number()
      .int(`${name} are whole. Enter a number without a fraction.`)
      .min(0, `${name} cannot be below 0.`),
  );
}

/** A tick: what browsers, forms and programs send for yes and for no. */
export const checkbox = z
  .union([z.boolean(), z.string(), z.null(), z.undefined()])
  .transform(
    (given) => given === true || (typeof given === 'string' && ['on', 'true', '1', 'yes'].includes(given)),
  );

/** One value, several or none: always a list. */
export function list<Item extends z.ZodType>(item: Item) {
  return z.preprocess(asList, z.array(item));
}

/** The whole form, without losing repeated keys. */
export function formValues(form: FormData): Record<string, FormDataEntryValue | FormDataEntryValue[]> {
  const values: Record<string, FormDataEntryValue | FormDataEntryValue[]> = {};
  for (const key of new Set(form.keys())) {
    const all = form.getAll(key);
    const [only] = all;
    values[key] = all.length === 1 && only !== undefined ? only : all;
  }
  return values;
}

function asList(given: unknown): unknown {
  if (given == null || given === '' || given === false) return [];
  return Array.isArray(given) ? given : [given];
}

const PLAIN = /^[+-]?(\d+(\.\d*)?|\.\d+)$/;
/** Not from a zero: `0,063` is how half the world writes a thickness, and 63 would be a thousand times too much. */
const WITH_THOUSANDS = /^[+-]?[1-9]\d{0,2}(,\d{3})+(\.\d+)?$/;

/** `undefined` for nothing, `null` for something that is no number. A comma counts only between thousands. */
function readNumber(typed: string | number): number | null | undefined {
  if (typeof typed === 'number') return Number.isFinite(typed) ? typed : null;
  const text = typed.trim().replace('−', '-');
  if (text === '') return undefined;
  if (PLAIN.test(text)) return Number(text);
  return WITH_THOUSANDS.test(text) ? Number(text.replaceAll(',', '')) : null;
}

function notANumber({ name, example = '0.063' }: NumberWords): string {
  return `${name} is not a number. Write it like ${example}.`;
}
