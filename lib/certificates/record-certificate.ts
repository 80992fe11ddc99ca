import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { certificates } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import type { RecordCertificate } from './prove-contract';
import { lockCertificate, refuseOtherVersion, refuseSetAside } from './lock-certificate';

/** Number and date as printed on it; both are sealed by the signature, so they stay once it is signed. */
export async function recordCertificate(
  ctx: Ctx,
  { certificateId, version, number, datedOn }: z.output<typeof RecordCertificate>,
) {
  authorize(ctx, 'certificate.prove');
  const locked = await lockCertificate(ctx, certificateId);
  refuseSetAside(locked);
  if (locked.isSigned)
    throw new AppError(
      'conflict',
      'This certificate is signed. Its number and date are sealed with the signature.',
    );
  refuseOtherVersion(locked, version);
  const { certificate } = locked;
  await ctx.tx
    .update(certificates)
    .set({ number, datedOn, version: version + 1 })
    .where(eq(certificates.id, certificateId));
  await recordAudit(ctx, {
    action: 'certificate.record',
    entity: 'certificate',
    entityId: certificateId,
    before: { number: certificate.number, datedOn: certificate.datedOn },
    after: { number, datedOn },
  });
  return { version: version + 1 };
}
