import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { lots } from '@/db/schema/lots';
import { assemblies, parts } from '@/db/schema/parts';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import type { takeOutPieces as declaration } from './contract';
import { movePieces } from './move-pieces';
import { openLocation } from './open-location';
import { byName, refuseNameCount } from './refuse-name-count';

/**
 * Takes pieces out of an assembly again, back to the stores: fitted by mistake, or wanted elsewhere first. They were
 * proved when they came into stock, so they may lie there again.
 *
 * @throws AppError `conflict` where the assembly is closed, or fewer are fitted.
 */
export async function takeOutPieces(ctx: Ctx, input: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'stock.fit');
  const [assembly] = await ctx.tx
    .select({ name: assemblies.name, closedAt: assemblies.closedAt })
    .from(assemblies)
    .where(eq(assemblies.id, input.assemblyId))
    .for('update');
  const [lot] = await ctx.tx
    .select({ number: lots.number, partNumber: parts.number })
    .from(lots)
    .innerJoin(parts, eq(parts.id, lots.partId))
    .where(eq(lots.id, input.lotId));
  if (!assembly) throw notFound('assembly');
  if (!lot) throw notFound('lot');
  if (assembly.closedAt !== null)
    throw new AppError('conflict', `${assembly.name} is closed. What is fitted stays fitted.`);
  refuseNameCount(input);
  const to = await openLocation(ctx, input.locationId);

  await movePieces(ctx, {
    lotId: input.lotId,
    pieces: input.pieces,
    from: { place: 'fitted', holderId: input.assemblyId },
    to: { place: 'stock', holderId: input.locationId },
    reason: 'unfitted',
    ...byName(input.pieceIds),
  });
  await recordAudit(ctx, {
    action: 'assembly.take_out',
    entity: 'assembly',
    entityId: input.assemblyId,
    after: { lot: lot.number, part: lot.partNumber, pieces: input.pieces, to: to.name },
  });
  return { done: true as const };
}
