import { and, asc, eq, ne } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { charts } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { processors } from '@/db/schema/organisations';
import { readings } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { figuresOf, readBatchOrder } from '@/lib/readings/orders-of-batch';

import { askedOfChart } from './asked-of-chart';
import type { ChartDetail } from './contract';
import { KeptChart } from './kept-chart';

export async function getChart(
  ctx: Ctx,
  { chartId }: { chartId: string },
): Promise<z.input<typeof ChartDetail>> {
  authorize(ctx, 'certificate.read');
  const [found] = await ctx.tx
    .select({ chart: charts, file: files, batch: batches, processor: processors.name, reading: readings })
    .from(charts)
    .innerJoin(files, eq(files.id, charts.fileId))
    .innerJoin(batches, eq(batches.id, charts.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .leftJoin(readings, eq(readings.fileId, charts.fileId))
    .where(eq(charts.id, chartId));
  if (!found) throw notFound('chart');
  const { chart, file, batch, processor, reading } = found;
  const kept = KeptChart.safeParse(reading?.content);
  const order = await readBatchOrder(ctx, batch.id);
  const others = await ctx.tx
    .select({ id: charts.id, fileName: files.name })
    .from(charts)
    .innerJoin(files, eq(files.id, charts.fileId))
    .where(and(eq(charts.batchId, batch.id), ne(charts.id, chartId)))
    .orderBy(asc(charts.id));
  return {
    chart: { id: chart.id, sentBy: chart.sentBy, createdAt: chart.createdAt },
    file: { id: file.id, name: file.name, mediaType: file.mediaType, sha256: file.sha256 },
    batch: { id: batch.id, number: batch.number, stage: batch.stage, processor },
    state: reading?.state ?? null,
    fault: reading?.fault ?? null,
    asked: order && askedOfChart(figuresOf(order)),
    kept: kept.success ? kept.data : null,
    others,
  };
}
