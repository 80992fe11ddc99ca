import { and, eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';

import { withTenant, type Db, type Tenant } from '@/db/client';
import { batches, batchLinks } from '@/db/schema/batches';
import { processors, shops } from '@/db/schema/organisations';
import { apiTokens, memberships, users } from '@/db/schema/people';
import { AppError } from '@/lib/errors';

import type { Actor } from './context';
import type { Role } from './roles';
import type { SessionClaims } from './session-claims';

/** Somebody, and for whom they act. */
export interface Identity {
  actor: Actor;
  tenant: Tenant;
}

export const NOBODY: Identity = {
  actor: { kind: 'nobody', name: 'nobody', roles: [] },
  tenant: { kind: 'door' },
};

/** Only the hash of a token or link is kept; the token itself is shown once. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/**
 * Who the cookie's claims are today: blocked people, changed roles and ended sessions take effect with the next
 * request. Null where the claims no longer hold.
 */
export async function identifySession(db: Db, claims: SessionClaims): Promise<Identity | null> {
  return claims.kind === 'link' ? identifyLink(db, claims.linkId) : identifyPerson(db, claims);
}

async function identifyPerson(
  db: Db,
  claims: Extract<SessionClaims, { kind: 'person' }>,
): Promise<Identity | null> {
  const rows = await withTenant(db, { kind: 'door' }, (tx) =>
    tx
      .select({
        name: users.name,
        sessionVersion: users.sessionVersion,
        shopId: memberships.shopId,
        processorId: memberships.processorId,
        roles: memberships.roles,
      })
      .from(users)
      .innerJoin(memberships, and(eq(memberships.userId, users.id), eq(memberships.active, true)))
      .where(and(eq(users.id, claims.userId), eq(users.active, true))),
  );
  // One person may work for two shops; the cookie says for which just now.
  const row = rows.find((one) =>
    claims.shopId === undefined
      ? one.processorId === (claims.processorId ?? null)
      : one.shopId === claims.shopId,
  );
  if (!row || row.sessionVersion !== claims.sessionVersion) return null;
  const tenant = tenantOf(row, claims.userId);
  return (
    tenant && {
      actor: { kind: 'person', userId: claims.userId, name: row.name, roles: row.roles as Role[] },
      tenant,
    }
  );
}

function tenantOf(
  row: { shopId: string | null; processorId: string | null },
  personId: string,
): Tenant | null {
  if (row.shopId !== null) return { kind: 'shop', shopId: row.shopId, personId };
  if (row.processorId !== null)
    return { kind: 'processor', processorId: row.processorId, batchId: null, personId };
  return null;
}

/** The link ends when the batch is settled or cancelled, or when the shop withdraws it. */
async function identifyLink(db: Db, linkId: string): Promise<Identity | null> {
  const [row] = await withTenant(db, { kind: 'door' }, (tx) =>
    tx
      .select({
        batchId: batchLinks.batchId,
        processorId: batchLinks.processorId,
        processor: processors.name,
        stage: batches.stage,
      })
      .from(batchLinks)
      .innerJoin(batches, eq(batches.id, batchLinks.batchId))
      .innerJoin(processors, eq(processors.id, batchLinks.processorId))
      .where(and(eq(batchLinks.id, linkId), isNull(batchLinks.withdrawnAt))),
  );
  if (!row || LINK_ENDS_AT.includes(row.stage)) return null;
  return {
    actor: { kind: 'link', linkId, name: row.processor, roles: ['processor'] },
    tenant: { kind: 'processor', processorId: row.processorId, batchId: row.batchId, personId: null },
  };
}

export const LINK_ENDS_AT: readonly string[] = ['settled', 'stocked', 'cancelled'];

/**
 * Who a bearer token speaks for.
 *
 * @throws AppError `not_signed_in` for a token that is unknown, revoked or past its day.
 */
export async function identifyToken(db: Db, token: string, now: Date): Promise<Identity> {
  const row = await withTenant(db, { kind: 'door' }, async (tx) => {
    const [found] = await tx
      .select({
        id: apiTokens.id,
        shopId: apiTokens.shopId,
        userId: apiTokens.userId,
        scopes: apiTokens.scopes,
        expiresAt: apiTokens.expiresAt,
        name: users.name,
        roles: memberships.roles,
      })
      .from(apiTokens)
      .innerJoin(users, and(eq(users.id, apiTokens.userId), eq(users.active, true)))
      .innerJoin(
        memberships,
        and(
          eq(memberships.userId, users.id),
          eq(memberships.shopId, apiTokens.shopId),
          eq(memberships.active, true),
        ),
      )
      .innerJoin(shops, eq(shops.id, apiTokens.shopId))
      .where(and(eq(apiTokens.tokenHash, hashToken(token)), isNull(apiTokens.revokedAt)));
    if (found) await tx.update(apiTokens).set({ lastUsedAt: now }).where(eq(apiTokens.id, found.id));
    return found;
  });
  if (!row || (row.expiresAt !== null && row.expiresAt < now))
    throw new AppError('not_signed_in', 'This token is not valid, or it was revoked.');
  return {
    actor: {
      kind: 'token',
      tokenId: row.id,
      userId: row.userId,
      name: row.name,
      roles: row.roles as Role[],
      scopes: row.scopes,
    },
    tenant: { kind: 'shop', shopId: row.shopId, personId: row.userId },
  };
}
