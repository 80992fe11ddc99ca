import { spawn } from 'node:child_process';

export type Output = 'show' | 'show_at_end' | 'keep';

interface RunOptions {
  readonly env: Readonly<Record<string, string>>;
  /** Shown as it comes, shown whole at the end, or kept (its last part) for the case that something goes wrong. */
  readonly output: Output;
  readonly onStart?: ((pid: number) => void) | undefined;
}

interface Ended {
  readonly code: number;
  readonly output: string;
}

const running = new Set<number>();

/** Runs Node with these arguments until it is done. */
export function runToEnd(args: readonly string[], { env, output, onStart }: RunOptions): Promise<Ended> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, {
      env: { ...process.env, ...env },
      stdio: ['ignore', output === 'show' ? 'inherit' : 'pipe', output === 'show' ? 'inherit' : 'pipe'],
      // A group of its own, so that whatever it starts can be ended with it.
      detached: true,
    });
    const { pid } = child;
    if (pid !== undefined) {
      running.add(pid);
      onStart?.(pid);
    }
    let kept = '';
    const most = output === 'keep' ? 8000 : Infinity;
    for (const stream of [child.stdout, child.stderr]) {
      stream?.on('data', (chunk: Buffer) => {
        kept += chunk.toString();
        if (kept.length > most) kept = kept.slice(-most);
      });
    }
    child.once('error', (error) => resolve({ code: 1, output: error.message }));
    child.once('close', (code) => {
      if (pid !== undefined) running.delete(pid);
      if (output === 'show_at_end') process.stdout.write(kept);
      resolve({ code: code ?? 1, output: kept.trim() });
    });
  });
}

/** Ends what is still running; the promises above then resolve by themselves. */
export function endAllRuns(): void {
  for (const pid of running) {
    try {
      process.kill(-pid, 'SIGTERM');
    } catch {
      // It ended by itself in the meantime.
    }
  }
}
