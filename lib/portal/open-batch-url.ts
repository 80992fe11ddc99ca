import { LINK_ENDS_AT } from '@/lib/auth/identify';
import type { Ctx } from '@/lib/auth/context';

import type { BatchForMail } from './batch-for-mail';
import { standingBatchUrl } from './standing-batch-url';

/** The page of a batch as a mail to its processor carries it; null where links have ended with the batch's stage. */
export async function openBatchUrl(
  ctx: Ctx,
  batch: Pick<BatchForMail, 'id' | 'stage' | 'processorId'>,
): Promise<string | null> {
  return LINK_ENDS_AT.includes(batch.stage)
    ? null
    : standingBatchUrl(ctx, { batchId: batch.id, processorId: batch.processorId });
}
