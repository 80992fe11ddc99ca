import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { lots } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import type { moveStock as declaration } from './contract';
import { movePieces } from './move-pieces';
import { openLocation } from './open-location';
import { byName, refuseNameCount } from './refuse-name-count';

/** Moves pieces between two places of the stores. */
export async function moveStock(ctx: Ctx, input: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'stock.release');
  const to = await openLocation(ctx, input.toLocationId);
  const [lot] = await ctx.tx.select({ number: lots.number }).from(lots).where(eq(lots.id, input.lotId));
  if (!lot) throw notFound('lot');
  refuseNameCount(input);
  if (input.fromLocationId === input.toLocationId)
    throw new AppError('bad_input', `They are in ${to.name} already.`, {
      fields: [{ field: 'toLocationId', message: 'They are there already. Choose another place.' }],
    });

  await movePieces(ctx, {
    lotId: input.lotId,
    pieces: input.pieces,
    from: { place: 'stock', holderId: input.fromLocationId },
    to: { place: 'stock', holderId: input.toLocationId },
    reason: 'moved',
    ...byName(input.pieceIds),
  });
  await recordAudit(ctx, {
    action: 'lot.move',
    entity: 'lot',
    entityId: input.lotId,
    after: { lot: lot.number, to: to.name, pieces: input.pieces },
  });
  return { done: true as const };
}
