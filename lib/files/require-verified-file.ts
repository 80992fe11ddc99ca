import { eq } from 'drizzle-orm';

import { files } from '@/db/schema/files';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import { purposeWords } from './kinds';
import type { FilePurpose } from './purpose';

interface WantedFile {
  fileId: string;
  purpose: FilePurpose;
  /** The batch it must have been sent for; null for files that stand by themselves. */
  batchId?: string | null;
  /** The processor it must come from, where a processor hands it in. */
  processorId?: string;
  /** Name of the field in the input, for the refusal. */
  field?: string;
}

/** For every verb that takes a file: it is this shop's, has arrived whole, and was sent for this. */
export async function requireVerifiedFile(
  ctx: Ctx,
  { fileId, purpose, batchId, processorId, field = 'fileId' }: WantedFile,
) {
  const [file] = await ctx.tx
    .select({
      id: files.id,
      name: files.name,
      state: files.state,
      purpose: files.purpose,
      batchId: files.batchId,
      processorId: files.processorId,
      sha256: files.sha256,
      refusal: files.refusal,
    })
    .from(files)
    .where(eq(files.id, fileId));
  const refuse = (message: string) => new AppError('bad_input', message, { fields: [{ field, message }] });
  if (!file || (processorId !== undefined && file.processorId !== processorId))
    throw refuse('This file belongs to another shop, or it does not exist. Send it again.');
  if (file.purpose !== purpose)
    throw refuse(
      `${file.name} was sent as a ${purposeWords(file.purpose)}, not as a ${purposeWords(purpose)}. Send it here again.`,
    );
  if (batchId !== undefined && file.batchId !== batchId)
    throw refuse(`${file.name} was sent for another batch. Send it here again.`);
  if (file.state === 'refused') throw refuse(file.refusal ?? `${file.name} was refused. Send another file.`);
  if (file.state !== 'verified' || file.sha256 === null)
    throw refuse(`${file.name} has not arrived yet. Wait for its upload, or send it again.`);
  return { id: file.id, name: file.name, sha256: file.sha256 };
}
