import { AsyncLocalStorage } from 'node:async_hooks';
import { createHash, randomUUID } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { rename, rm } from 'node:fs/promises';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import S3Error from '@20minutes/s3rver/lib/models/error.js';
import type S3rver from '@20minutes/s3rver';

interface Expectation {
  sha256: string | undefined;
}

/** What the current request promised about its body; the store itself is not shown the request's headers. */
export const expected = new AsyncLocalStorage<Expectation>();

/**
 * Makes an object appear whole or not at all, and only if it is what the request said.
 *
 * The package writes straight to the final name, so that an upload cut half way would be found as a short object; the
 * real service never shows one, and what we build on it must not be tested against something laxer.
 */
export function keepWholeObjectsOnly(s3: S3rver): void {
  s3.store.putContent = async (objectPath, content) => {
    const partial = `${objectPath}.${randomUUID()}.partial`;
    const md5 = createHash('md5');
    const sha256 = createHash('sha256');
    let sizeBytes = 0;

    try {
      await pipeline(
        Buffer.isBuffer(content) ? Readable.from([content]) : content,
        async function* measured(chunks: AsyncIterable<Buffer>) {
          for await (const chunk of chunks) {
            md5.update(chunk);
            sha256.update(chunk);
            sizeBytes += chunk.length;
            yield chunk;
          }
        },
        createWriteStream(partial),
      );
      refuseOtherContent(sha256.digest('base64'));
      await rename(partial, objectPath);
    } catch (error) {
      await rm(partial, { force: true });
      throw error;
    }
    return [sizeBytes, md5.digest('hex')];
  };
}

function refuseOtherContent(sha256: string): void {
  const promised = expected.getStore()?.sha256;
  if (promised !== undefined && promised !== sha256) {
    throw new S3Error('BadDigest', 'The SHA256 you specified did not match the calculated checksum.');
  }
}
