import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { processors, shops } from '@/db/schema/organisations';
import { mailedLinks, memberships, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { env } from '@/lib/env';
import { newId } from '@/lib/ids';
import { queueMail } from '@/lib/mail/queue-mail';

import type {
  requestReset as resetDeclaration,
  requestSignInLink as signInDeclaration,
} from './account-contract';
import { recordForPerson } from './record-for-person';
import { safeNext } from './safe-next';
import { takeTry } from './throttle';

const VALID_MIN = { sign_in: 20, reset: 60 } as const;

export async function requestSignInLink(
  ctx: Ctx,
  { email, next }: z.output<(typeof signInDeclaration)['input']>,
) {
  authorize(ctx, 'public.use');
  const to = safeNext(next);
  return mailLink(ctx, {
    email,
    purpose: 'sign_in',
    addressOf: (token) => `/sign-in-link/${token}${to === '/' ? '' : `?next=${encodeURIComponent(to)}`}`,
  });
}

export async function requestReset(ctx: Ctx, { email }: z.output<(typeof resetDeclaration)['input']>) {
  authorize(ctx, 'public.use');
  return mailLink(ctx, { email, purpose: 'reset', addressOf: (token) => `/reset/${token}` });
}

interface Asked {
  email: string;
  purpose: 'sign_in' | 'reset';
  addressOf: (token: string) => string;
}

/** Says "done" whoever asks and whoever is asked for: the answer must not tell who has an account. */
async function mailLink(ctx: Ctx, { email, purpose, addressOf }: Asked): Promise<{ done: true }> {
  await takeTry(ctx.tx, 'mail', { email, address: ctx.address ?? 'local' });
  const [user] = await ctx.tx
    .select({ id: users.id, name: users.name, shopZone: shops.zone, processorZone: processors.zone })
    .from(users)
    .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
    .leftJoin(shops, eq(shops.id, memberships.shopId))
    .leftJoin(processors, eq(processors.id, memberships.processorId))
    .where(and(eq(users.email, email), eq(users.active, true)))
    .orderBy(memberships.id)
    .limit(1);
  if (!user) return { done: true };

  const token = newToken();
  const expiresAt = new Date(ctx.now.getTime() + VALID_MIN[purpose] * 60_000);
  await ctx.tx.insert(mailedLinks).values({
    id: newId(),
    userId: user.id,
    purpose,
    tokenHash: hashToken(token),
    expiresAt,
    createdAt: ctx.now,
  });
  await queueMail(ctx, {
    template: purpose === 'reset' ? 'reset' : 'sign-in',
    to: email,
    props: {
      name: user.name,
      url: env.APP_URL + addressOf(token),
      expiresAt,
      zone: user.shopZone ?? user.processorZone ?? 'UTC',
      statedAt: ctx.now,
    },
  });
  await recordForPerson(
    ctx,
    user,
    { action: purpose === 'reset' ? 'person.ask_for_reset' : 'person.ask_for_link' },
    { kind: 'nobody', name: 'somebody at the sign-in page', roles: [] },
  );
  return { done: true };
}
