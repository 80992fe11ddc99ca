import { and, asc, eq, isNotNull } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines, requirements } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { changeBuilding, refOf } from '@/lib/batches/change-building';
import { groupedBy } from '@/lib/batches/grouped-by';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { limitWords } from '@/lib/parts/limit-words';
import { asRead } from '@/lib/parts/to-prove';

import type { addRequirements as declaration } from './contract';

/** As many as one line may ask for in all. */
const MOST = 60;

/** Adds to what lines ask to be proved, behind what is there already. */
export async function addRequirements(
  ctx: Ctx,
  { batchId, version, lines }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version });
  const known = await ctx.tx
    .select({ id: batchLines.id, lineNo: batchLines.lineNo })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const numbers = new Map(known.map(({ id, lineNo }) => [id, lineNo]));
  if (lines.some(({ lineId }) => !numbers.has(lineId))) throw notFound('line');

  const present = groupedBy(
    await ctx.tx
      .select({ lineId: requirements.lineId, seq: requirements.seq })
      .from(requirements)
      .where(and(eq(requirements.batchId, batchId), isNotNull(requirements.lineId))),
    ({ lineId }) => lineId,
  );
  for (const { lineId, requirements: added } of lines) {
    const there = present.get(lineId) ?? [];
    if (there.length + added.length > MOST)
      throw new AppError('bad_input', `Line ${numbers.get(lineId)} would ask for more than ${MOST} things.`);
    const last = Math.max(0, ...there.map(({ seq }) => seq));
    await ctx.tx.insert(requirements).values(
      added.map((one, at) => ({
        id: newId(),
        shopId: shopOf(ctx),
        batchId,
        lineId,
        seq: last + at + 1,
        ...asRead(one),
      })),
    );
  }
  await recordAudit(ctx, {
    action: 'batch.add_requirements',
    entity: 'batch',
    entityId: batchId,
    after: {
      requirements: lines.flatMap(({ lineId, requirements: added }) =>
        added.map(
          (one) =>
            `line ${numbers.get(lineId)}: ${one.characteristic} ${limitWords(one)} (${one.sourceText || one.source})`,
        ),
      ),
    },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}
