import { and, desc, eq, inArray, lt, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines } from '@/db/schema/batches';
import { files } from '@/db/schema/files';
import { balances, lots, movements, pieces } from '@/db/schema/lots';
import { processors } from '@/db/schema/organisations';
import { parts, routeSteps } from '@/db/schema/parts';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { fileRefColumns } from '@/lib/files/queries';
import type { Process } from '@/lib/trade/process';
import { beginsWith } from '@/lib/search/matches';
import type { Place } from '@/lib/stock/places';

import type {
  listLots as listDeclaration,
  listMovements as movementsDeclaration,
  Whereabouts,
} from './contract';
import { namesOfHolders } from './holders';
import { madeOfLot, placesOfLot } from './where-pieces-are';

const PLACES_OF: Record<Whereabouts, readonly Place[]> = {
  waiting: ['making', 'packed'],
  away: ['transit_out', 'at_processor', 'transit_back'],
  care: ['quarantine', 'hold'],
  stock: ['stock', 'fitted'],
};

const partOfLot = { id: parts.id, number: parts.number, revision: parts.revision, name: parts.name };

/** Newest first; ids are time-ordered, so the id is the key of the page. */
export async function listLots(
  ctx: Ctx,
  { after, limit, text, where, partId }: z.output<(typeof listDeclaration)['input']>,
) {
  authorize(ctx, 'lot.read');
  const rows = await ctx.tx
    .select({
      id: lots.id,
      number: lots.number,
      part: partOfLot,
      alloy: parts.alloy,
      heat: lots.heat,
      serialised: lots.serialised,
      madeOn: lots.madeOn,
      made: madeOfLot,
      places: placesOfLot,
      waitsFor: sql<Process | null>`(select s.process from balances b join route_steps s on s.id = b.holder_id where b.lot_id = lots.id and b.place = 'making' and b.pieces > 0 order by s.seq limit 1)`,
      hasMillCertificate: sql<boolean>`lots.mill_certificate_file_id is not null`,
    })
    .from(lots)
    .innerJoin(parts, eq(parts.id, lots.partId))
    .where(
      and(
        after === undefined ? undefined : lt(lots.id, after),
        text ? textMatches(text) : undefined,
        where === undefined
          ? undefined
          : sql`exists (select from balances b where b.lot_id = lots.id and b.pieces > 0 and b.place in ${[...PLACES_OF[where]]})`,
        partId === undefined ? undefined : eq(lots.partId, partId),
      ),
    )
    .orderBy(desc(lots.id))
    .limit(limit + 1);
  return toPage(rows, limit, (row) => row.id);
}

function textMatches(text: string): SQL {
  const begins = (column: SQL) => beginsWith(column, text);
  return sql`(${begins(sql`lots.number`)} or ${begins(sql`parts.number`)} or ${begins(sql`lots.heat`)})`;
}

export async function getLot(ctx: Ctx, { lotId }: { lotId: string }) {
  authorize(ctx, 'lot.read');
  const [row] = await ctx.tx
    .select({
      lot: lots,
      made: madeOfLot,
      millCertificate: fileRefColumns,
      part: {
        ...partOfLot,
        alloy: parts.alloy,
        form: parts.form,
        clad: parts.clad,
        thickness: parts.thicknessEntered,
        madeCondition: parts.madeCondition,
        endCondition: parts.endCondition,
        supersededAt: parts.supersededAt,
      },
    })
    .from(lots)
    .innerJoin(parts, eq(parts.id, lots.partId))
    .leftJoin(files, eq(files.id, lots.millCertificateFileId))
    .where(eq(lots.id, lotId));
  if (!row) throw notFound('lot');
  const { lot, ...rest } = row;
  const spots = await ctx.tx
    .select({ place: balances.place, holderId: balances.holderId, pieces: balances.pieces })
    .from(balances)
    .where(and(eq(balances.lotId, lotId), sql`${balances.pieces} > 0`))
    .orderBy(balances.place);
  const named = lot.serialised
    ? await ctx.tx
        .select({ serial: pieces.serial, place: pieces.place, holderId: pieces.holderId })
        .from(pieces)
        .where(eq(pieces.lotId, lotId))
        .orderBy(pieces.serial)
    : [];
  const names = await namesOfHolders(
    ctx,
    spots.map(({ holderId }) => holderId),
  );
  const holderOf = (id: string | null) => (id === null ? null : (names.get(id) ?? null));
  return {
    ...lot,
    ...rest,
    route: await routeOf(ctx, lot.partId),
    whereabouts: spots.map(({ holderId, ...spot }) => ({ ...spot, holder: holderOf(holderId) })),
    batches: await batchesOf(ctx, lotId),
    named: named.map(({ holderId, ...piece }) => ({ ...piece, holder: holderOf(holderId) })),
  };
}

const routeOf = (ctx: Ctx, partId: string) =>
  ctx.tx
    .select({
      id: routeSteps.id,
      seq: routeSteps.seq,
      process: routeSteps.process,
      specification: routeSteps.specification,
      specificationRevision: routeSteps.specificationRevision,
      targetCondition: routeSteps.targetCondition,
    })
    .from(routeSteps)
    .where(eq(routeSteps.partId, partId))
    .orderBy(routeSteps.seq);

const batchesOf = (ctx: Ctx, lotId: string) =>
  ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      stage: batches.stage,
      processor: processors.name,
      process: batches.process,
      pieces: sql<number>`sum(${batchLines.pieces})::int`,
      dispatchedAt: batches.dispatchedAt,
      promisedOn: batches.promisedOn,
    })
    .from(batchLines)
    .innerJoin(batches, eq(batches.id, batchLines.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(batchLines.lotId, lotId))
    .groupBy(batches.id, processors.name)
    .orderBy(desc(batches.id));

/** Newest first. Movements are only ever added, so their time-ordered ids keep the order they were written in. */
export async function listMovements(
  ctx: Ctx,
  { lotId, after, limit }: z.output<(typeof movementsDeclaration)['input']>,
) {
  authorize(ctx, 'lot.read');
  const rows = await ctx.tx
    .select()
    .from(movements)
    .where(and(eq(movements.lotId, lotId), after === undefined ? undefined : lt(movements.id, after)))
    .orderBy(desc(movements.id))
    .limit(limit + 1);
  const { rows: shown, next } = toPage(rows, limit, (row) => row.id);
  const names = await namesOfHolders(
    ctx,
    shown.flatMap(({ fromHolderId, toHolderId }) => [fromHolderId, toHolderId]),
  );
  const serials = await serialsOf(
    ctx,
    shown.flatMap(({ pieceIds }) => pieceIds ?? []),
  );
  return {
    next,
    rows: shown.map((row) => ({
      id: row.id,
      at: row.movedAt,
      by: row.movedBy,
      pieces: row.pieces,
      from:
        row.fromPlace === null
          ? null
          : { place: row.fromPlace, holder: names.get(row.fromHolderId ?? '') ?? null },
      to: { place: row.toPlace, holder: names.get(row.toHolderId) ?? null },
      reason: row.reason,
      note: row.note,
      serials: (row.pieceIds ?? []).map((id) => serials.get(id) ?? id).sort(),
    })),
  };
}

async function serialsOf(ctx: Ctx, pieceIds: readonly string[]): Promise<ReadonlyMap<string, string>> {
  if (pieceIds.length === 0) return new Map();
  const rows = await ctx.tx
    .select({ id: pieces.id, serial: pieces.serial })
    .from(pieces)
    .where(inArray(pieces.id, [...new Set(pieceIds)]));
  return new Map(rows.map(({ id, serial }) => [id, serial]));
}
