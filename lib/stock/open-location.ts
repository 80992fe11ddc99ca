import { eq } from 'drizzle-orm';

import { locations } from '@/db/schema/lots';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

/** The place that pieces are to go to, held open until they lie there. */
export async function openLocation(ctx: Pick<Ctx, 'tx'>, locationId: string): Promise<{ name: string }> {
  const [to] = await ctx.tx
    .select({ name: locations.name, closedAt: locations.closedAt })
    .from(locations)
    .where(eq(locations.id, locationId))
    .for('share');
  if (!to) throw notFound('place');
  if (to.closedAt !== null) throw new AppError('conflict', `${to.name} is closed. Choose another place.`);
  return to;
}
