import { verify } from '@node-rs/argon2';
import { and, eq } from 'drizzle-orm';

import { withTenant, type Db } from '@/db/client';
import { memberships, users } from '@/db/schema/people';
import type { SessionClaims } from '@/lib/auth/session-claims';

interface Attempt {
  email: string;
  password: string;
  address: string;
  now: Date;
}

// Compared when the account does not exist, so that the time of the answer does not tell which accounts do.
const NOBODYS_HASH = '$argon2id$v=19$m=19456,t=2,p=1$Y1iT+t7lfPSyA+EcCNSCIw$HFhOVU2vJHwzjzqZrhDZWNFfLbnco/axpeoVH8+eWp0';

/** Claims for the right e-mail and password, null for anything else; which of the two was wrong is not told. */
export async function signInWithPassword(db: Db, attempt: Attempt): Promise<SessionClaims | null> {
  const email = attempt.email.trim().toLowerCase();
  const user = await withTenant(db, { kind: 'door' }, async (tx) => {
    const [found] = await tx
      .select({ id: users.id, passwordHash: users.passwordHash, sessionVersion: users.sessionVersion, shopId: memberships.shopId, processorId: memberships.processorId })
      .from(users)
      .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
      .where(and(eq(users.email, email), eq(users.active, true)))
      .limit(1);
    return found;
  });
  const right = await verify(user?.passwordHash ?? NOBODYS_HASH, attempt.password).catch(() => false);
  return right && user?.passwordHash ? claimsOf(user) : null;
}

export function claimsOf(user: { id: string; sessionVersion: number; shopId: string | null; processorId: string | null }): SessionClaims {
  return {
    kind: 'person',
    userId: user.id,
    sessionVersion: user.sessionVersion,
    ...(user.shopId === null ? {} : { shopId: user.shopId }),
    ...(user.processorId === null ? {} : { processorId: user.processorId }),
  };
}
