import type pg from 'pg';
import PgBoss from 'pg-boss';

import type { Db } from '@/db/client';
import type { Job } from '@/lib/jobs/job';
import { runJob, saidLast } from '@/lib/jobs/worker';

interface Ran {
  id: string;
  data: Record<string, unknown>;
  error: Error | null;
}

/**
 * Works off what waits now in the queue of one job, as the worker does: taken, run, and marked done or to be tried
 * again. Jobs that wait for their next try are left alone.
 */
export async function runJobs(base: { db: Db; owner: Db }, job: Job): Promise<Ran[]> {
  const boss = queueOf(base.owner);
  const ran: Ran[] = [];
  for (;;) {
    const [taken] = await boss.fetch<Record<string, unknown>>(job.name, {
      batchSize: 1,
      includeMetadata: true,
    });
    if (!taken) return ran;
    const error = await runJob(base.db, job, {
      data: taken.data,
      attempt: taken.retryCount + 1,
      id: taken.id,
      gaveUp: saidLast(taken.output),
    }).then(
      () => null,
      (reason: unknown) => (reason instanceof Error ? reason : new Error(String(reason))),
    );
    if (error) await boss.fail(job.name, taken.id, error);
    else await boss.complete(job.name, taken.id);
    ran.push({ id: taken.id, data: taken.data, error });
  }
}

/** Never started: it only words the statements, which go over the owner's own connections. */
export function queueOf(owner: Db): PgBoss {
  const pool = (owner as Db & { $client: pg.Pool }).$client;
  return new PgBoss({
    schema: 'pgboss',
    migrate: false,
    db: { executeSql: (text: string, values: unknown[]) => pool.query(text, values) },
  });
}
