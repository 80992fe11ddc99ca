import { getToken } from 'next-auth/jwt';

import { primary } from '@/db/pools';
import { identifySession, identifyToken, NOBODY, type Identity } from '@/lib/auth/identify';
import { SessionClaims } from '@/lib/auth/session-claims';
import { env } from '@/lib/env';

/** Cookies are marked secure, and renamed so that nothing on plain http can set them, wherever the address is https. */
export const secureCookies = env.APP_URL.startsWith('https:');

/** Who sent these headers: a program with a bearer token, a person or a link with a cookie, or nobody. */
export async function identify(headers: Headers, now: Date): Promise<Identity> {
  const bearer = /^Bearer (.+)$/.exec(headers.get('authorization') ?? '')?.[1];
  if (bearer !== undefined) return identifyToken(primary(), bearer, now);
  const claims = await claimsOf(headers);
  return (claims && (await identifySession(primary(), claims))) ?? NOBODY;
}

/** What the signed cookie says, or null where there is none that holds. */
export async function claimsOf(headers: Headers): Promise<SessionClaims | null> {
  if (!headers.get('cookie')?.includes('authjs.session-token')) return null;
  const token = await getToken({ req: { headers }, secret: env.AUTH_SECRET, secureCookie: secureCookies });
  const parsed = SessionClaims.safeParse(token?.['claims']);
  return parsed.success ? parsed.data : null;
}
