import { and, eq, isNull } from 'drizzle-orm';

import { withTenant, type Db } from '@/db/client';
import { batches, batchLinks } from '@/db/schema/batches';
import { hashToken, LINK_ENDS_AT } from '@/lib/auth/identify';
import type { SessionClaims } from '@/lib/auth/session-claims';

/**
 * Claims for the link in a dispatch mail. It may be opened again and again, from any device, until the batch is
 * settled or the shop withdraws it; merely fetching its page (as mail scanners do) does not come here.
 */
export function openBatchLink(
  db: Db,
  { token, now }: { token: string; now: Date },
): Promise<SessionClaims | null> {
  return withTenant(db, { kind: 'door' }, async (tx) => {
    const [link] = await tx
      .select({ id: batchLinks.id, firstOpenedAt: batchLinks.firstOpenedAt, stage: batches.stage })
      .from(batchLinks)
      .innerJoin(batches, eq(batches.id, batchLinks.batchId))
      .where(and(eq(batchLinks.tokenHash, hashToken(token)), isNull(batchLinks.withdrawnAt)));
    if (!link || LINK_ENDS_AT.includes(link.stage)) return null;
    if (link.firstOpenedAt === null)
      await tx.update(batchLinks).set({ firstOpenedAt: now }).where(eq(batchLinks.id, link.id));
    return { kind: 'link', linkId: link.id };
  });
}
