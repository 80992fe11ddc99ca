import { describe, expect, test } from 'vitest';
import { openFile } from '@/lib/evidence/open/open-file';
import { layOutText } from '@/lib/evidence/open/lay-out-text';
import { textOfHtml } from '@/lib/evidence/open/mail/text-of-html';
import { makePdf } from './make-pdf';

const bytesOf = (text: string) => new Uint8Array(Buffer.from(text));

describe('plain text', () => {
  test('keeps its columns: what stands under each other has the same left edge', () => {
    const [page] = layOutText('Part      Qty\n10-200    12\n10-201\t  9');
    const at = (text: string) => page?.words.find((word) => word.text === text)?.box;
    expect(at('12')?.[0]).toBe(at('Qty')?.[0]);
    expect(at('9')?.[0]).toBe(36 + 10 * 6);
    expect(at('10-200')?.[1]).toBe((at('Part')?.[1] ?? 0) + 12);
  });

  test('goes on to a new page after a form feed or 60 lines', () => {
    expect(layOutText('one\ftwo', 3).map(({ number }) => number)).toEqual([3, 4]);
    expect(layOutText('line\n'.repeat(61))).toHaveLength(2);
  });

  test('is read in the letters of older machines too', async () => {
    const { pages, kind } = await openFile(new Uint8Array([0x39, 0x32, 0x30, 0x20, 0xb0, 0x46]), {
      name: 'a.txt',
    });
    expect(kind).toBe('digital');
    expect(pages[0]?.words.map(({ text }) => text)).toEqual(['920', '°F']);
    expect(pages[0]?.origin).toBe('plain_text');
  });
});

describe('a web page as mail programs write it', () => {
  test('keeps rows of a table on a line, and leaves out scripts and what is styled away', () => {
    const html =
      '<html><head><title>no</title></head><body><script>no()</script><p style="display:none">no</p><table><tr><td>PO</td><td>5001 &deg;F</td></tr><tr><td>x</td></tr></table></body></html>';
    expect(
      textOfHtml(html)
        .trim()
        .split('\n')
        .map((line) => line.split(/\s{2,}/)),
    ).toEqual([['PO', '5001 °F'], ['x']]);
  });
});

describe('a mail', () => {
  const mail = (attachment: string, name: string) =>
    bytesOf(
      [
        'From: inspector@example.com',
        'To: shop@example.com',
        'Subject: Certificate',
        'MIME-Version: 1.0',
        'Content-Type: multipart/mixed; boundary=b',
        '',
        '--b',
        'Content-Type: text/plain',
        '',
        'Certificate for PO-5001 attached.',
        '--b',
        `Content-Type: application/octet-stream; name="${name}"`,
        `Content-Disposition: attachment; filename="${name}"`,
        'Content-Transfer-Encoding: base64',
        '',
        attachment,
        '--b--',
        '',
      ].join('\r\n'),
    );

  test('is its text, then the pages of what is attached', async () => {
    const pdf = await makePdf((p, font) => p.drawText('Hardness', { x: 72, y: 700, size: 10, font }));
    const { pages } = await openFile(mail(Buffer.from(pdf).toString('base64'), 'c.pdf'), { name: 'a.eml' });
    expect(pages.map(({ number, origin }) => [number, origin])).toEqual([
      [1, 'plain_text'],
      [2, 'text_layer'],
    ]);
    expect(pages[1]?.words[0]?.text).toBe('Hardness');
  });

  test('is read although something attached cannot be', async () => {
    const { pages } = await openFile(mail(Buffer.from('MZ').toString('base64'), '../../c.pdf'), {
      name: 'a.eml',
    });
    expect(pages).toHaveLength(1);
  });
});
