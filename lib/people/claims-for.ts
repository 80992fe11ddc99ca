import type { SessionClaims } from '@/lib/auth/session-claims';

/** What the cookie of a person says who acts for one organisation. */
export function claimsFor(user: {
  id: string;
  sessionVersion: number;
  shopId: string | null;
  processorId: string | null;
}): SessionClaims {
  return {
    kind: 'person',
    userId: user.id,
    sessionVersion: user.sessionVersion,
    ...(user.shopId === null ? {} : { shopId: user.shopId }),
    ...(user.processorId === null ? {} : { processorId: user.processorId }),
  };
}
