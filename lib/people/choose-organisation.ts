import { and, eq } from 'drizzle-orm';

import { withTenant, type Db } from '@/db/client';
import { memberships, users } from '@/db/schema/people';
import type { SessionClaims } from '@/lib/auth/session-claims';

import { claimsFor } from './claims-for';
import { organisationsOf } from './my-account';

/** Claims of the same person for another of their organisations; null where the session or the membership does not hold. */
export function chooseOrganisation(
  db: Db,
  { now, membershipId }: { now: SessionClaims | null; membershipId: string },
): Promise<SessionClaims | null> {
  if (now?.kind !== 'person' || !/^[0-9a-f-]{36}$/.test(membershipId)) return Promise.resolve(null);
  return withTenant(db, { kind: 'door' }, async (tx) => {
    const [user] = await tx
      .select({
        id: users.id,
        sessionVersion: users.sessionVersion,
        shopId: memberships.shopId,
        processorId: memberships.processorId,
      })
      .from(users)
      .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
      .where(
        and(
          eq(users.id, now.userId),
          eq(users.active, true),
          eq(users.sessionVersion, now.sessionVersion),
          eq(memberships.id, membershipId),
        ),
      );
    return user ? claimsFor(user) : null;
  });
}

/** How many organisations there are to choose from. */
export async function countOrganisations(db: Db, userId: string): Promise<number> {
  return (await withTenant(db, { kind: 'door' }, (tx) => organisationsOf(tx, userId))).length;
}
