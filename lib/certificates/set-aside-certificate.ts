import { eq } from 'drizzle-orm';

import { certificates } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import { lockCertificate, refuseOtherVersion, refuseSetAside } from './lock-certificate';

/** A second copy, or replaced by a corrected one. The file stays as it was received; it only waits for nobody any more. */
export async function setAsideCertificate(
  ctx: Ctx,
  { certificateId, version, reason }: { certificateId: string; version: number; reason: string },
) {
  authorize(ctx, 'certificate.prove');
  const locked = await lockCertificate(ctx, certificateId);
  if (locked.isSigned)
    throw new AppError(
      'conflict',
      'This certificate is signed. What it covers stands; hold the pieces if it is in doubt.',
    );
  refuseSetAside(locked);
  refuseOtherVersion(locked, version);
  await ctx.tx
    .update(certificates)
    .set({ setAsideAt: ctx.now, setAsideReason: reason, version: version + 1 })
    .where(eq(certificates.id, certificateId));
  await recordAudit(ctx, {
    action: 'certificate.set_aside',
    entity: 'certificate',
    entityId: certificateId,
    after: { reason },
  });
  return { version: version + 1 };
}
