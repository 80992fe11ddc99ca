import { readFile } from 'node:fs/promises';
import { basename } from 'node:path';
import { parseArgs } from 'node:util';
import type { z } from 'zod';

/** The command was called wrongly, or something that was handed to it is not what it should be. */
export class InputError extends Error {
  constructor(
    readonly code: 'usage' | 'file_not_found' | 'input_not_valid',
    message: string,
  ) {
    super(message);
  }
}

interface Call<Name extends string> {
  readonly file: string;
  readonly options: Readonly<Partial<Record<Name, string>>>;
}

/**
 * The one file and the options of a call.
 *
 * @param usage what is said when the call is not understood.
 * @throws InputError `usage`
 */
export function callOf<Name extends string>(
  args: string[],
  names: readonly Name[],
  usage: string,
): Call<Name> {
  const options = Object.fromEntries(names.map((name) => [name, { type: 'string' as const }]));
  const parsed = understood(() => parseArgs({ args, options, allowPositionals: true }), usage);
  const [file, ...more] = parsed.positionals;
  if (file === undefined || more.length > 0) throw new InputError('usage', `Give one file. ${usage}`);
  const given = names.flatMap((name) => {
    const value = parsed.values[name];
    return typeof value === 'string' ? [[name, value] as const] : [];
  });
  return { file, options: fromEntries(given) };
}

/** As `Object.fromEntries`, which forgets which keys there may be. */
const fromEntries = <Name extends string>(entries: readonly (readonly [Name, string])[]) => {
  const options: Partial<Record<Name, string>> = {};
  for (const [name, value] of entries) options[name] = value;
  return options;
};

function understood<Value>(read: () => Value, usage: string): Value {
  try {
    return read();
  } catch (error) {
    const why = error instanceof Error ? error.message : String(error);
    throw new InputError('usage', `${why} ${usage}`);
  }
}

/** @throws InputError `file_not_found` */
export async function bytesOf(file: string): Promise<{ bytes: Uint8Array; name: string }> {
  const bytes = await readFile(file).catch(() => {
    throw new InputError('file_not_found', `${file} cannot be opened.`);
  });
  // A plain array: readers of formats refuse Node's own kind.
  return { bytes: new Uint8Array(bytes), name: basename(file) };
}

/**
 * A JSON document that was handed over.
 *
 * @returns undefined where none was. @throws InputError `file_not_found`, or `input_not_valid` with the place.
 */
export async function jsonOf<Schema extends z.ZodType>(
  file: string | undefined,
  schema: Schema,
): Promise<z.output<Schema> | undefined> {
  if (file === undefined) return undefined;
  const { bytes } = await bytesOf(file);
  const text = new TextDecoder().decode(bytes);
  const parsed = schema.safeParse(parseJson(text, file));
  if (parsed.success) return parsed.data;
  throw new InputError('input_not_valid', `${file}: ${placeOf(parsed.error)}`);
}

function parseJson(text: string, file: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new InputError('input_not_valid', `${file} is no JSON.`);
  }
}

const placeOf = ({ issues }: z.ZodError): string =>
  issues
    .slice(0, 3)
    .map(({ path, message }) => `${path.length === 0 ? 'the document' : path.join('.')}: ${message}`)
    .join('; ');

/** @throws InputError `usage` where it is no number. */
export function numberOf(option: string, written: string | undefined): number | undefined {
  if (written === undefined) return undefined;
  const value = Number(written);
  if (written.trim() === '' || !Number.isFinite(value))
    throw new InputError('usage', `--${option} ${written} is no number.`);
  return value;
}
