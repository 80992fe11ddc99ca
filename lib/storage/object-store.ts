import type { Readable } from 'node:stream';
import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadObjectCommand,
  PutObjectCommand,
  S3ServiceException,
} from '@aws-sdk/client-s3';
import { getSignedUrl } from '@aws-sdk/s3-request-presigner';
import { AppError, notFound } from '@/lib/errors';
import { ownStorage } from '@/lib/storage/storage-client';
import type { Storage } from '@/lib/storage/storage-client';

const UPLOAD_MINUTES = 10;

export interface UploadPromise {
  key: string;
  mediaType: string;
  sizeBytes: number;
  /** Hexadecimal. With it the address can only ever write these very bytes, so an original cannot be replaced through it. */
  sha256?: string;
  now: Date;
}

export interface SignedUpload {
  method: 'PUT';
  url: string;
  /** To be sent exactly so. The length is signed too, but browsers set it themselves. */
  headers: Record<string, string>;
  expiresAt: Date;
}

/** An address to which a browser may upload exactly what it announced, for ten minutes. Asks nobody, so it works while storage is down. */
export async function presignUpload(
  upload: UploadPromise,
  storage: Storage = ownStorage(),
): Promise<SignedUpload> {
  const { key, mediaType, sizeBytes, sha256, now } = upload;
  const command = new PutObjectCommand({
    Bucket: storage.bucket,
    Key: key,
    ContentType: mediaType,
    ContentLength: sizeBytes,
    ...(sha256 === undefined ? {} : { ChecksumSHA256: Buffer.from(sha256, 'hex').toString('base64') }),
  });
  const url = await getSignedUrl(storage.client, command, {
    expiresIn: UPLOAD_MINUTES * 60,
    signingDate: now,
    // Left to itself the client signs neither, and any file of any size could be sent.
    signableHeaders: new Set(['content-type', 'content-length']),
  });
  return {
    method: 'PUT',
    url,
    headers: { 'content-type': mediaType },
    expiresAt: new Date(now.getTime() + UPLOAD_MINUTES * 60_000),
  };
}

export interface StoredObject {
  sizeBytes: number;
  mediaType: string;
}

export interface NewObject {
  key: string;
  content: Buffer;
  mediaType: string;
}

/** For what the product makes itself (documents, archives). The same key with the same bytes may be put again. */
export async function putObject(
  { key, content, mediaType }: NewObject,
  storage: Storage = ownStorage(),
): Promise<void> {
  await reaching(() =>
    storage.client.send(
      new PutObjectCommand({
        Bucket: storage.bucket,
        Key: key,
        Body: content,
        ContentType: mediaType,
        ContentLength: content.length,
      }),
    ),
  );
}

/** The object as a stream, whole or one range of it (both ends included), or the refusal that it is not there. */
export async function getObject(
  key: string,
  range?: { firstByte: number; lastByte: number },
  storage: Storage = ownStorage(),
): Promise<StoredObject & { body: Readable }> {
  const found = await reaching(() =>
    storage.client.send(
      new GetObjectCommand({
        Bucket: storage.bucket,
        Key: key,
        ...(range === undefined ? {} : { Range: `bytes=${range.firstByte}-${range.lastByte}` }),
      }),
    ),
  );
  if (found?.Body === undefined) throw notFound('file');
  return { ...describe(found), body: found.Body as Readable };
}

/** The whole object in memory, for merging and hashing. Uploads are limited, so it fits. */
export async function readObject(key: string, storage: Storage = ownStorage()): Promise<Buffer> {
  const { body } = await getObject(key, undefined, storage);
  const chunks: Buffer[] = [];
  for await (const chunk of body as AsyncIterable<Buffer>) chunks.push(chunk);
  return Buffer.concat(chunks);
}

/** What storage says it holds, or null. It repeats the uploader's words about the type: only the bytes prove it. */
export async function headObject(key: string, storage: Storage = ownStorage()): Promise<StoredObject | null> {
  const found = await reaching(() =>
    storage.client.send(new HeadObjectCommand({ Bucket: storage.bucket, Key: key })),
  );
  return found === null ? null : describe(found);
}

/** Only for uploads that failed their verification or never came to be used. Evidence is never deleted. */
export async function deleteUnverifiedUpload(key: string, storage: Storage = ownStorage()): Promise<void> {
  await reaching(() => storage.client.send(new DeleteObjectCommand({ Bucket: storage.bucket, Key: key })));
}

/** Whether storage answers, knows us and has our bucket. Throws if not. */
export async function checkStorage(storage: Storage = ownStorage()): Promise<void> {
  // Looking for an object that is never there asks for no more rights than the work itself needs.
  await reaching(() => storage.client.send(new GetObjectCommand({ Bucket: storage.bucket, Key: '.ready' })));
}

/** Null for what is not there; one refusal, with a way on, for a storage that cannot be used. */
async function reaching<T>(work: () => Promise<T>): Promise<T | null> {
  try {
    return await work();
  } catch (error) {
    const isService = error instanceof S3ServiceException;
    if (isService && error.$metadata.httpStatusCode === 404 && error.name !== 'NoSuchBucket') return null;
    // The client's own error carries the whole signed request. It must not get into a log, so only its name goes on.
    throw new AppError(
      'unavailable',
      'The file store does not answer as it should. Nothing is lost; try again in a minute.',
      {
        extra: { reason: error instanceof Error ? error.name : 'unknown' },
      },
    );
  }
}

function describe(found: {
  ContentLength?: number | undefined;
  ContentType?: string | undefined;
}): StoredObject {
  return { sizeBytes: found.ContentLength ?? 0, mediaType: found.ContentType ?? 'application/octet-stream' };
}
