import { eq, sql } from 'drizzle-orm';

import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import { aboutOf, failureWords } from './failure-words';

type FailedRow = {
  id: string;
  name: string;
  data: Record<string, unknown>;
  state: string;
  attempts: number;
  attempts_meant: number;
  queued_at: string;
  last_tried_at: string | null;
  next_at: string | null;
  error: string | null;
};

/** The queue is nobody's tenant: the function it is read through (see the migration) tells only of this shop's jobs. */
export async function listFailedJobs(ctx: Ctx) {
  authorize(ctx, 'jobs.manage');
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const { rows } = await ctx.tx.execute<FailedRow>(sql`select * from failed_jobs()`);
  const jobs = rows.map((row) => ({
    id: row.id,
    says: failureWords(row.name, row.data),
    about: aboutOf(row.data),
    isGivenUp: row.state === 'failed',
    attempts: row.attempts,
    attemptsMeant: row.attempts_meant,
    error: row.error?.slice(0, 400) ?? null,
    queuedAt: new Date(row.queued_at),
    lastTriedAt: row.last_tried_at === null ? null : new Date(row.last_tried_at),
    nextAt: row.next_at === null ? null : new Date(row.next_at),
  }));
  return { zone: shop?.zone ?? 'UTC', jobs };
}

export async function retryJob(ctx: Ctx, { jobId }: { jobId: string }) {
  authorize(ctx, 'jobs.manage');
  const { rows } = await ctx.tx.execute<{ found: boolean }>(
    sql`select retry_failed_job(${jobId}::uuid) as found`,
  );
  if (rows[0]?.found !== true) throw notFound('job');
  await recordAudit(ctx, { action: 'job.retry', entity: 'job', entityId: jobId });
  return { done: true as const };
}
