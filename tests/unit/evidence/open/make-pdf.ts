import { createHash } from 'node:crypto';
import { PDFDocument, StandardFonts, type PDFFont, type PDFPage } from 'pdf-lib';
import { openFile } from '@/lib/evidence/open/open-file';
import type { Page } from '@/lib/evidence/page';

/** A PDF of one letter page, drawn by `draw` with Helvetica. */
export async function makePdf(draw: (page: PDFPage, font: PDFFont) => void): Promise<Uint8Array> {
  const document = await PDFDocument.create();
  const font = await document.embedFont(StandardFonts.Helvetica);
  draw(document.addPage([612, 792]), font);
  return document.save({ useObjectStreams: false });
}

/** The first page of what `draw` draws, opened. */
export async function openDrawn(draw: (page: PDFPage, font: PDFFont) => void): Promise<Page> {
  const { pages } = await openFile(await makePdf(draw), { name: 'certificate.pdf' });
  const [page] = pages;
  if (!page) throw new Error('no page');
  return page;
}

export const texts = (page: Page) => page.words.map(({ text }) => text);

const PADDING = Buffer.from('28BF4E5E4E758A4164004E56FFFA01082E2E00B6D0683E802F0CA9FE6453697A', 'hex');

/** The stream cipher of old PDFs, which is not in today's libraries. */
function rc4(key: Buffer, data: Buffer): Buffer {
  const s = Array.from({ length: 256 }, (_, i) => i);
  const at = (i: number) => s[i & 255] ?? 0;
  for (let i = 0, j = 0; i < 256; i++) {
    j = (j + at(i) + (key[i % key.length] ?? 0)) & 255;
    [s[i], s[j]] = [at(j), at(i)];
  }
  let [i, j] = [0, 0];
  return Buffer.from(
    data.map((byte) => {
      i = (i + 1) & 255;
      j = (j + at(i)) & 255;
      [s[i], s[j]] = [at(j), at(i)];
      return byte ^ at(at(i) + at(j));
    }),
  );
}

/** A PDF that opens with `password` only (40 bits, revision 2), saying `words`. */
export function makeLockedPdf(password: string, words: string): Uint8Array {
  const md5 = (data: Buffer) => createHash('md5').update(data).digest();
  const padded = Buffer.concat([Buffer.from(password, 'latin1'), PADDING]).subarray(0, 32);
  const owner = rc4(md5(padded).subarray(0, 5), padded);
  const id = Buffer.from('00112233445566778899aabbccddeeff', 'hex');
  const permissions = Buffer.from([0xfc, 0xff, 0xff, 0xff]);
  const key = md5(Buffer.concat([padded, owner, permissions, id])).subarray(0, 5);
  const user = rc4(key, PADDING);
  const objectKey = md5(Buffer.concat([key, Buffer.from([4, 0, 0, 0, 0])])).subarray(0, 10);
  const content = rc4(objectKey, Buffer.from(`BT /F1 12 Tf 72 700 Td (${words}) Tj ET`, 'latin1'));
  const objects = [
    '<< /Type /Catalog /Pages 2 0 R >>',
    '<< /Type /Pages /Kids [3 0 R] /Count 1 >>',
    '<< /Type /Page /Parent 2 0 R /MediaBox [0 0 612 792] /Contents 4 0 R /Resources << /Font << /F1 5 0 R >> >> >>',
    `<< /Length ${content.length} >>\nstream\n${content.toString('latin1')}\nendstream`,
    '<< /Type /Font /Subtype /Type1 /BaseFont /Helvetica >>',
    `<< /Filter /Standard /V 1 /R 2 /O <${owner.toString('hex')}> /U <${user.toString('hex')}> /P -4 >>`,
  ];
  let file = '%PDF-1.4\n';
  const offsets = objects.map((object, i) => {
    const offset = file.length;
    file += `${i + 1} 0 obj\n${object}\nendobj\n`;
    return offset;
  });
  const table = offsets.map((offset) => `${String(offset).padStart(10, '0')} 00000 n \n`).join('');
  const hex = id.toString('hex');
  file += `xref\n0 7\n0000000000 65535 f \n${table}trailer\n<< /Size 7 /Root 1 0 R /Encrypt 6 0 R /ID [<${hex}> <${hex}>] >>\nstartxref\n${file.length}\n%%EOF\n`;
  return new Uint8Array(Buffer.from(file, 'latin1'));
}

/** A PDF whose page content is `stream`, described by `entries`. */
export function pdfWithStream(stream: Buffer, entries: string): Uint8Array {
  return new Uint8Array(
    Buffer.concat([
      Buffer.from(
        `%PDF-1.4\n1 0 obj\n<< /Type /Catalog /Pages 2 0 R >>\nendobj\n2 0 obj\n<< /Type /Pages /Kids [3 0 R] /Count 1 >>\nendobj\n3 0 obj\n<< /Type /Page /Parent 2 0 R /MediaBox [0 0 612 792] /Contents 4 0 R >>\nendobj\n4 0 obj\n<< /Length ${stream.length} ${entries} >>\nstream\n`,
      ),
      stream,
      Buffer.from('\nendstream\nendobj\ntrailer\n<< /Root 1 0 R >>\n%%EOF\n'),
    ]),
  );
}
