import { desc, eq, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { files } from '@/db/schema/files';
import { lots } from '@/db/schema/lots';
import { assemblies, assemblyNeeds, parts, routeSteps } from '@/db/schema/parts';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { sourceWords } from '@/lib/batches/source-words';
import { notFound } from '@/lib/errors';
import { fileRefColumns } from '@/lib/files/queries';
import { madeOfLot, placesOfLot } from '@/lib/lots/where-pieces-are';
import { tablesOf } from '@/lib/reference/tables-of';
import { beginsWith, contains } from '@/lib/search/matches';

import { computedMassOf, type KeptPart } from './computed-mass';
import type { listParts as listDeclaration, PiecesAt } from './contract';
import type { Process } from '@/lib/trade/process';

const LOTS_SHOWN = 50;

// Outer tables are named in words inside subqueries; see lib/lots/where-pieces-are.ts.

/** By drawing number; a page begins after the part that ended the one before. */
export async function listParts(
  ctx: Ctx,
  { after, limit, text, superseded }: z.output<(typeof listDeclaration)['input']>,
) {
  authorize(ctx, 'part.read');
  const conditions: SQL[] = [
    ...(superseded === '0' ? [sql`${parts.supersededAt} is null`] : []),
    ...(text
      ? [
          sql`(${beginsWith(parts.number, text)} or ${parts.name} ilike ${contains(text)} or ${parts.alloy} ilike ${contains(text)})`,
        ]
      : []),
    ...(after === undefined
      ? []
      : [
          sql`(${parts.number}, ${parts.id}) > (select p.number, p.id from parts p where p.id::text = ${after})`,
        ]),
  ];
  const rows = await ctx.tx
    .select({
      id: parts.id,
      number: parts.number,
      revision: parts.revision,
      name: parts.name,
      alloy: parts.alloy,
      form: parts.form,
      clad: parts.clad,
      thickness: parts.thicknessEntered,
      madeCondition: parts.madeCondition,
      endCondition: parts.endCondition,
      serialised: parts.serialised,
      supersededAt: parts.supersededAt,
      processes: sql<
        Process[]
      >`(select coalesce(json_agg(s.process order by s.seq), '[]') from route_steps s where s.part_id = parts.id)`,
      lots: sql<number>`(select count(*)::int from lots l where l.part_id = parts.id)`,
      places: sql<
        PiecesAt[]
      >`(select coalesce(json_agg(json_build_object('place', x.place, 'pieces', x.pieces) order by x.place), '[]')
        from (select b.place, sum(b.pieces)::int as pieces from lots l join balances b on b.lot_id = l.id where l.part_id = parts.id and b.pieces > 0 group by b.place) x)`,
    })
    .from(parts)
    .where(conditions.length > 0 ? sql.join(conditions, sql` and `) : undefined)
    .orderBy(parts.number, parts.id)
    .limit(limit + 1);
  return toPage(rows, limit, (row) => row.id);
}

export async function getPart(ctx: Ctx, { partId }: { partId: string }) {
  authorize(ctx, 'part.read');
  const [row] = await ctx.tx
    .select({ part: parts, drawing: fileRefColumns })
    .from(parts)
    .leftJoin(files, eq(files.id, parts.drawingFileId))
    .where(eq(parts.id, partId));
  if (!row) throw notFound('part');
  const { part, drawing } = row;
  const measured = (value: number | null, entered: string | null) =>
    value === null || entered === null ? null : { value, entered };
  return {
    ...part,
    thickness: measured(part.thicknessMm, part.thicknessEntered),
    length: measured(part.lengthMm, part.lengthEntered),
    width: measured(part.widthMm, part.widthEntered),
    height: measured(part.heightMm, part.heightEntered),
    mass: measured(part.massG, part.massEntered),
    area: measured(part.areaMm2, part.areaEntered),
    computed: await computedOf(ctx, part),
    drawing,
    route: await routeOf(ctx, partId),
    revisions: await revisionsOf(ctx, part.number),
    ...(await lotsOf(ctx, partId)),
    neededFor: await neededFor(ctx, part.number),
  };
}

async function computedOf(ctx: Ctx, part: KeptPart) {
  const found = computedMassOf(await tablesOf(ctx), part);
  if (!found) return null;
  const { massG, areaMm2, rule, density } = found;
  return {
    massG,
    areaMm2,
    rule,
    density: `${density.gPerCm3.toFixed(3)} g/cm³, ${sourceWords(density.source)}`,
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
      classType: routeSteps.classType,
      conditionBefore: routeSteps.conditionBefore,
      targetCondition: routeSteps.targetCondition,
      toProve: routeSteps.toProve,
      ordering: routeSteps.ordering,
      note: routeSteps.note,
      waiting: sql<number>`(select coalesce(sum(b.pieces), 0)::int from lots l join balances b on b.lot_id = l.id where l.part_id = route_steps.part_id and b.place = 'making' and b.holder_id = route_steps.id)`,
      used: sql<boolean>`exists (select from movements m join lots l on l.id = m.lot_id where l.part_id = route_steps.part_id and route_steps.id in (m.to_holder_id, m.from_holder_id))
        or exists (select from batch_lines l where l.step_id = route_steps.id)`,
    })
    .from(routeSteps)
    .where(eq(routeSteps.partId, partId))
    .orderBy(routeSteps.seq);

const revisionsOf = (ctx: Ctx, number: string) =>
  ctx.tx
    .select({
      id: parts.id,
      revision: parts.revision,
      supersededAt: parts.supersededAt,
      createdAt: parts.createdAt,
      lots: sql<number>`(select count(*)::int from lots l where l.part_id = parts.id)`,
    })
    .from(parts)
    .where(eq(parts.number, number))
    .orderBy(desc(parts.createdAt), desc(parts.id));

async function lotsOf(ctx: Ctx, partId: string) {
  const rows = await ctx.tx
    .select({
      id: lots.id,
      number: lots.number,
      heat: lots.heat,
      madeOn: lots.madeOn,
      made: madeOfLot,
      places: placesOfLot,
      lotCount: sql<number>`(count(*) over ())::int`,
    })
    .from(lots)
    .where(eq(lots.partId, partId))
    .orderBy(desc(lots.id))
    .limit(LOTS_SHOWN);
  return { lots: rows, lotCount: rows[0]?.lotCount ?? 0 };
}

const neededFor = (ctx: Ctx, number: string) =>
  ctx.tx
    .select({
      assemblyId: assemblies.id,
      assembly: assemblies.name,
      neededOn: assemblies.neededOn,
      pieces: assemblyNeeds.pieces,
    })
    .from(assemblyNeeds)
    .innerJoin(assemblies, eq(assemblies.id, assemblyNeeds.assemblyId))
    .where(sql`${assemblyNeeds.partNumber} = ${number} and ${assemblies.closedAt} is null`)
    .orderBy(assemblies.neededOn, assemblies.name);
