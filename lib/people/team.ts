import { and, asc, eq, isNull, sql } from 'drizzle-orm';

import { invitations, memberships, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';

export async function listPeople(ctx: Ctx) {
  authorize(ctx, 'people.manage');
  const me = personOf(ctx.actor);
  const people = await ctx.tx
    .select({
      personId: users.id,
      name: users.name,
      email: users.email,
      roles: memberships.roles,
      active: sql<boolean>`${memberships.active} and ${users.active}`,
      version: memberships.version,
      since: memberships.createdAt,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.shopId, shopOf(ctx)))
    .orderBy(sql`${memberships.active} desc`, asc(users.name), asc(users.id));
  const pending = await ctx.tx
    .select({
      invitationId: invitations.id,
      name: invitations.name,
      email: invitations.email,
      roles: invitations.roles,
      expiresAt: invitations.expiresAt,
    })
    .from(invitations)
    .where(
      and(
        eq(invitations.shopId, shopOf(ctx)),
        isNull(invitations.acceptedAt),
        isNull(invitations.withdrawnAt),
      ),
    )
    .orderBy(asc(invitations.id));
  return {
    people: people.map((person) => ({ ...person, isMe: person.personId === me })),
    invitations: pending.map((invitation) => ({ ...invitation, isExpired: invitation.expiresAt <= ctx.now })),
  };
}
