import { eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';

import { files } from '@/db/schema/files';
import { recordAudit } from '@/lib/audit/record-audit';
import { newId } from '@/lib/ids';
import type { JobTools } from '@/lib/jobs/job';
import { putObject } from '@/lib/storage/object-store';

import type { FilePurpose } from './purpose';

export interface MadeFile {
  shopId: string;
  batchId: string | null;
  purpose: FilePurpose;
  name: string;
  mediaType: string;
  content: Buffer;
}

/**
 * Keeps a file that the product made itself (traveller, order, dossier). Bytes first, then the row that lets them
 * count, so no row ever points at nothing; a job that is run again finds what it stored before.
 */
export async function storeMadeFile(
  tools: Pick<JobTools, 'inShop'>,
  { content, ...file }: MadeFile,
): Promise<{ fileId: string; sha256: string }> {
  const sha256 = createHash('sha256').update(content).digest('hex');
  const storageKey = `made/${file.shopId}/${file.batchId ?? 'shop'}/${file.purpose}/${sha256}`;
  await putObject({ key: storageKey, content, mediaType: file.mediaType });

  return tools.inShop(file.shopId, async (ctx) => {
    const id = newId();
    const [added] = await ctx.tx
      .insert(files)
      .values({
        id,
        ...file,
        size: content.length,
        sha256,
        storageKey,
        state: 'verified',
        uploadedBy: 'Lotwright',
        createdAt: ctx.now,
        verifiedAt: ctx.now,
      })
      .onConflictDoNothing({ target: files.storageKey, where: isNull(files.copyOf) })
      .returning({ id: files.id });
    if (added) {
      await recordAudit(ctx, {
        action: 'file.make',
        entity: 'file',
        entityId: id,
        after: {
          name: file.name,
          purpose: file.purpose,
          batchId: file.batchId,
          size: content.length,
          sha256,
        },
      });
      return { fileId: id, sha256 };
    }
    const [here] = await ctx.tx.select({ id: files.id }).from(files).where(eq(files.storageKey, storageKey));
    if (!here) throw new Error(`file ${storageKey} is neither new nor here`);
    return { fileId: here.id, sha256 };
  });
}
