import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { files } from '@/db/schema/files';
import { readings } from '@/db/schema/readings';
import { askedOfChart } from '@/lib/charts/asked-of-chart';
import type { JobTools } from '@/lib/jobs/job';
import { readObject } from '@/lib/storage/object-store';

import { GIVEN_UP } from './give-up-reading';
import { READER_EDITION } from './kept-reading';
import { figuresOf, readBatchOrder } from './orders-of-batch';
import type { ChartAsk, readDocumentQueue } from './read-document-queue';
import { ReadingChild } from './reading-child';

const child = new ReadingChild();

/**
 * Reads one file in the process kept for it and writes down what was read, or why it could not be. A file that cannot
 * be read is a finding for the inspector, not a failed job.
 */
export async function readDocument(
  tools: JobTools,
  { shopId, readingId, ask: given }: z.output<typeof readDocumentQueue.payload>,
): Promise<void> {
  const [found] = await tools.inShop(shopId, (ctx) =>
    ctx.tx
      .select({
        kind: readings.kind,
        state: readings.state,
        faultCode: readings.faultCode,
        name: files.name,
        storageKey: files.storageKey,
        batchId: files.batchId,
      })
      .from(readings)
      .innerJoin(files, eq(files.id, readings.fileId))
      .where(eq(readings.id, readingId)),
  );
  // One that was given up is read after all where an admin has its job tried once more.
  if (!found || (found.state !== 'waiting' && found.faultCode !== GIVEN_UP)) return;
  const began = tools.now();
  const ask =
    found.kind === 'chart' ? (given ?? (await askOfBatch(tools, shopId, found.batchId))) : undefined;
  const outcome =
    ask === null
      ? NOTHING_ASKED
      : await child.read({
          kind: found.kind,
          name: found.name,
          bytes: await readObject(found.storageKey),
          ...(ask && { ask }),
        });
  const readAt = tools.now();
  await tools.inShop(shopId, (ctx) =>
    ctx.tx
      .update(readings)
      .set({
        ...('fault' in outcome
          ? { state: 'unreadable', faultCode: outcome.fault.code, fault: outcome.fault.message }
          : { state: 'read', faultCode: null, fault: null, content: outcome.content, pages: outcome.pages }),
        reader: READER_EDITION,
        seconds: (readAt.getTime() - began.getTime()) / 1000,
        readAt,
      })
      .where(and(eq(readings.id, readingId), eq(readings.state, found.state))),
  );
}

const NOTHING_ASKED = {
  fault: {
    code: 'nothing_asked',
    message: 'The batch asks for no temperature, or for several. Say what the chart is to be held against.',
  },
};

async function askOfBatch(tools: JobTools, shopId: string, batchId: string | null): Promise<ChartAsk | null> {
  const order = batchId === null ? null : await tools.inShop(shopId, (ctx) => readBatchOrder(ctx, batchId));
  const requirement = order && askedOfChart(figuresOf(order));
  return requirement && { requirement, corrections: {} };
}
