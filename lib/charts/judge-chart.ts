import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { charts } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { readAgain } from '@/lib/readings/request-reading';

import type { JudgeChart } from './contract';

/** A person says what the chart is held against and how its columns are to be understood; the worker reads it anew. */
export async function judgeChart(
  ctx: Ctx,
  { chartId, requirement, corrections }: z.output<typeof JudgeChart>,
) {
  authorize(ctx, 'certificate.prove');
  const [found] = await ctx.tx.select({ fileId: charts.fileId }).from(charts).where(eq(charts.id, chartId));
  if (!found) throw notFound('chart');
  const ask = { requirement, corrections };
  await readAgain(ctx, { fileId: found.fileId, kind: 'chart', ask });
  await recordAudit(ctx, { action: 'chart.judge', entity: 'chart', entityId: chartId, after: ask });
  return { state: 'waiting' as const };
}
