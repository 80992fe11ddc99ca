import { simpleParser } from 'mailparser';
import type { AddressObject, Attachment } from 'mailparser';

export interface StoredAttachment {
  fileName: string;
  mediaType: string;
  sizeBytes: number;
  /** Set for pictures that the HTML part shows in place. */
  contentId: string | null;
}

/** A message as the inbox page and the tests read it. The bytes as received are kept beside it. */
export interface StoredMessage {
  id: string;
  receivedAt: string;
  from: string;
  /** Who really gets it, by the SMTP envelope: what the To line says is only what the sender wrote. */
  recipients: string[];
  to: string[];
  cc: string[];
  replyTo: string[];
  subject: string;
  messageId: string | null;
  headers: Record<string, string>;
  text: string;
  html: string;
  /** Every address the reader could follow, once, in order. */
  links: string[];
  attachments: StoredAttachment[];
}

export interface FoundAttachment {
  attachment: StoredAttachment;
  content: Buffer;
}

export interface Envelope {
  from: string;
  recipients: string[];
}

export async function readMessage(
  id: string,
  raw: Buffer,
  envelope: Envelope,
  receivedAt: Date,
): Promise<StoredMessage> {
  const mail = await simpleParser(raw, { skipImageLinks: true, skipTextToHtml: true });
  const html = mail.html || '';
  return {
    id,
    receivedAt: receivedAt.toISOString(),
    from: mail.from?.text ?? envelope.from,
    recipients: envelope.recipients,
    to: addressesOf(mail.to),
    cc: addressesOf(mail.cc),
    replyTo: addressesOf(mail.replyTo),
    subject: mail.subject ?? '(no subject)',
    messageId: mail.messageId ?? null,
    headers: Object.fromEntries(
      mail.headerLines.map(({ key, line }) => [key, line.slice(key.length + 1).trim()]),
    ),
    text: mail.text ?? '',
    html,
    links: linksIn(html, mail.text ?? ''),
    attachments: mail.attachments.map(describeAttachment),
  };
}

/** The attachment's bytes, read again from the message as received: they are not stored twice. */
export async function readAttachment(raw: Buffer, index: number): Promise<FoundAttachment | null> {
  const mail = await simpleParser(raw);
  const found = mail.attachments[index];
  return found ? { attachment: describeAttachment(found), content: found.content } : null;
}

function describeAttachment(attachment: Attachment): StoredAttachment {
  return {
    fileName: attachment.filename ?? 'unnamed',
    mediaType: attachment.contentType,
    sizeBytes: attachment.size,
    contentId: attachment.cid ?? null,
  };
}

function addressesOf(field: AddressObject | AddressObject[] | undefined): string[] {
  if (field === undefined) return [];
  const objects = Array.isArray(field) ? field : [field];
  return objects
    .flatMap(({ value }) => value)
    .flatMap(({ address }) => (address ? [address.toLowerCase()] : []));
}

function linksIn(html: string, text: string): string[] {
  const inHtml = [...html.matchAll(/href="(https?:[^"]+)"/g)].map(([, link]) =>
    (link ?? '').replaceAll('&amp;', '&'),
  );
  const inText = [...text.matchAll(/https?:\/\/[^\s<>"')\]]+/g)].map(([link]) => link);
  return [...new Set([...inHtml, ...inText])];
}
