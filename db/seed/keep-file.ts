import { createHash } from 'node:crypto';

import { files } from '@/db/schema/files';
import { shopOf, type Ctx } from '@/lib/auth/context';
import type { FilePurpose } from '@/lib/files/purpose';
import { newId } from '@/lib/ids';
import { putObject } from '@/lib/storage/object-store';

interface Kept {
  purpose: FilePurpose;
  name: string;
  mediaType: string;
  content: Buffer;
  batchId?: string;
  processorId?: string;
}

/** Puts a real file into storage, as an upload that was verified at the scene's time. */
export async function keepFile(ctx: Ctx, { content, ...file }: Kept): Promise<string> {
  const id = newId();
  const storageKey = `seed/${shopOf(ctx)}/${id}`;
  await putObject({ key: storageKey, content, mediaType: file.mediaType });
  await ctx.tx.insert(files).values({
    id,
    shopId: shopOf(ctx),
    batchId: file.batchId ?? null,
    processorId: file.processorId ?? null,
    purpose: file.purpose,
    name: file.name,
    mediaType: file.mediaType,
    size: content.length,
    sha256: createHash('sha256').update(content).digest('hex'),
    storageKey,
    state: 'verified',
    uploadedBy: ctx.actor.name,
    createdAt: ctx.now,
    verifiedAt: ctx.now,
  });
  return id;
}
