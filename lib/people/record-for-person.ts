import { and, eq, isNotNull } from 'drizzle-orm';

import { inShopOf } from '@/db/client';
import { memberships } from '@/db/schema/people';
import { recordAudit, type AuditRecord } from '@/lib/audit/record-audit';
import type { Actor, Ctx } from '@/lib/auth/context';

interface Person {
  id: string;
  name: string;
}

/**
 * Records at the door what was done to a person's own account, in the chain of every shop they work for. A processor
 * has no chain; its people's accounts are told in the log.
 *
 * @param by who did it; left out: the person.
 */
export async function recordForPerson(
  ctx: Ctx,
  person: Person,
  record: Pick<AuditRecord, 'action' | 'before' | 'after'>,
  by: Actor = themselves(person),
): Promise<void> {
  const rows = await ctx.tx
    .select({ shopId: memberships.shopId })
    .from(memberships)
    .where(
      and(eq(memberships.userId, person.id), eq(memberships.active, true), isNotNull(memberships.shopId)),
    )
    // One order for everybody: each entry locks its shop's chain until the end.
    .orderBy(memberships.shopId);
  for (const { shopId } of rows) {
    if (shopId !== null)
      await recordInShop(ctx, shopId, { ...record, entity: 'person', entityId: person.id }, by);
  }
}

/** One entry in one shop's chain, written from the door. */
export function recordInShop(ctx: Ctx, shopId: string, record: AuditRecord, by: Actor): Promise<void> {
  return inShopOf(ctx.tx, ctx.tenant, shopId, () =>
    recordAudit({ ...ctx, tenant: { kind: 'shop', shopId, personId: null }, actor: by }, record),
  );
}

export const themselves = ({ id, name }: Person): Actor => ({ kind: 'person', userId: id, name, roles: [] });
