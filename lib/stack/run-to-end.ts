import { spawn } from 'node:child_process';

interface RunOptions {
  readonly env: Readonly<Record<string, string>>;
  /** Shown as it comes, or kept for the case that something goes wrong. */
  readonly output: 'show' | 'keep';
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
    for (const stream of [child.stdout, child.stderr]) {
      stream?.on('data', (chunk: Buffer) => (kept = (kept + chunk.toString()).slice(-8000)));
    }
    child.once('error', (error) => resolve({ code: 1, output: error.message }));
    child.once('close', (code) => {
      if (pid !== undefined) running.delete(pid);
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
