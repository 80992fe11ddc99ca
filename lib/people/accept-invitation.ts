import { and, eq, gt, isNull, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { processors, shops } from '@/db/schema/organisations';
import { invitations, memberships, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { hashPassword } from '@/lib/auth/passwords';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { acceptInvitation as declaration } from './account-contract';
import { refuseGuessable } from './change-password';
import { recordInShop, themselves } from './record-for-person';

/** Who invites whom to what. Fetching it, as mail scanners do, changes nothing. */
export async function readInvitation(ctx: Ctx, { token }: { token: string }) {
  authorize(ctx, 'public.use');
  const [found] = await ctx.tx
    .select({
      name: invitations.name,
      email: invitations.email,
      roles: invitations.roles,
      expiresAt: invitations.expiresAt,
      acceptedAt: invitations.acceptedAt,
      withdrawnAt: invitations.withdrawnAt,
      shop: shops.name,
      processor: processors.name,
      accountId: users.id,
    })
    .from(invitations)
    .leftJoin(shops, eq(shops.id, invitations.shopId))
    .leftJoin(processors, eq(processors.id, invitations.processorId))
    .leftJoin(users, eq(users.email, invitations.email))
    .where(eq(invitations.tokenHash, hashToken(token)));
  if (!found)
    return {
      state: 'unknown' as const,
      organisation: null,
      name: null,
      email: null,
      roles: [],
      hasAccount: false,
    };
  const { name, email, roles, shop, processor, accountId } = found;
  return {
    state: stateOf(found, ctx.now),
    organisation: shop ?? processor,
    name,
    email,
    roles,
    hasAccount: accountId !== null,
  };
}

function stateOf(
  {
    acceptedAt,
    withdrawnAt,
    expiresAt,
  }: { acceptedAt: Date | null; withdrawnAt: Date | null; expiresAt: Date },
  now: Date,
) {
  if (acceptedAt !== null) return 'accepted' as const;
  if (withdrawnAt !== null) return 'withdrawn' as const;
  return expiresAt <= now ? ('expired' as const) : ('open' as const);
}

/**
 * Uses up an invitation. Whoever holds the link reads that mailbox, which is as much as a mailed sign-in link asks;
 * an account that exists keeps its name and password.
 */
export async function acceptInvitation(
  ctx: Ctx,
  { token, name, password }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'public.use');
  const [invitation] = await ctx.tx
    .update(invitations)
    .set({ acceptedAt: ctx.now })
    .where(
      and(
        eq(invitations.tokenHash, hashToken(token)),
        isNull(invitations.acceptedAt),
        isNull(invitations.withdrawnAt),
        gt(invitations.expiresAt, ctx.now),
      ),
    )
    .returning({
      id: invitations.id,
      shopId: invitations.shopId,
      processorId: invitations.processorId,
      email: invitations.email,
      name: invitations.name,
      roles: invitations.roles,
    });
  if (!invitation)
    throw new AppError(
      'gone',
      'This invitation was used or withdrawn, or its time is over. Ask for another one.',
    );

  const [account] = await ctx.tx
    .select({ id: users.id, name: users.name })
    .from(users)
    .where(eq(users.email, invitation.email));
  const person = account ?? (await makeAccount(ctx, invitation.email, name ?? invitation.name, password));
  await joinOrganisation(ctx, person.id, invitation);
  if (invitation.shopId !== null) {
    const record = {
      action: 'invitation.accept',
      entity: 'person',
      entityId: person.id,
      after: { email: invitation.email, roles: invitation.roles },
    };
    await recordInShop(ctx, invitation.shopId, record, themselves(person));
  }
  return { email: invitation.email, hadAccount: account !== undefined };
}

async function makeAccount(ctx: Ctx, email: string, name: string, password: string | undefined) {
  if (password === undefined)
    throw new AppError('bad_input', 'Choose a password.', {
      fields: [{ field: 'password', message: 'Choose a password of 12 characters or more.' }],
    });
  refuseGuessable(password, email);
  const person = { id: newId(), name };
  await ctx.tx
    .insert(users)
    .values({ ...person, email, passwordHash: await hashPassword(password), createdAt: ctx.now });
  return person;
}

interface Joined {
  shopId: string | null;
  processorId: string | null;
  roles: string[];
}

/** Somebody who was there before comes back with the new roles. */
async function joinOrganisation(
  ctx: Ctx,
  userId: string,
  { shopId, processorId, roles }: Joined,
): Promise<void> {
  const same: SQL | undefined =
    shopId === null ? eq(memberships.processorId, processorId ?? '') : eq(memberships.shopId, shopId);
  const [back] = await ctx.tx
    .update(memberships)
    .set({ active: true, roles })
    .where(and(eq(memberships.userId, userId), same))
    .returning({ id: memberships.id });
  if (!back)
    await ctx.tx
      .insert(memberships)
      .values({ id: newId(), userId, shopId, processorId, roles, createdAt: ctx.now });
}
