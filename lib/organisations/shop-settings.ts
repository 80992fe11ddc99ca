import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { Currency } from '@/lib/money';

import type { updateShopSettings as declaration } from './contract';

const columns = {
  id: shops.id,
  name: shops.name,
  address: shops.address,
  phone: shops.phone,
  zone: shops.zone,
  currency: shops.currency,
  orderPrefix: shops.orderPrefix,
  dispatchAndAcceptance: shops.dispatchAndAcceptance,
  approvalAndPayment: shops.approvalAndPayment,
  secondApprovalAboveMinor: shops.secondApprovalAboveMinor,
  latenessBasis: shops.latenessBasis,
  version: shops.version,
};

export async function getShopSettings(ctx: Ctx) {
  authorize(ctx, 'shop.read');
  const [shop] = await ctx.tx
    .select(columns)
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw notFound('shop');
  return { ...shop, currency: Currency.parse(shop.currency) };
}

/** Batches, orders and invoices that exist keep the currency, prefix and policies they were made under. */
export async function updateShopSettings(
  ctx: Ctx,
  { version, ...wanted }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'shop.settings');
  const before = await getShopSettings(ctx);
  const [shop] = await ctx.tx
    .update(shops)
    .set({ ...wanted, version: version + 1 })
    .where(and(eq(shops.id, shopOf(ctx)), eq(shops.version, version)))
    .returning({ version: shops.version });
  if (!shop) throw changedMeanwhile('settings of the shop');
  const names = (Object.keys(wanted) as (keyof typeof wanted)[]).filter(
    (name) => JSON.stringify(before[name]) !== JSON.stringify(wanted[name]),
  );
  await recordAudit(ctx, {
    action: 'shop.change_settings',
    entity: 'shop',
    entityId: shopOf(ctx),
    before: Object.fromEntries(names.map((name) => [name, before[name]])),
    after: Object.fromEntries(names.map((name) => [name, wanted[name]])),
  });
  return { version: shop.version };
}
