import { and, eq } from 'drizzle-orm';
import { z } from 'zod';

import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import type { JobTools } from '@/lib/jobs/job';

import { getCustomerMethod } from './settings';

/** Writes down the method that a shop saved last on the payment service's page. */
export async function recordPayingMethod(tools: JobTools, customer: string): Promise<void> {
  const { shopId, paymentMethod } = await getCustomerMethod(customer);
  if (!z.uuid().safeParse(shopId).success || shopId === null || paymentMethod === null) return;
  await tools.inShop(shopId, async (ctx) => {
    // Only the shop's own customer: what a customer carries is text, which alone proves nothing.
    const [shop] = await ctx.tx
      .select({ before: shops.stripePaymentMethodId })
      .from(shops)
      .where(and(eq(shops.id, shopId), eq(shops.stripeCustomerId, customer)))
      .for('update');
    if (!shop || shop.before === paymentMethod) return;
    await ctx.tx.update(shops).set({ stripePaymentMethodId: paymentMethod }).where(eq(shops.id, shopId));
    await recordAudit(ctx, {
      action: 'shop.save_paying_method',
      entity: 'shop',
      entityId: shopId,
      before: { paymentMethod: shop.before },
      after: { paymentMethod },
    });
  });
}
