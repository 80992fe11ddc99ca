import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { contentDisposition, safeFileName } from '@/lib/files/file-name';
import { acceptedFiles, claimedKind, sizeWords } from '@/lib/files/kinds';
import { isWhatItSays, sniffKind } from '@/lib/files/sniff-kind';

describe('the name of a file', () => {
  test.each([
    ['C:\\fakepath\\cert.pdf', 'cert.pdf'],
    ['../../etc/passwd', 'passwd'],
    ['cert\u202efdp.exe', 'certfdp.exe'],
    ['  ..hidden. ', 'hidden'],
    ['a\tb\nc.pdf', 'abc.pdf'],
    ['\u0000', 'file'],
    ['', 'file'],
    ['Prüfzeugnis 41 Stück.pdf', 'Prüfzeugnis 41 Stück.pdf'],
  ])('%j is kept as %j', (sent, kept) => expect(safeFileName(sent)).toBe(kept));

  test('a long name keeps its ending', () =>
    expect(safeFileName(`${'x'.repeat(900)}.pdf`)).toMatch(/^x+….pdf$/));

  test('is one header line whatever it was, and means itself when it is read back', () =>
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (sent) => {
        const header = contentDisposition('attachment', sent);
        expect(header).toMatch(/^attachment; filename="[\x20-\x7e]*"; filename\*=UTF-8''[\w.~%&$+^`{|}#-]+$/);
        expect(safeFileName(decodeURIComponent(header.split("''")[1] ?? ''))).toBe(
          safeFileName(safeFileName(sent).toWellFormed()),
        );
      }),
    ));
});

describe('what a file says it is', () => {
  test.each([
    ['certificate', 'a.PDF', { kind: 'pdf' }],
    ['certificate', 'a.jpeg', { kind: 'jpeg' }],
    ['chart', 'a.tsv', { kind: 'tsv' }],
    ['photo', 'IMG_1.heic', { kind: 'heic' }],
    ['concession', 'yes.eml', { kind: 'eml' }],
  ] as const)('a %s named %s', (purpose, name, claimed) =>
    expect(claimedKind({ purpose, name, mediaType: '', size: 1 })).toEqual(claimed),
  );

  test('without an ending the browser is asked', () =>
    expect(claimedKind({ purpose: 'photo', name: 'image', mediaType: 'image/jpeg', size: 1 })).toEqual({
      kind: 'jpeg',
    }));
  test('a script is nothing we take', () =>
    expect(claimedKind({ purpose: 'photo', name: 'x.svg', mediaType: 'image/png', size: 1 })).toHaveProperty(
      'refusal',
    ));
  test('nobody sends a traveller', () =>
    expect(claimedKind({ purpose: 'traveller', name: 'x.pdf', mediaType: '', size: 1 })).toMatchObject({
      refusal: expect.stringMatching(/made by Lotwright itself/) as string,
    }));
  test('the chooser offers the same kinds', () =>
    expect(acceptedFiles('certificate')).toBe(
      '.pdf,.png,image/png,.jpg,.jpeg,image/jpeg,.tif,.tiff,image/tiff,.eml,.txt,.log',
    ));
  test.each([
    [12, '12 bytes'],
    [240 * 1024, '240 KB'],
    [1.8 * 1024 * 1024, '1.8 MB'],
  ])('%i is said as %s', (bytes, words) => expect(sizeWords(bytes)).toBe(words));
});

describe('what a file is', () => {
  const mail = Buffer.from(
    'From: a@b.test\r\nDate: Thu, 16 Apr 2026 08:00:00 +0000\r\nSubject: concession\r\n\r\nUse as is.',
  );
  test.each([
    ['a PDF behind a line of the scanner', Buffer.from('\r\nscan\r\n%PDF-1.4'), 'pdf'],
    ['UTF-16 text', Buffer.from('\ufefftime,C', 'utf16le'), 'text'],
    ['text in a national code page', Buffer.from('Härte;°C', 'latin1'), 'text'],
    ['text that begins like a bitmap', Buffer.from('BM furnace 3'), 'text'],
    ['a saved mail', mail, 'eml'],
    ['nothing', Buffer.alloc(0), 'other'],
  ])('%s', async (_what, head, is) => expect(await sniffKind(head)).toMatchObject({ is }));

  test('a mail may be sent as text, text not as a mail', () => {
    expect(isWhatItSays('txt', { is: 'eml' })).toBe(true);
    expect(isWhatItSays('eml', { is: 'text' })).toBe(false);
    expect(isWhatItSays('pdf', { is: 'text' })).toBe(false);
  });
});
