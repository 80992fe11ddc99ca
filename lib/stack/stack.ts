import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { CannotStart } from '@/db/cannot-start';
import { type Cluster, openCluster } from '@/db/cluster';
import { buildWeb } from './build';
import { loadDemoData, resetDatabase } from './demo-data';
import { type Part, standIns, type WebMode, webPart, workerPart } from './parts';
import { prepareDatabase } from './prepare-database';
import { claimRun } from './run-record';
import { endAllRuns } from './run-to-end';
import { answers, demandFreePorts, lastLines, type RunningPart, startPart } from './running-part';
import type { StackSettings } from './settings';

export interface StackOptions {
  readonly settings: StackSettings;
  readonly report: (line: string) => void;
  /** Called once, with a sentence, when a part dies that nobody asked to stop. */
  readonly onDeath: (sentence: string) => void;
}

const STAND_IN_MS = 30_000;
const BUILT_MS = 60_000;
const WATCH_MS = 1_000;
const DATABASE_AWAY_MS = 10_000;
const DEV_MS = 60_000;

/** Everything that runs together, brought up step by step and taken down in reverse. */
export class Stack {
  readonly #options: StackOptions;
  readonly #running: RunningPart[] = [];
  #claim: Awaited<ReturnType<typeof claimRun>> | undefined;
  #opening: Promise<Cluster> | undefined;
  #cluster: Cluster | undefined;
  #stopping: Promise<void> | undefined;

  constructor(options: StackOptions) {
    this.#options = options;
  }

  async claim(): Promise<void> {
    const { settings, report } = this.#options;
    this.#claim = await claimRun(settings, report);
  }

  async openDatabase({ reset }: { reset: boolean }): Promise<void> {
    const { settings, report } = this.#options;
    const ownerUrl = this.#ownerUrl();
    if (settings.runsHere.database) {
      this.#opening = openCluster({
        folder: settings.clusterFolder,
        port: settings.ports.database,
        throwAway: settings.kind === 'test',
        report,
      });
      this.#cluster = await this.#opening;
      this.#demandGoingOn();
      this.#watchDatabase(this.#cluster);
      if (reset) await resetDatabase(this.#cluster.superUrl, ownerUrl);
    }
    await prepareDatabase(ownerUrl);
  }

  async startStandIns({ reset }: { reset: boolean }): Promise<void> {
    const { settings, report } = this.#options;
    const parts = standIns(settings);
    if (settings.kind === 'test' && parts.length > 0 && (await allAnswer(parts))) {
      return report('The stand-ins for tests are already running; using them.');
    }
    if (reset) {
      for (const name of ['mail', 'storage', 'payments.json']) {
        rmSync(join(settings.dataFolder, name), { recursive: true, force: true });
      }
    }
    await Promise.all(parts.map((part) => this.#start(part, STAND_IN_MS)));
  }

  /** Into a database of our own only: its well-known passwords have no business in anybody else's. */
  async loadDemo(): Promise<void> {
    const { settings, report } = this.#options;
    if (!this.#cluster) return;
    await loadDemoData({
      superUrl: this.#cluster.superUrl,
      ownerUrl: this.#ownerUrl(),
      env: settings.env,
      report,
      onStart: this.#remember,
    });
  }

  async build(): Promise<void> {
    await buildWeb(this.#options.settings, { report: this.#options.report, onStart: this.#remember });
  }

  async startProduct(mode: WebMode): Promise<void> {
    const { settings } = this.#options;
    const timeoutMs = mode === 'dev' ? DEV_MS : BUILT_MS;
    await Promise.all(
      [workerPart(settings, mode), webPart(settings, mode)].map((part) => this.#start(part, timeoutMs)),
    );
  }

  /** Stops what this stack started and nothing else. Safe to call again. */
  stop(): Promise<void> {
    this.#stopping ??= this.#stopAll();
    return this.#stopping;
  }

  async #start(part: Part, timeoutMs: number): Promise<void> {
    const { settings, report, onDeath } = this.#options;
    const script = part.args.at(-1) ?? '';
    if (script.endsWith('.ts') && !existsSync(script))
      return report(`No ${part.name}: ${script} does not exist.`);

    await demandFreePorts(part);
    this.#demandGoingOn();
    const logFile = join(settings.dataFolder, 'logs', `${part.name}.log`);
    const running = startPart(part, { env: settings.env, logFile });
    this.#running.push(running);
    this.#remember(running.pid);
    try {
      await running.isUp(timeoutMs);
    } catch (error) {
      // While somebody is editing, a part that does not answer yet is what he is working on.
      if (!part.mayBeBroken || running.hasEnded()) throw error;
      report(error instanceof Error ? error.message : String(error));
    }

    void running.ended.then((how) => {
      if (!this.#stopping) onDeath(`${part.name} ${how}. The end of ${logFile}:\n${lastLines(logFile)}`);
    });
  }

  /** It runs apart from us, and may be restarted by hand: only one that stays away is dead. */
  #watchDatabase(cluster: Cluster): void {
    let missed = 0;
    const watch = setInterval(() => {
      missed = cluster.isRunning() ? 0 : missed + 1;
      if (missed * WATCH_MS < DATABASE_AWAY_MS || this.#stopping) return;
      clearInterval(watch);
      this.#options.onDeath(
        `The database is gone. The end of ${cluster.logFile}:\n${lastLines(cluster.logFile)}`,
      );
    }, WATCH_MS);
    watch.unref();
  }

  async #stopAll(): Promise<void> {
    endAllRuns();
    // The product first: it may still want to finish a request or a job with the services below it.
    const product = this.#running.filter(({ part }) => part.name === 'web' || part.name === 'worker');
    const services = this.#running.filter((running) => !product.includes(running));
    await Promise.all(product.map((running) => running.stop()));
    await Promise.all(services.map((running) => running.stop()));
    // Also one that is only just being started.
    const cluster = await this.#opening?.catch(() => undefined);
    await cluster?.stop();
    this.#claim?.release();
  }

  readonly #remember = (pid: number): void => this.#claim?.remember(pid);

  #demandGoingOn(): void {
    if (this.#stopping) throw new CannotStart('Stopped while starting.');
  }

  #ownerUrl(): string {
    return process.env['DATABASE_OWNER_URL'] ?? '';
  }
}

async function allAnswer(parts: readonly Part[]): Promise<boolean> {
  const up = await Promise.all(parts.map((part) => answers(part.health)));
  return up.every(Boolean);
}
