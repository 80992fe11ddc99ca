import { createHash, randomUUID } from 'node:crypto';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { request as httpRequest } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest';
import { startStorageServer, type StorageServer } from '@/fakes/storage/server';
import {
  checkStorage,
  deleteUnverifiedUpload,
  getObject,
  headObject,
  presignUpload,
  putObject,
  readObject,
} from '@/lib/storage/object-store';
import { makeStorage, type Storage } from '@/lib/storage/storage-client';

const ORIGIN = 'http://localhost:5600';

let dir: string;
let server: StorageServer;
let storage: Storage;

beforeAll(async () => {
  dir = await mkdtemp(path.join(tmpdir(), 'storage-'));
  server = await startStorageServer({ port: 0, dir, origins: [ORIGIN] });
  storage = storageAt(server.address);
});
afterEach(() => fail('none'));
afterAll(async () => {
  await server.close();
  await rm(dir, { recursive: true, force: true });
});

function storageAt(endpoint: string, changes: { bucket?: string; secretAccessKey?: string } = {}): Storage {
  return makeStorage({
    endpoint,
    region: 'us-east-1',
    bucket: 'lotwright',
    accessKeyId: 'S3RVER',
    secretAccessKey: 'S3RVER',
    ...changes,
  });
}

async function fail(mode: string): Promise<void> {
  const answer = await fetch(`${server.address}/control`, {
    method: 'POST',
    body: JSON.stringify({ fail: mode }),
  });
  expect(answer.status).toBe(200);
}

const newKey = () => `uploads/${randomUUID()}`;
const sha256Of = (content: Buffer) => createHash('sha256').update(content).digest('hex');
const content = Buffer.from('%PDF-1.7 a certificate of 41 pieces');

const announce = (
  changes: { mediaType?: string; sizeBytes?: number; sha256?: string; now?: Date; key?: string } = {},
) =>
  presignUpload(
    { key: newKey(), mediaType: 'application/pdf', sizeBytes: content.length, now: new Date(), ...changes },
    storage,
  );

const upload = ({ url, headers }: { url: string; headers: Record<string, string> }, body: Buffer = content) =>
  fetch(url, { method: 'PUT', headers, body: new Uint8Array(body) });

describe('an upload straight from the browser', () => {
  test('of exactly what was announced is taken', async () => {
    const key = newKey();
    const signed = await announce({ key, sha256: sha256Of(content) });
    expect((await upload(signed)).status).toBe(200);
    expect(await headObject(key, storage)).toEqual({
      sizeBytes: content.length,
      mediaType: 'application/pdf',
    });
    expect((await readObject(key, storage)).equals(content)).toBe(true);
  });

  test('of another type is refused', async () => {
    const key = newKey();
    const signed = await announce({ key });
    expect((await upload({ ...signed, headers: { 'content-type': 'text/html' } })).status).toBe(403);
    expect(await headObject(key, storage)).toBeNull();
  });

  test.each([
    ['longer', Buffer.concat([content, content])],
    ['shorter', content.subarray(1)],
  ])('that is %s than announced is refused', async (_how, body) => {
    const key = newKey();
    expect((await upload(await announce({ key }), body)).status).toBe(403);
    expect(await headObject(key, storage)).toBeNull();
  });

  test('of other bytes of the same length is refused, also over a file that is already there', async () => {
    const key = newKey();
    const signed = await announce({ key, sha256: sha256Of(content) });
    const forged = Buffer.from(content);
    forged[10] = 0x21;
    expect((await upload(signed, forged)).status).toBe(400);
    expect(await headObject(key, storage)).toBeNull();

    expect((await upload(signed)).status).toBe(200);
    expect((await upload(signed, forged)).status).toBe(400);
    expect((await readObject(key, storage)).equals(content)).toBe(true);
  });

  test.each([
    [
      'another signature',
      (url: string) =>
        url.replace(/X-Amz-Signature=(.)/, (_all, digit) => `X-Amz-Signature=${digit === '0' ? '1' : '0'}`),
    ],
    ['another key', (url: string) => url.replace('/uploads/', '/originals/')],
    ['a later expiry', (url: string) => url.replace('X-Amz-Expires=600', 'X-Amz-Expires=6000')],
    ['no signature at all', (url: string) => url.split('?')[0] ?? ''],
  ])('with %s is refused', async (_how, change) => {
    const signed = await announce();
    const url = change(signed.url);
    expect(url).not.toBe(signed.url);
    expect((await upload({ ...signed, url })).status).toBe(403);
  });

  test('is refused after ten minutes', async () => {
    const signed = await announce({ now: new Date(Date.now() - 11 * 60_000) });
    expect((await upload(signed)).status).toBe(403);
    expect(signed.expiresAt.getTime()).toBeLessThan(Date.now());
  });

  test('may come from our pages and from no other', async () => {
    const { url } = await announce();
    const preflight = (origin: string) =>
      fetch(url, {
        method: 'OPTIONS',
        headers: {
          origin,
          'access-control-request-method': 'PUT',
          'access-control-request-headers': 'content-type',
        },
      });
    expect((await preflight(ORIGIN)).status).toBe(200);
    expect((await preflight('http://elsewhere.test')).status).toBe(403);
  });

  test('that is cut half way leaves nothing behind', async () => {
    const key = newKey();
    const { url, headers } = await announce({ key, sizeBytes: 1_000_000 });
    await new Promise<void>((resolve) => {
      const sending = httpRequest(url, {
        method: 'PUT',
        headers: { ...headers, 'content-length': '1000000' },
      });
      sending.on('error', () => resolve());
      sending.write(Buffer.alloc(200_000), () => setTimeout(() => sending.destroy(new Error('cut')), 50));
    });
    await expect
      .poll(
        async () => (await readdir(dir, { recursive: true })).filter((name) => name.endsWith('.partial')),
        { timeout: 20_000 },
      )
      .toEqual([]);
    expect(await headObject(key, storage)).toBeNull();
  });
});

describe('an object', () => {
  test('we put is read back whole or in part, and repeating it changes nothing', async () => {
    const object = { key: `documents/${randomUUID()}.pdf`, content, mediaType: 'application/pdf' };
    await putObject(object, storage);
    await putObject(object, storage);
    expect((await readObject(object.key, storage)).equals(content)).toBe(true);

    const part = await getObject(object.key, { firstByte: 0, lastByte: 3 }, storage);
    expect(part.sizeBytes).toBe(4);
    expect(Buffer.concat(await part.body.toArray()).toString()).toBe('%PDF');
  });

  test('of no bytes can be kept', async () => {
    const key = newKey();
    await putObject({ key, content: Buffer.alloc(0), mediaType: 'text/plain' }, storage);
    expect(await headObject(key, storage)).toMatchObject({ sizeBytes: 0 });
    expect((await readObject(key, storage)).length).toBe(0);
  });

  test('that is not there is null to look at and not found to read', async () => {
    expect(await headObject('nothing/here', storage)).toBeNull();
    await expect(readObject('nothing/here', storage)).rejects.toMatchObject({ code: 'not_found' });
  });

  test('of a failed verification can be removed, twice', async () => {
    const key = newKey();
    await putObject({ key, content, mediaType: 'application/pdf' }, storage);
    await deleteUnverifiedUpload(key, storage);
    await deleteUnverifiedUpload(key, storage);
    expect(await headObject(key, storage)).toBeNull();
  });

  test('is refused to a client with the wrong key', async () => {
    const stranger = storageAt(server.address, { secretAccessKey: 'guessed' });
    await expect(
      putObject({ key: newKey(), content, mediaType: 'application/pdf' }, stranger),
    ).rejects.toMatchObject({
      code: 'unavailable',
      details: { extra: { reason: 'SignatureDoesNotMatch' } },
    });
  });
});

describe('a storage in trouble', () => {
  test('is one refusal with a way on, and does not stop an address from being signed', async () => {
    await fail('refuse');
    await expect(headObject('any', storage)).rejects.toMatchObject({ code: 'unavailable' });
    await fail('drop');
    await expect(headObject('any', storage)).rejects.toMatchObject({ code: 'unavailable' });
    await expect(announce()).resolves.toMatchObject({ method: 'PUT' });
  });

  test('that breaks off in the middle of an upload keeps nothing, and takes it the next time', async () => {
    const key = newKey();
    const signed = await announce({ key });
    await fail('cut');
    await expect(upload(signed)).rejects.toThrow();
    await fail('none');
    expect(await headObject(key, storage)).toBeNull();
    expect((await upload(signed)).status).toBe(200);
  });

  test('is seen by the readiness check, and so is a missing bucket', async () => {
    await expect(checkStorage(storage)).resolves.toBeUndefined();
    await expect(checkStorage(storageAt(server.address, { bucket: 'another' }))).rejects.toMatchObject({
      code: 'unavailable',
    });
    await expect(
      checkStorage(storageAt(server.address, { secretAccessKey: 'guessed' })),
    ).rejects.toMatchObject({ code: 'unavailable' });
    await expect(checkStorage(storageAt('http://127.0.0.1:1'))).rejects.toMatchObject({
      code: 'unavailable',
    });
  });
});
