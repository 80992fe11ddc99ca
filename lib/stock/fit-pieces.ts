import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { lots } from '@/db/schema/lots';
import { assemblies, parts } from '@/db/schema/parts';
import { readNeeds } from '@/lib/assemblies/readiness';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import type { fitPieces as declaration } from './contract';
import { movePieces } from './move-pieces';
import { byName, refuseNameCount } from './refuse-name-count';

/**
 * Issues pieces from stock to an assembly that needs their part. Only stock can be fitted, and only the gate fills
 * stock, so nothing unproved is ever fitted.
 *
 * @throws AppError `bad_input` where the assembly does not need the part, or not that many more.
 */
export async function fitPieces(ctx: Ctx, input: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'stock.fit');
  // Locked, so that two people who fit the last needed piece at once do it one after the other.
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
  if (assembly.closedAt !== null) throw new AppError('conflict', `${assembly.name} is closed.`);
  refuseNameCount(input);

  const need = (await readNeeds(ctx)).find(
    (one) => one.assemblyId === input.assemblyId && one.partNumber === lot.partNumber,
  );
  const open = need ? need.pieces - need.fitted : 0;
  if (!need)
    throw new AppError('bad_input', `${assembly.name} does not need ${lot.partNumber}.`, {
      fields: [{ field: 'assemblyId', message: `It does not need ${lot.partNumber}.` }],
    });
  if (open <= 0)
    throw new AppError('bad_input', `${assembly.name} has all its ${lot.partNumber}.`, {
      fields: [{ field: 'assemblyId', message: `It has all ${need.pieces} of ${lot.partNumber}.` }],
    });
  if (input.pieces > open)
    throw new AppError('bad_input', `${assembly.name} needs ${open} more of ${lot.partNumber}.`, {
      fields: [{ field: 'pieces', message: `It needs ${open} more. Enter ${open} or less.` }],
    });

  await movePieces(ctx, {
    lotId: input.lotId,
    pieces: input.pieces,
    from: { place: 'stock', holderId: input.locationId },
    to: { place: 'fitted', holderId: input.assemblyId },
    reason: 'fitted',
    ...byName(input.pieceIds),
  });
  await recordAudit(ctx, {
    action: 'assembly.fit',
    entity: 'assembly',
    entityId: input.assemblyId,
    after: { lot: lot.number, part: lot.partNumber, pieces: input.pieces },
  });
  return { done: true as const };
}
