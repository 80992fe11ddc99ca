import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readdirSync, realpathSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { CannotStart } from '@/db/cannot-start';

/** Views that obey the caller's row-level security came with 15. */
const OLDEST_MAJOR = 15;
const DEBIAN_FOLDER = '/usr/lib/postgresql';

export type Report = (line: string) => void;

interface Postgres {
  readonly bin: string;
  readonly major: number;
}

/** The server's programs; installs them where that is possible without asking anybody. */
export async function findOrInstallPostgres(report: Report, wantedMajor?: number): Promise<Postgres> {
  const found = findPostgres(wantedMajor);
  if (found) return found;

  const wanted = wantedMajor === undefined ? `${OLDEST_MAJOR} or newer` : String(wantedMajor);
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) {
    throw new CannotStart(
      `PostgreSQL ${wanted} is not on this machine: install its server (on Debian: sudo apt-get install postgresql), or set DATABASE_URL and DATABASE_OWNER_URL to one of your own.`,
    );
  }

  report('Installing PostgreSQL with apt-get …');
  await runApt(['update', '-qq']);
  const packageName = wantedMajor === undefined ? 'postgresql' : `postgresql-${wantedMajor}`;
  await runApt(['install', '-y', '-qq', '--no-install-recommends', packageName]);

  const installed = findPostgres(wantedMajor);
  if (!installed) {
    throw new CannotStart(
      `apt-get brought no PostgreSQL ${wanted}: install one, or set DATABASE_URL and DATABASE_OWNER_URL to one of your own.`,
    );
  }
  return installed;
}

function findPostgres(wantedMajor: number | undefined): Postgres | undefined {
  return candidates()
    .filter(({ bin }) => ['initdb', 'pg_ctl', 'postgres'].every((name) => existsSync(join(bin, name))))
    .filter(({ major }) => (wantedMajor === undefined ? major >= OLDEST_MAJOR : major === wantedMajor))
    .sort((a, b) => b.major - a.major)[0];
}

function candidates(): Postgres[] {
  const packaged = existsSync(DEBIAN_FOLDER)
    ? readdirSync(DEBIAN_FOLDER).map((version) => ({
        bin: join(DEBIAN_FOLDER, version, 'bin'),
        major: Number.parseInt(version, 10),
      }))
    : [];
  const onPath = (process.env.PATH ?? '')
    .split(delimiter)
    .filter((folder) => folder !== '' && existsSync(join(folder, 'pg_ctl')))
    // A link in /usr/local/bin leads to the folder that holds the other programs too.
    .map((folder) => dirname(realpathSync(join(folder, 'pg_ctl'))))
    .map((bin) => ({ bin, major: majorOf(bin) }));
  return [...packaged, ...onPath];
}

function majorOf(bin: string): number {
  const { stdout } = spawnSync(join(bin, 'pg_ctl'), ['--version'], { encoding: 'utf8' });
  return Number.parseInt(/(\d+)/.exec(stdout)?.[1] ?? '0', 10);
}

export function runApt(args: readonly string[]): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn('apt-get', args, {
      stdio: ['ignore', 'ignore', 'pipe'],
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    });
    let complaint = '';
    child.stderr.on('data', (chunk: Buffer) => (complaint = (complaint + chunk.toString()).slice(-600)));
    child.on('error', reject);
    child.on('close', (code) => {
      if (code === 0) resolve();
      else
        reject(
          new CannotStart(`apt-get ${args.join(' ')} failed: ${complaint.trim() || `exit code ${code}`}`),
        );
    });
  });
}
