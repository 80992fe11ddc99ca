import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { processors } from '@/db/schema/organisations';
import { readReadiness } from '@/lib/assemblies/readiness';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

import type { listStock as stockDeclaration, Location, Release, StockRow } from './contract';
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
    from locations l order by l.name`);
  return rows;
}

/** By part, lot and place; the key of a page is those three, so it does not move when pieces do. */
export async function listStock(ctx: Ctx, { after, limit, locationId, part }: z.output<(typeof stockDeclaration)['input']>) {
  authorize(ctx, 'stock.read');
  const from = after?.split('|') ?? [];
  const { rows } = await ctx.tx.execute<Row<StockRow>>(sql`
    select o.id as "lotId", o.number as "lotNumber", o.heat, a.id as "partId", a.number as "partNumber", a.revision as "partRevision",
      a.name as "partName", a.end_condition as condition, l.id as "locationId", l.name as location, b.pieces
    from balances b join lots o on o.id = b.lot_id join parts a on a.id = o.part_id join locations l on l.id = b.holder_id
    where b.place = 'stock' and b.pieces > 0
      ${locationId === undefined ? sql`` : sql`and b.holder_id = ${locationId}`}
      ${part === undefined ? sql`` : sql`and (a.number ilike ${`${part}%`} or a.name ilike ${`%${part}%`})`}
      ${from.length === 3 ? sql`and (a.number, o.number, l.name) > (${from[0]}, ${from[1]}, ${from[2]})` : sql``}
    order by a.number, o.number, l.name limit ${limit + 1}`);
  return toPage<StockRow>(rows, limit, (row) => `${row.partNumber}|${row.lotNumber}|${row.location}`);
}

export async function getGate(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'stock.read');
  const [batch] = await ctx.tx
    .select({ batchId: batches.id, number: batches.number, stage: batches.stage, processor: processors.name })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .where(eq(batches.id, batchId));
  if (!batch) throw notFound('batch');
  const lines = (await readGate(ctx, batchId)).map(({ line, nextStep, mayPass, missing }) => ({
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
  }));
  const assemblies = (await readReadiness(ctx)).filter((one) => one.batches.some((wait) => wait.id === batchId));
  return { ...batch, lines, locations: await readLocations(ctx), assemblies: assemblies.map(({ name, ready, needed }) => ({ name, ready, needed })) };
}

export async function listReleases(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'stock.read');
  const { rows } = await ctx.tx.execute<Row<Omit<Release, 'releasedAt'> & { releasedAt: string }>>(sql`
    select r.id, o.id as "lotId", o.number as "lotNumber", o.heat, a.number as "partNumber", a.revision as "partRevision", a.name as "partName",
      coalesce(s.target_condition, a.end_condition) as condition, r.pieces, l.name as location, b.number as "batchNumber", r.released_by as "releasedBy",
      to_char(r.released_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"') as "releasedAt"
    from releases r join lots o on o.id = r.lot_id join parts a on a.id = o.part_id join batches b on b.id = r.batch_id
    join batch_lines n on n.id = r.line_id join route_steps s on s.id = n.step_id left join locations l on l.id = r.location_id
    where r.batch_id = ${batchId} order by r.id`);
  return { rows };
}
