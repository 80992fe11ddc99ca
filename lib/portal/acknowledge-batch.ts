import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { addMessage } from '@/lib/messages/add-message';
import { readLineStanding, type LineStanding } from '@/lib/receipts/line-standing';

import { addPromise } from './add-promise';
import type { acknowledgeBatch as declaration } from './contract';
import { countedLines, moveCounted, sumOf, type CountedLine } from './counted-lines';
import { onBatch } from './on-batch';

/**
 * The processor has counted what came. What is missing stays on the way and the shop is told; when it comes after all,
 * the same is done again for the rest.
 */
export async function acknowledgeBatch(
  ctx: Ctx,
  { batchId, counts, promisedOn, note }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'portal.answer');
  return onBatch(ctx, { batchId, nothing: 'Do not work on it' }, async (inner, batch) => {
    const lines = await readLineStanding(inner, batchId);
    const expected = lines.reduce((sum, line) => sum + line.transitOut, 0);
    if (expected === 0)
      throw new AppError(
        'conflict',
        `Nothing of ${batch.number} is on its way to you any more. You have said already what you have.`,
      );
    const counted = countedLines(counts, {
      lines,
      most: (line) => line.transitOut,
      tooMany: (line, most) =>
        `The traveller says ${most} on line ${line.lineNo}. Enter ${most} or less; if you have more, write to the shop.`,
    });
    const came = sumOf(counted);
    if (came === 0)
      throw new AppError(
        'bad_input',
        'None of them has come? Report trouble, so that the shop looks for them.',
        { fields: [{ field: 'counts', message: 'Count at least 1, or report trouble.' }] },
      );

    await moveCounted(inner, counted, { from: 'transit_out', to: 'at_processor', reason: 'acknowledged' });
    const [after] = await inner.tx
      .update(batches)
      .set({
        acknowledgedAt: sql`coalesce(${batches.acknowledgedAt}, ${ctx.now.toISOString()}::timestamptz)`,
        acknowledgedPieces: sql`coalesce(${batches.acknowledgedPieces}, 0) + ${came}`,
      })
      .where(eq(batches.id, batchId))
      .returning({ acknowledgedPieces: batches.acknowledgedPieces });
    const acknowledgedPieces = after?.acknowledgedPieces ?? came;
    const missing = expected - came;
    await recordAudit(inner, {
      action: 'batch.acknowledge',
      entity: 'batch',
      entityId: batchId,
      after: {
        came,
        acknowledgedPieces,
        missing,
        lines: counted.map(({ line, pieces }) => ({ line: line.lineNo, pieces })),
      },
    });
    if (promisedOn !== null) await addPromise(inner, batchId, { promisedOn, note: '' });
    await refreshStanding(inner, batchId);
    await tellShop(inner, { batchId, lines, counted, missing, note });
    return { acknowledgedPieces, missing };
  });
}

interface Telling {
  batchId: string;
  lines: readonly LineStanding[];
  counted: readonly CountedLine[];
  missing: number;
  note: string;
}

async function tellShop(ctx: Ctx, { batchId, lines, counted, missing, note }: Telling): Promise<void> {
  if (missing === 0) {
    if (note !== '') await addMessage(ctx, { batchId, side: 'processor', kind: 'note', body: note });
    return;
  }
  const short = lines.flatMap((line) => {
    const pieces = counted.find((one) => one.line.lineId === line.lineId)?.pieces ?? 0;
    return pieces < line.transitOut
      ? [`line ${line.lineNo}, ${line.partNumber} ${line.partRevision}: ${pieces} of ${line.transitOut}`]
      : [];
  });
  const body = [
    `Fewer came than were sent: ${missing} ${missing === 1 ? 'is' : 'are'} missing.`,
    ...short.map((one) => `${one}.`),
    note,
  ]
    .filter(Boolean)
    .join('\n');
  await addMessage(ctx, { batchId, side: 'processor', kind: 'trouble', body });
}
