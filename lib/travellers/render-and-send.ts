import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchDocuments } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { batchLinkToken } from '@/lib/batches/batch-link-token';
import { storeMadeFile } from '@/lib/files/store-made-file';
import type { JobTools } from '@/lib/jobs/job';
import { renderPaper } from '@/lib/pdf/render-paper';
import { queueBatchMail } from '@/lib/portal/queue-batch-mail';

import { PaperContent } from './content';
import type { renderDocumentsQueue } from './render-documents-queue';

interface Made {
  id: string;
  name: string;
  content: PaperContent;
  fileId: string;
  sha256: string;
}

type Payload = z.output<typeof renderDocumentsQueue.payload>;

/**
 * Makes the papers that were stated, keeps them, and queues the mail that carries the link to them.
 *
 * Run again after a crash at any point it makes the same bytes and finds the file it kept before. The mail is queued in
 * the transaction that first records the papers, so it goes once.
 */
export async function renderAndSend(
  tools: JobTools,
  { shopId, batchId, documentIds, mail }: Payload,
): Promise<void> {
  const awaited = await tools.inShop(shopId, (ctx) => readAwaited(ctx, documentIds));
  const made: Made[] = [];
  for (const document of awaited) {
    const content = PaperContent.parse(document.content);
    const name = fileName(content);
    const kept = await storeMadeFile(tools, {
      shopId,
      batchId,
      purpose: content.kind,
      name,
      mediaType: 'application/pdf',
      content: await renderPaper(content, batchLinkToken),
    });
    made.push({ id: document.id, name, content, ...kept });
  }
  await tools.inShop(shopId, async (ctx) => {
    let recorded = 0;
    for (const { id, fileId, sha256 } of made) {
      // Two workers may have made the same paper; the one that records it first also sends the mail.
      const rows = await ctx.tx
        .update(batchDocuments)
        .set({ fileId, sha256 })
        .where(and(eq(batchDocuments.id, id), isNull(batchDocuments.fileId)))
        .returning({ id: batchDocuments.id });
      recorded += rows.length;
    }
    if (recorded > 0 && mail !== 'none') await sendMail(ctx, batchId, made, mail);
  });
}

const readAwaited = (ctx: Ctx, documentIds: readonly string[]) =>
  ctx.tx
    .select({ id: batchDocuments.id, content: batchDocuments.content })
    .from(batchDocuments)
    .where(and(inArray(batchDocuments.id, [...documentIds]), isNull(batchDocuments.fileId)))
    .orderBy(asc(batchDocuments.id));

/** Nothing is sent about a batch that was cancelled meanwhile: the word that it is off is on its way already. */
async function sendMail(
  ctx: Ctx,
  batchId: string,
  made: readonly Made[],
  mail: 'dispatch' | 'reissue',
): Promise<void> {
  const [batch] = await ctx.tx
    .select({ cancelledAt: batches.cancelledAt })
    .from(batches)
    .where(eq(batches.id, batchId));
  const traveller = made.map(({ content }) => content).find((content) => content.kind === 'traveller');
  if (!batch || batch.cancelledAt !== null || !traveller) return;
  const link = traveller.link && { url: `${traveller.link.base}${batchLinkToken(traveller.link.linkId)}` };
  const carried = {
    ...link,
    version: traveller.documentVersion,
    papers: made.map(({ fileId, name }) => ({ fileId, name })),
  };
  if (mail === 'dispatch') return queueBatchMail(ctx, batchId, { template: 'dispatch', ...carried });
  return queueBatchMail(ctx, batchId, {
    template: 'dispatch-reissued',
    changes: traveller.changes,
    ...carried,
  });
}

function fileName({ kind, number, orderNumber, documentVersion }: PaperContent): string {
  return kind === 'traveller'
    ? `${number} traveller v${documentVersion}.pdf`
    : `${orderNumber} order v${documentVersion}.pdf`;
}
