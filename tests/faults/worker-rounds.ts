import { sql } from 'drizzle-orm';
import { expect, vi } from 'vitest';

import { queueOf } from '../services/run-jobs';
import { BEYOND_THE_END, FEWEST_HITS, median, ROUNDS, seeded, UNDISTURBED } from './rounds';
import { count, type Setting } from './setting';

const PATIENCE = { timeout: 300_000, interval: 10 };

type AtQueue = Pick<Setting, 'owner' | 'workers'>;

interface Given {
  /** Full of jobs; the kills fall into its jobs, and into whatever else the worker does then. */
  queue: string;
  seed: number;
  /** What else happens while the worker of a round is at work. */
  meanwhile?: (round: number) => Promise<void>;
}

/**
 * Starts the worker, kills it at a random point of the first job it takes, lets the time pass after which the queue
 * misses that job, and so on. What is left after the last round is left in the queue.
 */
export async function killWorkerInRounds(setting: AtQueue, { queue, seed, meanwhile }: Given): Promise<void> {
  const [worker] = setting.workers;
  const random = seeded(seed);
  const undisturbed: number[] = [];
  for (let number = 1; number <= UNDISTURBED; number++) {
    const job = await startOnAJob(setting, queue);
    const began = performance.now();
    await vi.waitFor(async () => expect(await isInHand(setting, job)).toBe(false), PATIENCE);
    undisturbed.push(performance.now() - began);
    await worker.kill();
    await missWhatWasInHand(setting);
  }
  let hits = 0;
  for (let number = 1; number <= ROUNDS; number++) {
    const job = await startOnAJob(setting, queue);
    const killed = worker.killAfter(random() * median(undisturbed) * BEYOND_THE_END);
    await Promise.all([killed, meanwhile?.(number)]);
    if (await isInHand(setting, job)) hits++;
    await missWhatWasInHand(setting);
  }
  expect(hits, `kills in the middle of ${queue}, of ${ROUNDS}`).toBeGreaterThanOrEqual(FEWEST_HITS);
}

/** Several workers work off all that is left, without waiting out the pauses between the tries. */
export async function workOff(setting: AtQueue, until: () => Promise<void>): Promise<void> {
  await Promise.all(setting.workers.map((worker) => worker.start()));
  await vi.waitFor(
    async () => {
      await bringForward(setting);
      expect(await count(setting, sql`${WAITING} or (state = 'active' and name not like '\\_\\_%')`)).toBe(0);
      await until();
    },
    { ...PATIENCE, interval: 500 },
  );
  await Promise.all(setting.workers.map((worker) => worker.kill()));
  const given = sql`select from pgboss.job where state in ('failed', 'cancelled') and name <> ${NOTHING_TO_READ}`;
  expect(await count(setting, given)).toBe(0);
}

/** The papers of the factories are rows without bytes in storage: reading them is given up, as it should be. */
const NOTHING_TO_READ = 'read-document';

/** Queued for later is not waiting: a look at a payment in some minutes, the queue's own upkeep. */
const WAITING = sql`select * from pgboss.job where state = 'retry' or (state = 'created' and start_after <= now())`;

async function startOnAJob(setting: AtQueue, queue: string): Promise<string> {
  const due = sql`select from (${WAITING}) waiting where name = ${queue} and start_after <= now()`;
  if ((await count(setting, due)) === 0) await bringForward(setting);
  expect(await count(setting, due), `jobs of ${queue}`).toBeGreaterThan(0);
  await setting.workers[0].start();
  setting.workers[0].prepare();
  return vi.waitFor(async () => {
    const { rows } = await setting.owner.execute<{ id: string }>(
      sql`select id from pgboss.job where name = ${queue} and state = 'active'`,
    );
    const [job] = rows;
    if (!job) throw new Error(`the worker took nothing of ${queue}`);
    return job.id;
  }, PATIENCE);
}

const isInHand = async (setting: AtQueue, job: string): Promise<boolean> =>
  (await count(setting, sql`select from pgboss.job where id = ${job} and state = 'active'`)) > 0;

/** The queue's own upkeep finds what a dead worker had in hand, ten minutes after it was taken: they pass here. */
export async function missWhatWasInHand({ owner }: Pick<Setting, 'owner'>): Promise<void> {
  await owner.execute(
    sql`update pgboss.job set started_on = started_on - interval '11 minutes' where state = 'active'`,
  );
  await queueOf(owner).expire();
}

const bringForward = ({ owner }: AtQueue) =>
  owner.execute(sql`update pgboss.job set start_after = now() where state = 'retry'`);
