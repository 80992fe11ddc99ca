import { existsSync, mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { type Output, runToEnd } from './run-to-end';
import { type Tally, tallyPlaywright, tallyVitest } from './tally';

type Env = Readonly<Record<string, string>>;

export interface Phase {
  readonly name: string;
  /** How much of the stack must stand before it can run. */
  readonly needs: 'nothing' | 'database' | 'stack';
  /** Phases of one lane run one after another, the lanes side by side; what `behind` finds is shown at its end. */
  readonly lane: 'front' | 'behind';
  run(env: Env, output: Output): Promise<Tally>;
}

const FEWEST_MODULES = 100;
const RESULTS = 'test-results';
const bin = (...path: string[]) => join('node_modules', ...path);

const NEXT = bin('next', 'dist', 'bin', 'next');
const VITEST = bin('vitest', 'vitest.mjs');

/** In the order in which they run in their lane: what is cheap and says most first. */
export const PHASES: readonly Phase[] = [
  {
    name: 'types',
    needs: 'nothing',
    lane: 'front',
    async run(env, output) {
      // The types of the routes are generated; without them every page has an unknown `PageProps`.
      const generated = await runNode([NEXT, 'typegen'], env, output);
      return check(
        generated === 0
          ? await runNode([bin('typescript', 'bin', 'tsc'), '--noEmit'], env, output)
          : generated,
      );
    },
  },
  {
    name: 'lint',
    needs: 'nothing',
    lane: 'front',
    run: async (env, output) =>
      check(await runNode([bin('eslint', 'bin', 'eslint.js'), '.', '--max-warnings', '0'], env, output)),
  },
  {
    name: 'boundaries',
    needs: 'nothing',
    lane: 'front',
    async run(env) {
      const folders = ['app', 'components', 'emails', 'lib', 'db', 'fakes'].filter((folder) =>
        existsSync(folder),
      );
      const cruiser = bin('dependency-cruiser', 'bin', 'dependency-cruise.mjs');
      const args = [cruiser, '--config', '.dependency-cruiser.cjs', ...folders];
      const { code, output } = await runToEnd(args, { env, output: 'keep' });
      console.log(output);
      // With a compiler it does not know it looks at nothing, and finds nothing wrong.
      const seen = Number(/\((\d+) modules/.exec(output)?.[1] ?? 0);
      return check(code !== 0 || seen > FEWEST_MODULES ? code : 1);
    },
  },
  {
    name: 'unused',
    needs: 'nothing',
    lane: 'front',
    run: async (env, output) => check(await runNode([bin('knip', 'bin', 'knip.js')], env, output)),
  },
  vitest('unit', { needs: 'nothing', lane: 'front' }),
  { name: 'e2e', needs: 'stack', lane: 'front', run: runPlaywright },
  vitest('services', { needs: 'database', lane: 'behind' }),
  vitest('faults', { needs: 'database', lane: 'behind' }),
];

function vitest(name: string, where: Pick<Phase, 'needs' | 'lane'>): Phase {
  return { name, ...where, run: (env, output) => runVitest(name, env, output) };
}

async function runVitest(project: string, env: Env, output: Output): Promise<Tally> {
  const file = freshReport(project);
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
  const quiet = { ...env, LOG_LEVEL: 'silent', VITE_CONFIG_NATIVE_IGNORE_WARNING: 'true' };
  const code = await runNode([VITEST, 'run', '--project', project, ...reporters], quiet, output);
  return tallyVitest(file, code);
}

async function runPlaywright(env: Env, output: Output): Promise<Tally> {
  const file = freshReport('e2e');
  const code = await runNode([bin('@playwright', 'test', 'cli.js'), 'test'], env, output);
  return tallyPlaywright(file, code);
}

/** A report left over from an earlier run must not be counted for this one. */
function freshReport(name: string): string {
  mkdirSync(RESULTS, { recursive: true });
  const file = join(RESULTS, `${name}.json`);
  rmSync(file, { force: true });
  return file;
}

const check = (exitCode: number): Tally =>
  exitCode === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };

async function runNode(args: readonly string[], env: Env, output: Output): Promise<number> {
  const { code } = await runToEnd(args, { env, output });
  return code;
}
