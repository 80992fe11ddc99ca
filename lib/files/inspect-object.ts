import { createHash } from 'node:crypto';

import { getObject, headObject } from '@/lib/storage/object-store';

import { LARGEST_FILE } from './kinds';
import { sniffKind, SNIFFED_BYTES, type Sniffed } from './sniff-kind';

export interface Inspected {
  size: number;
  sha256: string;
  sniffed: Sniffed;
}

/** Reads an upload back from storage, whole, and says what really lies there; null where nothing does. */
export async function inspectObject(key: string): Promise<Inspected | null> {
  const stored = await headObject(key);
  if (stored === null) return null;
  const hash = createHash('sha256');
  const head: Buffer[] = [];
  let size = 0;
  const { body } = await getObject(key);
  for await (const chunk of body as AsyncIterable<Buffer>) {
    if (size < SNIFFED_BYTES) head.push(chunk.subarray(0, SNIFFED_BYTES - size));
    size += chunk.length;
    // Leaving the loop closes the stream: whoever announced 1 byte and found a way to store more costs us no more.
    if (size > LARGEST_FILE) break;
    hash.update(chunk);
  }
  return { size, sha256: hash.digest('hex'), sniffed: await sniffKind(Buffer.concat(head)) };
}
