import { eq } from 'drizzle-orm';

import { certificates } from '@/db/schema/evidence';
import { readings } from '@/db/schema/readings';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

/** A certificate with its reading; null for one taken in before files were read. */
export async function findReading(ctx: Ctx, certificateId: string) {
  const [found] = await ctx.tx
    .select({ certificate: certificates, reading: readings })
    .from(certificates)
    .leftJoin(readings, eq(readings.fileId, certificates.fileId))
    .where(eq(certificates.id, certificateId));
  if (!found) throw notFound('certificate');
  return found;
}
