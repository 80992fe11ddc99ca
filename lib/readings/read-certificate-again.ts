import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { findReading } from './find-reading';
import { readAgain } from './request-reading';

/** Has it read once more, or for the first time. */
export async function readCertificateAgain(ctx: Ctx, { certificateId }: { certificateId: string }) {
  authorize(ctx, 'certificate.add');
  const { certificate } = await findReading(ctx, certificateId);
  await readAgain(ctx, { fileId: certificate.fileId, kind: 'certificate' });
  await recordAudit(ctx, {
    action: 'certificate.read_again',
    entity: 'certificate',
    entityId: certificateId,
    after: { file: certificate.fileId },
  });
  return { state: 'waiting' as const };
}
