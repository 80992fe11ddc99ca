import { fork, type ChildProcess } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { resolve } from 'node:path';

import type { ReadingAnswer, ReadingRequest } from './reading-request';

export interface ReadingLimits {
  milliseconds: number;
  /** Of the whole process, pictures and recognition included. */
  bytes: number;
}

export const USUAL_READING_LIMITS: ReadingLimits = { milliseconds: 300_000, bytes: 1.5 * 1024 ** 3 };

const LOOK_EVERY_MS = 500;
const TYPESCRIPT = ['--import', 'tsx'];

type Outcome = { content: unknown; pages: unknown } | { fault: { code: string; message: string } };

/** The process that reads files, started when one is to be read and kept for the next. One file at a time. */
export class ReadingChild {
  private child: ChildProcess | null = null;
  private last = 0;

  constructor(private readonly limits: ReadingLimits = USUAL_READING_LIMITS) {}

  /**
   * Reads one file.
   *
   * @returns what was read, or why it cannot be read: too slow and too large are told of like any other fault.
   * @throws where something of ours went wrong; the file may be read again.
   */
  async read(file: Omit<ReadingRequest, 'id'>): Promise<Outcome> {
    // It may have died of itself since the last file.
    const child = this.child?.connected ? this.child : this.start();
    const id = ++this.last;
    const ended = new AbortController();
    try {
      const answer = await Promise.race([
        answerOf(child, { ...file, id }),
        this.tooSlow(ended.signal),
        this.tooLarge(child, ended.signal),
      ]);
      if ('error' in answer) throw new Error(answer.error);
      return answer;
    } finally {
      ended.abort();
      if (child.exitCode !== null || child.signalCode !== null || !child.connected) this.child = null;
    }
  }

  close(): void {
    this.child?.kill('SIGKILL');
    this.child = null;
  }

  private start(): ChildProcess {
    const child = fork(resolve('lib/readings/reading-process.ts'), {
      execArgv: [...TYPESCRIPT, '--max-old-space-size=1024'],
      serialization: 'advanced',
      stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
    });
    this.child = child;
    return child;
  }

  private async tooSlow(signal: AbortSignal): Promise<Outcome> {
    await pause(this.limits.milliseconds, signal);
    this.close();
    const minutes = Math.round(this.limits.milliseconds / 60_000);
    return {
      fault: {
        code: 'took_too_long',
        message: `Reading this file took longer than ${minutes} min and was ended. Read it by eye.`,
      },
    };
  }

  private async tooLarge(child: ChildProcess, signal: AbortSignal): Promise<Outcome> {
    for (;;) {
      await pause(LOOK_EVERY_MS, signal);
      const bytes = await bytesOf(child.pid);
      // While it was looked at, the file may have been read to its end; the process is the next one's then.
      if (bytes > this.limits.bytes && !signal.aborted) break;
    }
    this.close();
    return {
      fault: {
        code: 'too_large',
        message: 'This file needs more memory than reading may take, and was not read. Read it by eye.',
      },
    };
  }
}

function answerOf(child: ChildProcess, request: ReadingRequest): Promise<ReadingAnswer> {
  return new Promise((settle, fail) => {
    const onMessage = (answer: ReadingAnswer) => {
      if (answer.id !== request.id) return;
      child.off('exit', onExit);
      child.off('message', onMessage);
      settle(answer);
    };
    const onExit = () => {
      child.off('message', onMessage);
      settle({
        id: request.id,
        fault: {
          code: 'damaged',
          message: 'This file broke the reading off. Read it by eye, or ask for it again.',
        },
      });
    };
    child.on('message', onMessage);
    child.once('exit', onExit);
    child.send(request, (error) => {
      if (error) fail(error);
    });
  });
}

/** Never comes back once `signal` ended. */
function pause(milliseconds: number, signal: AbortSignal): Promise<void> {
  return new Promise((settle) => {
    if (signal.aborted) return;
    const stop = () => clearTimeout(timer);
    const timer = setTimeout(() => {
      signal.removeEventListener('abort', stop);
      settle();
    }, milliseconds);
    signal.addEventListener('abort', stop, { once: true });
  });
}

/** Resident memory of a process, where the system tells. */
async function bytesOf(pid: number | undefined): Promise<number> {
  try {
    const status = await readFile(`/proc/${pid}/status`, 'utf8');
    return Number(/VmRSS:\s+(\d+) kB/.exec(status)?.[1] ?? 0) * 1024;
  } catch {
    return 0;
  }
}
