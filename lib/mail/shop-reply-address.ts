import { and, asc, eq, sql } from 'drizzle-orm';

import { memberships, users } from '@/db/schema/people';
import { personOf, type Ctx } from '@/lib/auth/context';

/** Where an answer to a mail in the shop's name goes: the acting person, else the shop's first admin. Null outside a shop. */
export async function shopReplyAddress(ctx: Pick<Ctx, 'tx' | 'tenant' | 'actor'>): Promise<string | null> {
  if (ctx.tenant.kind !== 'shop') return null;
  const personId = personOf(ctx.actor);
  const [found] = await ctx.tx
    .select({ email: users.email })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.active, true),
        eq(users.active, true),
        personId === null ? sql`'admin' = any(${memberships.roles})` : eq(users.id, personId),
      ),
    )
    .orderBy(asc(memberships.id))
    .limit(1);
  return found?.email ?? null;
}
