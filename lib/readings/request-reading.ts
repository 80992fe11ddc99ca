import { eq } from 'drizzle-orm';

import { readings } from '@/db/schema/readings';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { enqueue } from '@/lib/jobs/queue';
import { newId } from '@/lib/ids';

import { readDocumentQueue, type ChartAsk } from './read-document-queue';
import type { ReadingKind } from './reading-state';

/** Has a verified file read by the worker, in the transaction that took it in. */
export async function requestReading(
  ctx: Ctx,
  { fileId, kind, ask }: { fileId: string; kind: ReadingKind; ask?: ChartAsk },
): Promise<void> {
  const readingId = newId();
  const [made] = await ctx.tx
    .insert(readings)
    .values({ id: readingId, shopId: shopOf(ctx), fileId, kind, createdAt: ctx.now })
    .onConflictDoNothing({ target: readings.fileId })
    .returning({ id: readings.id });
  if (made) await enqueue(ctx, readDocumentQueue, { shopId: shopOf(ctx), readingId, ...(ask && { ask }) });
}

/** Has a file read once more, or for the first time: after the reader learned something, or because it took too long. */
export async function readAgain(
  ctx: Ctx,
  { fileId, kind, ask }: { fileId: string; kind: ReadingKind; ask?: ChartAsk },
): Promise<void> {
  const [known] = await ctx.tx
    .update(readings)
    .set({ state: 'waiting', faultCode: null, fault: null })
    .where(eq(readings.fileId, fileId))
    .returning({ readingId: readings.id });
  if (known) await enqueue(ctx, readDocumentQueue, { shopId: shopOf(ctx), ...known, ...(ask && { ask }) });
  else await requestReading(ctx, { fileId, kind, ...(ask && { ask }) });
}
