import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CannotStart } from '@/db/cannot-start';
import { type StackSettings } from './settings';

/** What ends up in the web server; a change anywhere else needs no new build. */
const SOURCES = [
  ...['app', 'components', 'emails', 'lib', 'db', 'public'],
  ...['next.config.mjs', 'tailwind.config.ts', 'postcss.config.mjs', 'proxy.ts', 'instrumentation.ts'],
  ...['package-lock.json', 'tsconfig.json'],
];
const NOT_SOURCES = ['lib/stack', 'db/seed'];

/** Builds the web server unless the last build came from these very sources. */
export async function buildWeb(
  { distDir, env }: StackSettings,
  { force, report }: { force: boolean; report: (line: string) => void },
): Promise<void> {
  const stamp = join(distDir, 'lotwright-sources');
  const wanted = hashOf(SOURCES);
  const isFresh = existsSync(join(distDir, 'BUILD_ID')) && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted;
  if (isFresh && !force) return;

  report('Building the web server …');
  const began = Date.now();
  await runNextBuild(env);
  writeFileSync(stamp, wanted);
  report(`Built in ${Math.round((Date.now() - began) / 1000)} s.`);
}

function runNextBuild(env: Readonly<Record<string, string>>): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [join('node_modules', 'next', 'dist', 'bin', 'next'), 'build'], {
      env: { ...process.env, ...env, NODE_ENV: 'production' },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const collect = (chunk: Buffer) => (output = (output + chunk.toString()).slice(-8000));
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.once('error', reject);
    const endBuild = () => child.kill('SIGTERM');
    process.once('exit', endBuild);
    child.once('close', (code) => {
      process.off('exit', endBuild);
      if (code === 0) resolve();
      else reject(new CannotStart(`The web server could not be built:\n${output.trim()}`));
    });
  });
}

function hashOf(paths: readonly string[]): string {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesBelow)) hash.update(file).update('\0').update(readFileSync(file)).update('\0');
  return hash.digest('hex');
}

function filesBelow(path: string): string[] {
  if (!existsSync(path) || NOT_SOURCES.includes(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesBelow(join(path, name)));
}
