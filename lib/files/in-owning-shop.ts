import { inShopOf } from '@/db/client';
import type { Ctx } from '@/lib/auth/context';

/**
 * Work on a file in the name of the shop that keeps it. A processor only gets here after its own eyes have seen the
 * batch or the file.
 */
export function inOwningShop<T>(ctx: Ctx, shopId: string, work: (inner: Ctx) => Promise<T>): Promise<T> {
  if (ctx.tenant.kind === 'shop') return work(ctx);
  const inner: Ctx = { ...ctx, tenant: { kind: 'shop', shopId, personId: null } };
  return inShopOf(ctx.tx, ctx.tenant, shopId, () => work(inner));
}
