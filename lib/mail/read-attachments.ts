import type { JobTools } from '@/lib/jobs/job';
import { getVerifiedFile } from '@/lib/files/queries';
import { readObject } from '@/lib/storage/object-store';

import type { QueuedMail } from './queued-mail';
import type { MailAttachment } from './send-mail';

/** The bytes of the files that go along, read between transactions. */
export async function readAttachments(
  tools: Pick<JobTools, 'inShop'>,
  { shopId, attach }: Pick<QueuedMail, 'shopId' | 'attach'>,
): Promise<MailAttachment[]> {
  if (shopId === null || attach.length === 0) return [];
  const files = await tools.inShop(shopId, async (ctx) => {
    const found = [];
    for (const fileId of attach) found.push(await getVerifiedFile(ctx, { fileId }));
    return found;
  });
  return Promise.all(
    files.map(async ({ name, mediaType, storageKey }) => ({
      fileName: name,
      mediaType,
      content: await readObject(storageKey),
    })),
  );
}
