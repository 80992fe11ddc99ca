import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { shops } from '@/db/schema/organisations';
import { invitations, memberships, users } from '@/db/schema/people';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { env } from '@/lib/env';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { queueMail } from '@/lib/mail/queue-mail';

import type { invitePerson as declaration } from './team-contract';

/** Long enough for a holiday. */
export const INVITATION_DAYS = 14;

export async function invitePerson(
  ctx: Ctx,
  { email, name, roles }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'people.manage');
  const shopId = shopOf(ctx);
  const [member] = await ctx.tx
    .select({ id: memberships.id })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.shopId, shopId), eq(users.email, email)));
  if (member)
    throw new AppError('conflict', 'This person is in the shop already.', {
      fields: [
        {
          field: 'email',
          message: 'Somebody with this address is in the shop already. Change their roles instead.',
        },
      ],
    });
  const [waiting] = await ctx.tx
    .select({ id: invitations.id })
    .from(invitations)
    .where(
      and(
        eq(invitations.shopId, shopId),
        eq(invitations.email, email),
        isNull(invitations.acceptedAt),
        isNull(invitations.withdrawnAt),
      ),
    );
  if (waiting)
    throw new AppError('conflict', 'This person is invited already.', {
      fields: [
        {
          field: 'email',
          message: 'This address is invited already. Mail that invitation once more, or withdraw it.',
        },
      ],
    });

  const invitationId = newId();
  const token = newToken();
  await ctx.tx.insert(invitations).values({
    id: invitationId,
    shopId,
    email,
    name,
    roles,
    tokenHash: hashToken(token),
    invitedBy: personOf(ctx.actor),
    expiresAt: expiryOf(ctx),
    createdAt: ctx.now,
  });
  await mailInvitation(ctx, { email, name, roles, token });
  await recordAudit(ctx, {
    action: 'invitation.send',
    entity: 'invitation',
    entityId: invitationId,
    after: { email, name, roles },
  });
  return { invitationId };
}

export async function renewInvitation(ctx: Ctx, { invitationId }: { invitationId: string }) {
  authorize(ctx, 'people.manage');
  const token = newToken();
  const [invitation] = await ctx.tx
    .update(invitations)
    .set({ tokenHash: hashToken(token), expiresAt: expiryOf(ctx) })
    .where(openInvitation(ctx, invitationId))
    .returning({ email: invitations.email, name: invitations.name, roles: invitations.roles });
  if (!invitation) throw notFound('invitation');
  await mailInvitation(ctx, { ...invitation, token });
  await recordAudit(ctx, {
    action: 'invitation.renew',
    entity: 'invitation',
    entityId: invitationId,
    after: { email: invitation.email },
  });
  return { done: true as const };
}

export async function withdrawInvitation(ctx: Ctx, { invitationId }: { invitationId: string }) {
  authorize(ctx, 'people.manage');
  const [invitation] = await ctx.tx
    .update(invitations)
    .set({ withdrawnAt: ctx.now })
    .where(openInvitation(ctx, invitationId))
    .returning({ email: invitations.email });
  if (!invitation) throw notFound('invitation');
  await recordAudit(ctx, {
    action: 'invitation.withdraw',
    entity: 'invitation',
    entityId: invitationId,
    before: { email: invitation.email },
  });
  return { done: true as const };
}

const openInvitation = (ctx: Ctx, id: string) =>
  and(
    eq(invitations.id, id),
    eq(invitations.shopId, shopOf(ctx)),
    isNull(invitations.acceptedAt),
    isNull(invitations.withdrawnAt),
  );

const expiryOf = (ctx: Ctx): Date => new Date(ctx.now.getTime() + INVITATION_DAYS * 86_400_000);

async function mailInvitation(
  ctx: Ctx,
  { email, name, roles, token }: { email: string; name: string; roles: readonly string[]; token: string },
): Promise<void> {
  const [shop] = await ctx.tx
    .select({ name: shops.name, zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw new Error('a shop without a row');
  await queueMail(ctx, {
    template: 'invitation',
    to: email,
    props: {
      organisation: shop.name,
      inviter: ctx.actor.name,
      name,
      roles: [...roles],
      url: `${env.APP_URL}/invitation/${token}`,
      expiresAt: expiryOf(ctx),
      zone: shop.zone,
      statedAt: ctx.now,
    },
  });
}
