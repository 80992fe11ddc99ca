import { isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { releases } from '@/db/schema/dossiers';
import { locations } from '@/db/schema/lots';
import { readReadiness } from '@/lib/assemblies/readiness';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, type FieldError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

import type { releasePieces as declaration } from './contract';
import { movePieces } from './move-pieces';
import { readGate, type GateLine } from './read-gate';
import { byName, refuseNameCount } from './refuse-name-count';

type Input = z.output<(typeof declaration)['input']>;

/**
 * Lets proved pieces pass the gate: to a stock place, or (the route has a further outside step) back to wait for it.
 * The batch is locked first, so that two presses find each other's pieces gone and the second is refused.
 *
 * @throws AppError `bad_input` naming each line and what is missing; nothing moves unless all may.
 */
export async function releasePieces(ctx: Ctx, { batchId, lines }: Input) {
  authorize(ctx, 'stock.release');
  const batch = await lockSentBatch(ctx, batchId, 'Nothing of it can be released');
  const gate = await readGate(ctx, batchId);
  // Held open until the pieces lie there.
  const places = await ctx.tx
    .select({ id: locations.id })
    .from(locations)
    .where(isNull(locations.closedAt))
    .for('share');
  const fields = faultsOf(lines, gate, new Set(places.map((place) => place.id)));
  const [first] = fields;
  if (first) throw new AppError('bad_input', `Nothing was released. ${first.message}`, { fields });

  const before = await readReadiness(ctx);
  const released = [];
  for (const line of lines) {
    const found = gate.find((one) => one.line.lineId === line.lineId);
    if (!found) throw new AppError('not_found', 'This line is not of this batch.');
    released.push(await releaseLine(ctx, batchId, found, line));
  }
  await recordAudit(ctx, {
    action: 'batch.release',
    entity: 'batch',
    entityId: batchId,
    after: { number: batch.number, lines },
  });
  await refreshStanding(ctx, batchId);
  return { releases: released, assemblies: nearer(before, await readReadiness(ctx)) };
}

/** Assemblies that have more pieces ready than before. */
function nearer(before: Awaited<ReturnType<typeof readReadiness>>, after: typeof before) {
  return after
    .filter((one) => one.ready > (before.find((was) => was.id === one.id)?.ready ?? 0))
    .map(({ id, name, ready, needed }) => ({ id, name, ready, needed }));
}

async function releaseLine(
  ctx: Ctx,
  batchId: string,
  { line, nextStep }: GateLine,
  { pieces, locationId, pieceIds }: Input['lines'][number],
) {
  refuseNameCount({ pieces, pieceIds });
  const id = newId();
  await ctx.tx.insert(releases).values({
    id,
    shopId: shopOf(ctx),
    batchId,
    lineId: line.lineId,
    lotId: line.lotId,
    pieces,
    locationId: nextStep ? null : locationId,
    releasedBy: ctx.actor.name,
    releasedAt: ctx.now,
  });
  await movePieces(ctx, {
    lotId: line.lotId,
    pieces,
    from: { place: 'quarantine', holderId: line.lineId },
    to: nextStep
      ? { place: 'making', holderId: nextStep.id }
      : { place: 'stock', holderId: locationId ?? '' },
    reason: 'released',
    batchLineId: line.lineId,
    ...byName(pieceIds),
  });
  return { id, lineId: line.lineId, pieces };
}

function faultsOf(
  lines: Input['lines'],
  gate: readonly GateLine[],
  openPlaces: ReadonlySet<string>,
): FieldError[] {
  return lines.flatMap(({ lineId, pieces, locationId }, at): FieldError[] => {
    const found = gate.find((one) => one.line.lineId === lineId);
    if (lines.findIndex((other) => other.lineId === lineId) < at)
      return [{ field: `lines.${at}.lineId`, message: 'This line is named twice.' }];
    if (!found) return [{ field: `lines.${at}.lineId`, message: 'This line is not of this batch.' }];
    if (pieces > found.mayPass)
      return [
        {
          field: `lines.${at}.pieces`,
          message: `Line ${found.line.lineNo}: ${found.mayPass} may be released now, not ${pieces}.`,
        },
      ];
    if (!found.nextStep && (locationId === null || !openPlaces.has(locationId)))
      return [
        {
          field: `lines.${at}.locationId`,
          message: `Line ${found.line.lineNo}: choose the place it goes to.`,
        },
      ];
    return [];
  });
}
