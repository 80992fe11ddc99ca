import { and, eq, isNull } from 'drizzle-orm';

import { shops } from '@/db/schema/organisations';
import type { Outside } from '@/lib/api/endpoint';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { env } from '@/lib/env';
import { shopReplyAddress } from '@/lib/mail/shop-reply-address';

import { createCustomer, createPaymentMethodLink } from './payments';
import { methodWords, toldInWords } from './settings';

async function readShop(ctx: Ctx) {
  authorize(ctx, 'shop.settings');
  const [shop] = await ctx.tx
    .select({
      name: shops.name,
      customer: shops.stripeCustomerId,
      paymentMethod: shops.stripePaymentMethodId,
    })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw new Error('a shop without its row');
  return shop;
}

/** What the payment service calls the saved method: asked between transactions, and missing where it does not answer. */
export async function askMethodWords({ inTenant }: Outside): Promise<string | null> {
  const { paymentMethod } = await inTenant(readShop);
  return paymentMethod === null ? null : methodWords(paymentMethod);
}

export async function getPayingMethod(ctx: Ctx, _: object, says: string | null = null) {
  authorize(ctx, 'shop.settings');
  const { paymentMethod } = await readShop(ctx);
  return { saved: paymentMethod !== null, says: paymentMethod === null ? null : says };
}

/** The shop's customer at the service (made once), and a page for it. What is saved there comes by webhook. */
export async function makeMethodPage({ inTenant }: Outside): Promise<{ customer: string; url: string }> {
  // The mail address of the first admin, so that a repeat by another one is the same request.
  const { shopId, ...shop } = await inTenant(async (ctx) => ({
    ...(await readShop(ctx)),
    shopId: shopOf(ctx),
    email: await shopReplyAddress({ ...ctx, actor: { kind: 'job', name: 'settings', roles: [] } }),
  }));
  const back = `${env.APP_URL}/settings/payments`;
  return toldInWords(async () => {
    const customer =
      shop.customer ?? (await createCustomer({ name: shop.name, email: shop.email ?? '', shopId }));
    return {
      customer,
      url: await createPaymentMethodLink({ customer, successUrl: `${back}?saved=1`, cancelUrl: back }),
    };
  });
}

export async function linkPayingMethod(
  ctx: Ctx,
  _: object,
  { customer, url }: { customer: string; url: string },
) {
  authorize(ctx, 'shop.settings');
  const [made] = await ctx.tx
    .update(shops)
    .set({ stripeCustomerId: customer })
    .where(and(eq(shops.id, shopOf(ctx)), isNull(shops.stripeCustomerId)))
    .returning({ id: shops.id });
  await recordAudit(ctx, {
    action: 'shop.open_paying_page',
    entity: 'shop',
    entityId: shopOf(ctx),
    after: { customer, ...(made ? { customerIsNew: true } : {}) },
  });
  return { url };
}
