import type { z } from 'zod';

import { cellText, readCell } from './cell-text';
import type { Column } from './row-columns';

/** What is wrong with one row, by the head of the column where it is; an empty head is the row as a whole. */
export interface CellProblem {
  readonly column: string;
  readonly message: string;
}

export type ReadRow =
  | { readonly ok: true; readonly row: unknown }
  | { readonly ok: false; readonly problems: readonly CellProblem[] };

/** A row as cells, one for each column. */
export const cellsOfRow = (columns: readonly Column[], row: unknown): string[] =>
  columns.map(({ path, shapes }) => {
    const value = path.reduce<unknown>((inside, part) => (isObject(inside) ? inside[part] : undefined), row);
    // An object in a place where words may stand has columns of its own.
    const isOwn = isObject(value) && !Array.isArray(value) && !shapes.some(({ type }) => type === 'object');
    return isOwn || isListOfObjects(value) ? '' : cellText(value, shapes);
  });

/** A row from its cells, one for each column, as the schema has it; or all that is wrong with it. */
export function rowFromCells(
  columns: readonly Column[],
  schema: z.ZodType,
  cells: readonly string[],
): ReadRow {
  const row: Record<string | number, unknown> = {};
  const problems: CellProblem[] = [];
  for (const [at, { head, path, shapes, empty }] of columns.entries()) {
    const text = (cells[at] ?? '').trim();
    if (text === '') {
      if (empty !== 'left_out') put(row, path, empty === 'null' ? null : []);
      continue;
    }
    const read = readCell(text, shapes);
    if (read.ok) put(row, path, read.value);
    else problems.push({ column: head, message: read.message });
  }
  if (problems.length > 0) return { ok: false, problems };
  const parsed = schema.safeParse(withoutHoles(row));
  if (parsed.success) return { ok: true, row: parsed.data };
  return { ok: false, problems: parsed.error.issues.flatMap((issue) => problemsOf(columns, issue, [])) };
}

const MISSING = 'Is empty, and may not be in a row of this kind.';

const isObject = (value: unknown): value is Record<string | number, unknown> =>
  typeof value === 'object' && value !== null;
const isListOfObjects = (value: unknown): boolean =>
  Array.isArray(value) && value.some((one) => isObject(one) && !Array.isArray(one));

function put(row: Record<string | number, unknown>, path: Column['path'], value: unknown): void {
  let inside = row;
  for (const [at, part] of path.slice(0, -1).entries()) {
    const next = inside[part] ?? (typeof path[at + 1] === 'number' ? [] : {});
    inside[part] = next;
    inside = next as typeof row;
  }
  inside[path.at(-1) ?? ''] = value;
}

/** Where the first of two numbered groups is left empty, the second becomes the first. */
function withoutHoles(value: unknown): unknown {
  if (Array.isArray(value)) return value.filter((one) => one !== undefined).map(withoutHoles);
  if (!isObject(value)) return value;
  return Object.fromEntries(Object.entries(value).map(([key, one]) => [key, withoutHoles(one)]));
}

function problemsOf(
  columns: readonly Column[],
  issue: z.core.$ZodIssue,
  above: readonly PropertyKey[],
): CellProblem[] {
  const path = [...above, ...issue.path];
  const at = (message: string, inside: readonly PropertyKey[] = path) => ({
    column: headAt(columns, inside),
    message,
  });
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key) =>
        at('Does not belong to a row of this kind. Leave it empty.', [...path, key]),
      );
    case 'invalid_union': {
      const [nearest] = issue.errors.toSorted((one, other) => one.length - other.length);
      return nearest ? nearest.flatMap((inner) => problemsOf(columns, inner, path)) : [at(MISSING)];
    }
    case 'custom':
      return [at(issue.message)];
    default:
      // What stood in a cell was read by this very schema: what is left is that nothing stands there.
      return [at(MISSING)];
  }
}

function headAt(columns: readonly Column[], path: readonly PropertyKey[]): string {
  const begins = (longer: readonly PropertyKey[], shorter: readonly PropertyKey[]) =>
    shorter.every((part, at) => longer[at] === part);
  const found =
    columns.find((column) => column.path.length === path.length && begins(path, column.path)) ??
    columns.find((column) => path.length > 0 && begins(column.path, path)) ??
    columns.find((column) => begins(path, column.path));
  return found?.head ?? '';
}
