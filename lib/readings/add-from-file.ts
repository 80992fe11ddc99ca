import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { readings } from '@/db/schema/readings';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { lockSentBatch, type LockedBatch } from '@/lib/receipts/lock-batch';

import type { AddFromFile } from './contract';
import { findReading } from './find-reading';
import { KeptCertificates } from './kept-reading';
import { readBatchOrder } from './orders-of-batch';
import { ownPlace } from './own-place';

type Reading = typeof readings.$inferSelect;

/**
 * Takes up another certificate of a file that came for one, or the same one for another batch of its processor: a
 * certificate of its own, with the same bytes and what was read in them, that is proved and signed for itself.
 */
export async function addFromFile(ctx: Ctx, { certificateId, place, batchId }: z.output<typeof AddFromFile>) {
  authorize(ctx, 'certificate.add');
  const { certificate, reading } = await findReading(ctx, certificateId);
  const [from] = await ctx.tx
    .select({ number: batches.number, processorId: batches.processorId })
    .from(batches)
    .where(eq(batches.id, certificate.batchId));
  const batch = await lockSentBatch(ctx, batchId, 'A certificate cannot be of it');
  if (!from || batch.processorId !== from.processorId)
    throw new AppError(
      'conflict',
      `${batch.number} is at another processor than ${from?.number ?? 'this one'}. Its certificates come from there.`,
    );
  const read = heldIn(reading, place);
  const source = await fileOf(ctx, certificate.fileId);
  await refuseSecondTime(ctx, { sha256: source.sha256, place, batch });

  const [id, fileId] = [newId(), newId()];
  const shopId = shopOf(ctx);
  await ctx.tx
    .insert(files)
    .values({ ...source, id: fileId, batchId, copyOf: source.copyOf ?? source.id, createdAt: ctx.now });
  await ctx.tx.insert(certificates).values({
    id,
    shopId,
    batchId,
    fileId,
    place,
    sentBy: certificate.sentBy,
    createdAt: ctx.now,
  });
  await ctx.tx.insert(readings).values({ ...read, id: newId(), fileId, createdAt: ctx.now });
  await recordAudit(ctx, {
    action: 'certificate.add',
    entity: 'certificate',
    entityId: id,
    after: {
      batchId,
      batch: batch.number,
      file: source.name,
      sha256: source.sha256,
      place,
      from: certificateId,
    },
  });
  await refreshStanding(ctx, batchId);
  return { certificateId: id };
}

function heldIn(reading: Reading | null, place: number): Reading {
  if (reading?.state !== 'read')
    throw new AppError(
      'conflict',
      'This file was not read, so nobody knows what else it holds. Add it by hand.',
    );
  if (place < KeptCertificates.parse(reading.content).certificates.length) return reading;
  const message = 'The file holds no such certificate.';
  throw new AppError('bad_input', message, { fields: [{ field: 'place', message }] });
}

async function fileOf(ctx: Ctx, fileId: string) {
  const [file] = await ctx.tx.select().from(files).where(eq(files.id, fileId));
  if (!file) throw new Error('a certificate without its file');
  return file;
}

/** Each certificate of a file counts once for a batch, by whichever of its copies it came. */
async function refuseSecondTime(
  ctx: Ctx,
  { sha256, place, batch }: { sha256: string | null; place: number; batch: LockedBatch },
): Promise<void> {
  if (sha256 === null) return;
  const known = await ctx.tx
    .select({ id: certificates.id, place: certificates.place, content: readings.content })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .leftJoin(readings, eq(readings.fileId, certificates.fileId))
    .where(and(eq(files.sha256, sha256), eq(certificates.batchId, batch.id)));
  const order = (await readBatchOrder(ctx, batch.id))?.order ?? null;
  const same = known.find((one) => {
    const kept = KeptCertificates.safeParse(one.content);
    return ownPlace(kept.success ? kept.data.certificates : [], { place: one.place, order }) === place;
  });
  if (same)
    throw new AppError('conflict', `It is a certificate of ${batch.number} already.`, {
      extra: { certificateId: same.id },
    });
}
