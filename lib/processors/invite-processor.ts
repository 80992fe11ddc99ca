import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { atDoorOf } from '@/db/client';
import { shops } from '@/db/schema/organisations';
import { invitations, memberships, users } from '@/db/schema/people';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { queueMail } from '@/lib/mail/queue-mail';
import { INVITATION_DAYS } from '@/lib/people/invite-person';

import type { inviteProcessor as declaration } from './contract';
import { getProcessor } from './queries';

/**
 * Invites the processor to an account of its own. An account there sees the batches of every shop the processor
 * serves, so the invitation goes to the processor's own e-mail and nowhere else: a shop that could name any address
 * could let its friends look at other shops.
 */
export async function inviteProcessor(ctx: Ctx, { processorId }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'processor.edit');
  const { name, email } = await getProcessor(ctx, { processorId });
  const [shop] = await ctx.tx
    .select({ name: shops.name, zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw new Error('a shop without a row');
  const token = newToken();
  const expiresAt = new Date(ctx.now.getTime() + INVITATION_DAYS * 86_400_000);
  const invitationId = await atDoorOf(ctx.tx, ctx.tenant, () =>
    replaceInvitation(ctx, { processorId, name, email, token, expiresAt }),
  );
  await queueMail(ctx, {
    template: 'invitation',
    to: email,
    props: {
      organisation: name,
      inviter: `${ctx.actor.name} of ${shop.name}`,
      name,
      roles: ['processor'],
      url: `${env.APP_URL}/invitation/${token}`,
      expiresAt,
      zone: shop.zone,
      statedAt: ctx.now,
    },
  });
  await recordAudit(ctx, {
    action: 'processor.invite',
    entity: 'processor',
    entityId: processorId,
    after: { email, invitationId },
  });
  return { email };
}

interface NewInvitation {
  processorId: string;
  name: string;
  email: string;
  token: string;
  expiresAt: Date;
}

/** One invitation at a time waits at a desk, whichever shop sent it. */
async function replaceInvitation(
  ctx: Ctx,
  { processorId, name, email, token, expiresAt }: NewInvitation,
): Promise<string> {
  const [member] = await ctx.tx
    .select({ id: memberships.id })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(eq(memberships.processorId, processorId), eq(memberships.active, true), eq(users.email, email)),
    );
  if (member)
    throw new AppError(
      'conflict',
      `${email} has an account already. It signs in with it, or opens the link in your dispatch mail.`,
    );
  await ctx.tx
    .update(invitations)
    .set({ withdrawnAt: ctx.now })
    .where(
      and(
        eq(invitations.processorId, processorId),
        isNull(invitations.acceptedAt),
        isNull(invitations.withdrawnAt),
      ),
    );
  const id = newId();
  await ctx.tx.insert(invitations).values({
    id,
    processorId,
    email,
    name,
    roles: ['processor'],
    tokenHash: hashToken(token),
    invitedBy: personOf(ctx.actor),
    expiresAt,
    createdAt: ctx.now,
  });
  return id;
}
