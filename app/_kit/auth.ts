import NextAuth, { CredentialsSignin } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';

import { primary } from '@/db/pools';
import type { SessionClaims } from '@/lib/auth/session-claims';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { chooseOrganisation } from '@/lib/people/choose-organisation';
import { openBatchLink } from '@/lib/people/open-batch-link';
import { signInWithMailedLink } from '@/lib/people/sign-in-with-mailed-link';
import { signInWithPassword } from '@/lib/people/sign-in-with-password';

import { clientAddress } from './client-address';
import { claimsOf, secureCookies } from './session';

declare module 'next-auth' {
  interface User {
    claims: SessionClaims;
  }
}

const text = (value: unknown): string => (typeof value === 'string' ? value : '');
const addressOf = (request: Request): string => clientAddress(request.headers) ?? 'local';

/** Too many tries: the seconds to wait travel in the code, because the form's answer and the address carry nothing else. */
class SignInThrottled extends CredentialsSignin {
  constructor(refusal: AppError) {
    super(refusal.message);
    this.code = `wait-${String(refusal.details.extra?.['waitS'] ?? 900)}`;
  }
}

async function throttled<T>(work: Promise<T>): Promise<T> {
  return work.catch((error: unknown) => {
    throw error instanceof AppError && error.code === 'too_many' ? new SignInThrottled(error) : error;
  });
}

/**
 * The ways in. Each answers with claims, which the signed cookie carries; what the claims are worth is decided
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
        const claims = await throttled(
          signInWithPassword(primary(), {
            email: text(email),
            password: text(password),
            address: addressOf(request),
          }),
        );
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
    // For somebody who is in already and works for another organisation too.
    Credentials({
      id: 'organisation',
      credentials: { membershipId: {} },
      authorize: async ({ membershipId }, request) => {
        const claims = await chooseOrganisation(primary(), {
          now: await claimsOf(request.headers),
          membershipId: text(membershipId),
        });
        return claims && { id: 'person', claims };
      },
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => ({ ...token, ...(user ? { claims: user.claims } : {}) }),
    session: ({ session }) => session,
  },
  logger: {
    error: (error) =>
      error instanceof CredentialsSignin
        ? log.info({ reason: error.code }, 'sign-in refused')
        : log.error({ error }, 'sign-in failed'),
    warn: (code) => log.warn({ code }, 'sign-in'),
    debug: () => undefined,
  },
});
