import { and, eq, sql } from 'drizzle-orm';

import { balances, locations } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

/**
 * Closes a place of the stores: nothing goes there any more. Its name and what once lay there stay on the record.
 *
 * @throws AppError `conflict` where pieces lie in it, or it is closed already.
 */
export async function closeLocation(ctx: Ctx, { locationId }: { locationId: string }) {
  authorize(ctx, 'stock.release');
  const { name, closedAt } = await lockLocation(ctx, locationId);
  if (closedAt !== null) throw new AppError('conflict', `${name} is closed already.`);
  const pieces = await piecesIn(ctx, locationId);
  if (pieces > 0)
    throw new AppError(
      'conflict',
      `${pieces.toLocaleString('en-US')} pc are in ${name}. Move them first, then close it.`,
    );
  await ctx.tx.update(locations).set({ closedAt: ctx.now }).where(eq(locations.id, locationId));
  await recordAudit(ctx, {
    action: 'location.close',
    entity: 'location',
    entityId: locationId,
    after: { name },
  });
  return { done: true as const };
}

/** Opens a closed place again: closed by mistake, or wanted once more. */
export async function reopenLocation(ctx: Ctx, { locationId }: { locationId: string }) {
  authorize(ctx, 'stock.release');
  const { name, closedAt } = await lockLocation(ctx, locationId);
  if (closedAt === null) throw new AppError('conflict', `${name} is open.`);
  await ctx.tx.update(locations).set({ closedAt: null }).where(eq(locations.id, locationId));
  await recordAudit(ctx, {
    action: 'location.reopen',
    entity: 'location',
    entityId: locationId,
    after: { name },
  });
  return { done: true as const };
}

/** Whoever moves pieces here holds the row shared until they lie here, so what is counted next is all of it. */
async function lockLocation(ctx: Ctx, locationId: string) {
  const [location] = await ctx.tx
    .select({ name: locations.name, closedAt: locations.closedAt })
    .from(locations)
    .where(eq(locations.id, locationId))
    .for('update');
  if (!location) throw notFound('place');
  return location;
}

async function piecesIn(ctx: Ctx, locationId: string): Promise<number> {
  const [sum] = await ctx.tx
    .select({ pieces: sql<number>`coalesce(sum(${balances.pieces}), 0)::int` })
    .from(balances)
    .where(and(eq(balances.place, 'stock'), eq(balances.holderId, locationId)));
  return sum?.pieces ?? 0;
}
