import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
  accessSync,
  chmodSync,
  constants,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { readdir } from 'node:fs/promises';
import { createServer } from 'node:net';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Client } from 'pg';
import { CannotStart } from '@/db/cannot-start';
import { findOrInstallPostgres, type Report } from '@/db/postgres-binaries';
import { isAlive, startedAt } from '@/db/process-identity';

interface ClusterOptions {
  /** Where the cluster lives. It is made there when it is not there yet. */
  readonly folder: string;
  readonly port: number;
  /** A throw-away cluster trades safety for speed and starts empty. */
  readonly throwAway: boolean;
  readonly report: Report;
}

export interface Cluster {
  readonly superUrl: string;
  /** False when another living process runs it: then `stop` leaves it alone. */
  readonly startedHere: boolean;
  readonly logFile: string;
  isRunning(): boolean;
  stop(): Promise<void>;
}

const DATABASE = 'lotwright';
const SETTINGS = ['max_connections=200', 'timezone=UTC', 'log_timezone=UTC'];
const FAST_AND_UNSAFE = ['fsync=off', 'full_page_writes=off', 'synchronous_commit=off'];

/** Makes what is missing, starts it, and sees to it that the roles and the database exist. */
export async function openCluster({ folder, port, throwAway, report }: ClusterOptions): Promise<Cluster> {
  const place = await reachablePlace(folder, report);
  const ownerFile = `${place}.owner`;
  const superUrl = `postgresql://postgres@127.0.0.1:${port}/postgres`;

  const logFile = join(place, 'server.log');
  const isRunning = () => runningServer(place) !== undefined;

  const running = runningServer(place);
  if (running && ownerIsAlive(ownerFile)) {
    if (running.port !== port) {
      throw new CannotStart(
        `The database in ${place} is already running, on port ${running.port} instead of ${port}.`,
      );
    }
    await ensureRolesAndDatabase(superUrl);
    return { superUrl, startedHere: false, logFile, isRunning, stop: () => Promise.resolve() };
  }
  // Whoever started it was killed before he could stop it.
  if (running) await stopServer(place, running.pid);
  if (throwAway) rmSync(place, { recursive: true, force: true });

  await demandFreePort(port);
  await setAsideWhatIsNotACluster(place, report);
  const made = clusterMajor(place);
  const { bin } = await findOrInstallPostgres(report, made);
  if (made === undefined) await makeCluster(bin, place);
  removeStalePid(place);

  const options = [...SETTINGS, ...(throwAway ? FAST_AND_UNSAFE : [])].map((setting) => `-c ${setting}`);
  const started = await runAsServer(join(bin, 'pg_ctl'), [
    ...['-D', place, '-w', '-t', '60', '-l', logFile],
    ...['-o', `-h 127.0.0.1 -p ${port} -k '' ${options.join(' ')}`, 'start'],
  ]);
  if (started.code !== 0) {
    throw new CannotStart(`PostgreSQL did not start in ${place}:\n${lastLines(logFile, started.output)}`);
  }
  writeFileSync(ownerFile, JSON.stringify({ pid: process.pid, startedAt: startedAt(process.pid) }));

  await ensureRolesAndDatabase(superUrl);
  return {
    superUrl,
    startedHere: true,
    logFile,
    isRunning,
    async stop() {
      await runAsServer(join(bin, 'pg_ctl'), ['-D', place, '-m', 'fast', '-w', '-t', '30', 'stop']);
      rmSync(ownerFile, { force: true });
      if (throwAway) rmSync(place, { recursive: true, force: true });
    },
  };
}

/** A database of its own name in a running cluster, owned as the real one is. */
export async function createDatabase(superUrl: string, name: string, template = 'template0'): Promise<void> {
  await asSuperuser(superUrl, (client) =>
    client.query(`create database "${name}" owner lotwright_owner template "${template}"`),
  );
}

export async function dropDatabase(superUrl: string, name: string): Promise<void> {
  await asSuperuser(superUrl, (client) => client.query(`drop database if exists "${name}" with (force)`));
}

async function ensureRolesAndDatabase(superUrl: string): Promise<void> {
  const roles = readFileSync(join(dirname(fileURLToPath(import.meta.url)), 'roles.sql'), 'utf8');
  const isThere = await asSuperuser(superUrl, async (client) => {
    await client.query(roles);
    const { rowCount } = await client.query('select from pg_database where datname = $1', [DATABASE]);
    return rowCount === 1;
  });
  if (!isThere) await createDatabase(superUrl, DATABASE);
}

async function asSuperuser<T>(superUrl: string, work: (client: Client) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: superUrl, connectionTimeoutMillis: 15_000 });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** PostgreSQL refuses to run as root, so root hands its folder to the postgres account, which must be able to get there. */
async function reachablePlace(folder: string, report: Report): Promise<string> {
  mkdirSync(dirname(folder), { recursive: true });
  if (process.getuid?.() !== 0) {
    demandOwn(folder);
    return folder;
  }

  await findOrInstallPostgres(report);
  if ((await run('id', ['postgres'])).code !== 0) {
    throw new CannotStart(
      'PostgreSQL does not run as root, and there is no account named postgres to run it as: make one, or start Lotwright as an ordinary user.',
    );
  }
  const probe = await runAsServer('test', ['-x', dirname(folder)]);
  if (probe.code === 0) return folder;

  const name = createHash('sha256').update(folder).digest('hex').slice(0, 12);
  const elsewhere = join('/var/lib/lotwright', name);
  mkdirSync('/var/lib/lotwright', { recursive: true, mode: 0o755 });
  report(
    `The postgres account may not enter ${dirname(folder)}; the database lives in ${elsewhere} instead.`,
  );
  return elsewhere;
}

function demandOwn(folder: string): void {
  if (!existsSync(folder)) return;
  try {
    accessSync(folder, constants.R_OK | constants.W_OK | constants.X_OK);
  } catch {
    throw new CannotStart(
      `${folder} belongs to another user: start Lotwright as that user, or from a copy of your own.`,
    );
  }
}

async function makeCluster(bin: string, place: string): Promise<void> {
  // The marker outlives a crash, so a cluster interrupted while being made is recognised and made anew.
  writeFileSync(incompleteMarker(place), '');
  rmSync(place, { recursive: true, force: true });
  mkdirSync(place, { recursive: true, mode: 0o700 });
  chmodSync(place, 0o700);
  if (process.getuid?.() === 0) await run('chown', ['postgres:postgres', place]);

  const options = ['-U', 'postgres', '-A', 'trust', '-E', 'UTF8', '--locale=C.UTF-8'];
  const made = await runAsServer(join(bin, 'initdb'), ['-D', place, ...options]);
  if (made.code !== 0)
    throw new CannotStart(`PostgreSQL could not make a cluster in ${place}:\n${made.output}`);
  rmSync(incompleteMarker(place));
}

const incompleteMarker = (place: string) => `${place}.incomplete`;

/** Never deletes what it did not half-make itself: anything unknown is moved to one side. */
async function setAsideWhatIsNotACluster(place: string, report: Report): Promise<void> {
  if (existsSync(incompleteMarker(place))) {
    report('The database was interrupted while being made; making it anew.');
    rmSync(place, { recursive: true, force: true });
    return;
  }
  if (!existsSync(place) || (await readdir(place)).length === 0) return;
  if (existsSync(join(place, 'PG_VERSION')) && existsSync(join(place, 'global', 'pg_control'))) return;

  const aside = `${place}.broken-${Date.now()}`;
  renameSync(place, aside);
  report(`${place} was not a whole database cluster. It is kept as ${aside}; making a new one.`);
}

function clusterMajor(place: string): number | undefined {
  const file = join(place, 'PG_VERSION');
  return existsSync(file) ? Number.parseInt(readFileSync(file, 'utf8'), 10) : undefined;
}

interface RunningServer {
  readonly pid: number;
  readonly port: number;
}

function runningServer(place: string): RunningServer | undefined {
  const file = join(place, 'postmaster.pid');
  if (!existsSync(file)) return undefined;
  const [pid = 0, , , port = 0] = readFileSync(file, 'utf8').split('\n').map(Number);
  return isAlive(pid, { command: /postgres/, workingFolder: place }) ? { pid, port } : undefined;
}

/** After a crash the number in the file may belong to some other program, and PostgreSQL would wait for it for ever. */
function removeStalePid(place: string): void {
  if (!runningServer(place)) rmSync(join(place, 'postmaster.pid'), { force: true });
}

function ownerIsAlive(ownerFile: string): boolean {
  if (!existsSync(ownerFile)) return false;
  try {
    const owner = JSON.parse(readFileSync(ownerFile, 'utf8')) as { pid: number; startedAt: string | null };
    return isAlive(owner.pid) && startedAt(owner.pid) === owner.startedAt;
  } catch {
    // Half written: its writer was killed.
    return false;
  }
}

async function stopServer(place: string, pid: number): Promise<void> {
  process.kill(pid, 'SIGINT');
  for (let waited = 0; waited < 30_000; waited += 100) {
    if (!runningServer(place)) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new CannotStart(`The database left running in ${place} (process ${pid}) does not stop.`);
}

function demandFreePort(port: number): Promise<void> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', () =>
      reject(new CannotStart(`Port ${port} is taken by another program, and the database needs it.`)),
    );
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve()));
  });
}

interface Finished {
  readonly code: number;
  readonly output: string;
}

function runAsServer(command: string, args: readonly string[]): Promise<Finished> {
  if (process.getuid?.() !== 0) return run(command, args);
  // A clean environment: root's own must not leak into a server that runs as somebody else.
  const clean = ['env', '-i', `PATH=${process.env.PATH ?? '/usr/bin:/bin'}`, 'HOME=/tmp', 'LANG=C.UTF-8'];
  const account = ['--reuid=postgres', '--regid=postgres', '--init-groups'];
  return run('setpriv', [...account, ...clean, command, ...args]);
}

function run(command: string, args: readonly string[]): Promise<Finished> {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: '/', stdio: ['ignore', 'pipe', 'pipe'] });
    let output = '';
    const collect = (chunk: Buffer) => (output = (output + chunk.toString()).slice(-4000));
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.on('error', (error) => resolve({ code: 127, output: error.message }));
    // `exit`, not `close`: the server inherits the pipes and keeps them open for as long as it runs.
    child.on('exit', (code) => resolve({ code: code ?? 1, output }));
  });
}

function lastLines(file: string, otherwise: string): string {
  if (!existsSync(file)) return otherwise;
  return readFileSync(file, 'utf8').trim().split('\n').slice(-8).join('\n');
}
