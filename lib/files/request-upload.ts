import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { files } from '@/db/schema/files';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { presignUpload } from '@/lib/storage/object-store';

import type { requestUpload as declaration } from './contract';
import { safeFileName } from './file-name';
import { alreadyHere, findSameFile, oneAtATime } from './find-same-file';
import { inOwningShop } from './in-owning-shop';
import { claimedKind, mediaTypeOf, purposeWords } from './kinds';
import type { FilePurpose } from './purpose';
import { fileColumns } from './queries';

type RequestUploadInput = z.output<(typeof declaration)['input']>;

/** What a processor may send; drawings and mill certificates are the shop's own. */
const FROM_PROCESSORS: readonly FilePurpose[] = ['certificate', 'chart', 'invoice', 'photo'];
const NEEDS_BATCH: readonly FilePurpose[] = ['certificate', 'chart', 'invoice'];
/** A certificate may come to the shop without saying which batch it is of: it waits in the intake. */
const MAY_COME_ALONE: readonly FilePurpose[] = ['certificate'];

/**
 * Announces a file. The address it gives can store these very bytes and no others: length, type and hash are in its
 * signature. An upload that was interrupted is announced again and goes to the same place.
 */
export async function requestUpload(ctx: Ctx, input: RequestUploadInput) {
  authorize(ctx, 'file.add');
  const name = safeFileName(input.name);
  const claimed = claimedKind({ ...input, name });
  if ('refusal' in claimed)
    throw new AppError(claimed.tooLarge ? 'too_large' : 'bad_input', claimed.refusal, {
      fields: [{ field: 'file', message: claimed.refusal }],
    });
  const { shopId, processorId } = await whereItBelongs(ctx, input);
  const mediaType = mediaTypeOf(claimed.kind);

  return inOwningShop(ctx, shopId, async (inner) => {
    const wanted = {
      purpose: input.purpose,
      sha256: input.sha256,
      batchId: input.batchId ?? null,
      processorId,
    };
    await oneAtATime(inner, wanted);
    const here = await findSameFile(inner, wanted, 'verified');
    // A drawing or mill certificate serves many parts and lots; in a batch the same paper twice is a slip of the hand.
    if (here && input.batchId !== undefined) throw alreadyHere(name, here, input.purpose);
    if (here) return { file: await fileOf(inner, here.id), upload: null };

    const awaited = await findSameFile(inner, wanted, 'awaited');
    const fileId = awaited?.id ?? (await announce(inner, { ...wanted, name, mediaType, size: input.size }));
    const { storageKey, ...file } = await fileOf(inner, fileId);
    const upload = await presignUpload({
      key: storageKey,
      mediaType: file.mediaType,
      sizeBytes: file.size,
      sha256: input.sha256,
      now: ctx.now,
    });
    return { file, upload };
  });
}

async function whereItBelongs(
  ctx: Ctx,
  { purpose, batchId }: RequestUploadInput,
): Promise<{ shopId: string; processorId: string | null }> {
  const { tenant } = ctx;
  if (tenant.kind === 'processor' && !FROM_PROCESSORS.includes(purpose))
    throw new AppError('not_allowed', `Only the shop itself adds a ${purposeWords(purpose)}.`);
  if (batchId === undefined) {
    if (tenant.kind === 'processor' || (NEEDS_BATCH.includes(purpose) && !MAY_COME_ALONE.includes(purpose)))
      throw new AppError('bad_input', 'Say for which batch this file is.', {
        fields: [{ field: 'batchId', message: 'Say for which batch this file is.' }],
      });
    return { shopId: shopOf(ctx), processorId: null };
  }
  const [batch] = await ctx.tx
    .select({
      shopId: batches.shopId,
      number: batches.number,
      dispatchedAt: batches.dispatchedAt,
      cancelledAt: batches.cancelledAt,
    })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  if (batch.cancelledAt !== null)
    throw new AppError('conflict', `${batch.number} is cancelled. Nothing more is added to it.`);
  if (batch.dispatchedAt === null && NEEDS_BATCH.includes(purpose)) {
    throw new AppError(
      'conflict',
      `${batch.number} has not been dispatched yet, so there is no ${purposeWords(purpose)} for it. Dispatch it first, or choose the batch this belongs to.`,
    );
  }
  return { shopId: batch.shopId, processorId: tenant.kind === 'processor' ? tenant.processorId : null };
}

interface NewFile {
  purpose: FilePurpose;
  sha256: string;
  batchId: string | null;
  processorId: string | null;
  name: string;
  mediaType: string;
  size: number;
}

async function announce(ctx: Ctx, file: NewFile): Promise<string> {
  const id = newId();
  const shopId = shopOf(ctx);
  await ctx.tx.insert(files).values({
    id,
    shopId,
    ...file,
    storageKey: `files/${shopId}/${id}`,
    uploadedBy: ctx.actor.name,
    createdAt: ctx.now,
  });
  await recordAudit(ctx, { action: 'file.announce', entity: 'file', entityId: id, after: { ...file } });
  return id;
}

async function fileOf(ctx: Ctx, fileId: string) {
  const [file] = await ctx.tx
    .select({ ...fileColumns, storageKey: files.storageKey })
    .from(files)
    .where(and(eq(files.id, fileId)));
  if (!file) throw notFound('file');
  return file;
}
