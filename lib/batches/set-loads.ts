import { and, asc, eq, inArray } from 'drizzle-orm';
import type { z } from 'zod';

import { batchLines } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import { changeBuilding, refOf } from './change-building';
import { groupedBy } from './grouped-by';
import type { setLoads as declaration } from './load-contract';
import { refreshStanding } from './refresh-standing';

/** Puts lines into loads, all at once. */
export async function setLoads(
  ctx: Ctx,
  { batchId, version, loads }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.build');
  const batch = await changeBuilding(ctx, { batchId, version });
  const wanted = new Map(loads.map(({ lineId, loadNo }) => [lineId, loadNo]));
  const before = await ctx.tx
    .select({ id: batchLines.id, lineNo: batchLines.lineNo, loadNo: batchLines.loadNo })
    .from(batchLines)
    .where(eq(batchLines.batchId, batchId))
    .orderBy(asc(batchLines.lineNo));
  const known = new Set(before.map(({ id }) => id));
  if ([...wanted.keys()].some((id) => !known.has(id))) throw notFound('line');

  for (const [loadNo, together] of groupedBy([...wanted], ([, no]) => no))
    await ctx.tx
      .update(batchLines)
      .set({ loadNo })
      .where(
        and(
          eq(batchLines.batchId, batchId),
          inArray(
            batchLines.id,
            together.map(([id]) => id),
          ),
        ),
      );
  const after = before.map((line) => ({ ...line, loadNo: wanted.get(line.id) ?? null }));
  await recordAudit(ctx, {
    action: 'batch.set_loads',
    entity: 'batch',
    entityId: batchId,
    before: { loads: before.filter(({ id }) => wanted.has(id)).map(inWords) },
    after: { loads: after.filter(({ id }) => wanted.has(id)).map(inWords) },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}

const inWords = ({ lineNo, loadNo }: { lineNo: number; loadNo: number | null }): string =>
  `line ${lineNo}: ${loadNo === null ? 'no load' : `load ${loadNo}`}`;
