import { existsSync, readFileSync } from 'node:fs';

export interface Tally {
  readonly passed: number;
  readonly failed: number;
}

/** Adds what a test runner wrote about itself; a runner that failed without naming a test counts as one failure. */
export function tallyVitest(file: string, exitCode: number): Tally {
  const report = readReport<VitestReport>(file);
  const emptyFailures = (report?.testResults ?? []).filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  ).length;
  return settle(report?.numPassedTests ?? 0, (report?.numFailedTests ?? 0) + emptyFailures, exitCode);
}

export function tallyPlaywright(file: string, exitCode: number): Tally {
  const report = readReport<PlaywrightReport>(file);
  return settle(
    report?.stats.expected ?? 0,
    (report?.stats.unexpected ?? 0) + (report?.stats.flaky ?? 0),
    exitCode,
  );
}

export function sum(tallies: readonly Tally[]): Tally {
  return tallies.reduce(
    (total, one) => ({ passed: total.passed + one.passed, failed: total.failed + one.failed }),
    { passed: 0, failed: 0 },
  );
}

function settle(passed: number, failed: number, exitCode: number): Tally {
  const foundNothing = passed + failed === 0;
  return { passed, failed: failed === 0 && (exitCode !== 0 || foundNothing) ? 1 : failed };
}

function readReport<T>(file: string): T | undefined {
  if (!existsSync(file)) return undefined;
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as T;
  } catch {
    // The runner died while writing it; its exit code tells the rest.
    return undefined;
  }
}

interface VitestReport {
  readonly numPassedTests: number;
  readonly numFailedTests: number;
  readonly testResults: readonly {
    readonly status: string;
    readonly assertionResults: readonly { readonly status: string }[];
  }[];
}

interface PlaywrightReport {
  readonly stats: { readonly expected: number; readonly unexpected: number; readonly flaky: number };
}
