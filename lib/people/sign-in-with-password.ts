import { and, eq } from 'drizzle-orm';

import { withTenant, type Db } from '@/db/client';
import { memberships, users } from '@/db/schema/people';
import { isPassword } from '@/lib/auth/passwords';
import type { SessionClaims } from '@/lib/auth/session-claims';

import { claimsFor } from './claims-for';
import { giveBackTry, takeTry } from './throttle';

interface Attempt {
  email: string;
  password: string;
  address: string;
}

/**
 * Claims for the right e-mail and password, null for anything else; which of the two was wrong is not told. The try is
 * taken before the password is looked at, so that many at once do not get through together.
 *
 * @throws AppError `too_many`.
 */
export async function signInWithPassword(db: Db, attempt: Attempt): Promise<SessionClaims | null> {
  await takeTry(db, 'sign_in', attempt);
  const user = await withTenant(db, { kind: 'door' }, async (tx) => {
    const [found] = await tx
      .select({
        id: users.id,
        passwordHash: users.passwordHash,
        sessionVersion: users.sessionVersion,
        shopId: memberships.shopId,
        processorId: memberships.processorId,
      })
      .from(users)
      .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
      .where(and(eq(users.email, attempt.email.trim().toLowerCase()), eq(users.active, true)))
      .orderBy(memberships.id)
      .limit(1);
    return found;
  });
  if (!(await isPassword(user?.passwordHash, attempt.password)) || !user) return null;
  await giveBackTry(db, 'sign_in', attempt);
  return claimsFor(user);
}
