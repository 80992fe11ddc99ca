import { createHash } from 'node:crypto';

import type { Endpoint, Outside } from '@/lib/api/endpoint';
import type { Ctx } from '@/lib/auth/context';
import { completeUploadEndpoint } from '@/lib/files/endpoints';
import type { FilePurpose } from '@/lib/files/purpose';
import { requestUpload } from '@/lib/files/request-upload';

/** Opens one committed transaction as somebody: `world.as(['lead'], work)` with the roles filled in. */
export type As = <T>(work: (ctx: Ctx) => Promise<T>) => Promise<T>;

export interface Sent {
  purpose: FilePurpose;
  name: string;
  content: Buffer;
  mediaType?: string;
  batchId?: string;
}

export const PDF = Buffer.from(
  '%PDF-1.7\n1 0 obj <</Type /Catalog>> endobj\ntrailer <</Root 1 0 R>>\n%%EOF\n',
);
export const PNG = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);

/** A PDF like no other, so that tests do not meet each other's. */
export const somePdf = (words: string): Buffer => Buffer.concat([PDF, Buffer.from(`% ${words}\n`)]);

export const announceUpload = (as: As, { content, ...file }: Sent) =>
  as((ctx) =>
    requestUpload(ctx, {
      mediaType: '',
      ...file,
      size: content.length,
      sha256: createHash('sha256').update(content).digest('hex'),
    }),
  );

/** Runs an endpoint in its steps, as `serve` does. */
export async function inSteps(as: As, endpoint: Endpoint, input: Record<string, unknown>): Promise<unknown> {
  const outside: Outside = { inTenant: as };
  const found = await endpoint.outside?.(outside, input);
  return as((ctx) => endpoint.run(ctx, input, found));
}

export const complete = (as: As, fileId: string): Promise<unknown> =>
  inSteps(as, completeUploadEndpoint as unknown as Endpoint, { fileId });

/** A file sent and verified, all the way through storage. The address is good for ten real minutes: open `as` with the real time. */
export async function uploadFile(as: As, sent: Sent): Promise<string> {
  const { file, upload } = await announceUpload(as, sent);
  const answer =
    upload &&
    (await fetch(upload.url, { method: 'PUT', headers: upload.headers, body: new Uint8Array(sent.content) }));
  if (answer && !answer.ok) throw new Error(`storage answered ${answer.status}: ${await answer.text()}`);
  await complete(as, file.id);
  return file.id;
}
