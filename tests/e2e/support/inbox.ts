import { expect } from '@playwright/test';

import { env } from '@/lib/env';

interface Received {
  id: string;
  subject: string;
  links: string[];
}

const INBOX_PORT_AFTER_SMTP = 55;

/** Where the stand-in for mail shows what it got: its own port, a fixed way from the SMTP port. */
const inboxUrl = (): string =>
  `http://127.0.0.1:${Number(new URL(env.SMTP_URL).port) + INBOX_PORT_AFTER_SMTP}`;

/** Waits until a mail to somebody with these words in its subject has arrived. */
export async function mailTo(address: string, subject: string): Promise<Received> {
  let found: Received | undefined;
  await expect
    .poll(
      async () => {
        const response = await fetch(`${inboxUrl()}/messages?to=${encodeURIComponent(address)}`);
        const messages = (await response.json()) as Received[];
        found = messages.find((message) => message.subject.includes(subject));
        return found !== undefined;
      },
      { message: `a mail to ${address} about ${subject}`, timeout: 60_000 },
    )
    .toBe(true);
  if (!found) throw new Error('no mail');
  return found;
}
