import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { batchDocuments } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';
import { batchLinkToken } from '@/lib/batches/batch-link-token';
import { storeMadeFile } from '@/lib/files/store-made-file';
import type { JobTools } from '@/lib/jobs/job';
import { renderPaper } from '@/lib/pdf/render-paper';
import { queueBatchMail } from '@/lib/portal/queue-batch-mail';

import { PaperContent } from './content';
import type { renderDocumentsQueue } from './render-documents-queue';

type Payload = z.output<typeof renderDocumentsQueue.payload>;

/**
 * Makes the papers that were stated, keeps them, and queues the mail that carries the link to them.
 *
 * Run again after a crash at any point it makes the same bytes and finds the file it kept before. The mail is queued in
 * the transaction that first records the papers, so it goes once.
 */
export async function renderAndSend(tools: JobTools, { shopId, batchId, documentIds, mail }: Payload): Promise<void> {
  const awaited = await tools.inShop(shopId, (ctx) => readAwaited(ctx, documentIds));
  const made: { id: string; fileId: string; sha256: string }[] = [];
  for (const document of awaited) {
    const content = PaperContent.parse(document.content);
    const kept = await storeMadeFile(tools, { shopId, batchId, purpose: content.kind, name: fileName(content), mediaType: 'application/pdf', content: await renderPaper(content, batchLinkToken) });
    made.push({ id: document.id, ...kept });
  }
  await tools.inShop(shopId, async (ctx) => {
    let recorded = 0;
    for (const { id, fileId, sha256 } of made) {
      // Two workers may have made the same paper; the one that records it first also sends the mail.
      const rows = await ctx.tx.update(batchDocuments).set({ fileId, sha256 }).where(and(eq(batchDocuments.id, id), isNull(batchDocuments.fileId))).returning({ id: batchDocuments.id });
      recorded += rows.length;
    }
    if (recorded > 0) await sendMail(ctx, batchId, awaited, mail);
  });
}

const readAwaited = (ctx: Ctx, documentIds: readonly string[]) =>
  ctx.tx
    .select({ id: batchDocuments.id, content: batchDocuments.content })
    .from(batchDocuments)
    .where(and(inArray(batchDocuments.id, [...documentIds]), isNull(batchDocuments.fileId)))
    .orderBy(asc(batchDocuments.id));

async function sendMail(ctx: Ctx, batchId: string, documents: readonly { content: unknown }[], mail: Payload['mail']): Promise<void> {
  const traveller = documents.map(({ content }) => PaperContent.parse(content)).find((content) => content.kind === 'traveller');
  if (!traveller?.link) return;
  const url = `${traveller.link.base}${batchLinkToken(traveller.link.linkId)}`;
  const version = traveller.documentVersion;
  if (mail === 'dispatch') return queueBatchMail(ctx, batchId, { template: 'dispatch', url, version });
  return queueBatchMail(ctx, batchId, { template: 'dispatch-reissued', url, version, changes: traveller.changes });
}

function fileName({ kind, number, orderNumber, documentVersion }: PaperContent): string {
  return kind === 'traveller' ? `${number} traveller v${documentVersion}.pdf` : `${orderNumber} order v${documentVersion}.pdf`;
}
