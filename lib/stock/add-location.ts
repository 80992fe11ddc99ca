import { eq } from 'drizzle-orm';

import { locations } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

/** Names a place in the stores. */
export async function addLocation(ctx: Ctx, { name }: { name: string }) {
  authorize(ctx, 'stock.release');
  const id = newId();
  const [known] = await ctx.tx.select({ id: locations.id }).from(locations).where(eq(locations.name, name));
  if (known)
    throw new AppError('conflict', `There is a place called ${name} already.`, {
      fields: [{ field: 'name', message: 'There is a place of this name already.' }],
    });
  await ctx.tx.insert(locations).values({ id, shopId: shopOf(ctx), name, createdAt: ctx.now });
  await recordAudit(ctx, { action: 'location.add', entity: 'location', entityId: id, after: { name } });
  return { id };
}
