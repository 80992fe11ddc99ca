import NextAuth from 'next-auth';
import Credentials from 'next-auth/providers/credentials';

import { primary } from '@/db/pools';
import type { SessionClaims } from '@/lib/auth/session-claims';
import { env } from '@/lib/env';
import { openBatchLink } from '@/lib/people/open-batch-link';
import { signInWithMailedLink } from '@/lib/people/sign-in-with-mailed-link';
import { signInWithPassword } from '@/lib/people/sign-in-with-password';

import { secureCookies } from './session';

declare module 'next-auth' {
  interface User {
    claims: SessionClaims;
  }
}

const text = (value: unknown): string => (typeof value === 'string' ? value : '');
const addressOf = (request: Request): string => request.headers.get('x-forwarded-for')?.split(',')[0]?.trim() ?? 'local';

/**
 * The three ways in. Each answers with claims, which the signed cookie carries; what the claims are worth is decided
 * with every request (lib/auth/identify.ts).
 */
export const { handlers, signIn, signOut } = NextAuth({
  secret: env.AUTH_SECRET,
  trustHost: true,
  useSecureCookies: secureCookies,
  session: { strategy: 'jwt', maxAge: 14 * 24 * 3600 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    Credentials({
      id: 'password',
      credentials: { email: {}, password: {} },
      authorize: async ({ email, password }, request) => {
        const claims = await signInWithPassword(primary(), { email: text(email), password: text(password), address: addressOf(request), now: new Date() });
        return claims && { id: 'person', claims };
      },
    }),
    Credentials({
      id: 'mailed-link',
      credentials: { token: {} },
      authorize: async ({ token }) => {
        const claims = await signInWithMailedLink(primary(), { token: text(token), now: new Date() });
        return claims && { id: 'person', claims };
      },
    }),
    Credentials({
      id: 'batch-link',
      credentials: { token: {} },
      authorize: async ({ token }) => {
        const claims = await openBatchLink(primary(), { token: text(token), now: new Date() });
        return claims && { id: 'link', claims };
      },
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => ({ ...token, ...(user ? { claims: user.claims } : {}) }),
    session: ({ session }) => session,
  },
});
