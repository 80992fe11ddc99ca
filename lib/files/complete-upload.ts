import { and, eq } from 'drizzle-orm';

import { files } from '@/db/schema/files';
import type { Outside } from '@/lib/api/endpoint';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { deleteUnverifiedUpload } from '@/lib/storage/object-store';

import { alreadyHere, findSameFile, oneAtATime } from './find-same-file';
import { inOwningShop } from './in-owning-shop';
import { inspectObject, type Inspected } from './inspect-object';
import { kindOfMediaType, kindWords, LARGEST_FILE, sizeWords } from './kinds';
import { fileColumns } from './queries';
import { isWhatItSays } from './sniff-kind';

interface CompleteUploadInput {
  fileId: string;
}

type Announced = Awaited<ReturnType<typeof getAnnounced>>;

/**
 * Reads the upload back before anything is believed, outside any transaction, for it may take seconds. What is not what
 * it was announced as is refused for good: the row keeps the reason, the bytes go.
 */
export async function inspectUpload(
  outside: Outside,
  { fileId }: CompleteUploadInput,
): Promise<Inspected | null> {
  const file = await outside.inTenant((ctx) => getAnnounced(ctx, fileId));
  if (file.state === 'verified') return null;
  if (file.state === 'refused') throw refused(file.refusal ?? `${file.name} was refused. Send another file.`);
  const found = await inspectObject(file.storageKey);
  if (found === null)
    throw new AppError(
      'conflict',
      `${file.name} has not arrived: its upload was interrupted. Send it again.`,
    );

  const fault = faultOf(file, found);
  if (fault === null) return found;
  await outside.inTenant((ctx) => refuseUpload(ctx, file, fault));
  await deleteUnverifiedUpload(file.storageKey);
  throw refused(fault, found.size > LARGEST_FILE);
}

/** Lets a file count once its bytes were read back. Safe to repeat. */
export async function completeUpload(ctx: Ctx, { fileId }: CompleteUploadInput, inspected: Inspected | null) {
  authorize(ctx, 'file.add');
  const file = await getAnnounced(ctx, fileId);
  return inOwningShop(ctx, file.shopId, async (inner) => {
    if (inspected !== null && file.state === 'awaited') await verify(inner, file, inspected);
    const [now] = await inner.tx.select(fileColumns).from(files).where(eq(files.id, fileId));
    if (!now) throw notFound('file');
    return now;
  });
}

async function verify(ctx: Ctx, file: Announced, { sha256, size }: Inspected): Promise<void> {
  await oneAtATime(ctx, { sha256 });
  const same = file.batchId === null ? null : await findSameFile(ctx, { ...file, sha256 }, 'verified');
  if (same && same.id !== file.id) throw alreadyHere(file.name, same, file.purpose);
  const [verified] = await ctx.tx
    .update(files)
    .set({ state: 'verified', sha256, size, verifiedAt: ctx.now })
    .where(and(eq(files.id, file.id), eq(files.state, 'awaited')))
    .returning({ id: files.id });
  // Already verified by the same call, sent twice.
  if (!verified) return;
  await recordAudit(ctx, {
    action: 'file.receive',
    entity: 'file',
    entityId: file.id,
    after: { name: file.name, purpose: file.purpose, batchId: file.batchId, size, sha256 },
  });
}

async function refuseUpload(ctx: Ctx, file: Announced, refusal: string): Promise<void> {
  authorize(ctx, 'file.add');
  await inOwningShop(ctx, file.shopId, async (inner) => {
    await inner.tx
      .update(files)
      .set({ state: 'refused', refusal })
      .where(and(eq(files.id, file.id), eq(files.state, 'awaited')));
    await recordAudit(inner, {
      action: 'file.refuse',
      entity: 'file',
      entityId: file.id,
      after: { name: file.name, refusal },
    });
  });
}

async function getAnnounced(ctx: Ctx, fileId: string) {
  authorize(ctx, 'file.add');
  const [file] = await ctx.tx
    .select({
      ...fileColumns,
      shopId: files.shopId,
      processorId: files.processorId,
      storageKey: files.storageKey,
    })
    .from(files)
    .where(eq(files.id, fileId));
  if (!file) throw notFound('file');
  return file;
}

function faultOf(file: Announced, found: Inspected): string | null {
  const claimed = kindOfMediaType(file.mediaType);
  if (found.size === 0)
    return `${file.name} is empty: it arrived with 0 bytes. Look at the file on your side and choose it again.`;
  if (found.size > LARGEST_FILE)
    return `${file.name} has more than 50 MB. Scan it in fewer colours or split it.`;
  if (found.size !== file.size)
    return `${file.name} arrived with ${sizeWords(found.size)} of ${sizeWords(file.size)}. Send it again.`;
  if (file.sha256 !== null && found.sha256 !== file.sha256)
    return `${file.name} did not arrive as it was sent. Send it again.`;
  if (claimed === null || isWhatItSays(claimed, found.sniffed)) return null;
  return `${file.name} is not ${kindWords(claimed)}, as its name says: it is ${sniffedWords(found)}. Choose the right file, or save it as what it is.`;
}

function sniffedWords({ sniffed }: Inspected): string {
  if (sniffed.is === 'other') return sniffed.says;
  return sniffed.is === 'text' ? 'plain text' : kindWords(sniffed.is);
}

const refused = (message: string, tooLarge = false): AppError =>
  new AppError(tooLarge ? 'too_large' : 'bad_input', message, { fields: [{ field: 'file', message }] });
