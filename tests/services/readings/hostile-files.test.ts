import { crc32, deflateSync } from 'node:zlib';
import { PDFDocument } from 'pdf-lib';
import { expect, test } from 'vitest';

import { addCertificate } from '@/lib/certificates/add-certificate';
import { getCertificate } from '@/lib/certificates/get-certificate';
import { getCertificateReading } from '@/lib/readings/get-certificate-reading';

import { makeDispatchedBatch } from '../../factories/batches';
import { certificatePaper, HEAT_TREAT, makePaperWorld, readAll } from '../../factories/papers';
import { uploadFile, type As } from '../../factories/uploads';
import { makeLockedPdf, pdfWithStream } from '../../unit/evidence/open/make-pdf';
import { openDatabase } from '../open-database';

const base = openDatabase();

interface Sent {
  name?: string;
  content: Buffer;
}

/** A batch that is out, and a good certificate of it. */
async function setup() {
  const world = await makePaperWorld(base);
  const batch = await world.as(['lead'], (ctx) =>
    makeDispatchedBatch(ctx, world.processorId, { requirements: HEAT_TREAT }),
  );
  return { world, batch, good: await certificatePaper(world, batch.id) };
}
type Setup = Awaited<ReturnType<typeof setup>>;

/** Sent, taken up and read as every certificate is; what the inspector is shown of it in the end. */
async function shownOf({ world, batch }: Setup, { name = 'certificate.pdf', content }: Sent) {
  // Storage keeps real time: an address signed for another day is refused.
  const office: As = (work) => world.as(['office'], work, new Date());
  const fileId = await uploadFile(office, { purpose: 'certificate', name, content, batchId: batch.id });
  const { id: certificateId } = await office((ctx) => addCertificate(ctx, { batchId: batch.id, fileId }));
  await readAll(base);
  return world.as(['inspector'], async (ctx) => ({
    name: (await getCertificate(ctx, { certificateId })).file.name,
    reading: await getCertificateReading(ctx, { certificateId }),
  }));
}

/** After whatever came before, a good certificate is read as ever. */
async function readsOn(at: Setup): Promise<void> {
  const { reading } = await shownOf(at, { content: Buffer.concat([at.good, Buffer.from('\n')]) });
  expect(reading).toMatchObject({ state: 'read', certificateNumber: '26-00417' });
}

const bombOf = (times: number): Buffer => {
  let packed: Buffer = deflateSync(Buffer.alloc(300 * 1024 * 1024), { level: 9 });
  for (let at = 1; at < times; at++) packed = deflateSync(packed, { level: 9 });
  const filters = '/FlateDecode '.repeat(times);
  return Buffer.from(pdfWithStream(packed, `/Filter [${filters}]`));
};

/** All black, one bit for each of its pixels. */
function hugePicture(side: number): Buffer {
  const chunk = (type: string, data: Buffer): Buffer => {
    const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
    const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)];
    length.writeUInt32BE(data.length);
    sum.writeUInt32BE(crc32(body));
    return Buffer.concat([length, body, sum]);
  };
  const head = Buffer.alloc(13);
  head.writeUInt32BE(side, 0);
  head.writeUInt32BE(side, 4);
  head[8] = 1;
  return Buffer.concat([
    Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'),
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(Buffer.alloc((side / 8 + 1) * side))),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

async function manyPages(count: number): Promise<Buffer> {
  const document = await PDFDocument.create();
  for (let at = 0; at < count; at++) document.addPage([200, 200]);
  return Buffer.from(await document.save());
}

const PAGE = '<!doctype html><html><script>fetch("/")</script><body>Certificate</body></html>';
const ARCHIVE = Buffer.from('PK\x03\x04\x14\x00\x00\x00\x08\x00certificate', 'latin1');

test.each<[string, (good: Buffer) => Sent | Promise<Sent>, RegExp]>([
  [
    'a PDF with an archive behind it',
    (good) => ({ content: Buffer.concat([good, ARCHIVE, Buffer.from('PK\x05\x06', 'latin1')]) }),
    /something else in one/,
  ],
  [
    'a web page with a PDF in it',
    (good) => ({ content: Buffer.concat([Buffer.from(PAGE), good]) }),
    /two kinds of file in one/,
  ],
  ['a stream that unpacks without end', () => ({ content: bombOf(1) }), /large|unpack/i],
  ['one that is packed twice', () => ({ content: bombOf(2) }), /large|unpack/i],
  ['3,000 pages', async () => ({ content: await manyPages(3000) }), /3,?000 pages/],
  ['30,000 × 30,000 px', () => ({ name: 'page.png', content: hugePicture(30_000) }), /30,?000/],
  [
    'a PDF cut off in its middle',
    (good) => ({ content: good.subarray(0, good.length * 0.6) }),
    /breaks off|damaged/,
  ],
  ['a locked PDF', () => ({ content: Buffer.from(makeLockedPdf('quench', 'Hardness')) }), /password/],
])('%s is kept, and the inspector is told why it could not be read', async (_, make, says) => {
  const at = await setup();
  const { reading } = await shownOf(at, await make(at.good));
  expect(reading).toMatchObject({
    state: 'unreadable',
    fault: expect.stringMatching(says) as string,
    facts: [],
    proposals: [],
  });
  await readsOn(at);
});

test.each<[string, Sent, RegExp]>([
  ['a web page named .pdf', { content: Buffer.from(PAGE) }, /certificate\.pdf/],
  ['an archive named .pdf', { content: ARCHIVE }, /certificate\.pdf/],
  [
    'a program whose name is written backwards',
    { name: 'certificate\u202efdp.exe', content: ARCHIVE },
    /certificatefdp\.exe cannot be a certificate/,
  ],
])('%s is refused where it is sent, in words', async (_, sent, says) => {
  const at = await setup();
  await expect(shownOf(at, sent)).rejects.toMatchObject({ message: expect.stringMatching(says) as string });
  await readsOn(at);
});

test('a script in a PDF is never run: what stands on the page is read', async () => {
  const at = await setup();
  const document = await PDFDocument.load(at.good);
  document.addJavaScript('open', 'app.alert("signed"); this.submitForm("http://127.0.0.1:1/");');
  const { reading } = await shownOf(at, { content: Buffer.from(await document.save()) });
  expect(reading).toMatchObject({ state: 'read', certificateNumber: '26-00417', discrepancies: [] });
});

test.each([
  ['../../../etc/certificate.pdf', 'certificate.pdf'],
  ['C:\\windows\\certificate.pdf', 'certificate.pdf'],
  ['certi\u202eficate\u0000.pdf', 'certificate.pdf'],
])('%j is shown and kept as %s', async (name, kept) => {
  const at = await setup();
  const shown = await shownOf(at, { name, content: at.good });
  expect(shown).toMatchObject({ name: kept, reading: { state: 'read' } });
});
