import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { expect, test } from 'vitest';

interface Cruise {
  summary: {
    violations: { rule: { name: string }; from: string; to: string }[];
    totalCruised: number;
    totalDependenciesCruised: number;
  };
  modules: { source: string }[];
}

test('the walls of the house stand, and were really looked at', { timeout: 120_000 }, async () => {
  const folders = ['app', 'components', 'emails', 'lib', 'db', 'fakes'];
  // With a compiler it does not know it would inspect nothing and pass.
  const { stdout } = await promisify(execFile)(
    process.execPath,
    [
      'node_modules/dependency-cruiser/bin/dependency-cruise.mjs',
      '--config',
      '.dependency-cruiser.cjs',
      '--output-type',
      'json',
      ...folders,
    ],
    { maxBuffer: 200_000_000 },
  ).catch((error: unknown) => error as { stdout: string });
  const { summary, modules } = JSON.parse(stdout) as Cruise;
  expect(summary.totalCruised).toBeGreaterThan(300);
  expect(summary.totalDependenciesCruised).toBeGreaterThan(1000);
  for (const folder of folders)
    expect(modules.some(({ source }) => source.startsWith(`${folder}/`))).toBe(true);
  expect(summary.violations.map(({ rule, from, to }) => `${rule.name}: ${from} → ${to}`)).toEqual([]);
});
