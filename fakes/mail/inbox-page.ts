import { escapeHtml, page } from '../page';
import type { StoredAttachment, StoredMessage } from './message';

export function inboxPage(messages: readonly StoredMessage[], to: string): string {
  const filter = `<form class="row" method="get" action="/">
<label>Mail to<input type="search" name="to" value="${escapeHtml(to)}" placeholder="anyone" size="32"></label>
<button>Show</button>${to ? '<a href="/">Show all</a>' : ''}
</form>`;
  const list = messages.length === 0 ? `<p class="empty">${emptySentence(to)}</p>` : table(messages);
  return page({
    title: 'Inbox',
    heading: 'Inbox',
    wide: true,
    body: `<h1>Mail sent by this installation</h1>${filter}${list}`,
  });
}

export type MessageView = 'html' | 'text' | 'raw';

/** One message. The HTML part sits in a frame without scripts; links in it open outside the frame. */
export function messagePage(message: StoredMessage, view: MessageView, raw: string): string {
  const tabs: [MessageView, string][] = [
    ...(message.html ? [['html', 'As shown'] satisfies [MessageView, string]] : []),
    ['text', 'Text part'],
    ['raw', 'As sent'],
  ];
  const nav = tabs
    .map(
      ([key, label]) =>
        `<a href="/message/${message.id}?view=${key}"${key === view ? ' aria-current="page"' : ''}>${label}</a>`,
    )
    .join('');
  const body = `<h1>${escapeHtml(message.subject)}</h1>
<dl>
<dt>From</dt><dd>${escapeHtml(message.from)}</dd>
<dt>To</dt><dd>${escapeHtml(message.recipients.join(', '))}</dd>
${message.replyTo.length > 0 ? `<dt>Reply to</dt><dd>${escapeHtml(message.replyTo.join(', '))}</dd>` : ''}
<dt>Received</dt><dd class="mono">${escapeHtml(readableTime(message.receivedAt))}</dd>
${attachmentRow(message)}
</dl>
<nav aria-label="Parts of the message">${nav}</nav>
${viewOf(message, view, raw)}`;
  return page({ title: message.subject, heading: 'Inbox', body });
}

function viewOf(message: StoredMessage, view: MessageView, raw: string): string {
  if (view === 'raw') return `<pre>${escapeHtml(raw)}</pre>`;
  if (view === 'text') return `<pre>${escapeHtml(message.text) || '(no text part)'}</pre>`;
  return `<iframe title="The message" sandbox="allow-popups allow-popups-to-escape-sandbox allow-top-navigation-by-user-activation" src="/messages/${message.id}/html"></iframe>`;
}

/** The HTML part as served into the frame: pictures that came with the message point at their attachments. */
export function framedHtml(message: StoredMessage): string {
  const withPictures = message.attachments.reduce(
    (html, { contentId }, index) =>
      contentId === null
        ? html
        : html.replaceAll(`cid:${contentId}`, `/messages/${message.id}/attachments/${index}`),
    message.html,
  );
  return `<base target="_blank">${withPictures}`;
}

function table(messages: readonly StoredMessage[]): string {
  const rows = messages.map(
    (message) => `<tr>
<td><a href="/message/${message.id}">${escapeHtml(message.subject)}</a></td>
<td>${message.recipients.map((to) => `<a href="/?to=${encodeURIComponent(to)}">${escapeHtml(to)}</a>`).join('<br>')}</td>
<td class="narrow-off quiet">${escapeHtml(message.from)}</td>
<td class="narrow-off right mono">${message.attachments.length || ''}</td>
<td class="mono keep">${escapeHtml(readableTime(message.receivedAt))}</td>
</tr>`,
  );
  return `<table><thead><tr><th>Subject</th><th>To</th><th class="narrow-off">From</th><th class="narrow-off right">Files</th><th>Received</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
}

function attachmentRow({ id, attachments }: StoredMessage): string {
  if (attachments.length === 0) return '';
  const link = (attachment: StoredAttachment, index: number) =>
    `<a href="/messages/${id}/attachments/${index}">${escapeHtml(attachment.fileName)}</a> <span class="caption">${escapeHtml(attachment.mediaType)}, ${Math.ceil(attachment.sizeBytes / 1024)} KB</span>`;
  return `<dt>Files</dt><dd>${attachments.map(link).join('<br>')}</dd>`;
}

function emptySentence(to: string): string {
  return to
    ? `Nothing has been sent to ${escapeHtml(to)}.`
    : 'Nothing has been sent yet. Dispatch a batch and its mail appears here.';
}

function readableTime(iso: string): string {
  return `${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`;
}
