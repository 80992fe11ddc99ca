import { sql } from 'drizzle-orm';

import type { Ctx } from '@/lib/auth/context';
import type { Stage } from '@/lib/batches/stage';

import { allocate, type Need } from './allocate';

type NeedRow = Need & { name: string; neededOn: string | null };

interface BatchWait {
  id: string;
  number: string;
  stage: Stage;
  processor: string;
  promisedOn: string | null;
  /** Pieces of the part that are on the batch now: packed, away, back and held together. */
  pieces: number;
  packed: number;
  away: number;
  back: number;
  held: number;
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
    const row = byAssembly.get(need.assemblyId) ?? {
      id: need.assemblyId,
      name: need.name,
      neededOn: need.neededOn,
      needed: 0,
      ready: 0,
      batches: [],
    };
    row.needed += need.pieces;
    row.ready += ready[at] ?? 0;
    // A part that is ready waits for no batch, even if more of it is under way.
    if ((ready[at] ?? 0) < need.pieces)
      addWaits(
        row,
        waits.filter((wait) => wait.partNumber === need.partNumber),
      );
    byAssembly.set(need.assemblyId, row);
  });
  return [...byAssembly.values()];
}

/** A batch that carries two of its parts stands once, with the pieces of both. */
function addWaits(row: Readiness, waits: readonly BatchWait[]): void {
  for (const { id, number, stage, processor, promisedOn, ...counts } of waits) {
    const known = row.batches.find((one) => one.id === id);
    if (!known)
      row.batches.push({
        id,
        number,
        stage,
        processor,
        promisedOn,
        pieces: counts.pieces,
        packed: counts.packed,
        away: counts.away,
        back: counts.back,
        held: counts.held,
      });
    else
      for (const count of ['pieces', 'packed', 'away', 'back', 'held'] as const)
        known[count] += counts[count];
  }
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

/** Batches on their way that carry a part some open assembly needs, soonest promise first. Pieces that passed the gate are not on the batch any more. */
export async function readWaits(ctx: Pick<Ctx, 'tx'>): Promise<(BatchWait & { partNumber: string })[]> {
  const { rows } = await ctx.tx.execute<BatchWait & { partNumber: string } & Record<string, unknown>>(sql`
    select b.id, b.number, b.stage, r.name as processor, b.promised_on::text as "promisedOn", p.number as "partNumber", sum(k.pieces)::int as pieces,
      coalesce(sum(k.pieces) filter (where k.place = 'packed'), 0)::int as packed,
      coalesce(sum(k.pieces) filter (where k.place in ('transit_out', 'at_processor', 'transit_back')), 0)::int as away,
      coalesce(sum(k.pieces) filter (where k.place = 'quarantine'), 0)::int as back,
      coalesce(sum(k.pieces) filter (where k.place = 'hold'), 0)::int as held
    from batches b join processors r on r.id = b.processor_id join batch_lines l on l.batch_id = b.id join lots o on o.id = l.lot_id join parts p on p.id = o.part_id
    cross join lateral (
      select h.place, h.pieces from balances h where h.lot_id = l.lot_id and h.holder_id = l.id and h.place in ('packed', 'transit_out', 'at_processor', 'transit_back', 'quarantine')
      union all
      select h.place, h.pieces from nonconformances n join balances h on h.lot_id = n.lot_id and h.place = 'hold' and h.holder_id = n.id where n.line_id = l.id
    ) k
    where b.stage in ('building', 'dispatched', 'at_processor', 'returned', 'proved', 'settled', 'held') and k.pieces > 0
      and p.number in (select n.part_number from assembly_needs n join assemblies a on a.id = n.assembly_id where a.closed_at is null)
    group by b.id, r.name, p.number order by b.promised_on nulls last, b.id`);
  return rows;
}
