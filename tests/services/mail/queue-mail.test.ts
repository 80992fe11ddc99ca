import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { sql } from 'drizzle-orm';
import { afterAll, afterEach, beforeAll, describe, expect, test, vi } from 'vitest';

import { withTenant } from '@/db/client';
import { startMailServer, type MailServer } from '@/fakes/mail/server';
import type { StoredMessage } from '@/fakes/mail/message';
import { newId } from '@/lib/ids';
import type { Job } from '@/lib/jobs/job';
import type { queueMail as QueueMail } from '@/lib/mail/queue-mail';

import { makeWorld, type World } from '../../factories/world';
import { sampleMails } from '../../unit/emails/sample-mails';
import { openDatabase } from '../open-database';
import { runJobs } from '../run-jobs';

const base = openDatabase();

let folder: string;
let server: MailServer;
let queueMail: typeof QueueMail;
let sendMailJob: Job;

// A mail server of its own: taking it down must not disturb the other files.
beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'queued-mail-'));
  server = await startMailServer({ smtpPort: 0, httpPort: 0, dir: folder });
  vi.resetModules();
  vi.stubEnv('SMTP_URL', `smtp://127.0.0.1:${server.smtpPort}`);
  ({ queueMail } = await import('@/lib/mail/queue-mail'));
  ({ sendMailJob } = (await import('@/lib/jobs/definitions/send-mail')) as unknown as { sendMailJob: Job });
});
afterEach(() => fail('none'));
afterAll(async () => {
  vi.unstubAllEnvs();
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

const fail = (mode: string) =>
  fetch(`${server.address}/control`, { method: 'POST', body: JSON.stringify({ fail: mode }) });
const inbox = async (to: string) =>
  (await (await fetch(`${server.address}/messages?to=${encodeURIComponent(to)}`)).json()) as StoredMessage[];
const address = () => `desk-${newId()}@processor.test`;

const queueIn = (world: World, to: string) =>
  world.as(['lead'], (ctx) => queueMail(ctx, { template: 'dispatch', to, props: sampleMails.dispatch }));
const waiting = async (to: string) =>
  (
    await base.owner.execute<{
      state: string;
      retry_limit: number;
      retry_backoff: boolean;
      start_after: string;
    }>(
      sql`select state, retry_limit, retry_backoff, start_after from pgboss.job where name = 'send-mail' and data->'to'->>0 = ${to}`,
    )
  ).rows;

describe('a queued mail', () => {
  test("is sent once, in the shop's name, with an answer reaching whoever caused it", async () => {
    const world = await makeWorld(base.db, base.owner);
    const to = address();
    await queueIn(world, to);
    const [ran] = await runJobs(base, sendMailJob);
    expect(ran?.error).toBeNull();
    const messages = await inbox(to);
    expect(messages).toHaveLength(1);
    expect(messages[0]).toMatchObject({
      subject: 'B-0419 from Heron Reach Floatworks: 60 parts are on the way',
      to: [to],
      replyTo: [`person-${world.userId}@shop.test`],
      messageId: `<${String(ran?.data['mailId'])}@lotwright.test>`,
    });
    expect(messages[0]?.text).toContain('Back by Tue 30 Jun');
    expect(messages[0]?.links).toContain(sampleMails.dispatch.url);
    expect(await runJobs(base, sendMailJob)).toEqual([]);
  });

  test('does not go when what causes it is rolled back', async () => {
    const world = await makeWorld(base.db, base.owner);
    const to = address();
    await expect(
      world.as(['lead'], async (ctx) => {
        await queueMail(ctx, { template: 'dispatch', to, props: sampleMails.dispatch });
        throw new Error('no');
      }),
    ).rejects.toThrow('no');
    expect(await waiting(to)).toEqual([]);
  });

  test('that cannot be rendered, or has no address, stops what causes it', async () => {
    const world = await makeWorld(base.db, base.owner);
    await expect(
      world.as(['lead'], (ctx) =>
        queueMail(ctx, {
          template: 'dispatch',
          to: address(),
          props: { ...sampleMails.dispatch, lines: [] },
        }),
      ),
    ).rejects.toThrow();
    await expect(queueIn(world, 'not an address')).rejects.toThrow();
  });

  test('may belong to no shop: a sign-in link is queued at the door', async () => {
    const to = address();
    await withTenant(base.db, { kind: 'door' }, (tx) =>
      queueMail(
        { tx, tenant: { kind: 'door' }, actor: { kind: 'nobody', name: 'nobody', roles: [] } },
        { template: 'sign-in', to, props: sampleMails['sign-in'] },
      ),
    );
    const ran = await runJobs(base, sendMailJob);
    expect(ran).toMatchObject([{ data: { shopId: null, replyTo: null } }]);
    expect(await inbox(to)).toHaveLength(1);
  });
});

describe('with the mail server in trouble', () => {
  test.each(['refuse', 'defer', 'reject'])(
    '(%s) the mail is tried again later and the shop sees it waiting',
    async (mode) => {
      const world = await makeWorld(base.db, base.owner);
      const to = address();
      await fail(mode);
      await queueIn(world, to);
      const [ran] = await runJobs(base, sendMailJob);
      expect(ran?.error).not.toBeNull();
      const [job] = await waiting(to);
      expect(job).toMatchObject({ state: 'retry', retry_backoff: true });
      expect(job?.retry_limit).toBeGreaterThanOrEqual(10);
      expect(new Date(job?.start_after ?? 0).getTime()).toBeGreaterThan(Date.now());
      const seen = await world.as(
        ['admin'],
        async ({ tx }) => (await tx.execute(sql`select name, state from failed_jobs()`)).rows,
      );
      expect(seen).toEqual([{ name: 'send-mail', state: 'retry' }]);
      expect(await inbox(to)).toEqual([]);

      await fail('none');
      await base.owner.execute(
        sql`update pgboss.job set start_after = now() where name = 'send-mail' and data->'to'->>0 = ${to}`,
      );
      await runJobs(base, sendMailJob);
      expect(await inbox(to)).toHaveLength(1);
    },
  );

  test('a line that breaks after the mail was taken makes a repeat that says it is one', async () => {
    const world = await makeWorld(base.db, base.owner);
    const to = address();
    await fail('drop');
    await queueIn(world, to);
    expect((await runJobs(base, sendMailJob))[0]?.error).not.toBeNull();
    await fail('none');
    await base.owner.execute(
      sql`update pgboss.job set start_after = now() where name = 'send-mail' and data->'to'->>0 = ${to}`,
    );
    await runJobs(base, sendMailJob);
    const messages = await inbox(to);
    expect(messages).toHaveLength(2);
    expect(new Set(messages.map((message) => message.messageId)).size).toBe(1);
  });

  test('given up, it is on the list of failed jobs, and one more try sends it', async () => {
    const world = await makeWorld(base.db, base.owner);
    const to = address();
    await fail('refuse');
    await queueIn(world, to);
    await base.owner.execute(
      sql`update pgboss.job set retry_limit = 0 where name = 'send-mail' and data->'to'->>0 = ${to}`,
    );
    await runJobs(base, sendMailJob);
    const [failed] = await world.as(
      ['admin'],
      async ({ tx }) =>
        (
          await tx.execute<{ id: string; state: string; error: string }>(
            sql`select id, state, error from failed_jobs()`,
          )
        ).rows,
    );
    expect(failed).toMatchObject({ state: 'failed' });
    expect(failed?.error).toBeTruthy();

    await fail('none');
    await world.as(['admin'], ({ tx }) => tx.execute(sql`select retry_failed_job(${failed?.id})`));
    await runJobs(base, sendMailJob);
    expect(await inbox(to)).toHaveLength(1);
  });
});
