import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';

/**
 * A process of ours that is killed without a word and started again. The next one may stand loaded beside it, to be
 * told only to begin, so that no round waits for a program to be read.
 */
export class Killable {
  private running: ChildProcess | null = null;
  private spare: ChildProcess | null = null;

  constructor(
    private readonly command: readonly string[],
    private readonly env: Readonly<Record<string, string>>,
    private readonly health: string,
  ) {}

  async start(): Promise<void> {
    this.running = this.spare ?? this.load();
    this.running.stdin?.write('begin\n');
    this.spare = null;
    await this.isUp();
  }

  /** Loads the next one beforehand. */
  prepare(): void {
    this.spare ??= this.load();
  }

  /** Waits until it answers, whoever starts it. */
  async isUp(): Promise<void> {
    for (const deadline = Date.now() + 300_000; Date.now() < deadline;) {
      if (await answers(this.health)) return;
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
    throw new Error(`${this.command.join(' ')} did not come up`);
  }

  /** The process that runs now; it stays the same as long as nobody dies. */
  get pid(): number | null {
    const { running } = this;
    return running && running.exitCode === null && running.signalCode === null ? (running.pid ?? null) : null;
  }

  /** SIGKILL: nothing in it gets a chance to tidy up. */
  async kill(): Promise<void> {
    await end(this.running);
    this.running = null;
  }

  /** Kills it after so many milliseconds, whatever it does then. */
  async killAfter(ms: number): Promise<void> {
    await new Promise((resolve) => setTimeout(resolve, ms));
    await this.kill();
  }

  /** Leaves nothing behind. */
  async close(): Promise<void> {
    await this.kill();
    await end(this.spare);
    this.spare = null;
  }

  private load(): ChildProcess {
    return spawn(process.execPath, this.command, {
      env: { ...process.env, ...this.env },
      stdio: ['pipe', 'ignore', 'inherit'],
      // A group of its own, as the parts of the product have; it ends with its input, whatever becomes of us.
      detached: true,
    });
  }
}

async function end(child: ChildProcess | null): Promise<void> {
  if (!child || child.exitCode !== null || child.signalCode !== null) return;
  const gone = once(child, 'exit');
  child.kill('SIGKILL');
  await gone;
}

const answers = (url: string): Promise<boolean> =>
  fetch(url).then(
    async (response) => {
      await response.arrayBuffer();
      return response.ok;
    },
    () => false,
  );
