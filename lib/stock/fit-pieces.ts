import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { locations, lots } from '@/db/schema/lots';
import { assemblies, parts } from '@/db/schema/parts';
import { readNeeds } from '@/lib/assemblies/readiness';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';

import type { fitPieces as fitDeclaration, moveStock as moveDeclaration } from './contract';
import { movePieces } from './move-pieces';

/**
 * Issues pieces from stock to an assembly that needs their part. Only stock can be fitted, and only the gate fills
 * stock, so nothing unproved is ever fitted.
 *
 * @throws AppError `bad_input` where the assembly does not need the part, or not that many more.
 */
export async function fitPieces(ctx: Ctx, input: z.output<(typeof fitDeclaration)['input']>) {
  authorize(ctx, 'stock.fit');
  // Locked, so that two people who fit the last needed piece at once do it one after the other.
  const [assembly] = await ctx.tx.select({ name: assemblies.name, closedAt: assemblies.closedAt }).from(assemblies).where(eq(assemblies.id, input.assemblyId)).for('update');
  const [lot] = await ctx.tx.select({ number: lots.number, partNumber: parts.number }).from(lots).innerJoin(parts, eq(parts.id, lots.partId)).where(eq(lots.id, input.lotId));
  if (!assembly) throw notFound('assembly');
  if (!lot) throw notFound('lot');
  if (assembly.closedAt !== null) throw new AppError('conflict', `${assembly.name} is closed.`);

  const need = (await readNeeds(ctx)).find((one) => one.assemblyId === input.assemblyId && one.partNumber === lot.partNumber);
  const open = need ? need.pieces - need.fitted : 0;
  if (!need) throw new AppError('bad_input', `${assembly.name} does not need ${lot.partNumber}.`, { fields: [{ field: 'assemblyId', message: `It does not need ${lot.partNumber}.` }] });
  if (input.pieces > open) throw new AppError('bad_input', `${assembly.name} needs ${open} more of ${lot.partNumber}.`, { fields: [{ field: 'pieces', message: `It needs ${open} more. Enter ${open} or less.` }] });

  await movePieces(ctx, { lotId: input.lotId, pieces: input.pieces, from: { place: 'stock', holderId: input.locationId }, to: { place: 'fitted', holderId: input.assemblyId }, reason: 'fitted' });
  await recordAudit(ctx, { action: 'assembly.fit', entity: 'assembly', entityId: input.assemblyId, after: { lot: lot.number, part: lot.partNumber, pieces: input.pieces } });
  return { done: true as const };
}

/** Moves pieces between two places of the stores. */
export async function moveStock(ctx: Ctx, input: z.output<(typeof moveDeclaration)['input']>) {
  authorize(ctx, 'stock.release');
  const [to] = await ctx.tx.select({ name: locations.name, closedAt: locations.closedAt }).from(locations).where(eq(locations.id, input.toLocationId));
  if (!to) throw notFound('place');
  if (to.closedAt !== null) throw new AppError('conflict', `${to.name} is closed. Choose another place.`);
  await movePieces(ctx, { lotId: input.lotId, pieces: input.pieces, from: { place: 'stock', holderId: input.fromLocationId }, to: { place: 'stock', holderId: input.toLocationId }, reason: 'moved' });
  await recordAudit(ctx, { action: 'lot.move', entity: 'lot', entityId: input.lotId, after: { to: to.name, pieces: input.pieces } });
  return { done: true as const };
}
