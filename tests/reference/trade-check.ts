import { readdirSync } from 'node:fs';
import path from 'node:path';

import { startVitest, type TestModule } from 'vitest/node';

import { publishedRows } from './values';

/** `npm run trade:check`: runs the reference tests and prints what was really checked. Exit 1 where a test fails. */
interface Checked {
  source: string;
  confidence: string;
}

/** What the tests of one file have read of the published values, each row once. */
interface ModuleCount {
  rows: Map<string, Checked>;
  tests: number;
  failed: string[];
}

function countOf(module: TestModule): ModuleCount {
  const count: ModuleCount = { rows: new Map(), tests: 0, failed: [] };
  for (const test of module.children.allTests()) {
    count.tests += 1;
    const { state } = test.result();
    if (state === 'failed') count.failed.push(test.fullName);
    // A row of a test that failed was looked at, but did not hold.
    if (state !== 'passed') continue;
    for (const [place, row] of Object.entries(test.meta().published ?? {})) count.rows.set(place, row);
  }
  if (module.errors().length > 0) count.failed.push(`${module.moduleId} could not be run`);
  return count;
}

/** Every row of every file, so that a row nobody checks is told. */
function allPlaces(): string[] {
  const files = readdirSync(path.join(import.meta.dirname, 'values')).filter((name) => name.endsWith('.csv'));
  return files.flatMap((name) => {
    const file = path.basename(name, '.csv');
    return publishedRows(file, []).map((_, index) => `${file}:${index + 1}`);
  });
}

/** Rows by the file they stand in, by number. */
function byFile(places: readonly string[]): Map<string, string[]> {
  const files = new Map<string, string[]>();
  for (const place of places) {
    const [file = '', row = ''] = place.split(':');
    files.set(file, [...(files.get(file) ?? []), row]);
  }
  return files;
}

function lineOf(name: string, { rows, tests, failed }: ModuleCount): string {
  const checked = [...rows.values()];
  const read = checked.filter(({ confidence }) => confidence === 'read').length;
  const memory = checked.filter(({ confidence }) => confidence === 'memory').length;
  const partly = checked.filter(({ confidence }) => confidence === 'read+memory').length;
  const computed = checked.length - read - memory - partly;
  const sources = new Set(checked.map(({ source }) => source)).size;
  const cells = [checked.length, sources, read, partly, computed, memory, tests, failed.length];
  return name.padEnd(NAME_WIDTH) + cells.map((cell) => String(cell).padStart(CELL_WIDTH)).join('');
}

const NAME_WIDTH = 28;
const CELL_WIDTH = 10;
const HEADINGS = ['values', 'sources', 'read', 'partly', 'computed', 'memory', 'tests', 'failed'];

async function main(): Promise<number> {
  const vitest = await startVitest('test', ['tests/reference'], {
    watch: false,
    project: ['unit'],
    reporters: [{}],
  });
  const modules = vitest.state.getTestModules();
  await vitest.close();
  const counts = modules
    .map((module) => [path.basename(module.moduleId).replace('.test.ts', ''), countOf(module)] as const)
    .toSorted(([one], [other]) => one.localeCompare(other));
  const total: ModuleCount = { rows: new Map(), tests: 0, failed: [] };
  console.log(''.padEnd(NAME_WIDTH) + HEADINGS.map((heading) => heading.padStart(CELL_WIDTH)).join(''));
  for (const [name, count] of counts) {
    console.log(lineOf(name, count));
    for (const [place, row] of count.rows) total.rows.set(place, row);
    total.tests += count.tests;
    total.failed.push(...count.failed);
  }
  console.log(lineOf('all', total));
  const unread = allPlaces().filter((place) => !total.rows.has(place));
  for (const [file, rows] of byFile(unread))
    console.log(`\nNot read by any test that passed, of ${file}: ${rows.join(', ')}`);
  for (const name of total.failed) console.log(`\nFailed: ${name}`);
  return total.failed.length > 0 || total.tests === 0 ? 1 : 0;
}

process.exitCode = await main();
