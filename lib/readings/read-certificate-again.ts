import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { findReading } from './find-reading';
import { readOnceMore, requestReading } from './request-reading';

/** Has it read once more, or for the first time. */
export async function readCertificateAgain(ctx: Ctx, { certificateId }: { certificateId: string }) {
  authorize(ctx, 'certificate.add');
  const { certificate, reading } = await findReading(ctx, certificateId);
  if (reading) await readOnceMore(ctx, reading.id);
  else await requestReading(ctx, { fileId: certificate.fileId, kind: 'certificate' });
  return { state: 'waiting' as const };
}
