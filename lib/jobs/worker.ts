import { createServer } from 'node:http';
import PgBoss from 'pg-boss';
import { z } from 'zod';

import { connect, withTenant, type Db, type Tenant } from '@/db/client';
import type { Ctx } from '@/lib/auth/context';
import { env } from '@/lib/env';
import { newId } from '@/lib/ids';
import { log } from '@/lib/log';

import { ALL_JOBS } from './all-jobs';
import type { Job, JobTools } from './job';
import { patientConnection } from './patient-connection';
import { QUEUES } from './queues';

/** The worker process: runs queued jobs until it is told to stop, then finishes the ones in hand. */
async function main(): Promise<void> {
  const { db, pool } = connect(env.DATABASE_URL, 10);
  const queue = patientConnection(env.DATABASE_URL, 6);
  const boss = new PgBoss({
    db: queue,
    schema: 'pgboss',
    migrate: false,
    archiveFailedAfterSeconds: 90 * 24 * 3600,
  });
  boss.on('error', (error) => log.error({ error }, 'queue'));
  await boss.start();
  for (const job of ALL_JOBS) await listen(boss, db, job);

  const health = createServer((_, response) => response.end('ok')).listen(env.WORKER_PORT, '127.0.0.1');
  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    health.close();
    await boss.stop({ graceful: true, timeout: 6000, close: true });
    await Promise.all([queue.close(), pool.end()]);
    process.exit(0);
  };
  process.on('SIGTERM', () => void stop());
  process.on('SIGINT', () => void stop());
  log.info({ jobs: ALL_JOBS.map((job) => job.name) }, 'worker ready');
}

async function listen(boss: PgBoss, db: Db, job: Job): Promise<void> {
  for (let lane = 0; lane < job.concurrency; lane++) {
    await boss.work<unknown>(
      job.name,
      { pollingIntervalSeconds: 1, batchSize: 1, includeMetadata: true },
      async (taken) => {
        for (const one of taken)
          await runJob(db, job, {
            data: one.data,
            attempt: one.retryCount + 1,
            id: one.id,
            gaveUp: saidLast(one.output),
          });
      },
    );
  }
}

/** Of a job that was given up: an error of its own, or what the queue says of one whose worker died. */
export function saidLast(output: unknown): string | null {
  const said = LastWords.safeParse(output);
  return said.success ? (said.data.message ?? said.data.value?.message ?? null) : null;
}

const LastWords = z.object({
  message: z.string().optional(),
  value: z.object({ message: z.string() }).optional(),
});

/** Runs one job as the worker does; tests call it through `runJobs`. */
export async function runJob(
  db: Db,
  job: Job,
  { data, attempt, id: jobId, gaveUp }: Pick<JobTools, 'attempt' | 'gaveUp'> & { data: unknown; id: string },
): Promise<void> {
  const within = <T>(tenant: Tenant, work: (ctx: Ctx) => Promise<T>): Promise<T> =>
    withTenant(db, tenant, (tx) =>
      work({
        tenant,
        actor: { kind: 'job', name: job.name, roles: [] },
        tx,
        now: new Date(),
        requestId: jobId || newId(),
        address: null,
      }),
    );
  const tools: JobTools = {
    attempt,
    gaveUp,
    now: () => new Date(),
    inShop: (shopId, work) => within({ kind: 'shop', shopId, personId: null }, work),
    atDoor: (work) => within({ kind: 'door' }, work),
  };
  try {
    await job.run(tools, job.payload.parse(data));
    log.info({ job: job.name, jobId, attempt }, 'done');
  } catch (error) {
    const last = attempt > (QUEUES.find((queue) => queue.name === job.name)?.retries ?? 0);
    log.warn({ job: job.name, jobId, attempt, error }, last ? 'given up' : 'to be tried again');
    throw error;
  }
}

if (process.argv[1] === import.meta.filename) await main();
