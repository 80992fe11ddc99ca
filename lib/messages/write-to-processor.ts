import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import { addMessage } from './add-message';
import type { NewMessage } from './contract';

/** The shop asks, answers or leaves a note. */
export async function writeToProcessor(ctx: Ctx, message: NewMessage) {
  authorize(ctx, 'batch.message');
  const [batch] = await ctx.tx
    .select({ number: batches.number, dispatchedAt: batches.dispatchedAt })
    .from(batches)
    .where(eq(batches.id, message.batchId));
  if (!batch) throw notFound('batch');
  if (batch.dispatchedAt === null)
    throw new AppError(
      'conflict',
      `${batch.number} has not left yet, so nobody there sees it. Put it into the note of the batch.`,
    );
  return addMessage(ctx, { ...message, side: 'shop' });
}
