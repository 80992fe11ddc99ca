import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { requirements } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, notFound } from '@/lib/errors';
import { readLineStanding } from '@/lib/receipts/line-standing';
import { lockSentBatch } from '@/lib/receipts/lock-batch';
import { movePieces } from '@/lib/stock/move-pieces';

import type { RaiseNonconformance } from './contract';
import { coveredPiecesOf } from './covered-pieces';
import { openNonconformance } from './open-nonconformance';

type Input = z.output<typeof RaiseNonconformance>;

/** Puts pieces in quarantine on hold until somebody decides about them. */
export async function raiseNonconformance(ctx: Ctx, input: Input) {
  authorize(ctx, 'nonconformance.raise');
  const batch = await lockSentBatch(ctx, input.batchId, 'Nothing of it can be held');
  const line = (await readLineStanding(ctx, batch.id)).find((one) => one.lineId === input.lineId);
  if (!line) throw notFound('line');
  if (input.pieces > line.inQuarantine) throw tooMany(line);
  if (line.serialised && input.pieceIds.length !== input.pieces) {
    throw new AppError(
      'bad_input',
      `Line ${line.lineNo}, ${line.partNumber}: tick the serial number of each of the ${input.pieces} pieces.`,
      { fields: [{ field: 'pieceIds', message: `${input.pieceIds.length} ticked. Tick ${input.pieces}.` }] },
    );
  }
  await refuseForeignEvidence(ctx, input);

  const opened = await openNonconformance(ctx, {
    batchId: batch.id,
    lineId: line.lineId,
    lotId: line.lotId,
    kind: input.kind,
    pieces: input.pieces,
    coveredPieces: coveredPiecesOf(input.kind, input.pieces, line),
    what: input.what,
    requirementId: input.requirementId,
    certificateId: input.certificateId,
  });
  await movePieces(ctx, {
    lotId: line.lotId,
    pieces: input.pieces,
    from: { place: 'quarantine', holderId: line.lineId },
    to: { place: 'hold', holderId: opened.id },
    reason: 'held',
    batchLineId: line.lineId,
    note: opened.number,
    ...(line.serialised ? { pieceIds: input.pieceIds } : {}),
  });
  await refreshStanding(ctx, batch.id);
  return opened;
}

function tooMany({
  lineNo,
  partNumber,
  inQuarantine,
}: {
  lineNo: number;
  partNumber: string;
  inQuarantine: number;
}): AppError {
  const message =
    inQuarantine === 0
      ? 'Nothing of it is in quarantine, so nothing can be held.'
      : `${inQuarantine} in quarantine. Enter ${inQuarantine} or less.`;
  return new AppError('bad_input', `Line ${lineNo}, ${partNumber}: ${message}`, {
    fields: [{ field: 'pieces', message }],
  });
}

/** The requirement and the certificate it points at must be of the same batch. */
async function refuseForeignEvidence(
  ctx: Ctx,
  { batchId, lineId, requirementId, certificateId }: Input,
): Promise<void> {
  if (requirementId !== null) {
    const [requirement] = await ctx.tx
      .select({ lineId: requirements.lineId })
      .from(requirements)
      .where(and(eq(requirements.id, requirementId), eq(requirements.batchId, batchId)));
    if (!requirement || (requirement.lineId !== null && requirement.lineId !== lineId))
      throw notFound('requirement');
  }
  if (certificateId !== null) {
    const [certificate] = await ctx.tx
      .select({ id: certificates.id })
      .from(certificates)
      .where(and(eq(certificates.id, certificateId), eq(certificates.batchId, batchId)));
    if (!certificate) throw notFound('certificate');
  }
}
