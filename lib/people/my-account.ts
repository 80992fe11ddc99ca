import { and, asc, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { processors, shops } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import { personOf, type Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import type { updateAccount as declaration } from './account-contract';
import { recordForPerson } from './record-for-person';

/** A link and a token have no account of their own: they are somebody's key, not somebody. */
export function meAtTheDoor(ctx: Ctx): string {
  const me = ctx.actor.kind === 'person' ? personOf(ctx.actor) : null;
  if (me === null)
    throw new AppError(
      'not_allowed',
      'This belongs to a person with an account. Sign in with your own e-mail.',
    );
  return me;
}

export async function getAccount(ctx: Ctx) {
  authorize(ctx, 'self.manage');
  const me = meAtTheDoor(ctx);
  const [user] = await ctx.tx
    .select({
      name: users.name,
      email: users.email,
      units: users.units,
      singleKeys: users.singleKeys,
      passwordHash: users.passwordHash,
    })
    .from(users)
    .where(eq(users.id, me));
  if (!user) throw notFound('person');
  const { passwordHash, ...account } = user;
  return { ...account, hasPassword: passwordHash !== null, organisations: await organisationsOf(ctx.tx, me) };
}

/** Every shop and processor a person works for, oldest first. */
export async function organisationsOf(tx: Ctx['tx'], userId: string) {
  const rows = await tx
    .select({
      membershipId: memberships.id,
      shopId: memberships.shopId,
      processorId: memberships.processorId,
      shop: shops.name,
      processor: processors.name,
      roles: memberships.roles,
    })
    .from(memberships)
    .leftJoin(shops, eq(shops.id, memberships.shopId))
    .leftJoin(processors, eq(processors.id, memberships.processorId))
    .where(and(eq(memberships.userId, userId), eq(memberships.active, true)))
    .orderBy(asc(memberships.id));
  return rows.map(({ membershipId, shopId, processorId, shop, processor, roles }) => ({
    membershipId,
    id: shopId ?? processorId ?? '',
    roles,
    kind: shopId === null ? ('processor' as const) : ('shop' as const),
    name: shop ?? processor ?? '',
  }));
}

export async function updateAccount(ctx: Ctx, change: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'self.manage');
  const me = meAtTheDoor(ctx);
  const [before] = await ctx.tx
    .select({ name: users.name, units: users.units, singleKeys: users.singleKeys })
    .from(users)
    .where(eq(users.id, me));
  if (!before) throw notFound('person');
  const after = {
    name: change.name ?? before.name,
    units: change.units ?? before.units,
    singleKeys: change.singleKeys ?? before.singleKeys,
  };
  await ctx.tx.update(users).set(after).where(eq(users.id, me));
  await recordForPerson(
    ctx,
    { id: me, name: before.name },
    { action: 'person.update_account', before, after },
  );
  return { done: true as const };
}
