import { CannotStart } from '@/db/cannot-start';
import { runApt } from '@/db/postgres-binaries';
import { findChromium } from './chromium';
import type { Output } from './run-to-end';
import { stackSettings } from './settings';
import { Stack } from './stack';
import { sum, type Tally } from './tally';
import { type Phase, PHASES } from './test-phases';

const report = (line: string) => console.log(line);
/** Named ones only, or all of them: `npm test -- unit services`. */
const wanted = process.argv.slice(2);

async function main(): Promise<void> {
  const unknown = wanted.filter((name) => !PHASES.some((phase) => phase.name === name));
  if (unknown.length > 0) {
    console.error(
      `There is no ${unknown.join(', ')}; there are ${PHASES.map(({ name }) => name).join(', ')}.`,
    );
    process.exit(1);
  }
  const phases = PHASES.filter(({ name }) => wanted.length === 0 || wanted.includes(name));

  let death: string | undefined;
  const settings = stackSettings('test', process.env, process.cwd());
  Object.assign(process.env, settings.env);
  const stack = new Stack({
    settings,
    report,
    onDeath: (sentence) => {
      death ??= sentence;
      console.error(`\n${sentence}`);
    },
  });
  endOnSignals(stack);

  const began = Date.now();
  const lane = (name: Phase['lane']) => phases.filter((phase) => phase.lane === name);
  const [front, behind] = [lane('front'), lane('behind')];
  const lanes = await Promise.all([
    runLane(front, { stack, env: settings.env, output: 'show' }),
    runLane(behind, { stack, env: settings.env, output: front.length === 0 ? 'show' : 'show_at_end' }),
  ]);
  const tallies = lanes.flat();
  await stack.stop();
  if (death !== undefined) tallies.push(['a part of the stack died', { passed: 0, failed: 1 }]);

  const total = sum(tallies.map(([, tally]) => tally));
  report(`\n── all, ${seconds(began)} s ${'─'.repeat(50)}`);
  for (const [name, { passed, failed }] of tallies) {
    report(`  ${name.padEnd(12)} ${String(passed).padStart(5)} passed ${String(failed).padStart(5)} failed`);
  }
  // The last line, read by machines.
  report(`${total.passed} passed, ${total.failed} failed`);
  process.exit(total.failed === 0 ? 0 : 1);
}

interface Run {
  readonly stack: Stack;
  readonly env: Readonly<Record<string, string>>;
  readonly output: Output;
}

async function runLane(phases: readonly Phase[], run: Run): Promise<[string, Tally][]> {
  const tallies: [string, Tally][] = [];
  for (const phase of phases) {
    const began = Date.now();
    report(`\n── ${phase.name} ${'─'.repeat(Math.max(0, 60 - phase.name.length))}`);
    const tally = await runPhase(phase, run);
    tallies.push([phase.name, tally]);
    report(`${phase.name}: ${tally.passed} passed, ${tally.failed} failed, ${seconds(began)} s`);
  }
  return tallies;
}

/** Whatever goes wrong on the way to a phase is a failure of that phase; the others still run. */
async function runPhase(phase: Phase, { stack, env, output }: Run): Promise<Tally> {
  try {
    if (phase.needs !== 'nothing') await once('database', () => openDatabase(stack));
    if (phase.needs === 'stack') await once('stack', () => openProduct(stack));
    return await phase.run(env, output);
  } catch (error) {
    console.error(error instanceof CannotStart ? error.message : error);
    return { passed: 0, failed: 1 };
  }
}

const done = new Map<string, Promise<void>>();

function once(step: string, work: () => Promise<void>): Promise<void> {
  const begun = done.get(step) ?? work();
  done.set(step, begun);
  return begun;
}

async function openDatabase(stack: Stack): Promise<void> {
  await stack.claim();
  await stack.openDatabase({ reset: true });
  await stack.startStandIns({ reset: true });
}

async function openProduct(stack: Stack): Promise<void> {
  await installChromium();
  await stack.loadDemo();
  await stack.build();
  await stack.startProduct('built');
}

async function installChromium(): Promise<void> {
  if (findChromium() !== undefined || process.env['CHROMIUM_PATH'] !== undefined) return;
  if (process.getuid?.() !== 0) {
    throw new CannotStart(
      'Chromium is not on this machine: install it (on Debian: sudo apt-get install chromium).',
    );
  }
  report('Installing Chromium with apt-get …');
  await runApt(['update', '-qq']);
  await runApt(['install', '-y', '-qq', '--no-install-recommends', 'chromium']);
}

function endOnSignals(stack: Stack): void {
  let isEnding = false;
  for (const [signal, code] of [
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ] as const) {
    process.on(signal, () => {
      if (isEnding) return;
      isEnding = true;
      report('\nStopping …');
      void stack.stop().then(() => process.exit(code));
    });
  }
}

const seconds = (since: number) => Math.round((Date.now() - since) / 1000);

await main();
