import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerHtml, answerJson, answerWith } from '../answer';
import type { Answer } from '../answer';
import { chosenMode } from '../control';
import { readBody } from '../read-body';
import { framedHtml, inboxPage, messagePage } from './inbox-page';
import type { MessageView } from './inbox-page';
import type { MailStore } from './mail-store';
import { readAttachment } from './message';
import type { FoundAttachment, StoredMessage } from './message';
import { MAIL_FAILURES } from './smtp';
import type { MailFailure } from './smtp';

export interface Inbox {
  store: MailStore;
  failure(): MailFailure;
  setFailure(failure: MailFailure): void;
}

/**
 * The readable side of the mail stand-in.
 *
 *   GET    /                           the inbox page            GET /message/:id   one message
 *   GET    /messages?to=&limit=        JSON, newest first        GET /messages/:id  JSON, with text, html, links
 *   GET    /messages/:id/html | /raw | /attachments/:n
 *   DELETE /messages?to=  /messages/:id
 *   POST   /control {"fail": "none" | "refuse" | "defer" | "reject" | "drop"}
 */
export async function serveInbox(
  inbox: Inbox,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const { pathname, searchParams } = new URL(request.url ?? '/', 'http://inbox.local');
  const [section = '', id, part, index] = pathname.split('/').slice(1);
  const to = searchParams.get('to') ?? '';

  if (section === 'health') return answerJson(response, 200, { ok: true, failure: inbox.failure() });
  if (section === 'control' && request.method === 'POST') return control(inbox, request, response);
  if (section === '') return answerHtml(response, inboxPage(inbox.store.list({ to }), to));
  if (section === 'messages' && id === undefined) {
    const messages = inbox.store.list({ to, limit: Number(searchParams.get('limit') ?? 500) });
    if (request.method === 'DELETE') await inbox.store.remove(messages);
    return answerJson(response, 200, messages);
  }

  const message = id === undefined ? null : inbox.store.find(id);
  if (message === null) return answerJson(response, 404, { error: 'There is no such message.' });
  if (section === 'message') return showMessage(inbox, message, searchParams.get('view'), response);
  if (section === 'messages' && request.method === 'DELETE') await inbox.store.remove([message]);
  if (section === 'messages') return servePart(inbox, message, { part, index }, response);
  return answerJson(response, 404, { error: 'There is no such page.' });
}

async function showMessage(
  inbox: Inbox,
  message: StoredMessage,
  asked: string | null,
  response: ServerResponse,
): Promise<void> {
  const fallback: MessageView = message.html ? 'html' : 'text';
  const view: MessageView =
    asked === 'raw' || asked === 'text' || (asked === 'html' && message.html) ? asked : fallback;
  const raw = view === 'raw' ? (await inbox.store.raw(message)).toString('utf8') : '';
  answerHtml(response, messagePage(message, view, raw));
}

async function servePart(
  inbox: Inbox,
  message: StoredMessage,
  { part, index }: { part: string | undefined; index: string | undefined },
  response: ServerResponse,
): Promise<void> {
  if (part === undefined) return answerJson(response, 200, message);
  if (part === 'html') {
    return answerHtml(response, framedHtml(message), {
      'content-security-policy':
        'sandbox allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation',
    });
  }
  const raw = await inbox.store.raw(message);
  if (part === 'raw')
    return answerWith(response, { status: 200, type: 'text/plain; charset=utf-8', body: raw });
  if (part === 'attachments') {
    const found = await readAttachment(raw, Number(index));
    if (found) return answerWith(response, attachmentAnswer(found));
  }
  answerJson(response, 404, { error: 'The message has no such part.' });
}

/** Shown in the browser, never run: a mailed file may be anything. The PDF viewer refuses a sandbox, and runs nothing of ours. */
function attachmentAnswer({ attachment, content }: FoundAttachment): Answer {
  return {
    status: 200,
    type: attachment.mediaType,
    body: content,
    headers: {
      'content-disposition': `inline; filename*=UTF-8''${encodeURIComponent(attachment.fileName)}`,
      ...(attachment.mediaType === 'application/pdf' ? {} : { 'content-security-policy': 'sandbox' }),
    },
  };
}

async function control(inbox: Inbox, request: IncomingMessage, response: ServerResponse): Promise<void> {
  try {
    inbox.setFailure(chosenMode(await readBody(request), 'fail', MAIL_FAILURES));
    answerJson(response, 200, { failure: inbox.failure() });
  } catch (error) {
    answerJson(response, 400, { error: error instanceof Error ? error.message : String(error) });
  }
}
