import { and, desc, eq, isNull } from 'drizzle-orm';

import { batchDocuments, batches, batchLinks } from '@/db/schema/batches';
import { hashToken } from '@/lib/auth/identify';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { batchLinkToken } from '@/lib/batches/batch-link-token';
import { newId } from '@/lib/ids';
import { enqueue } from '@/lib/jobs/queue';
import { makeBatchLink } from '@/lib/portal/make-batch-link';

import { readPaperContents } from './paper-content';
import { renderDocumentsQueue } from './render-documents-queue';

/**
 * States the next version of traveller and order of a batch, and queues their making and the mail that carries them:
 * all in the caller's transaction, so that papers, frozen lines and mail exist together or not at all.
 */
export async function statePapers(
  ctx: Ctx,
  batchId: string,
  { mail, changes }: { mail: 'dispatch' | 'reissue'; changes: readonly string[] },
): Promise<number> {
  const linkId = await linkFor(ctx, batchId, mail);
  const documentVersion = (await lastVersion(ctx, batchId)) + 1;
  const version = { documentVersion, changes };
  const { traveller, order } = await readPaperContents(ctx, batchId, linkId, {
    traveller: version,
    order: version,
  });
  const stated = [traveller, order].map((content) => ({
    id: newId(),
    shopId: shopOf(ctx),
    batchId,
    kind: content.kind,
    documentVersion,
    content,
    changes: [...changes],
    statedAt: ctx.now,
    createdAt: ctx.now,
  }));
  await ctx.tx.insert(batchDocuments).values(stated);
  await enqueue(ctx, renderDocumentsQueue, {
    shopId: shopOf(ctx),
    batchId,
    documentIds: stated.map((one) => one.id),
    mail,
  });
  return documentVersion;
}

async function lastVersion(ctx: Ctx, batchId: string): Promise<number> {
  const [last] = await ctx.tx
    .select({ version: batchDocuments.documentVersion })
    .from(batchDocuments)
    .where(eq(batchDocuments.batchId, batchId))
    .orderBy(desc(batchDocuments.documentVersion))
    .limit(1);
  return last?.version ?? 0;
}

/**
 * The link the papers carry: the one that stands, if its key can still be made; otherwise a new one beside it. Where
 * the shop has withdrawn them all, a new version of the papers does not give back what was taken away.
 */
async function linkFor(ctx: Ctx, batchId: string, mail: 'dispatch' | 'reissue'): Promise<string | null> {
  const standing = await ctx.tx
    .select({ id: batchLinks.id, tokenHash: batchLinks.tokenHash })
    .from(batchLinks)
    .where(and(eq(batchLinks.batchId, batchId), isNull(batchLinks.withdrawnAt)))
    .orderBy(desc(batchLinks.id));
  const known = standing.find((link) => link.tokenHash === hashToken(batchLinkToken(link.id)));
  if (known) return known.id;
  if (mail === 'reissue' && standing.length === 0) return null;
  const [batch] = await ctx.tx
    .select({ processorId: batches.processorId })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!batch) throw new Error('no batch to link to');
  return (await makeBatchLink(ctx, { batchId, processorId: batch.processorId })).linkId;
}
