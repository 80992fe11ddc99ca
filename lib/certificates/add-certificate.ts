import { eq } from 'drizzle-orm';

import { certificates } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId } from '@/lib/ids';
import { requestReading } from '@/lib/readings/request-reading';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

/** Adds a certificate that came to the shop itself, on paper or by mail. */
export async function addCertificate(ctx: Ctx, { batchId, fileId }: { batchId: string; fileId: string }) {
  authorize(ctx, 'certificate.add');
  const batch = await lockSentBatch(ctx, batchId, 'A certificate cannot be of it');
  const file = await requireVerifiedFile(ctx, { fileId, purpose: 'certificate', batchId: batch.id });
  const [known] = await ctx.tx
    .select({ id: certificates.id })
    .from(certificates)
    .where(eq(certificates.fileId, file.id));
  if (known)
    throw new AppError('conflict', `${file.name} is already a certificate of ${batch.number}.`, {
      extra: { certificateId: known.id },
    });
  const id = newId();
  await ctx.tx.insert(certificates).values({
    id,
    shopId: shopOf(ctx),
    batchId,
    fileId: file.id,
    sentBy: ctx.actor.name,
    createdAt: ctx.now,
  });
  await requestReading(ctx, { fileId: file.id, kind: 'certificate' });
  await recordAudit(ctx, {
    action: 'certificate.add',
    entity: 'certificate',
    entityId: id,
    after: { batchId, file: file.name, sha256: file.sha256 },
  });
  return { id };
}
