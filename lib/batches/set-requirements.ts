import { and, asc, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines, requirements } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { asRead, type ToProve } from '@/lib/parts/to-prove';

import { changeBuilding, refOf } from './change-building';
import type { setRequirements as declaration } from './contract';
import { refreshStanding } from './refresh-standing';

/** Replaces what must be proved for one line, or for the whole batch where no line is named. */
export async function setRequirements(
  ctx: Ctx,
  { batchId, version, lineId, requirements: asked }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version });
  const lineNo = lineId === null ? null : await lineNoOf(ctx, batchId, lineId);
  const these = and(
    eq(requirements.batchId, batchId),
    lineId === null ? isNull(requirements.lineId) : eq(requirements.lineId, lineId),
  );

  const before = await ctx.tx
    .select({
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
      source: requirements.source,
      sourceText: requirements.sourceText,
    })
    .from(requirements)
    .where(these)
    .orderBy(asc(requirements.seq));
  await ctx.tx.delete(requirements).where(these);
  if (asked.length > 0) {
    await ctx.tx.insert(requirements).values(
      asked.map((one, at) => ({
        id: newId(),
        shopId: shopOf(ctx),
        batchId,
        lineId,
        seq: at + 1,
        ...asRead(one),
      })),
    );
  }
  await recordAudit(ctx, {
    action: 'batch.set_requirements',
    entity: 'batch',
    entityId: batchId,
    before: { line: lineNo, requirements: before.map(inWords) },
    after: { line: lineNo, requirements: asked.map(inWords) },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

async function lineNoOf(ctx: Ctx, batchId: string, lineId: string): Promise<number> {
  const [line] = await ctx.tx
    .select({ lineNo: batchLines.lineNo })
    .from(batchLines)
    .where(and(eq(batchLines.id, lineId), eq(batchLines.batchId, batchId)));
  if (!line) throw notFound('line');
  return line.lineNo;
}

/** One requirement as the audit trail tells it: `Hardness 63 to 83 HRB (AMS 2658)`. */
const inWords = ({ characteristic, limit, unit, source, sourceText }: ToProve): string =>
  `${[characteristic, limit, unit].filter(Boolean).join(' ')} (${sourceText || source})`;
