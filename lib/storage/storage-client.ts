import { S3Client } from '@aws-sdk/client-s3';
import { env } from '@/lib/env';

export interface StorageConfig {
  endpoint: string;
  region: string;
  bucket: string;
  accessKeyId: string;
  secretAccessKey: string;
}

/** Where objects are kept: a client and the one bucket that is ours. */
export interface Storage {
  client: S3Client;
  bucket: string;
}

export function makeStorage({
  endpoint,
  region,
  bucket,
  accessKeyId,
  secretAccessKey,
}: StorageConfig): Storage {
  const client = new S3Client({
    endpoint,
    region,
    credentials: { accessKeyId, secretAccessKey },
    // The bucket in the path, not in the host name: it works with every service that speaks the protocol.
    forcePathStyle: true,
    // By default the client would sign the checksum of an empty body into an upload address.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 3,
    requestHandler: { connectionTimeout: 3_000, requestTimeout: 60_000 },
  });
  return { client, bucket };
}

let shared: Storage | undefined;

/** The installation's own, made when first needed. */
export function ownStorage(): Storage {
  shared ??= makeStorage({
    endpoint: env.S3_ENDPOINT,
    region: env.S3_REGION,
    bucket: env.S3_BUCKET,
    accessKeyId: env.S3_ACCESS_KEY_ID,
    secretAccessKey: env.S3_SECRET_ACCESS_KEY,
  });
  return shared;
}
