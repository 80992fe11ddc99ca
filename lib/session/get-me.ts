import { eq } from 'drizzle-orm';

import { processors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import { personOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

export async function getMe(ctx: Ctx) {
  authorize(ctx, 'self.manage');
  const personId = personOf(ctx.actor);
  const [person] =
    personId === null
      ? []
      : await ctx.tx
          .select({ units: users.units, singleKeys: users.singleKeys })
          .from(users)
          .where(eq(users.id, personId));
  return {
    name: ctx.actor.name,
    roles: [...ctx.actor.roles],
    organisation: await organisationOf(ctx),
    units: person?.units ?? ('inch' as const),
    singleKeys: person?.singleKeys ?? true,
    batchId: ctx.tenant.kind === 'processor' ? ctx.tenant.batchId : null,
  };
}

async function organisationOf({ tenant, tx }: Ctx) {
  if (tenant.kind === 'shop') {
    const [shop] = await tx
      .select({ id: shops.id, name: shops.name, zone: shops.zone, currency: shops.currency })
      .from(shops)
      .where(eq(shops.id, tenant.shopId));
    if (shop) return { ...shop, kind: 'shop' as const };
  }
  if (tenant.kind === 'processor') {
    const [processor] = await tx
      .select({ id: processors.id, name: processors.name, zone: processors.zone })
      .from(processors)
      .where(eq(processors.id, tenant.processorId));
    if (processor) return { ...processor, kind: 'processor' as const, currency: null };
  }
  throw notFound('organisation');
}
