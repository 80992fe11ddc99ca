import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { readLineStanding } from '@/lib/receipts/line-standing';

import type { shipBatch as declaration } from './contract';
import { countedLines, moveCounted, sumOf } from './counted-lines';
import { onBatch } from './on-batch';

/** Pieces left the processor. Several shipments of one batch are several calls. */
export async function shipBatch(
  ctx: Ctx,
  { batchId, counts, note }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'portal.answer');
  return onBatch(ctx, { batchId, nothing: 'Ask the shop where its pieces go' }, async (inner, batch) => {
    const lines = await readLineStanding(inner, batchId);
    if (lines.every((line) => line.atProcessor === 0)) {
      const notYet = lines.some((line) => line.transitOut > 0);
      throw new AppError(
        'conflict',
        notYet
          ? `Say first how many pieces of ${batch.number} you have.`
          : `Nothing of ${batch.number} is with you any more.`,
      );
    }
    const counted = countedLines(counts, {
      lines,
      most: (line) => line.atProcessor,
      tooMany: (line, most) => `You have ${most} of line ${line.lineNo}. Enter ${most} or less.`,
    });
    const shipped = sumOf(counted);
    if (shipped === 0)
      throw new AppError('bad_input', 'Count at least 1 piece that was shipped.', {
        fields: [{ field: 'counts', message: 'Count at least 1.' }],
      });

    await moveCounted(inner, counted, { from: 'at_processor', to: 'transit_back', reason: 'shipped' });
    await inner.tx
      .update(batches)
      .set({
        shippedAt: ctx.now,
        ...(note === '' ? {} : { shippedNote: note }),
        markedDoneAt: sql`coalesce(${batches.markedDoneAt}, ${ctx.now.toISOString()}::timestamptz)`,
      })
      .where(eq(batches.id, batchId));
    await recordAudit(inner, {
      action: 'batch.ship',
      entity: 'batch',
      entityId: batchId,
      after: { shipped, note, lines: counted.map(({ line, pieces }) => ({ line: line.lineNo, pieces })) },
    });
    await refreshStanding(inner, batchId);
    return { shipped };
  });
}
