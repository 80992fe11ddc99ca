// Plain JavaScript without dependencies: this runs before anything is installed.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const OLDEST_NODE = [20, 19];
const STAMP = join('node_modules', '.lotwright-lock');
// One name stands for an install that got to its end: the loader every TypeScript process here needs.
const LOADER = join('node_modules', 'tsx', 'package.json');

/** Ends the process with one sentence where going on makes no sense. */
export function preparePackages() {
  process.chdir(join(import.meta.dirname, '..', '..'));
  demandNode();

  const wanted = createHash('sha256').update(readFileSync('package-lock.json')).digest('hex');
  if (existsSync(LOADER) && installedLock() === wanted) return;
  if (existsSync(LOADER) && matchesLock()) {
    writeFileSync(STAMP, wanted);
    return;
  }

  console.log('Installing the locked packages (npm ci) …');
  const options = ['ci', '--ignore-scripts', '--no-audit', '--no-fund'];
  const { status, error } = spawnSync('npm', options, { stdio: ['ignore', 'inherit', 'inherit'] });
  if (error || status !== 0) {
    fail(
      `npm could not install the packages (${error?.message ?? `exit code ${status}`}); see its messages above.`,
    );
  }
  writeFileSync(STAMP, wanted);
}

function demandNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  const [oldestMajor, oldestMinor] = OLDEST_NODE;
  if (major > oldestMajor || (major === oldestMajor && minor >= oldestMinor)) return;
  fail(`Lotwright needs Node.js ${OLDEST_NODE.join('.')} or newer; this is ${process.versions.node}.`);
}

function installedLock() {
  return existsSync(STAMP) ? readFileSync(STAMP, 'utf8').trim() : '';
}

/** npm keeps its own account of what it installed; comparing it saves an install after `npm ci` by hand. */
function matchesLock() {
  const account = join('node_modules', '.package-lock.json');
  if (!existsSync(account)) return false;
  const installed = JSON.parse(readFileSync(account, 'utf8')).packages;
  const locked = JSON.parse(readFileSync('package-lock.json', 'utf8')).packages;
  return Object.entries(locked).every(
    ([path, entry]) => path === '' || entry.optional || installed[path]?.version === entry.version,
  );
}

function fail(sentence) {
  console.error(sentence);
  process.exit(1);
}
