import { env } from '@/lib/env';
import { mailTransport } from '@/lib/mail/mail-transport';
import type { MailTransport } from '@/lib/mail/mail-transport';

export interface MailAttachment {
  fileName: string;
  mediaType: string;
  content: Buffer;
  /** For a picture the HTML shows in place, as `cid:…`. */
  contentId?: string;
}

export interface Mail {
  to: string | readonly string[];
  subject: string;
  html: string;
  text: string;
  /**
   * Without angle brackets, and the same for every attempt to send the same mail: when the line breaks between
   * "kept" and "told", the mail goes out twice, and only this lets the reader's program show it once.
   */
  messageId: string;
  attachments?: readonly MailAttachment[];
  replyTo?: string;
  headers?: Readonly<Record<string, string>>;
}

/**
 * Hands one mail to the mail server. Resolves only when the server has taken it for every recipient; throws otherwise,
 * and the job that called it tries again.
 */
export async function sendMail(mail: Mail, transport: MailTransport = mailTransport()): Promise<void> {
  const sent = await transport.sendMail({
    from: env.MAIL_FROM,
    to: [mail.to].flat(),
    subject: mail.subject,
    html: mail.html,
    text: mail.text,
    messageId: `<${mail.messageId}>`,
    headers: {
      // Keeps holiday answers away from an address nobody reads.
      'Auto-Submitted': 'auto-generated',
      ...mail.headers,
    },
    ...(mail.replyTo === undefined ? {} : { replyTo: mail.replyTo }),
    attachments: (mail.attachments ?? []).map(({ fileName, mediaType, content, contentId }) => ({
      filename: fileName,
      contentType: mediaType,
      content,
      ...(contentId === undefined ? {} : { cid: contentId }),
    })),
  });
  // With several recipients the server may take some and refuse others; that is not "sent".
  if (sent.rejected.length > 0)
    throw new Error(`The mail server refused ${sent.rejected.length} of the recipients.`);
}

/** Whether the mail server answers and lets us in. Throws if not. */
export async function checkMail(transport: MailTransport = mailTransport()): Promise<void> {
  await transport.verify();
}
