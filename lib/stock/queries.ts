import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { processors } from '@/db/schema/organisations';
import { readNeeds, readReadiness } from '@/lib/assemblies/readiness';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { beginsWith, contains } from '@/lib/search/matches';

import type {
  GateLine,
  listStock as stockDeclaration,
  Location,
  Release,
  StockRow,
  StockSpot,
} from './contract';
import { readGate } from './read-gate';

type Row<T> = T & Record<string, unknown>;

export async function listLocations(ctx: Ctx) {
  authorize(ctx, 'stock.read');
  return { rows: await readLocations(ctx) };
}

async function readLocations(ctx: Ctx): Promise<Location[]> {
  const { rows } = await ctx.tx.execute<Row<Location>>(sql`
    select l.id, l.name, l.closed_at is not null as closed,
      coalesce((select sum(b.pieces)::int from balances b where b.place = 'stock' and b.holder_id = l.id), 0) as pieces
    from locations l order by l.closed_at is not null, l.name`);
  return rows;
}

/** By part, lot and place; the key of a page is those three, so it does not move when pieces do. */
export async function listStock(
  ctx: Ctx,
  { after, limit, locationId, text }: z.output<(typeof stockDeclaration)['input']>,
) {
  authorize(ctx, 'stock.read');
  const from = after?.split('|') ?? [];
  const { rows } = await ctx.tx.execute<Row<StockRow>>(sql`
    select o.id as "lotId", o.number as "lotNumber", o.heat, a.id as "partId", a.number as "partNumber", a.revision as "partRevision",
      a.name as "partName", a.end_condition as condition, l.id as "locationId", l.name as location, b.pieces
    from balances b join lots o on o.id = b.lot_id join parts a on a.id = o.part_id join locations l on l.id = b.holder_id
    where b.place = 'stock' and b.pieces > 0
      ${locationId === undefined ? sql`` : sql`and b.holder_id = ${locationId}`}
      ${text === undefined || text === '' ? sql`` : likeText(text)}
      ${from.length === 3 ? sql`and (a.number, o.number, l.name) > (${from[0]}, ${from[1]}, ${from[2]})` : sql``}
    order by a.number, o.number, l.name limit ${limit + 1}`);
  return toPage<StockRow>(rows, limit, (row) => `${row.partNumber}|${row.lotNumber}|${row.location}`);
}

const likeText = (text: string) => {
  const [part, lot, heat] = [sql`a.number`, sql`o.number`, sql`o.heat`].map((of) => beginsWith(of, text));
  return sql`and (a.name ilike ${contains(text)} or ${part} or ${lot} or ${heat})`;
};

/** What may be done with pieces of one lot in one place. */
export async function getStockSpot(
  ctx: Ctx,
  { lotId, locationId }: { lotId: string; locationId: string },
): Promise<StockSpot> {
  authorize(ctx, 'stock.read');
  const { rows } = await ctx.tx.execute<{ part: string; pieces: number; named: StockSpot['named'] }>(sql`
    select a.number as part, coalesce((select b.pieces from balances b where b.lot_id = o.id and b.place = 'stock' and b.holder_id = ${locationId}), 0) as pieces,
      coalesce((select jsonb_agg(jsonb_build_object('id', n.id, 'serial', n.serial) order by n.serial) from pieces n where n.lot_id = o.id and n.place = 'stock' and n.holder_id = ${locationId}), '[]') as named
    from lots o join parts a on a.id = o.part_id where o.id = ${lotId}`);
  const [spot] = rows;
  if (!spot) throw notFound('lot');
  const needs = (await readNeeds(ctx)).filter(
    (need) => need.partNumber === spot.part && need.fitted < need.pieces,
  );
  return {
    pieces: spot.pieces,
    named: spot.named,
    needs: needs.map(({ assemblyId, name, neededOn, pieces, fitted }) => ({
      assemblyId,
      name,
      neededOn,
      open: pieces - fitted,
    })),
  };
}

export async function getGate(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'stock.read');
  const [batch] = await ctx.tx
    .select({
      batchId: batches.id,
      number: batches.number,
      stage: batches.stage,
      processor: processors.name,
      dispatchedAt: batches.dispatchedAt,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const beside = await readBesideLines(ctx, batchId);
  const lines = (await readGate(ctx, batchId)).map(
    ({ line, nextStep, mayPass, missing, unpaid }): GateLine => ({
      lineId: line.lineId,
      lineNo: line.lineNo,
      lotId: line.lotId,
      lotNumber: line.lotNumber,
      partNumber: line.partNumber,
      partRevision: line.partRevision,
      partName: line.partName,
      pieces: line.pieces,
      released: line.released,
      mayPass,
      nextProcess: nextStep?.process ?? null,
      missing: missing.map((one) => ({ ...one, detail: [...one.detail] })),
      unpaid,
      ...(beside.get(line.lineId) ?? { holds: [], named: [], usualLocationId: null }),
    }),
  );
  const assemblies = (await readReadiness(ctx)).filter((one) =>
    one.batches.some((wait) => wait.id === batchId),
  );
  const { dispatchedAt, ...head } = batch;
  return {
    ...head,
    dispatched: dispatchedAt !== null,
    lines,
    locations: await readLocations(ctx),
    assemblies: assemblies.map(({ id, name, ready, needed }) => ({ id, name, ready, needed })),
  };
}

type BesideLine = Pick<GateLine, 'holds' | 'named' | 'usualLocationId'>;

/** What the screen of the gate shows beside its verdict. */
async function readBesideLines(ctx: Ctx, batchId: string): Promise<Map<string, BesideLine>> {
  const { rows } = await ctx.tx.execute<Row<BesideLine> & { lineId: string }>(sql`
    select l.id as "lineId",
      coalesce((select jsonb_agg(jsonb_build_object('id', n.id, 'number', n.number) order by n.number) from nonconformances n
        join balances b on b.lot_id = n.lot_id and b.place = 'hold' and b.holder_id = n.id and b.pieces > 0 where n.line_id = l.id), '[]') as holds,
      coalesce((select jsonb_agg(jsonb_build_object('id', n.id, 'serial', n.serial) order by n.serial) from pieces n where n.lot_id = l.lot_id and n.place = 'quarantine' and n.holder_id = l.id), '[]') as named,
      coalesce(
        (select r.location_id from releases r join lots x on x.id = r.lot_id join locations k on k.id = r.location_id where x.part_id = o.part_id and k.closed_at is null order by r.released_at desc, r.id desc limit 1),
        (select r.location_id from releases r join locations k on k.id = r.location_id where k.closed_at is null order by r.id desc limit 1)) as "usualLocationId"
    from batch_lines l join lots o on o.id = l.lot_id where l.batch_id = ${batchId}`);
  return new Map(rows.map(({ lineId, ...beside }) => [lineId, beside]));
}

export async function listReleases(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'stock.read');
  const { rows } = await ctx.tx.execute<Row<Omit<Release, 'releasedAt'> & { releasedAt: string }>>(sql`
    select r.id, o.id as "lotId", o.number as "lotNumber", o.heat, a.number as "partNumber", a.revision as "partRevision", a.name as "partName",
      concat_ws(' ', a.alloy, case when a.clad then 'clad' end, a.thickness_entered) as material, coalesce(s.target_condition, a.end_condition) as condition,
      r.pieces, l.name as location, case when r.location_id is null then
        (select x.process from route_steps x where x.part_id = s.part_id and x.seq > s.seq order by x.seq limit 1) end as "nextProcess",
      b.number as "batchNumber",
      coalesce((select jsonb_agg(c.serial order by c.serial) from movements m join pieces c on c.id = any (m.piece_ids)
        where m.lot_id = r.lot_id and m.batch_line_id = r.line_id and m.reason = 'released' and m.moved_at = r.released_at), '[]') as serials,
      coalesce((select jsonb_agg(distinct c.number) filter (where c.number is not null) from coverage v join certificates c on c.id = v.certificate_id where v.line_id = n.id), '[]') as certificates,
      (select to_char(max(g.signed_at) at time zone h.zone, 'YYYY-MM-DD') from coverage v join signatures g on g.id = v.signature_id where v.line_id = n.id) as "provedOn",
      r.released_by as "releasedBy", to_char(r.released_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"') as "releasedAt"
    from releases r join lots o on o.id = r.lot_id join parts a on a.id = o.part_id join batches b on b.id = r.batch_id join shops h on h.id = r.shop_id
    join batch_lines n on n.id = r.line_id join route_steps s on s.id = n.step_id left join locations l on l.id = r.location_id
    where r.batch_id = ${batchId} order by r.id`);
  return { rows };
}
