import { z } from 'zod';
import { invalid } from './payment-fault';

export type FormValue = string | FormValue[] | { [key: string]: FormValue };
export type Form = Record<string, FormValue>;

/** Reads the bracketed form of the wire: `transfer_data[destination]=acct_1&expand[0]=latest_charge`. */
export function parseForm(encoded: string): Form {
  const root: Form = {};
  for (const [name, value] of new URLSearchParams(encoded)) {
    const keys = name.split('[').map((key) => key.replace(/\]$/, ''));
    place(root, keys, value);
  }
  return listsOf(root) as Form;
}

/** The parameters of a request, or the refusal that names the parameter at fault. */
export function readParams<Shape extends z.ZodType>(shape: Shape, form: Form): z.output<Shape> {
  const parsed = shape.safeParse(form);
  if (parsed.success) return parsed.data;
  throw refusalOf(parsed.error);
}

export const flag = z.enum(['true', 'false']).transform((word) => word === 'true');
export const metadata = z.record(z.string(), z.string());
export const expand = z.array(z.string());
export const wholeNumber = z
  .string()
  .regex(/^-?\d+$/, 'Invalid integer')
  .transform(Number);

function place(into: Form, keys: string[], value: string): void {
  const [key = '', ...rest] = keys;
  if (key === '__proto__') return;
  // `name[]` is the next place in a list.
  const own = key === '' ? String(Object.keys(into).length) : key;
  if (rest.length === 0) {
    into[own] = value;
    return;
  }
  const existing = into[own];
  const next: Form = typeof existing === 'object' && !Array.isArray(existing) ? existing : {};
  into[own] = next;
  place(next, rest, value);
}

function listsOf(value: FormValue): FormValue {
  if (typeof value === 'string' || Array.isArray(value)) return value;
  const entries = Object.entries(value).map(([key, inner]) => [key, listsOf(inner)] as const);
  const isList = entries.length > 0 && entries.every(([key], index) => key === String(index));
  return isList ? entries.map(([, inner]) => inner) : Object.fromEntries(entries);
}

function refusalOf(error: z.ZodError): Error {
  const issue = error.issues[0];
  const param = (keys: readonly PropertyKey[]) =>
    keys.map((key, at) => (at === 0 ? String(key) : `[${String(key)}]`)).join('');
  if (issue?.code === 'unrecognized_keys') {
    const name = param([...issue.path, issue.keys[0] ?? '']);
    return invalid(`Received a parameter this stand-in does not know: ${name}`, {
      code: 'parameter_unknown',
      param: name,
    });
  }
  const name = param(issue?.path ?? []);
  const isMissing = issue?.code === 'invalid_type' && issue.input === undefined;
  return isMissing
    ? invalid(`Missing required param: ${name}.`, { code: 'parameter_missing', param: name })
    : invalid(`Invalid ${name}: ${issue?.message ?? 'not readable'}`, {
        code: 'parameter_invalid',
        param: name,
      });
}
