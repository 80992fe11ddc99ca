import { eq } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { auditEntries } from '@/db/schema/audit';
import { batches } from '@/db/schema/batches';
import { files } from '@/db/schema/files';
import type { Endpoint } from '@/lib/api/endpoint';
import { readFileContentEndpoint } from '@/lib/files/endpoints';
import { requestUpload } from '@/lib/files/request-upload';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { storeMadeFile } from '@/lib/files/store-made-file';
import { newId } from '@/lib/ids';
import { headObject } from '@/lib/storage/object-store';

import {
  announceUpload,
  complete,
  inSteps,
  PDF,
  PNG,
  somePdf,
  uploadFile,
  type As,
  type Sent,
} from '../../factories/uploads';
import { makeWorld, TODAY, type World } from '../../factories/world';
import { openDatabase } from '../open-database';

const base = openDatabase();

async function setup() {
  const world = await makeWorld(base.db, base.owner);
  // Storage keeps real time: an address signed for another day is refused.
  const now = new Date();
  const lead: As = (work) => world.as(['lead'], work, now);
  return { world, lead, now };
}

/** A batch as the files see it: dispatched or not. */
async function batchOf(world: World, dispatched = true): Promise<string> {
  const id = newId();
  await base.owner.insert(batches).values({
    id,
    shopId: world.shopId,
    number: `B-${id.slice(-6)}`,
    orderNumber: `TP-${id.slice(-6)}`,
    processorId: world.processorId,
    process: 'anodize',
    specification: 'MIL-A-8625',
    currency: 'USD',
    createdAt: TODAY,
    ...(dispatched ? { dispatchedAt: TODAY, stage: 'dispatched' as const } : {}),
  });
  return id;
}

const put = (upload: { url: string; headers: Record<string, string> }, content: Buffer) =>
  fetch(upload.url, { method: 'PUT', headers: upload.headers, body: new Uint8Array(content) });

const stateOf = async (as: As, fileId: string) =>
  (await as(({ tx }) => tx.select().from(files).where(eq(files.id, fileId))))[0];

const drawing = (content = somePdf(newId())): Sent => ({
  purpose: 'drawing',
  name: 'FL-4418-03_C.pdf',
  content,
});

test('a file counts once it is sent, read back and hashed; the audit says so', async () => {
  const { lead, now } = await setup();
  const sent = drawing();
  const { file, upload } = await announceUpload(lead, sent);
  expect(file.state).toBe('awaited');
  if (!upload) throw new Error('no address');
  expect((await put(upload, sent.content)).status).toBe(200);
  await complete(lead, file.id);

  const kept = await stateOf(lead, file.id);
  expect(kept).toMatchObject({
    state: 'verified',
    size: sent.content.length,
    mediaType: 'application/pdf',
    verifiedAt: now,
  });
  const audit = await lead(({ tx }) =>
    tx
      .select({ action: auditEntries.action })
      .from(auditEntries)
      .where(eq(auditEntries.entityId, file.id))
      .orderBy(auditEntries.seq),
  );
  expect(audit.map(({ action }) => action)).toEqual(['file.announce', 'file.receive']);
});

test('completing twice changes nothing', async () => {
  const { lead } = await setup();
  const fileId = await uploadFile(lead, drawing());
  const before = await stateOf(lead, fileId);
  await complete(lead, fileId);
  expect(await stateOf(lead, fileId)).toEqual(before);
});

test('whoever may only read cannot add a file', async () => {
  const { world } = await setup();
  await expect(announceUpload((work) => world.as(['auditor'], work), drawing())).rejects.toMatchObject({
    code: 'not_allowed',
  });
});

test.each([
  ['an empty file', { name: 'empty.pdf', content: Buffer.alloc(0) }, 'bad_input', /0 bytes/],
  [
    'a kind that is never a drawing',
    { name: 'run.exe', content: PDF },
    'bad_input',
    /run\.exe cannot be a drawing/,
  ],
  [
    'a chart sent as a drawing',
    { name: 'run.csv', content: Buffer.from('t,C\n') },
    'bad_input',
    /a PDF, a PNG picture/,
  ],
] as const)('%s is refused when it is announced', async (_what, file, code, message) => {
  const { lead } = await setup();
  const refusal = announceUpload(lead, { purpose: 'drawing', ...file });
  await expect(refusal).rejects.toMatchObject({
    code,
    message: expect.stringMatching(message) as string,
    details: { fields: [{ field: 'file' }] },
  });
});

test('over 50 MB is refused when it is announced', async () => {
  const { lead } = await setup();
  const refusal = lead((ctx) =>
    requestUpload(ctx, {
      purpose: 'drawing',
      name: 'big.pdf',
      mediaType: '',
      size: 50 * 1024 * 1024 + 1,
      sha256: '0'.repeat(64),
    }),
  );
  await expect(refusal).rejects.toMatchObject({
    code: 'too_large',
    message: 'big.pdf has 50.0 MB; the most is 50 MB. Scan it in fewer colours or split it.',
  });
});

test.each([
  ['a picture named .pdf', 'scan.pdf', PNG, /scan\.pdf is not a PDF, as its name says: it is a PNG picture/],
  [
    'a page named .pdf',
    'cert.pdf',
    Buffer.from('<html><script>alert(1)</script></html>'),
    /it is plain text/,
  ],
  ['an archive named .png', 'photo.png', Buffer.from('504b0304140000000800', 'hex'), /it is a ZIP file/],
  ['bytes of no kind', 'scan.tif', Buffer.from([0, 1, 2, 3, 4, 5, 6, 7, 8, 9]), /no kind of file/],
])('%s is refused with what it really is, and its bytes go', async (_what, name, bytes, message) => {
  const { lead } = await setup();
  const content = Buffer.concat([bytes, Buffer.from(newId())]);
  const { file, upload } = await announceUpload(lead, { purpose: 'drawing', name, content });
  if (!upload) throw new Error('no address');
  await put(upload, content);
  await expect(complete(lead, file.id)).rejects.toMatchObject({
    code: 'bad_input',
    message: expect.stringMatching(message) as string,
  });
  const kept = await stateOf(lead, file.id);
  expect(kept?.state).toBe('refused');
  expect(await headObject(kept?.storageKey ?? '')).toBeNull();
  // Asked again, it says the same; the right file may then be sent.
  await expect(complete(lead, file.id)).rejects.toMatchObject({
    message: expect.stringMatching(message) as string,
  });
});

test('an interrupted upload is told as such, and goes to the same place when it is sent again', async () => {
  const { lead } = await setup();
  const sent = drawing();
  const first = await announceUpload(lead, sent);
  await expect(complete(lead, first.file.id)).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringMatching(/interrupted. Send it again/) as string,
  });
  expect((await stateOf(lead, first.file.id))?.state).toBe('awaited');

  const again = await announceUpload(lead, sent);
  expect(again.file.id).toBe(first.file.id);
  if (!again.upload) throw new Error('no address');
  await put(again.upload, sent.content);
  await complete(lead, again.file.id);
  expect((await stateOf(lead, first.file.id))?.state).toBe('verified');
});

test('the address of an upload cannot replace the original afterwards', async () => {
  const { lead } = await setup();
  const sent = drawing();
  const { file, upload } = await announceUpload(lead, sent);
  if (!upload) throw new Error('no address');
  await put(upload, sent.content);
  await complete(lead, file.id);
  const forged = Buffer.from(sent.content);
  forged[9] = 0x39;
  expect((await put(upload, forged)).status).toBeGreaterThanOrEqual(400);
});

test('the same certificate twice in a batch is refused with the one it repeats; a drawing is simply used again', async () => {
  const { world, lead } = await setup();
  const batchId = await batchOf(world);
  const content = somePdf(newId());
  const fileId = await uploadFile(lead, { purpose: 'certificate', name: '26-04177.pdf', content, batchId });
  await expect(
    announceUpload(lead, { purpose: 'certificate', name: 'again.pdf', content, batchId }),
  ).rejects.toMatchObject({
    code: 'conflict',
    message:
      'again.pdf is already here as 26-04177.pdf, sent by Test Person: the same certificate to the last byte. Use that one, or choose another file.',
    details: { extra: { fileId } },
  });

  const first = await uploadFile(lead, drawing(content));
  const second = await announceUpload(lead, drawing(content));
  expect(second).toMatchObject({ upload: null, file: { id: first, state: 'verified' } });
});

test('two of the same at once: one counts', async () => {
  const { world, lead } = await setup();
  const batchId = await batchOf(world);
  const content = somePdf(newId());
  const ids = await Promise.all(
    [1, 2].map(() => announceUpload(lead, { purpose: 'certificate', name: 'c.pdf', content, batchId })),
  );
  expect(new Set(ids.map(({ file }) => file.id)).size).toBe(1);
});

test('a certificate for a batch that has not left is refused; only certificates may come for no batch yet', async () => {
  const { world, lead } = await setup();
  const batchId = await batchOf(world, false);
  await expect(
    announceUpload(lead, { purpose: 'certificate', name: 'c.pdf', content: somePdf(newId()), batchId }),
  ).rejects.toMatchObject({
    code: 'conflict',
    message: expect.stringMatching(/has not been dispatched yet/) as string,
  });
  const alone = await announceUpload(lead, {
    purpose: 'certificate',
    name: 'c.pdf',
    content: somePdf(newId()),
  });
  expect(alone.upload).not.toBeNull();
  await expect(
    announceUpload(lead, { purpose: 'invoice', name: 'i.pdf', content: somePdf(newId()) }),
  ).rejects.toMatchObject({ code: 'bad_input' });
  await expect(
    announceUpload((work) => world.asProcessor(work), {
      purpose: 'certificate',
      name: 'c.pdf',
      content: somePdf(newId()),
    }),
  ).rejects.toMatchObject({ code: 'bad_input' });
});

test('another shop neither completes, reads nor uses the file', async () => {
  const { lead } = await setup();
  const { world: stranger, lead: strange } = await setup();
  const fileId = await uploadFile(lead, drawing());
  await expect(complete(strange, fileId)).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    inSteps(strange, readFileContentEndpoint as unknown as Endpoint, { fileId, inline: '0' }),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(
    stranger.as(['lead'], (ctx) => requireVerifiedFile(ctx, { fileId, purpose: 'drawing' })),
  ).rejects.toMatchObject({ code: 'bad_input' });
});

test('the processor sends for its batch, reads its own and the traveller, and nothing else', async () => {
  const { world, lead } = await setup();
  const batchId = await batchOf(world);
  const link: As = (work) => world.asProcessor(work, batchId, new Date());
  const fileId = await uploadFile(link, {
    purpose: 'certificate',
    name: 'cert.pdf',
    content: somePdf(newId()),
    batchId,
  });
  expect(await stateOf(lead, fileId)).toMatchObject({
    shopId: world.shopId,
    processorId: world.processorId,
    batchId,
    state: 'verified',
    uploadedBy: 'Test Processor',
  });
  expect(
    await inSteps(link, readFileContentEndpoint as unknown as Endpoint, { fileId, inline: '0' }),
  ).toBeInstanceOf(Response);

  const own = await uploadFile(lead, {
    purpose: 'certificate',
    name: 'by-mail.pdf',
    content: somePdf(newId()),
    batchId,
  });
  await expect(
    inSteps(link, readFileContentEndpoint as unknown as Endpoint, { fileId: own, inline: '0' }),
  ).rejects.toMatchObject({ code: 'not_found' });
  await expect(announceUpload(link, drawing())).rejects.toMatchObject({ code: 'not_allowed' });
  const other = await batchOf(world);
  await expect(
    announceUpload(link, {
      purpose: 'certificate',
      name: 'c.pdf',
      content: somePdf(newId()),
      batchId: other,
    }),
  ).rejects.toMatchObject({ code: 'not_found' });
});

test('content is served so that nothing in it can run', async () => {
  const { lead } = await setup();
  const sent = drawing();
  const fileId = await uploadFile(lead, { ...sent, name: '../a\u202eb "ü".pdf' });
  const saved = (await inSteps(lead, readFileContentEndpoint as unknown as Endpoint, {
    fileId,
    inline: '0',
  })) as Response;
  expect(saved.headers.get('content-disposition')).toBe(
    `attachment; filename="ab ___.pdf"; filename*=UTF-8''ab%20%22%C3%BC%22.pdf`,
  );
  expect(saved.headers.get('x-content-type-options')).toBe('nosniff');
  expect(saved.headers.get('content-security-policy')).toMatch(/^sandbox; default-src 'none'/);
  expect(Buffer.from(await saved.arrayBuffer()).equals(sent.content)).toBe(true);

  const shown = (await inSteps(lead, readFileContentEndpoint as unknown as Endpoint, {
    fileId,
    inline: '1',
  })) as Response;
  expect(shown.headers.get('content-disposition')).toMatch(/^inline;/);
  await shown.body?.cancel();
});

test('a chart in any text is taken; it is only ever saved, never shown', async () => {
  const { world, lead } = await setup();
  const batchId = await batchOf(world);
  const fileId = await uploadFile(lead, {
    purpose: 'chart',
    name: 'F-3 run.csv',
    content: Buffer.from('time;°C\r\n08:00;493\r\n', 'latin1'),
    batchId,
  });
  const shown = (await inSteps(lead, readFileContentEndpoint as unknown as Endpoint, {
    fileId,
    inline: '1',
  })) as Response;
  expect(shown.headers.get('content-disposition')).toMatch(/^attachment;/);
  await shown.body?.cancel();
});

test('what the product makes itself is kept once, however often it is made', async () => {
  const { world, lead } = await setup();
  const tools = {
    inShop: <T>(_shop: string, work: Parameters<typeof world.as<T>>[1]) => world.as(['lead'], work),
  };
  const made = {
    shopId: world.shopId,
    batchId: null,
    purpose: 'dossier' as const,
    name: 'L-0001.pdf',
    mediaType: 'application/pdf',
    content: somePdf(newId()),
  };
  const first = await storeMadeFile(tools, made);
  expect(await storeMadeFile(tools, made)).toEqual(first);
  expect(await stateOf(lead, first.fileId)).toMatchObject({ state: 'verified', sha256: first.sha256 });
});

test('a verb takes a file only for what it was sent for, and only when it has arrived', async () => {
  const { world, lead } = await setup();
  const fileId = await uploadFile(lead, drawing());
  const need = (wanted: Parameters<typeof requireVerifiedFile>[1]) =>
    world.as(['lead'], (ctx) => requireVerifiedFile(ctx, wanted));
  await expect(need({ fileId, purpose: 'drawing' })).resolves.toMatchObject({ id: fileId });
  await expect(need({ fileId, purpose: 'certificate' })).rejects.toMatchObject({
    message: expect.stringMatching(/was sent as a drawing/) as string,
  });
  const { file } = await announceUpload(lead, drawing());
  await expect(need({ fileId: file.id, purpose: 'drawing', field: 'drawingFileId' })).rejects.toMatchObject({
    details: { fields: [{ field: 'drawingFileId' }] },
  });
});
