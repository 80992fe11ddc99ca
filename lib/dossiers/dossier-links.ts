import { and, eq, isNull } from 'drizzle-orm';

import { inShopOf } from '@/db/client';
import { dossierLinks } from '@/db/schema/dossiers';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { env } from '@/lib/env';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';

import { readDossier } from './read-dossier';

const DAY_MS = 24 * 3600 * 1000;

/** Gives out a link. Only its hash is kept, so the address is told once. */
export async function shareDossier(
  ctx: Ctx,
  { lotId, forWhom, days }: { lotId: string; forWhom: string; days: number },
) {
  authorize(ctx, 'dossier.share');
  const { lot } = await readDossier(ctx, lotId);
  const [id, token] = [newId(), newToken()];
  const expiresAt = new Date(ctx.now.getTime() + days * DAY_MS);
  await ctx.tx.insert(dossierLinks).values({
    id,
    shopId: shopOf(ctx),
    lotId,
    tokenHash: hashToken(token),
    forWhom,
    expiresAt,
    createdBy: ctx.actor.name,
    createdAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'dossier.share',
    entity: 'lot',
    entityId: lotId,
    after: { lot: lot.number, forWhom, expiresAt: expiresAt.toISOString() },
  });
  return { id, url: `${env.APP_URL}/d/${token}` };
}

export async function withdrawDossierLink(ctx: Ctx, { linkId }: { linkId: string }) {
  authorize(ctx, 'dossier.share');
  const [link] = await ctx.tx
    .update(dossierLinks)
    .set({ withdrawnAt: ctx.now })
    .where(and(eq(dossierLinks.id, linkId), isNull(dossierLinks.withdrawnAt)))
    .returning({ lotId: dossierLinks.lotId, forWhom: dossierLinks.forWhom });
  if (!link) throw notFound('link');
  await recordAudit(ctx, {
    action: 'dossier.withdraw_link',
    entity: 'lot',
    entityId: link.lotId,
    after: { forWhom: link.forWhom },
  });
  return { done: true as const };
}

/**
 * Runs work in the shop of a dossier link, reading only, for whoever holds it.
 *
 * @throws AppError `gone` when it ended or was withdrawn, `not_found` when it is none of ours.
 */
export async function throughDossierLink<T>(
  ctx: Ctx,
  token: string,
  work: (inner: Ctx, link: { lotId: string; forWhom: string; expiresAt: Date; shopId: string }) => Promise<T>,
): Promise<T> {
  const [link] = await ctx.tx
    .select({
      shopId: dossierLinks.shopId,
      lotId: dossierLinks.lotId,
      forWhom: dossierLinks.forWhom,
      expiresAt: dossierLinks.expiresAt,
      withdrawnAt: dossierLinks.withdrawnAt,
    })
    .from(dossierLinks)
    .where(eq(dossierLinks.tokenHash, hashToken(token)));
  if (!link)
    throw new AppError('not_found', 'This is not a link of ours. Look whether the whole address was copied.');
  if (link.withdrawnAt !== null)
    throw new AppError('gone', 'The shop has withdrawn this link. Ask it for a new one.');
  if (link.expiresAt <= ctx.now)
    throw new AppError('gone', 'This link has ended. Ask the shop for a new one.');
  return inShopOf(ctx.tx, ctx.tenant, link.shopId, () =>
    work({ ...ctx, tenant: { kind: 'shop', shopId: link.shopId, personId: null } }, link),
  );
}
