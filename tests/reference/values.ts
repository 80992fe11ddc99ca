import { readFileSync } from 'node:fs';
import path from 'node:path';

import Papa from 'papaparse';
import { TestRunner } from 'vitest';

import { CERTAINTIES, CONFIDENCES } from '@/lib/trade/source';

const FOLDER = path.join(import.meta.dirname, 'values');
const PROVENANCE = ['source', 'confidence', 'certainty'] as const;

export type PublishedRow<Column extends string> = Record<Column | (typeof PROVENANCE)[number], string>;

/**
 * The published values of one file in tests/reference/values, as text, in the order of the file.
 *
 * @param file its name without ending: `soak-times`.
 * @param columns those the test reads, besides source, confidence and certainty, which every file has.
 */
export function publishedRows<const Column extends string>(
  file: string,
  columns: readonly Column[],
): PublishedRow<Column>[] {
  const text = readFileSync(path.join(FOLDER, `${file}.csv`), 'utf8');
  const { data, errors, meta } = Papa.parse<PublishedRow<Column>>(text, {
    header: true,
    skipEmptyLines: true,
  });
  const missing = [...columns, ...PROVENANCE].filter((column) => !meta.fields?.includes(column));
  if (errors[0] || missing.length > 0 || data.length === 0)
    throw new Error(`${file}.csv: ${errors[0]?.message ?? `no rows, or no column ${missing.join(', ')}`}`);
  const unsaid = data.findIndex(({ source, confidence, certainty }) => {
    const known: readonly string[] = [...CONFIDENCES, ...CERTAINTIES];
    return source === '' || !known.includes(confidence) || !known.includes(certainty);
  });
  if (unsaid >= 0) throw new Error(`${file}.csv: row ${unsaid + 1} does not say where it comes from`);
  return data.map((row, index) => noteWhenRead(row, `${file}:${index + 1}`));
}

declare module 'vitest' {
  interface TaskMeta {
    /** The rows of published values that the test has read, for the count of `npm run trade:check`. */
    published?: Record<string, { source: string; confidence: string }>;
  }
}

/**
 * A row counts as checked where a running test reads a value of it, so that the count cannot say more than the tests
 * do. What is read only to name a test does not count.
 */
function noteWhenRead<Column extends string>(row: PublishedRow<Column>, place: string): PublishedRow<Column> {
  const { source, confidence }: PublishedRow<never> = row;
  const noted: PropertyDescriptorMap = {};
  for (const [column, value] of Object.entries(row)) {
    const get = () => {
      const meta = TestRunner.getCurrentTest()?.meta;
      if (meta) meta.published = { ...meta.published, [place]: { source, confidence } };
      return value;
    };
    const isValue = !PROVENANCE.some((name) => name === column);
    noted[column] = isValue ? { enumerable: true, get } : { enumerable: true, value };
  }
  return Object.defineProperties({ ...row }, noted);
}

/** A published value as a number; an empty field is no zero. */
export function numberOf(text: string): number {
  const value = Number(text);
  if (text.trim() === '' || !Number.isFinite(value)) throw new Error(`"${text}" is not a number`);
  return value;
}

/** Where a value comes from, as the name of a test says it. */
export function saidBy({ source, confidence }: { source: string; confidence: string }): string {
  return confidence === 'memory' ? `${source}, from memory` : source;
}

/** Cases for `test.each(…)('%s', …)`: each named by what it says and where that comes from. */
export const casesOf = <Row extends { source: string; confidence: string }>(
  rows: readonly Row[],
  says: (row: Row) => string,
): [name: string, row: Row][] => rows.map((row) => [`${says(row)} (${saidBy(row)})`, row]);

/** The rows with `said` beside them for the names of tests; copies would not be noted when they are read. */
export const named = <Row extends { source: string; confidence: string }>(rows: readonly Row[]) =>
  rows.map((row) => Object.assign(row, { said: saidBy(row) }));
