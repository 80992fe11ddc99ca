import type { z } from 'zod';

import { readingCorrections } from '@/db/schema/readings';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { lockCertificate, refuseSetAside } from '@/lib/certificates/lock-certificate';
import { AppError } from '@/lib/errors';
import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';

import type { CorrectReading } from './contract';
import { findReading } from './find-reading';
import { KeptCertificates } from './kept-reading';
import { readBatchOrder } from './orders-of-batch';
import { ownPlace } from './own-place';
import { hasField, withCorrection } from './with-corrections';

/** Puts a person's value beside the machine's; the later of two corrections of a field counts. */
export async function correctReading(
  ctx: Ctx,
  { certificateId, field, corrected }: z.output<typeof CorrectReading>,
) {
  authorize(ctx, 'certificate.prove');
  const locked = await lockCertificate(ctx, certificateId);
  refuseSetAside(locked);
  const { reading } = await findReading(ctx, certificateId);
  if (reading?.state !== 'read')
    throw new AppError(
      'conflict',
      'This certificate was not read by the machine, so there is nothing to correct.',
    );
  const { certificates: read } = KeptCertificates.parse(reading.content);
  const batch = await readBatchOrder(ctx, locked.batch.id);
  const { place } = locked.certificate;
  const stated = read[ownPlace(read, { place, order: batch?.order ?? null })];
  const fact = stated?.facts.find((one) => one.field === field);
  if (stated) refuseWhatDoesNotFit(stated, { field, corrected });
  await ctx.tx.insert(readingCorrections).values({
    shopId: shopOf(ctx),
    readingId: reading.id,
    field,
    read: fact?.value == null ? null : String(fact.value),
    corrected,
    correctedBy: ctx.actor.name,
    correctedAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'certificate.correct_reading',
    entity: 'certificate',
    entityId: certificateId,
    before: { field, read: fact?.value ?? null },
    after: { field, corrected },
  });
  return { field };
}

/** What cannot stand in the field would be kept and count for nothing, and nobody would know. */
function refuseWhatDoesNotFit(
  stated: StatedCertificate,
  { field, corrected }: { field: string; corrected: string },
): void {
  const isKnown = hasField(stated, field);
  if (
    isKnown ? withCorrection(stated, { field, corrected }) : stated.facts.some((one) => one.field === field)
  )
    return;
  const message = isKnown
    ? 'This cannot stand there. Write a date as 2026-06-17, a time as 2026-06-17T14:05, a number in figures, yes or no.'
    : 'The machine reads no such thing on a certificate.';
  throw new AppError('bad_input', message, {
    fields: [{ field: isKnown ? 'corrected' : 'field', message }],
  });
}
