import { eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { shops } from '@/db/schema/organisations';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import { addMessage } from '@/lib/messages/add-message';
import type { NewMessage } from '@/lib/messages/contract';
import { readThread } from '@/lib/messages/read-thread';

/** The processor asks, answers or leaves a note. A cancelled batch is still talked about: its pieces have to go back. */
export async function writeToShop(ctx: Ctx, message: NewMessage) {
  authorize(ctx, 'portal.answer');
  return inShopOfSeen(ctx, message.batchId, (inner) => addMessage(inner, { ...message, side: 'processor' }));
}

/** Something is wrong: burrs, a cracked part, a furnace that failed. The shop is told at once. */
export async function reportTrouble(
  ctx: Ctx,
  { batchId, body, lineId }: { batchId: string; body: string; lineId: string | null },
) {
  authorize(ctx, 'portal.answer');
  return inShopOfSeen(ctx, batchId, (inner) =>
    addMessage(inner, { batchId, body, lineId, side: 'processor', kind: 'trouble' }),
  );
}

export async function listPortalMessages(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'portal.read');
  const [batch] = await ctx.tx
    .select({ other: shops.name, zone: shops.zone })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  return { ...(await readThread(ctx, batchId)), ...batch, closed: null };
}

async function inShopOfSeen<T>(ctx: Ctx, batchId: string, work: (inner: Ctx) => Promise<T>): Promise<T> {
  const [seen] = await ctx.tx.select({ shopId: batches.shopId }).from(batches).where(eq(batches.id, batchId));
  if (!seen) throw notFound('batch');
  return inOwningShop(ctx, seen.shopId, work);
}
