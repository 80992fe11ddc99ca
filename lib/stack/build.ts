import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CannotStart } from '@/db/cannot-start';
import { runToEnd } from './run-to-end';
import type { StackSettings } from './settings';

/** What ends up in the web server; a change anywhere else needs no new build. */
const SOURCES = [
  ...['app', 'components', 'emails', 'lib', 'db', 'public'],
  ...['next.config.mjs', 'tailwind.config.ts', 'postcss.config.mjs', 'proxy.ts', 'instrumentation.ts'],
  ...['package-lock.json', 'tsconfig.json'],
];
const NEXT = join('node_modules', 'next', 'dist', 'bin', 'next');
const NOT_SOURCES = ['lib/stack', 'db/seed'];

/** Builds the web server unless the last build came from these very sources. */
export async function buildWeb(
  { distDir, env }: StackSettings,
  { report, onStart }: { report: (line: string) => void; onStart: (pid: number) => void },
): Promise<void> {
  const stamp = join(distDir, 'lotwright-sources');
  const wanted = hashOf(SOURCES);
  const isFresh =
    existsSync(join(distDir, 'BUILD_ID')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted;
  if (isFresh) return;

  report('Building the web server …');
  const began = Date.now();
  const { code, output } = await runToEnd([NEXT, 'build'], {
    env: { ...env, NODE_ENV: 'production' },
    output: 'keep',
    onStart,
  });
  if (code !== 0) throw new CannotStart(`The web server could not be built:\n${output}`);
  writeFileSync(stamp, wanted);
  report(`Built in ${Math.round((Date.now() - began) / 1000)} s.`);
}

function hashOf(paths: readonly string[]): string {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesBelow))
    hash.update(file).update('\0').update(readFileSync(file)).update('\0');
  return hash.digest('hex');
}

function filesBelow(path: string): string[] {
  if (!existsSync(path) || NOT_SOURCES.includes(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesBelow(join(path, name)));
}
