import { sql } from 'drizzle-orm';

import type { Ctx } from '@/lib/auth/context';
import type { Stage } from '@/lib/batches/stage';

import { allocate, type Need } from './allocate';

type NeedRow = Need & { name: string; neededOn: string | null };

interface BatchWait {
  id: string;
  number: string;
  stage: Stage;
  pieces: number;
  promisedOn: string | null;
}

export interface Readiness {
  id: string;
  name: string;
  neededOn: string | null;
  needed: number;
  ready: number;
  batches: BatchWait[];
}

/** How far each open assembly is, earliest need first, and which batches hold what it still waits for. */
export async function readReadiness(ctx: Pick<Ctx, 'tx'>): Promise<Readiness[]> {
  const needs = await readNeeds(ctx);
  const ready = allocate(needs, await readStock(ctx));
  const waits = await readWaits(ctx);
  const byAssembly = new Map<string, Readiness>();
  needs.forEach((need, at) => {
    const row = byAssembly.get(need.assemblyId) ?? { id: need.assemblyId, name: need.name, neededOn: need.neededOn, needed: 0, ready: 0, batches: [] };
    row.needed += need.pieces;
    row.ready += ready[at] ?? 0;
    // A part that is ready waits for no batch, even if more of it is under way.
    if ((ready[at] ?? 0) < need.pieces) row.batches.push(...waits.filter((wait) => wait.partNumber === need.partNumber && !row.batches.some((known) => known.id === wait.id)));
    byAssembly.set(need.assemblyId, row);
  });
  return [...byAssembly.values()];
}

/** Needs of open assemblies with what is fitted of each, in the order in which stock is shared out. */
export async function readNeeds(ctx: Pick<Ctx, 'tx'>): Promise<NeedRow[]> {
  const { rows } = await ctx.tx.execute<NeedRow & Record<string, unknown>>(sql`
    select a.id as "assemblyId", a.name, a.needed_on::text as "neededOn", n.part_number as "partNumber", n.pieces,
      coalesce((select sum(b.pieces)::int from balances b join lots l on l.id = b.lot_id join parts p on p.id = l.part_id
        where b.place = 'fitted' and b.holder_id = a.id and p.number = n.part_number), 0) as fitted
    from assemblies a join assembly_needs n on n.assembly_id = a.id
    where a.closed_at is null order by a.needed_on nulls last, a.id, n.part_number`);
  return rows;
}

/** Pieces in stock by part number, over all revisions, lots and locations. */
export async function readStock(ctx: Pick<Ctx, 'tx'>): Promise<Map<string, number>> {
  const { rows } = await ctx.tx.execute<{ number: string; pieces: number }>(sql`
    select p.number, sum(b.pieces)::int as pieces from balances b join lots l on l.id = b.lot_id join parts p on p.id = l.part_id
    where b.place = 'stock' and b.pieces > 0 and p.number in (select n.part_number from assembly_needs n join assemblies a on a.id = n.assembly_id where a.closed_at is null)
    group by p.number`);
  return new Map(rows.map((row) => [row.number, row.pieces]));
}

/** Batches on their way that carry a part some open assembly needs, soonest promise first. */
export async function readWaits(ctx: Pick<Ctx, 'tx'>): Promise<(BatchWait & { partNumber: string })[]> {
  const { rows } = await ctx.tx.execute<BatchWait & { partNumber: string } & Record<string, unknown>>(sql`
    select b.id, b.number, b.stage, sum(l.pieces)::int as pieces, b.promised_on::text as "promisedOn", p.number as "partNumber"
    from batches b join batch_lines l on l.batch_id = b.id join lots o on o.id = l.lot_id join parts p on p.id = o.part_id
    where b.stage in ('building', 'dispatched', 'at_processor', 'returned', 'proved', 'settled', 'held')
      and p.number in (select n.part_number from assembly_needs n join assemblies a on a.id = n.assembly_id where a.closed_at is null)
    group by b.id, p.number order by b.promised_on nulls last, b.id`);
  return rows;
}
