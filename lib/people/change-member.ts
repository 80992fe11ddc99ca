import { and, eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { memberships } from '@/db/schema/people';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';

import type { changeRoles as rolesDeclaration, setPersonActive as activeDeclaration } from './team-contract';

export async function changeRoles(
  ctx: Ctx,
  { personId, roles, version }: z.output<(typeof rolesDeclaration)['input']>,
) {
  authorize(ctx, 'people.manage');
  const before = await lockMember(ctx, personId, version);
  if (before.active && !roles.includes('admin')) refuseLastAdmin(before);
  await ctx.tx
    .update(memberships)
    .set({ roles, version: version + 1 })
    .where(eq(memberships.id, before.id));
  await recordAudit(ctx, {
    action: 'person.change_roles',
    entity: 'person',
    entityId: personId,
    before: { roles: before.roles },
    after: { roles },
  });
  return { version: version + 1 };
}

export async function setPersonActive(
  ctx: Ctx,
  { personId, active, version }: z.output<(typeof activeDeclaration)['input']>,
) {
  authorize(ctx, 'people.manage');
  const before = await lockMember(ctx, personId, version);
  if (!active) refuseLastAdmin(before);
  await ctx.tx
    .update(memberships)
    .set({ active, version: version + 1 })
    .where(eq(memberships.id, before.id));
  await recordAudit(ctx, {
    action: active ? 'person.open' : 'person.close',
    entity: 'person',
    entityId: personId,
    before: { active: before.active },
    after: { active },
  });
  return { version: version + 1 };
}

interface Member {
  id: string;
  roles: readonly string[];
  active: boolean;
  otherAdmins: number;
}

/** Locks every membership of the shop, in one order, so that two admins cannot take the role from each other at once. */
async function lockMember(ctx: Ctx, personId: string, version: number): Promise<Member> {
  const everybody = await ctx.tx
    .select({
      id: memberships.id,
      userId: memberships.userId,
      roles: memberships.roles,
      active: memberships.active,
      version: memberships.version,
      mayEnter: sql<boolean>`(select u.active from users u where u.id = ${memberships.userId})`,
    })
    .from(memberships)
    .where(and(eq(memberships.shopId, shopOf(ctx))))
    .orderBy(memberships.id)
    .for('update');
  const member = everybody.find((one) => one.userId === personId);
  if (!member) throw notFound('person');
  if (member.version !== version) throw changedMeanwhile('person');
  const otherAdmins = everybody.filter(
    (one) => one.id !== member.id && one.active && one.mayEnter && one.roles.includes('admin'),
  ).length;
  return { ...member, otherAdmins };
}

function refuseLastAdmin({ roles, active, otherAdmins }: Member): void {
  if (!active || !roles.includes('admin') || otherAdmins > 0) return;
  throw new AppError('conflict', 'This is the last admin of the shop. Make somebody else an admin first.');
}
