import { type ChildProcess, spawn } from 'node:child_process';
import { createWriteStream, existsSync, mkdirSync, readFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname } from 'node:path';
import { CannotStart } from '@/db/cannot-start';
import type { Part } from './parts';

const GRACE_MS = 8_000;

export interface RunningPart {
  readonly part: Part;
  readonly pid: number;
  readonly logFile: string;
  /** Resolves when the process ends, whoever ended it. */
  readonly ended: Promise<string>;
  hasEnded(): boolean;
  /** Resolves when it answers; rejects when it ends before or takes too long. */
  isUp(timeoutMs: number): Promise<void>;
  stop(): Promise<void>;
}

export function startPart(
  part: Part,
  { env, logFile }: { env: Readonly<Record<string, string>>; logFile: string },
): RunningPart {
  mkdirSync(dirname(logFile), { recursive: true });
  const log = createWriteStream(logFile, { flags: 'w' });
  const child = spawn(process.execPath, part.args, {
    env: { ...process.env, ...env, ...part.env },
    stdio: ['ignore', 'pipe', 'pipe'],
    // A group of its own: Ctrl-C reaches only us, and we end the parts in order, with the children they started.
    detached: true,
  });
  for (const stream of [child.stdout, child.stderr]) {
    stream.pipe(log, { end: false });
    if (part.showOutput) stream.on('data', (chunk: Buffer) => process.stdout.write(chunk));
  }

  let hasEnded = false;
  const ended = new Promise<string>((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (code, signal) =>
      resolve(signal ? `ended by ${signal}` : `ended with code ${code ?? '?'}`),
    );
  }).then((how) => {
    hasEnded = true;
    return how;
  });

  return {
    part,
    pid: child.pid ?? 0,
    logFile,
    ended,
    hasEnded: () => hasEnded,
    isUp: (timeoutMs) => waitUntilUp(part, { timeoutMs, ended, logFile }),
    async stop() {
      if (hasEnded) return;
      signalGroup(child, 'SIGTERM');
      if ((await Promise.race([ended, afterMs(GRACE_MS)])) === undefined) signalGroup(child, 'SIGKILL');
      await ended;
    },
  };
}

export async function demandFreePorts(part: Part): Promise<void> {
  for (const port of part.ports) {
    if (!(await isFree(port))) {
      throw new CannotStart(`Port ${port} is taken by another program, and ${part.name} needs it.`);
    }
  }
}

export function lastLines(logFile: string, count = 20): string {
  if (!existsSync(logFile)) return '(it wrote nothing)';
  return readFileSync(logFile, 'utf8').trimEnd().split('\n').slice(-count).join('\n');
}

function waitUntilUp(
  part: Part,
  { timeoutMs, ended, logFile }: { timeoutMs: number; ended: Promise<string>; logFile: string },
): Promise<void> {
  const giveUpAt = Date.now() + timeoutMs;
  let death: string | undefined;
  void ended.then((how) => (death = how));

  return new Promise((resolve, reject) => {
    const attempt = async () => {
      if (death !== undefined) {
        return reject(
          new CannotStart(
            `${part.name} ${death} before it was up. The end of ${logFile}:\n${lastLines(logFile)}`,
          ),
        );
      }
      if (await answers(part.health)) return resolve();
      if (Date.now() > giveUpAt) {
        return reject(
          new CannotStart(
            `${part.name} does not answer at ${part.health} after ${timeoutMs / 1000} s. The end of ${logFile}:\n${lastLines(logFile)}`,
          ),
        );
      }
      setTimeout(() => void attempt(), 100);
    };
    void attempt();
  });
}

export async function answers(url: string): Promise<boolean> {
  try {
    // A development server compiles on the first request, which takes longer than any later one.
    const response = await fetch(url, { signal: AbortSignal.timeout(60_000) });
    await response.arrayBuffer();
    return response.ok;
  } catch {
    return false;
  }
}

function isFree(port: number): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)));
  });
}

function signalGroup(child: ChildProcess, signal: NodeJS.Signals): void {
  if (child.pid === undefined) return;
  try {
    process.kill(-child.pid, signal);
  } catch {
    // Gone in the meantime, which is what was wanted.
  }
}

const afterMs = (ms: number) =>
  new Promise<undefined>((resolve) => {
    setTimeout(() => resolve(undefined), ms).unref();
  });
