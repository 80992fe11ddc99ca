import { and, eq } from 'drizzle-orm';

import { files } from '@/db/schema/files';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

export const fileColumns = {
  id: files.id,
  name: files.name,
  mediaType: files.mediaType,
  size: files.size,
  purpose: files.purpose,
  state: files.state,
  sha256: files.sha256,
  refusal: files.refusal,
  batchId: files.batchId,
  uploadedBy: files.uploadedBy,
  createdAt: files.createdAt,
};

/** A file as a page of another thing names it. */
export const fileRefColumns = {
  id: files.id,
  name: files.name,
  size: files.size,
  mediaType: files.mediaType,
  sha256: files.sha256,
};

export async function getFile(ctx: Ctx, { fileId }: { fileId: string }) {
  authorize(ctx, 'file.read');
  const [file] = await ctx.tx.select(fileColumns).from(files).where(eq(files.id, fileId));
  if (!file) throw notFound('file');
  return file;
}

/** A file that counts, with where its bytes lie. */
export async function getVerifiedFile(ctx: Ctx, { fileId }: { fileId: string }) {
  authorize(ctx, 'file.read');
  const [file] = await ctx.tx
    .select({ ...fileColumns, storageKey: files.storageKey })
    .from(files)
    .where(and(eq(files.id, fileId), eq(files.state, 'verified')));
  if (!file) throw notFound('file');
  return file;
}
