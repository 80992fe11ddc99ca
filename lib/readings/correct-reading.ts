import type { z } from 'zod';

import { readingCorrections } from '@/db/schema/readings';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { lockCertificate, refuseSetAside } from '@/lib/certificates/lock-certificate';
import { AppError } from '@/lib/errors';

import type { CorrectReading } from './contract';
import { findReading } from './find-reading';
import { KeptCertificates } from './kept-reading';

/** Puts a person's value beside the machine's; the later of two corrections of a field counts. */
export async function correctReading(
  ctx: Ctx,
  { certificateId, field, corrected }: z.output<typeof CorrectReading>,
) {
  authorize(ctx, 'certificate.prove');
  refuseSetAside(await lockCertificate(ctx, certificateId));
  const { reading } = await findReading(ctx, certificateId);
  if (reading?.state !== 'read')
    throw new AppError(
      'conflict',
      'This certificate was not read by the machine, so there is nothing to correct.',
    );
  const { certificates: read } = KeptCertificates.parse(reading.content);
  const fact = read.flatMap(({ facts }) => facts).find((one) => one.field === field);
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
