import { and, asc, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { atDoorOf } from '@/db/client';
import { processors } from '@/db/schema/organisations';
import { invitations, memberships, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import { personOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { env } from '@/lib/env';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { log } from '@/lib/log';
import { queueMail } from '@/lib/mail/queue-mail';

import { INVITATION_DAYS } from './invite-person';
import type {
  inviteColleague as inviteDeclaration,
  setColleagueActive as activeDeclaration,
} from './team-contract';

/** Whoever opened the link of one batch has no colleagues here: only a person with an account may let others in. */
function ownProcessor({ tenant }: Ctx): string {
  if (tenant.kind !== 'processor' || tenant.batchId !== null || tenant.personId === null)
    throw new AppError(
      'not_allowed',
      'The link in a mail opens its batch only. Sign in to look after your people.',
    );
  return tenant.processorId;
}

export async function listColleagues(ctx: Ctx) {
  authorize(ctx, 'portal.account');
  const me = personOf(ctx.actor);
  const people = await ctx.tx
    .select({ personId: users.id, name: users.name, email: users.email, active: memberships.active })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.processorId, ownProcessor(ctx)))
    .orderBy(asc(users.name), asc(users.id));
  return { people: people.map((person) => ({ ...person, isMe: person.personId === me })) };
}

/** A processor has no chain of its own; who let whom in is told in the log. */
export async function inviteColleague(
  ctx: Ctx,
  { email, name }: z.output<(typeof inviteDeclaration)['input']>,
) {
  authorize(ctx, 'portal.account');
  const processorId = ownProcessor(ctx);
  const { people } = await listColleagues(ctx);
  if (people.some((person) => person.email === email && person.active))
    throw new AppError('conflict', 'This person is in already.', {
      fields: [{ field: 'email', message: 'Somebody with this address is in already.' }],
    });
  const [processor] = await ctx.tx
    .select({ name: processors.name, zone: processors.zone })
    .from(processors)
    .where(eq(processors.id, processorId));
  if (!processor) throw notFound('processor');
  const token = newToken();
  const expiresAt = new Date(ctx.now.getTime() + INVITATION_DAYS * 86_400_000);
  await atDoorOf(ctx.tx, ctx.tenant, async () => {
    await ctx.tx
      .update(invitations)
      .set({ withdrawnAt: ctx.now })
      .where(
        and(
          eq(invitations.processorId, processorId),
          eq(invitations.email, email),
          isNull(invitations.acceptedAt),
          isNull(invitations.withdrawnAt),
        ),
      );
    await ctx.tx.insert(invitations).values({
      id: newId(),
      processorId,
      email,
      name,
      roles: ['processor'],
      tokenHash: hashToken(token),
      invitedBy: personOf(ctx.actor),
      expiresAt,
      createdAt: ctx.now,
    });
  });
  await queueMail(ctx, {
    template: 'invitation',
    to: email,
    props: {
      organisation: processor.name,
      inviter: ctx.actor.name,
      name,
      roles: ['processor'],
      url: `${env.APP_URL}/invitation/${token}`,
      expiresAt,
      zone: processor.zone,
      statedAt: ctx.now,
    },
  });
  log.info({ requestId: ctx.requestId, processorId, by: ctx.actor.name }, 'a processor invited a colleague');
  return { done: true as const };
}

export async function setColleagueActive(
  ctx: Ctx,
  { personId, active }: z.output<(typeof activeDeclaration)['input']>,
) {
  authorize(ctx, 'portal.account');
  const processorId = ownProcessor(ctx);
  if (personId === personOf(ctx.actor))
    throw new AppError('conflict', 'You cannot close your own way in. Somebody else of your company can.');
  const [changed] = await atDoorOf(ctx.tx, ctx.tenant, () =>
    ctx.tx
      .update(memberships)
      .set({ active })
      .where(and(eq(memberships.processorId, processorId), eq(memberships.userId, personId)))
      .returning({ id: memberships.id }),
  );
  if (!changed) throw notFound('person');
  log.info(
    { requestId: ctx.requestId, processorId, personId, active, by: ctx.actor.name },
    'a processor opened or closed a colleague’s way in',
  );
  return { done: true as const };
}
