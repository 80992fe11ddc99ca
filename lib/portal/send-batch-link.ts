import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { LINK_ENDS_AT } from '@/lib/auth/identify';
import { AppError, notFound } from '@/lib/errors';

import { batchForMail } from './batch-for-mail';
import { makeBatchLink } from './make-batch-link';
import { queueBatchMail } from './queue-batch-mail';

/** Mails a new link: the first was lost, withdrawn, or another person there is to have one. */
export async function sendBatchLink(ctx: Ctx, { batchId, to }: { batchId: string; to?: string | undefined }) {
  authorize(ctx, 'batch.dispatch');
  const [batch] = await ctx.tx
    .select({
      number: batches.number,
      stage: batches.stage,
      dispatchedAt: batches.dispatchedAt,
      processorId: batches.processorId,
    })
    .from(batches)
    .where(eq(batches.id, batchId))
    .for('update');
  if (!batch) throw notFound('batch');
  if (batch.dispatchedAt === null)
    throw new AppError(
      'conflict',
      `${batch.number} has not left yet. Its processor gets the link with the dispatch.`,
    );
  if (LINK_ENDS_AT.includes(batch.stage))
    throw new AppError('conflict', `${batch.number} is ${batch.stage}, so a link to it would open nothing.`);

  const sentTo = to ?? (await batchForMail(ctx, batchId)).deskEmail;
  const { linkId, url } = await makeBatchLink(ctx, { batchId, processorId: batch.processorId });
  await queueBatchMail(ctx, batchId, { template: 'batch-link', url, to: sentTo });
  await recordAudit(ctx, {
    action: 'batch.send_link',
    entity: 'batch',
    entityId: batchId,
    after: { linkId, to: sentTo },
  });
  return { sentTo };
}
