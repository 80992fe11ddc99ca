import { simpleParser } from 'mailparser';
import { UnreadableFile, type OpenedFile, type Page } from '../../page';
import { layOutText } from '../lay-out-text';
import type { Opened } from '../open-file';
import { textOfHtml } from './text-of-html';

/** A mail holds at most so many attachments worth opening, and mails in mails go so deep. */
const MOST_ATTACHMENTS = 20;
/** Pictures smaller than this are the sender's logo. */
const SMALLEST_PICTURE = 20_000;
const RANK: Readonly<Record<OpenedFile['kind'], number>> = { digital: 0, scan: 1, photo: 2 };

/**
 * Opens a mail: first its text as typed pages, then its attachments in their order.
 *
 * An attachment that cannot be read is passed over when another one, or the text, can; else its reason is the mail's.
 */
export async function openMail(
  bytes: Uint8Array,
  openAttachment: (bytes: Uint8Array, name: string) => Promise<Opened>,
): Promise<Opened> {
  const mail = await simpleParser(Buffer.from(bytes), {
    skipHtmlToText: true,
    skipTextToHtml: true,
    skipImageLinks: true,
  });
  const body = mail.text?.trim() ? mail.text : textOfHtml(typeof mail.html === 'string' ? mail.html : '');
  const pages: Page[] = layOutText(body);
  let kind: OpenedFile['kind'] = 'digital';
  let refused: UnreadableFile | null = null;

  for (const attachment of mail.attachments.slice(0, MOST_ATTACHMENTS)) {
    if (attachment.contentType.startsWith('image/') && attachment.size < SMALLEST_PICTURE) continue;
    try {
      const opened = await openAttachment(attachment.content, attachment.filename ?? '');
      pages.push(...opened.pages);
      if (RANK[opened.kind] > RANK[kind]) kind = opened.kind;
    } catch (cause) {
      if (!(cause instanceof UnreadableFile) || cause.code === 'took_too_long') throw cause;
      refused ??= cause;
    }
  }
  if (pages.length === 0)
    throw refused ?? new UnreadableFile('empty', 'This mail holds no text and no document.');
  return { kind, pages };
}
