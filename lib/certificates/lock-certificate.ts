import { eq } from 'drizzle-orm';

import { certificates, signatures } from '@/db/schema/evidence';
import type { Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

/**
 * Holds a certificate and its batch until the transaction ends. The batch first, always: coverage of one line comes
 * from several certificates, and two signers must not both count the same pieces.
 *
 * @throws AppError `conflict` for a batch that has not left, or a certificate that was set aside.
 */
export async function lockCertificate(ctx: Ctx, certificateId: string) {
  const [found] = await ctx.tx
    .select({ batchId: certificates.batchId })
    .from(certificates)
    .where(eq(certificates.id, certificateId));
  if (!found) throw notFound('certificate');
  const batch = await lockSentBatch(ctx, found.batchId, 'Nothing of it can be proved');
  const [certificate] = await ctx.tx
    .select()
    .from(certificates)
    .where(eq(certificates.id, certificateId))
    .for('update');
  if (!certificate) throw notFound('certificate');
  const signed = await ctx.tx
    .select({ id: signatures.id })
    .from(signatures)
    .where(eq(signatures.certificateId, certificateId))
    .limit(1);
  return { certificate, batch, isSigned: signed.length > 0 };
}

type Locked = Awaited<ReturnType<typeof lockCertificate>>;

export function refuseSetAside({ certificate }: Pick<Locked, 'certificate'>): void {
  if (certificate.setAsideAt !== null)
    throw new AppError('conflict', 'This certificate was set aside. Take it up again first.');
}

export function refuseOtherVersion({ certificate }: Pick<Locked, 'certificate'>, version: number): void {
  if (certificate.version !== version) throw changedMeanwhile('certificate');
}
