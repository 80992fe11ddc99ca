import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { newId } from '@/lib/ids';
import { sendMailJob } from '@/lib/jobs/definitions/send-mail';
import { listFailedJobs, retryJob } from '@/lib/jobs/failed-jobs';
import { enqueue } from '@/lib/jobs/queue';
import { sendMailQueue } from '@/lib/mail/queued-mail';

import { lastAudit } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';

const base = openDatabase();

/** A mail whose props cannot be rendered: it fails with each try. */
async function failOnce(world: World): Promise<void> {
  await world.as(['lead'], (ctx) =>
    enqueue(ctx, sendMailQueue, {
      shopId: world.shopId,
      mailId: newId(),
      template: 'dispatch',
      to: ['desk@processor.test'],
      replyTo: null,
      props: { secretLink: 'https://do-not-show.test' },
    }),
  );
  await runJobs(base, sendMailJob);
}

const list = (world: World) => world.as(['admin'], (ctx) => listFailedJobs(ctx));
const giveUp = () => base.owner.execute(sql`update pgboss.job set retry_limit = 0 where state = 'retry'`);
const makeDue = () =>
  base.owner.execute(
    sql`update pgboss.job set start_after = now() - interval '1 second' where state = 'retry'`,
  );

test('what failed once stands there with its error, its try and when it is tried next', async () => {
  const world = await makeWorld(base.db, base.owner);
  await failOnce(world);
  const { jobs } = await list(world);
  expect(jobs).toHaveLength(1);
  expect(jobs[0]).toMatchObject({
    says: 'The mail “dispatch” to desk@processor.test did not leave.',
    isGivenUp: false,
    attempts: 1,
    attemptsMeant: 15,
  });
  expect(jobs[0]?.nextAt?.getTime()).toBeGreaterThan(jobs[0]?.queuedAt.getTime() ?? 0);
  expect(jobs[0]?.error).not.toBeNull();
  expect(JSON.stringify(jobs)).not.toContain('do-not-show');
});

test('what was given up is tried once more when an admin says so, and is recorded', async () => {
  const world = await makeWorld(base.db, base.owner);
  await failOnce(world);
  await giveUp();
  await makeDue();
  await runJobs(base, sendMailJob);
  const [job] = (await list(world)).jobs;
  expect(job).toMatchObject({ isGivenUp: true, attempts: 2, nextAt: null });

  await world.as(['admin'], (ctx) => retryJob(ctx, { jobId: job?.id ?? '' }));
  expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'job.retry'))).toMatchObject({
    entityId: job?.id,
  });
  const ran = await runJobs(base, sendMailJob);
  expect(ran.map((one) => one.id)).toEqual([job?.id]);
  expect((await list(world)).jobs).toMatchObject([{ isGivenUp: true, attempts: 3 }]);
});

test('another shop sees nothing of it and cannot try it again', async () => {
  const [one, two] = [await makeWorld(base.db, base.owner), await makeWorld(base.db, base.owner)];
  await failOnce(one);
  const [job] = (await list(one)).jobs;
  expect((await list(two)).jobs).toEqual([]);
  await expect(two.as(['admin'], (ctx) => retryJob(ctx, { jobId: job?.id ?? '' }))).rejects.toMatchObject({
    code: 'not_found',
  });
});

test('only an admin looks at it', async () => {
  const world = await makeWorld(base.db, base.owner);
  await expect(
    world.as(['lead', 'inspector', 'office', 'auditor'], (ctx) => listFailedJobs(ctx)),
  ).rejects.toMatchObject({ code: 'not_allowed' });
});

test('the shop’s role may add to the queue and read nothing of it but through that door', async () => {
  const world = await makeWorld(base.db, base.owner);
  for (const statement of [
    sql`select data from pgboss.job`,
    sql`delete from pgboss.job`,
    sql`update pgboss.job set state = 'cancelled'`,
    sql`select * from pgboss.archive`,
  ]) {
    await expect(world.as(['admin'], ({ tx }) => tx.execute(statement))).rejects.toThrow();
  }
  await expect(world.asProcessor(({ tx }) => tx.execute(sql`select * from failed_jobs()`))).rejects.toThrow();
});
