import { existsSync } from 'node:fs';
import { relative } from 'node:path';
import { pathToFileURL } from 'node:url';
import { CannotStart } from '@/db/cannot-start';
import { type StackSettings, stackSettings } from './settings';
import { Stack } from './stack';

const SIGN_INS = 'db/seed/sign-ins.ts';
const isDev = process.argv.includes('--dev');
let isEnding = false;
const report = (line: string) => console.log(line);

async function main(): Promise<void> {
  // What is already in the environment wins over the file.
  if (existsSync('.env')) process.loadEnvFile('.env');

  let stack: Stack | undefined;
  let exitCode: number | undefined;
  const end = async (code: number) => {
    exitCode ??= code;
    await stack?.stop();
    process.exit(exitCode);
  };
  try {
    const settings = stackSettings('local', process.env, process.cwd());
    Object.assign(process.env, settings.env);
    await demandUsableEnvironment();

    stack = new Stack({
      settings,
      report,
      onDeath: (sentence) => {
        console.error(`\n${sentence}\nStopping the rest.`);
        void end(1);
      },
    });
    endOnSignals(end);
    await bringUp(stack);
    await printTable(settings);
  } catch (error) {
    // Stopped while starting: what failed then failed because of that.
    if (!isEnding) console.error(error instanceof CannotStart ? error.message : error);
    await end(1);
  }
}

async function bringUp(stack: Stack): Promise<void> {
  await stack.claim();
  const reset = process.argv.includes('--reset');
  await stack.openDatabase({ reset });
  await stack.startStandIns({ reset });
  await Promise.all([stack.loadDemo(), isDev ? Promise.resolve() : stack.build()]);
  report(isDev ? 'Starting the development server …' : 'Starting …');
  await stack.startProduct(isDev ? 'dev' : 'built');
}

/** The product parses its settings when it is loaded; loading it here names a wrong one before anything is started. */
async function demandUsableEnvironment(): Promise<void> {
  try {
    await import('@/lib/env');
  } catch (error) {
    throw new CannotStart(error instanceof Error ? error.message : String(error));
  }
}

function endOnSignals(end: (code: number) => Promise<void>): void {
  for (const [signal, code] of [
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ] as const) {
    process.on(signal, () => {
      if (isEnding) return;
      isEnding = true;
      report('\nStopping …');
      void end(code);
    });
  }
  // The terminal may be gone by the time we say goodbye.
  process.stdout.on('error', () => undefined);
  process.stderr.on('error', () => undefined);
}

async function printTable({ env, ports, runsHere, dataFolder }: StackSettings): Promise<void> {
  const rows = [
    ['Web', env['APP_URL'] ?? ''],
    ...(runsHere.mail ? [['Inbox', `http://localhost:${ports.inbox}`]] : []),
    ...(runsHere.payments ? [['Payments', `http://localhost:${ports.payments}`]] : []),
    ...(runsHere.storage ? [['Storage', `http://127.0.0.1:${ports.storage}`]] : []),
    ...(runsHere.database ? [['Database', env['DATABASE_URL'] ?? '']] : []),
    ['Logs', `${relative(process.cwd(), dataFolder)}/logs`],
  ];
  report(`\nLotwright is up.\n\n${aligned(rows)}\n`);

  const signIns = await readSignIns();
  if (signIns.length > 0 && runsHere.database) {
    const people = signIns.map(({ role, email, password, name }) => [role, email, password, name]);
    report(`${aligned([['Role', 'E-mail', 'Password', 'Name'], ...people])}\n`);
  }
  report('Ctrl-C stops everything.');
}

interface DemoSignIn {
  readonly email: string;
  readonly password: string;
  readonly role: string;
  readonly name: string;
}

async function readSignIns(): Promise<readonly DemoSignIn[]> {
  if (!existsSync(SIGN_INS)) return [];
  const loaded = (await import(pathToFileURL(SIGN_INS).href)) as { demoSignIns: readonly DemoSignIn[] };
  return loaded.demoSignIns;
}

function aligned(rows: readonly (readonly string[])[]): string {
  const widths = (rows[0] ?? []).map((_, column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows
    .map((row) => `  ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ')}`.trimEnd())
    .join('\n');
}

await main();
