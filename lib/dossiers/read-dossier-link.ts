import { eq } from 'drizzle-orm';

import { inShopOf } from '@/db/client';
import { dossierLinks } from '@/db/schema/dossiers';
import { shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';

import type { DossierLinkFace } from './contract';

/** What a link says of itself before anything is opened: a link that has ended still names its shop, to be asked for a new one. */
export async function readDossierLink(ctx: Ctx, { token }: { token: string }): Promise<DossierLinkFace> {
  authorize(ctx, 'public.use');
  const [link] = await ctx.tx
    .select({
      shopId: dossierLinks.shopId,
      expiresAt: dossierLinks.expiresAt,
      withdrawnAt: dossierLinks.withdrawnAt,
    })
    .from(dossierLinks)
    .where(eq(dossierLinks.tokenHash, hashToken(token)));
  if (!link) return { state: 'unknown', shop: null, phone: null, zone: null, endedAt: null };
  const [shop] = await inShopOf(ctx.tx, ctx.tenant, link.shopId, () =>
    ctx.tx
      .select({ name: shops.name, phone: shops.phone, zone: shops.zone })
      .from(shops)
      .where(eq(shops.id, link.shopId)),
  );
  const face = { shop: shop?.name ?? null, phone: shop?.phone ?? null, zone: shop?.zone ?? null };
  if (link.withdrawnAt !== null)
    return { ...face, state: 'withdrawn', endedAt: link.withdrawnAt.toISOString() };
  if (link.expiresAt <= ctx.now) return { ...face, state: 'ended', endedAt: link.expiresAt.toISOString() };
  return { ...face, state: 'open', endedAt: null };
}
