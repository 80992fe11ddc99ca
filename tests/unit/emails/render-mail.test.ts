import { describe, expect, test } from 'vitest';

import { MAIL_PROPS, type MailTemplate } from '@/emails/mail-props';
import { renderMail } from '@/lib/mail/render-mail';

import { sampleMails } from './sample-mails';

const TEMPLATES = Object.keys(MAIL_PROPS) as MailTemplate[];
const rendered = (template: MailTemplate, changes: Record<string, unknown> = {}) =>
  renderMail(template, { ...sampleMails[template], ...changes });

/** What a person reads in the HTML: no tags, no hidden preview, entities as the letters they are. */
function wordsOf(html: string): string {
  return html
    .replace(/<head>.*?<\/head>/s, '')
    .replace(/<div[^>]*data-skip-in-text[^>]*>.*?<\/div>/s, '')
    .replace(/<[^>]*data-skip-in-text[^>]*>[^<]*(<[^>]+>)?/g, ' ')
    .replace(/<!--.*?-->/gs, '')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&#x27;/g, "'")
    .replace(/&amp;/g, '&')
    .replace(/\s+/g, ' ');
}

const lettersOf = (text: string): string[] => text.match(/[\p{L}\p{N}]+/gu) ?? [];
const linksOf = (html: string) =>
  [...html.matchAll(/href="([^"]+)"/g)].map(([, url = '']) => url.replaceAll('&amp;', '&'));

describe.each(TEMPLATES)('the mail %s', (template) => {
  test('has a subject of one line, and says the same in both parts', async () => {
    const { subject, html, text } = await rendered(template);
    expect(subject).toMatch(/^\S[^\n]{5,140}\S$/);
    const inHtml = lettersOf(wordsOf(html));
    const inText = lettersOf(text.replace(/http\S+/g, ' '));
    expect(inText.filter((word) => !inHtml.includes(word))).toEqual([]);
    expect(inHtml.filter((word) => !inText.includes(word))).toEqual([]);
  });

  test('brings each link in both parts, and no address that is not ours', async () => {
    const { html, text } = await rendered(template);
    for (const url of linksOf(html)) {
      expect(url).toMatch(/^http:\/\/localhost:4600\//);
      expect(text.split(/\s+/)).toContain(url);
    }
    expect(html).not.toMatch(/<(img|script|link|iframe)\b/);
  });

  test('is made of tables no wider than 600 px, and names its language', async () => {
    const { html } = await rendered(template);
    expect(html).toContain('<html');
    expect(html).toMatch(/<html[^>]*lang="en"/);
    expect(html).toContain('max-width:600px');
    // Programs that cut a long mail hide its end; ours are far from it.
    expect(html.length).toBeLessThan(60_000);
  });
});

describe('names from outside', () => {
  test('are text, never markup', async () => {
    const { html, text } = await rendered('dispatch');
    expect(html).toContain('Keel doubler &lt;aft&gt; &amp; more');
    expect(text).toContain('Keel doubler <aft> & more');
    const notice = await rendered('message', {
      body: '<b>no</b>\n<script>alert(1)</script>',
      author: 'R & <i>A</i>',
    });
    expect(notice.html).not.toContain('<script');
    expect(notice.html).not.toContain('<b>no');
    expect(notice.text).toContain('<script>alert(1)</script>');
  });

  test('cannot add a header through the subject', async () => {
    const { subject } = await rendered('dispatch', { shop: 'Heron Reach\r\nBcc: everybody@shop.test' });
    expect(subject).not.toMatch(/[\r\n]/);
  });
});

describe('what a mail is about', () => {
  test('the dispatch says pieces, lines, day, order and whom to ring, and does not promise to take papers by mail', async () => {
    const { subject, text } = await rendered('dispatch');
    expect(subject).toBe('B-0419 from Heron Reach Floatworks: 60 parts are on the way');
    expect(text).toContain('60 parts are on the way to you');
    expect(text).toContain('Back by Tue 30 Jun');
    expect(text).toMatch(/1 +FL-4418-03 C +Bulkhead web/);
    expect(text).toMatch(/Pieces +60/);
    expect(text).toContain('stop and call Ines Halloran, 555 0117');
    expect(text).not.toMatch(/reply to this mail/i);
  });

  test('one part is singular', async () => {
    const { subject } = await rendered('dispatch', { pieces: 1 });
    expect(subject).toContain('1 part is on the way');
  });

  test('without a link nothing is pressed', async () => {
    const { html, text } = await rendered('dispatch', { url: null });
    expect(linksOf(html)).toEqual([]);
    expect(text).toContain('Sign in to see the batch');
  });

  test('issued again, it says the version and each change', async () => {
    const { subject, text } = await rendered('dispatch-reissued');
    expect(subject).toContain('changed, version 2');
    expect(text).toContain('Line 2: 14 pieces instead of 12');
  });

  test('a notice tells who, to which side, about which line and to which question', async () => {
    const toShop = await rendered('message');
    expect(toShop.subject).toBe('B-0419: a question from Ostrow Heat Treating');
    expect(toShop.text.replace(/\s+/g, ' ')).toContain('About line 2, FL-4410-12 D.');
    const answer = await rendered('message', {
      to: 'processor',
      kind: 'answer',
      answers: { author: 'Ruth', body: 'Which drawing?' },
    });
    expect(answer.subject).toBe('B-0419: an answer from Heron Reach Floatworks');
    expect(answer.text).toContain('Ruth asked:');
    expect(answer.text).toContain('Which drawing?');
    expect((await rendered('trouble')).subject).toBe('B-0419: trouble reported from Ostrow Heat Treating');
  });

  test('the remittance says what was paid and what was not', async () => {
    const { subject, text } = await rendered('remittance');
    expect(subject).toBe('Heron Reach Floatworks paid 1,618.80 USD, invoice 26-1187, B-0419');
    expect(text).toMatch(/Certification +1,500\.00/);
    expect(text).toContain('Not paid');
    expect((await rendered('remittance', { withheld: [] })).text).not.toContain('Not paid');
  });

  test('a refused invoice says which, why, and where a corrected one goes while the links stand', async () => {
    const { subject, text } = await rendered('invoice-refused');
    expect(subject).toBe('Heron Reach Floatworks refused invoice 26-1187, B-0419');
    expect(text).toContain('The lot charge stands twice.');
    expect(text).toContain('Send a corrected invoice');
    const ended = await rendered('invoice-refused', { url: null, invoiceNumber: null, totalMinor: null });
    expect(linksOf(ended.html)).toEqual([]);
    expect(ended.subject).toContain('refused an invoice');
    expect(ended.text).not.toContain('null');
  });

  test('moments are told in the zone of the reader', async () => {
    expect((await rendered('sign-in')).text.replace(/\s+/g, ' ')).toContain('Wed 17 Jun 07:42');
    expect((await rendered('sign-in', { zone: 'UTC' })).text.replace(/\s+/g, ' ')).toContain(
      'Wed 17 Jun 12:42',
    );
  });

  test('what a mail cannot be made of is refused with its field', async () => {
    await expect(rendered('dispatch', { lines: [] })).rejects.toThrow(/lines/);
    await expect(rendered('sign-in', { url: 'not an address' })).rejects.toThrow(/url/);
  });
});
