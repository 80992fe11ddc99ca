import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { readings } from '@/db/schema/readings';
import type { JobTools } from '@/lib/jobs/job';

import type { giveUpReadingQueue } from './read-document-queue';

/** What the queue says of a job whose worker never came back from it. */
const NEVER_CAME_BACK = /timeout/;

/**
 * Ends a reading that failed with every try: nobody waits for it any longer, and the inspector is told to read by eye.
 * Also where the worker itself died of the file and could say nothing.
 */
export async function giveUpReading(
  tools: JobTools,
  { shopId, readingId }: z.output<typeof giveUpReadingQueue.payload>,
): Promise<void> {
  const why = NEVER_CAME_BACK.test(tools.gaveUp ?? '')
    ? 'the program that reads was ended in the middle of it, time and again'
    : 'something other than the file failed, time and again';
  await tools.inShop(shopId, (ctx) =>
    ctx.tx
      .update(readings)
      .set({
        state: 'unreadable',
        faultCode: GIVEN_UP,
        fault: `This file could not be read: ${why}. Read it by eye, or have it read again.`,
        readAt: tools.now(),
      })
      .where(and(eq(readings.id, readingId), eq(readings.state, 'waiting'))),
  );
}

export const GIVEN_UP = 'given_up';
