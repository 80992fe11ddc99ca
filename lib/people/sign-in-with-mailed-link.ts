import { and, eq, gt, isNull } from 'drizzle-orm';

import { withTenant, type Db } from '@/db/client';
import { mailedLinks, memberships, users } from '@/db/schema/people';
import { hashToken } from '@/lib/auth/identify';
import type { SessionClaims } from '@/lib/auth/session-claims';

import { claimsFor } from './claims-for';

/** Uses up a single-use link. Two presses at once: the condition on `used_at` lets one of them win. */
export function signInWithMailedLink(
  db: Db,
  { token, now }: { token: string; now: Date },
): Promise<SessionClaims | null> {
  return withTenant(db, { kind: 'door' }, async (tx) => {
    const [link] = await tx
      .update(mailedLinks)
      .set({ usedAt: now })
      .where(
        and(
          eq(mailedLinks.tokenHash, hashToken(token)),
          eq(mailedLinks.purpose, 'sign_in'),
          isNull(mailedLinks.usedAt),
          gt(mailedLinks.expiresAt, now),
        ),
      )
      .returning({ userId: mailedLinks.userId });
    if (!link) return null;
    const [user] = await tx
      .select({
        id: users.id,
        sessionVersion: users.sessionVersion,
        shopId: memberships.shopId,
        processorId: memberships.processorId,
      })
      .from(users)
      .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
      .where(and(eq(users.id, link.userId), eq(users.active, true)))
      .orderBy(memberships.id)
      .limit(1);
    return user ? claimsFor(user) : null;
  });
}
