import { randomUUID } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest';
import { startMailServer, type MailServer } from '@/fakes/mail/server';
import type { StoredMessage } from '@/fakes/mail/message';
import { makeMailTransport, type MailTransport } from '@/lib/mail/mail-transport';
import { checkMail, sendMail, type Mail } from '@/lib/mail/send-mail';

let dir: string;
let server: MailServer;
let transport: MailTransport;

beforeAll(async () => {
  dir = await mkdtemp(path.join(tmpdir(), 'mail-'));
  server = await startMailServer({ smtpPort: 0, httpPort: 0, dir });
  transport = makeMailTransport(`smtp://127.0.0.1:${server.smtpPort}`);
});
afterEach(() => fail('none'));
afterAll(async () => {
  await server.close();
  await rm(dir, { recursive: true, force: true });
});

const someMail = (changes: Partial<Mail> = {}): Mail => ({
  to: `${randomUUID()}@processor.test`,
  subject: 'Batch B-0404 is on its way · 41 pièces',
  html: '<p>Open <a href="http://localhost:4600/p/abc?x=1&amp;y=2">your page</a></p>',
  text: 'Open http://localhost:4600/p/abc?x=1&y=2',
  messageId: `${randomUUID()}@lotwright.test`,
  ...changes,
});

async function inbox(to: string): Promise<StoredMessage[]> {
  return (await (
    await fetch(`${server.address}/messages?to=${encodeURIComponent(to)}`)
  ).json()) as StoredMessage[];
}

async function fail(mode: string): Promise<void> {
  const answer = await fetch(`${server.address}/control`, {
    method: 'POST',
    body: JSON.stringify({ fail: mode }),
  });
  expect(answer.status).toBe(200);
}

const addressOf = (mail: Mail) => String(mail.to);

describe('a mail that is sent', () => {
  test('arrives with both parts, its own id, reply address and headers', async () => {
    const mail = someMail({ replyTo: 'desk@shop.test', headers: { 'X-Batch': 'B-0404' } });
    await sendMail(mail, transport);

    const [message] = await inbox(addressOf(mail));
    expect(message).toMatchObject({
      subject: mail.subject,
      to: [mail.to],
      recipients: [mail.to],
      replyTo: ['desk@shop.test'],
      messageId: `<${mail.messageId}>`,
      links: ['http://localhost:4600/p/abc?x=1&y=2'],
    });
    expect(message?.headers).toMatchObject({ 'x-batch': 'B-0404', 'auto-submitted': 'auto-generated' });
    expect(message?.html).toContain('your page');
    expect(message?.text).toContain('Open http://');
  });

  test('brings its attachments byte for byte', async () => {
    const content = Buffer.from([
      0,
      255,
      10,
      13,
      13,
      10,
      46,
      10,
      ...Array.from({ length: 5000 }, (_, at) => at % 256),
    ]);
    const mail = someMail({
      attachments: [{ fileName: 'Traveller B-0404 é.pdf', mediaType: 'application/pdf', content }],
    });
    await sendMail(mail, transport);

    const [message] = await inbox(addressOf(mail));
    expect(message?.attachments).toMatchObject([
      { fileName: 'Traveller B-0404 é.pdf', mediaType: 'application/pdf', sizeBytes: content.length },
    ]);
    const fetched = await fetch(`${server.address}/messages/${message?.id}/attachments/0`);
    expect(Buffer.from(await fetched.arrayBuffer()).equals(content)).toBe(true);
  });

  test('goes to each of several people once', async () => {
    const people = [`${randomUUID()}@a.test`, `${randomUUID()}@b.test`];
    await sendMail(someMail({ to: people }), transport);
    for (const person of people) expect(await inbox(person)).toHaveLength(1);
  });

  test('is still there after the mail server was started again', async () => {
    const mail = someMail();
    await sendMail(mail, transport);
    const second = await startMailServer({ smtpPort: 0, httpPort: 0, dir });
    try {
      const found = (await (
        await fetch(`${second.address}/messages?to=${addressOf(mail)}`)
      ).json()) as StoredMessage[];
      expect(found).toHaveLength(1);
    } finally {
      await second.close();
    }
  });

  test('cannot put a header of its own into the message through the subject', async () => {
    const mail = someMail({ subject: 'Hello\r\nBcc: other@elsewhere.test' });
    await sendMail(mail, transport);
    expect(await inbox('other@elsewhere.test')).toHaveLength(0);
    const [message] = await inbox(addressOf(mail));
    expect(message?.headers['bcc']).toBeUndefined();
  });
});

describe('a mail server in trouble', () => {
  test.each([
    ['refuse', 421],
    ['defer', 451],
    ['reject', 550],
  ])('that answers "%s" makes sending fail with %i and keeps nothing', async (mode, responseCode) => {
    await fail(mode);
    const mail = someMail();
    await expect(sendMail(mail, transport)).rejects.toMatchObject({ responseCode });
    expect(await inbox(addressOf(mail))).toHaveLength(0);
  });

  test('that breaks the line after keeping the mail leaves two copies with one id, so that the reader sees one', async () => {
    const mail = someMail();
    await fail('drop');
    await expect(sendMail(mail, transport)).rejects.toThrow();
    await fail('none');
    await sendMail(mail, transport);
    const ids = (await inbox(addressOf(mail))).map(({ messageId }) => messageId);
    expect(ids).toEqual([`<${mail.messageId}>`, `<${mail.messageId}>`]);
  });

  test('is seen by the readiness check', async () => {
    await expect(checkMail(transport)).resolves.toBeUndefined();
    await fail('refuse');
    await expect(checkMail(transport)).rejects.toThrow();
    await expect(checkMail(makeMailTransport('smtp://127.0.0.1:1'))).rejects.toThrow();
  });

  test('is not told to fail in a way it does not know', async () => {
    const answer = await fetch(`${server.address}/control`, {
      method: 'POST',
      body: JSON.stringify({ fail: 'sometimes' }),
    });
    expect(answer.status).toBe(400);
  });
});

describe('the inbox page', () => {
  test('lists, shows each part, and never runs what is in a message', async () => {
    const mail = someMail({
      subject: '<script>alert(1)</script>',
      html: '<p>Hi</p><img src="cid:logo"><script>alert(2)</script>',
      attachments: [
        { fileName: 'logo.png', mediaType: 'image/png', content: Buffer.from('png'), contentId: 'logo' },
      ],
    });
    await sendMail(mail, transport);
    const [message] = await inbox(addressOf(mail));

    const list = await (await fetch(`${server.address}/?to=${addressOf(mail)}`)).text();
    expect(list).toContain('&lt;script&gt;alert(1)&lt;/script&gt;');
    expect(list).not.toContain('<script>');

    const shown = await (await fetch(`${server.address}/message/${message?.id}`)).text();
    expect(shown).toContain('<iframe');
    expect(shown).not.toContain('<script>');
    const framed = await fetch(`${server.address}/messages/${message?.id}/html`);
    expect(framed.headers.get('content-security-policy')).toMatch(/^sandbox/);
    expect(framed.headers.get('content-security-policy')).not.toContain('allow-scripts');
    expect(await framed.text()).toContain(`/messages/${message?.id}/attachments/0`);

    const raw = await (await fetch(`${server.address}/message/${message?.id}?view=raw`)).text();
    expect(raw).toContain('Message-ID');
  });

  test('finds nothing outside its folder, and forgets what it is told to', async () => {
    expect((await fetch(`${server.address}/messages/..%2f..%2fpackage`)).status).toBe(404);
    const mail = someMail();
    await sendMail(mail, transport);
    await fetch(`${server.address}/messages?to=${addressOf(mail)}`, { method: 'DELETE' });
    expect(await inbox(addressOf(mail))).toHaveLength(0);
  });
});
