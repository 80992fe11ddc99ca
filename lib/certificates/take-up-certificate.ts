import { eq } from 'drizzle-orm';

import { certificates } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import { lockCertificate, refuseOtherVersion } from './lock-certificate';

/** Takes back that a certificate was set aside. */
export async function takeUpCertificate(
  ctx: Ctx,
  { certificateId, version }: { certificateId: string; version: number },
) {
  authorize(ctx, 'certificate.prove');
  const locked = await lockCertificate(ctx, certificateId);
  if (locked.certificate.setAsideAt === null)
    throw new AppError('conflict', 'This certificate is not set aside.');
  refuseOtherVersion(locked, version);
  await ctx.tx
    .update(certificates)
    .set({ setAsideAt: null, setAsideReason: null, version: version + 1 })
    .where(eq(certificates.id, certificateId));
  await recordAudit(ctx, {
    action: 'certificate.take_up',
    entity: 'certificate',
    entityId: certificateId,
    before: { reason: locked.certificate.setAsideReason },
  });
  return { version: version + 1 };
}
