import { createTransport } from 'nodemailer';
import type { Transporter } from 'nodemailer';
import type SMTPTransport from 'nodemailer/lib/smtp-transport';
import { env } from '@/lib/env';

export type MailTransport = Transporter<SMTPTransport.SentMessageInfo>;

/** A job that waits for ever looks like a job that works: a silent server counts as a failed attempt. */
const CONNECT_MS = 10_000;
const SILENCE_MS = 60_000;

export function makeMailTransport(smtpUrl: string): MailTransport {
  return createTransport({
    url: smtpUrl,
    connectionTimeout: CONNECT_MS,
    greetingTimeout: CONNECT_MS,
    socketTimeout: SILENCE_MS,
    // Attachments are handed over as bytes. A path or address in a message could only have come from outside.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}

let shared: MailTransport | undefined;

/** The installation's own, made when first needed. */
export function mailTransport(): MailTransport {
  shared ??= makeMailTransport(env.SMTP_URL);
  return shared;
}
