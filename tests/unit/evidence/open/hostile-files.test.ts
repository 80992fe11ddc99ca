import { deflateSync } from 'node:zlib';
import { PDFDocument } from 'pdf-lib';
import sharp from 'sharp';
import { describe, expect, test } from 'vitest';
import { openFile, type OpenOptions } from '@/lib/evidence/open/open-file';
import { USUAL_LIMITS } from '@/lib/evidence/open/limits';
import { makeLockedPdf, makePdf, pdfWithStream } from './make-pdf';

const bytesOf = (text: string) => new Uint8Array(Buffer.from(text, 'latin1'));
const refusal = (bytes: Uint8Array, options: OpenOptions) =>
  openFile(bytes, options).then(
    () => 'opened',
    (cause: { code?: string }) => cause.code,
  );
const certificate = () =>
  makePdf((p, font) => p.drawText('Certificate of conformance', { x: 72, y: 700, size: 12, font }));

describe('a file that cannot be read says why', () => {
  test.each([
    ['nothing', new Uint8Array(0), 'a.pdf', 'empty'],
    ['zeros', new Uint8Array(4096), 'a.pdf', 'empty'],
    [
      'a web page named .pdf',
      bytesOf('<!DOCTYPE html><html><body>Certificate</body></html>'),
      'a.pdf',
      'not_what_its_name_says',
    ],
    ['an archive named .pdf', bytesOf('PK\x03\x04\x14\x00\x00\x00'), 'a.pdf', 'not_what_its_name_says'],
    ['text named .jpg', bytesOf('Certificate of conformance'), 'a.jpg', 'not_what_its_name_says'],
    ['an office document', bytesOf('PK\x03\x04\x14\x00\x00\x00'), 'a.docx', 'kind_not_supported'],
    ['a program', bytesOf('MZ\x90\x00\x03\x00'), 'a.exe', 'kind_not_supported'],
    [
      'a web page in front of a PDF',
      bytesOf('<html><script>1</script>%PDF-1.4\n%%EOF'),
      'a.pdf',
      'not_what_its_name_says',
    ],
    ['a header and no more', bytesOf('%PDF-1.4\nrubbish\n%%EOF'), 'a.pdf', 'damaged'],
    ['a broken JPEG', bytesOf('\xff\xd8\xff\xe0rubbish'), 'a.jpg', 'damaged'],
  ])('%s', async (_, bytes, name, code) => {
    expect(await refusal(bytes, { name })).toBe(code);
  });

  test('a PDF cut off in its middle', async () => {
    const bytes = await certificate();
    expect(await refusal(bytes.subarray(0, bytes.length * 0.6), { name: 'a.pdf' })).toBe('damaged');
  });

  test('a PDF with an archive behind it', async () => {
    const bytes = Buffer.concat([await certificate(), Buffer.from('PK\x03\x04rest PK\x05\x06', 'latin1')]);
    expect(await refusal(new Uint8Array(bytes), { name: 'a.pdf' })).toBe('not_what_its_name_says');
  });

  test('a truncated picture', async () => {
    const noise = Buffer.from(Array.from({ length: 90_000 }, (_, i) => (i * 7919) % 251));
    const jpeg = await sharp(noise, { raw: { width: 300, height: 300, channels: 1 } })
      .jpeg()
      .toBuffer();
    expect(await refusal(new Uint8Array(jpeg.subarray(0, jpeg.length / 2)), { name: 'a.jpg' })).toBe(
      'damaged',
    );
  });

  test('too many bytes, pages, pixels', async () => {
    const document = await PDFDocument.create();
    for (let i = 0; i < 61; i++) document.addPage([200, 200]);
    expect(await refusal(await document.save(), { name: 'a.pdf' })).toBe('too_many_pages');
    expect(
      await refusal(await certificate(), { name: 'a.pdf', limits: { ...USUAL_LIMITS, bytes: 100 } }),
    ).toBe('too_large');
    const black = await sharp({ create: { width: 9000, height: 9000, channels: 3, background: 'black' } })
      .png()
      .toBuffer();
    expect(await refusal(new Uint8Array(black), { name: 'a.png' })).toBe('too_large');
  });

  test('streams that unpack without end, also when packed twice', async () => {
    const megabytes = deflateSync(Buffer.alloc(300 * 1024 * 1024), { level: 9 });
    expect(await refusal(pdfWithStream(megabytes, '/Filter /FlateDecode'), { name: 'a.pdf' })).toBe(
      'too_large',
    );
    const twice = deflateSync(megabytes, { level: 9 });
    expect(twice.length).toBeLessThan(64 * 1024);
    expect(
      await refusal(pdfWithStream(twice, '/Filter [/FlateDecode /FlateDecode]'), { name: 'a.pdf' }),
    ).toBe('too_large');
    const picture = pdfWithStream(Buffer.from('x'), '/Subtype /Image /Width 30000 /Height 30000');
    expect(await refusal(picture, { name: 'a.pdf' })).toBe('too_large');
  });

  test('an impatient caller', async () => {
    const limits = { ...USUAL_LIMITS, signal: AbortSignal.abort() };
    expect(await refusal(await certificate(), { name: 'a.pdf', limits })).toBe('took_too_long');
  });
});

test('a locked PDF asks for its password, refuses a wrong one, opens with the right one', async () => {
  const locked = makeLockedPdf('quench', 'Hardness HRB');
  expect(await refusal(locked, { name: 'a.pdf' })).toBe('password_needed');
  expect(await refusal(locked, { name: 'a.pdf', password: 'temper' })).toBe('wrong_password');
  const { pages } = await openFile(locked, { name: 'a.pdf', password: 'quench' });
  expect(pages[0]?.words.map(({ text }) => text)).toEqual(['Hardness', 'HRB']);
});
