import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { awayOf } from '@/lib/receipts/away';
import { readLineStanding } from '@/lib/receipts/line-standing';

import { addPromise } from './add-promise';
import { onBatch } from './on-batch';

/** A day by which the pieces will be done. A later one takes its place; the first stays on the record. */
export async function promiseDay(
  ctx: Ctx,
  { batchId, promisedOn, note }: { batchId: string; promisedOn: string; note: string },
) {
  authorize(ctx, 'portal.answer');
  return onBatch(ctx, { batchId, nothing: 'Do not work on it' }, async (inner, batch) => {
    const lines = await readLineStanding(inner, batchId);
    if (lines.every((line) => awayOf(line) === 0))
      throw new AppError(
        'conflict',
        `All of ${batch.number} is back at the shop. There is nothing left to promise.`,
      );
    await addPromise(inner, batchId, { promisedOn, note });
    await refreshStanding(inner, batchId);
    return { done: true as const };
  });
}
