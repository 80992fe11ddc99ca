import { Readable } from 'node:stream';

import type { Outside } from '@/lib/api/endpoint';
import type { Ctx } from '@/lib/auth/context';
import { authorize } from '@/lib/auth/authorize';
import { getObject } from '@/lib/storage/object-store';

import { contentDisposition } from './file-name';
import { mayBeShownInline } from './kinds';
import { getVerifiedFile } from './queries';

interface ReadFileContentInput {
  fileId: string;
  inline: '0' | '1';
}

/**
 * Opens the stream from storage outside any transaction. Whatever lies in the file, it cannot act as a page of ours:
 * its type is not guessed, it may load nothing and run nothing, and most of it is only ever saved.
 */
export async function openFileContent(
  outside: Outside,
  { fileId, inline }: ReadFileContentInput,
): Promise<Response> {
  const file = await outside.inTenant((ctx) => getVerifiedFile(ctx, { fileId }));
  const { body } = await getObject(file.storageKey);
  return new Response(Readable.toWeb(body) as ReadableStream<Uint8Array>, {
    headers: fileHeaders(file, inline === '1'),
  });
}

export async function readFileContent(
  ctx: Ctx,
  _input: ReadFileContentInput,
  content: Response,
): Promise<Response> {
  authorize(ctx, 'file.read');
  return Promise.resolve(content);
}

/** Headers under which any kept file leaves us; also for documents that are made as one asks for them. */
export function fileHeaders(
  file: { name: string; mediaType: string; size?: number; sha256?: string | null },
  inline: boolean,
): Record<string, string> {
  const how = inline && mayBeShownInline(file.mediaType) ? 'inline' : 'attachment';
  return {
    'content-type': file.mediaType,
    ...(file.size === undefined ? {} : { 'content-length': String(file.size) }),
    'content-disposition': contentDisposition(how, file.name),
    'x-content-type-options': 'nosniff',
    'content-security-policy':
      "sandbox; default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'",
    'cross-origin-resource-policy': 'same-origin',
    'cache-control': 'private, no-store',
    ...(file.sha256 == null ? {} : { 'x-content-sha256': file.sha256 }),
  };
}
