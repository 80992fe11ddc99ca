import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';

import { build } from 'esbuild';

/** Bundles an entry of ours into one file, packages left outside, so that a killed process is up again in a second. */
export async function bundle(entry: string, name: string): Promise<string> {
  const outfile = `.data/test/faults/${name}.mjs`;
  await build({
    entryPoints: [entry],
    outfile,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    jsx: 'automatic',
    logLevel: 'error',
  });
  return outfile;
}

/** A process that is killed without a word, and started again. */
export class Killable {
  private child: ChildProcess | null = null;

  constructor(
    private readonly script: string,
    private readonly args: readonly string[],
    private readonly env: Readonly<Record<string, string>>,
    private readonly health: string,
  ) {}

  async start(): Promise<void> {
    this.child = spawn(process.execPath, [this.script, ...this.args], {
      env: { ...process.env, ...this.env },
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    for (const deadline = Date.now() + 30_000; Date.now() < deadline;) {
      if (
        await fetch(this.health).then(
          (response) => response.ok,
          () => false,
        )
      )
        return;
      await new Promise((resolve) => setTimeout(resolve, 25));
    }
    throw new Error(`${this.script} did not come up`);
  }

  /** SIGKILL: nothing in it gets a chance to tidy up. */
  async kill(): Promise<void> {
    const child = this.child;
    this.child = null;
    if (!child || child.exitCode !== null || child.signalCode !== null) return;
    const gone = once(child, 'exit');
    child.kill('SIGKILL');
    await gone;
  }

  /** Kills it after so many milliseconds, whatever it does then. */
  killAfter(ms: number): Promise<void> {
    return new Promise((resolve) => setTimeout(() => void this.kill().then(resolve), ms));
  }
}

/** Numbers between 0 and 1 that are the same in every run, so that a round that fails can be looked at again. */
export function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32;
  };
}
