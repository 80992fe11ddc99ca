import { eq, sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { files } from '@/db/schema/files';
import { giveUpReadingJob } from '@/lib/jobs/definitions/give-up-reading';
import { readDocumentJob } from '@/lib/jobs/definitions/read-document';
import { listFailedJobs, retryJob } from '@/lib/jobs/failed-jobs';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';
import { readCertificateAgain } from '@/lib/readings/read-certificate-again';
import { deleteUnverifiedUpload, putObject, readObject } from '@/lib/storage/object-store';

import { makeDispatchedBatch } from '../../factories/batches';
import { certificatePaper, handIn, HEAT_TREAT, makePaperWorld, readAll } from '../../factories/papers';
import type { World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { queueOf, runJobs } from '../run-jobs';

const base = openDatabase();

/** A good certificate that waits for being read. */
async function setup() {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT }),
  );
  const content = await certificatePaper(world, batch.id);
  const certificateId = await handIn(world, batch.id, { kind: 'certificate', content });
  return { world, certificateId };
}

/** Takes the bytes of a shop's files out of the store; says how to bring them back. */
async function takeBytesAway(world: World) {
  const kept = await base.owner
    .select({ key: files.storageKey, mediaType: files.mediaType })
    .from(files)
    .where(eq(files.shopId, world.shopId));
  const away = await Promise.all(
    kept.map(async (file) => ({ ...file, content: Buffer.from(await readObject(file.key)) })),
  );
  for (const { key } of kept) await deleteUnverifiedUpload(key);
  return () => Promise.all(away.map((file) => putObject(file)));
}

const readingOf = (world: World, certificateId: string) =>
  world.as(['inspector'], (ctx) => getCertificateReading(ctx, { certificateId }));

const makeDue = () =>
  base.owner.execute(
    sql`update pgboss.job set start_after = now() where state = 'retry' and name = 'read-document'`,
  );

/** Runs it as often as the queue gives it out. */
async function failEveryTry(): Promise<number> {
  for (let tries = 0; ; tries++) {
    await makeDue();
    if ((await runJobs(base, readDocumentJob)).length === 0) return tries;
  }
}

/** A worker takes it and is never heard of again, until its time is over: as often as the queue gives it out. */
async function dieOfEveryTry(): Promise<number> {
  const boss = queueOf(base.owner);
  for (let tries = 0; ; tries++) {
    await makeDue();
    if ((await boss.fetch(readDocumentJob.name)).length === 0) return tries;
    await base.owner.execute(
      sql`update pgboss.job set started_on = now() - interval '1 day' where state = 'active' and name = 'read-document'`,
    );
    await boss.maintain();
  }
}

test('a file that fails with every try is waited for as long as it is tried, and then ends in words', async () => {
  const { world, certificateId } = await setup();
  await takeBytesAway(world);
  await runJobs(base, readDocumentJob);
  await runJobs(base, giveUpReadingJob);
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'waiting', fault: null });
  expect(await failEveryTry()).toBe(4);
  await runJobs(base, giveUpReadingJob);
  expect(await readingOf(world, certificateId)).toMatchObject({
    state: 'unreadable',
    fault:
      'This file could not be read: something other than the file failed, time and again. Read it by eye, or have it read again.',
    facts: [],
    proposals: [],
  });
});

test('a file of which the worker dies each time ends in words as well', async () => {
  const { world, certificateId } = await setup();
  expect(await dieOfEveryTry()).toBe(5);
  await runJobs(base, giveUpReadingJob);
  expect(await readingOf(world, certificateId)).toMatchObject({
    state: 'unreadable',
    fault: expect.stringContaining('was ended in the middle of it, time and again') as string,
  });
});

test('what was given up is read when somebody asks for it again', async () => {
  const { world, certificateId } = await setup();
  const bringBack = await takeBytesAway(world);
  await failEveryTry();
  await runJobs(base, giveUpReadingJob);
  await bringBack();
  await world.as(['office'], (ctx) => readCertificateAgain(ctx, { certificateId }));
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'waiting', fault: null });
  await readAll(base);
  expect(await readingOf(world, certificateId)).toMatchObject({
    state: 'read',
    certificateNumber: '26-00417',
  });
});

test('an admin finds it among the work that failed, and has it tried once more from there', async () => {
  const { world, certificateId } = await setup();
  const bringBack = await takeBytesAway(world);
  await failEveryTry();
  await runJobs(base, giveUpReadingJob);
  await bringBack();
  const { jobs } = await world.as(['admin'], (ctx) => listFailedJobs(ctx));
  expect(jobs).toMatchObject([
    {
      says: 'The machine did not read a file that came in. A person reads it.',
      isGivenUp: true,
      attempts: 5,
    },
  ]);
  await world.as(['admin'], (ctx) => retryJob(ctx, { jobId: jobs[0]?.id ?? '' }));
  await readAll(base);
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'read', fault: null });
});

test('what was read in the meantime stays read', async () => {
  const { world, certificateId } = await setup();
  await readAll(base);
  const boss = queueOf(base.owner);
  const [{ id: readingId } = { id: '' }] = (
    await base.owner.execute<{ id: string }>(sql`select id from readings where shop_id = ${world.shopId}`)
  ).rows;
  await boss.send(giveUpReadingJob.name, { shopId: world.shopId, readingId });
  expect((await runJobs(base, giveUpReadingJob)).at(-1)).toMatchObject({ data: { readingId }, error: null });
  expect(await readingOf(world, certificateId)).toMatchObject({ state: 'read', fault: null });
});
