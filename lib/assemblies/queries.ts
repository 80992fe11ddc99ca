import { and, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';

import { shops } from '@/db/schema/organisations';
import { assemblies } from '@/db/schema/parts';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import { notFound } from '@/lib/errors';

import { allocate } from './allocate';
import type { AssemblyNeedRow, AssemblyRow } from './contract';
import { readNeeds, readReadiness, readStock, readWaits } from './readiness';

const MOST_CLOSED = 100;

export async function listAssemblies(ctx: Ctx, { closed }: { closed: '0' | '1' }) {
  authorize(ctx, 'assembly.read');
  return { today: await todayOf(ctx), rows: closed === '1' ? await readClosed(ctx) : await readOpen(ctx) };
}

/** As the stock is shared out; those that need nothing yet at the end, so that a new one is found again. */
async function readOpen(ctx: Ctx): Promise<AssemblyRow[]> {
  const ready = await readReadiness(ctx);
  const without = await ctx.tx
    .select({ id: assemblies.id, name: assemblies.name, neededOn: assemblies.neededOn })
    .from(assemblies)
    .where(
      and(
        isNull(assemblies.closedAt),
        sql`not exists (select 1 from assembly_needs n where n.assembly_id = ${assemblies.id})`,
      ),
    )
    .orderBy(assemblies.name);
  return [
    ...ready.map((row) => ({ ...row, closedAt: null })),
    ...without.map((row) => ({ ...row, needed: 0, ready: 0, closedAt: null, batches: [] })),
  ];
}

/** Nothing in stock is counted for a closed one: what it has is what was fitted. */
async function readClosed(ctx: Ctx): Promise<AssemblyRow[]> {
  const rows = await ctx.tx
    .select({
      id: assemblies.id,
      name: assemblies.name,
      neededOn: assemblies.neededOn,
      closedAt: assemblies.closedAt,
      needed: sql<number>`coalesce((select sum(n.pieces)::int from assembly_needs n where n.assembly_id = ${assemblies.id}), 0)`,
      ready: sql<number>`coalesce((select sum(b.pieces)::int from balances b where b.place = 'fitted' and b.holder_id = ${assemblies.id}), 0)`,
    })
    .from(assemblies)
    .where(isNotNull(assemblies.closedAt))
    .orderBy(desc(assemblies.closedAt), desc(assemblies.id))
    .limit(MOST_CLOSED);
  return rows.map(({ closedAt, ...row }) => ({
    ...row,
    closedAt: closedAt?.toISOString() ?? null,
    batches: [],
  }));
}

export async function getAssembly(ctx: Ctx, { assemblyId }: { assemblyId: string }) {
  authorize(ctx, 'assembly.read');
  const [assembly] = await ctx.tx
    .select({
      id: assemblies.id,
      name: assemblies.name,
      neededOn: assemblies.neededOn,
      note: assemblies.note,
      closedAt: assemblies.closedAt,
      version: assemblies.version,
    })
    .from(assemblies)
    .where(eq(assemblies.id, assemblyId));
  if (!assembly) throw notFound('assembly');
  const { closedAt, ...rest } = assembly;
  return {
    ...rest,
    closed: closedAt !== null,
    today: await todayOf(ctx),
    needs: await readNeedRows(ctx, assemblyId),
  };
}

async function todayOf(ctx: Ctx): Promise<string> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return calendarDay(ctx.now, shop?.zone ?? 'UTC');
}

type Known = Pick<
  AssemblyNeedRow,
  'partNumber' | 'partId' | 'partName' | 'pieces' | 'fitted' | 'stock' | 'waiting' | 'fittedLots'
>;

async function readNeedRows(ctx: Ctx, assemblyId: string): Promise<AssemblyNeedRow[]> {
  const all = await readNeeds(ctx);
  const ready = allocate(all, await readStock(ctx));
  const readyOf = new Map(all.map((need, at) => [`${need.assemblyId} ${need.partNumber}`, ready[at] ?? 0]));
  const waits = await readWaits(ctx);
  const { rows } = await ctx.tx.execute<Known & Record<string, unknown>>(sql`
    select n.part_number as "partNumber", a.id as "partId", a.name as "partName", n.pieces,
      coalesce((select sum(b.pieces)::int from balances b join lots o on o.id = b.lot_id join parts p on p.id = o.part_id
        where b.place = 'fitted' and b.holder_id = n.assembly_id and p.number = n.part_number), 0) as fitted,
      coalesce((select jsonb_agg(jsonb_build_object('process', w.process, 'pieces', w.pieces) order by w.seq, w.process) from (
        select s.process, min(s.seq) as seq, sum(b.pieces)::int as pieces from balances b join route_steps s on s.id = b.holder_id join parts p on p.id = s.part_id
        where b.place = 'making' and b.pieces > 0 and p.number = n.part_number group by s.process) w), '[]') as waiting,
      coalesce((select jsonb_agg(jsonb_build_object('lotId', o.id, 'lotNumber', o.number, 'pieces', b.pieces,
          'named', coalesce((select jsonb_agg(jsonb_build_object('id', c.id, 'serial', c.serial) order by c.serial) from pieces c where c.lot_id = o.id and c.place = 'fitted' and c.holder_id = n.assembly_id), '[]')) order by o.number)
        from balances b join lots o on o.id = b.lot_id join parts p on p.id = o.part_id
        where b.place = 'fitted' and b.pieces > 0 and b.holder_id = n.assembly_id and p.number = n.part_number), '[]') as "fittedLots",
      coalesce((select jsonb_agg(jsonb_build_object('lotId', o.id, 'lotNumber', o.number, 'locationId', l.id, 'location', l.name, 'pieces', b.pieces) order by o.number, l.name)
        from balances b join lots o on o.id = b.lot_id join parts p on p.id = o.part_id join locations l on l.id = b.holder_id
        where b.place = 'stock' and b.pieces > 0 and p.number = n.part_number), '[]') as stock
    from assembly_needs n left join parts a on a.number = n.part_number and a.shop_id = n.shop_id and a.superseded_at is null
    where n.assembly_id = ${assemblyId} order by n.part_number`);
  return rows.map((row) => ({
    ...row,
    inStock: Math.max(0, (readyOf.get(`${assemblyId} ${row.partNumber}`) ?? row.fitted) - row.fitted),
    batches: waits.filter((wait) => wait.partNumber === row.partNumber),
  }));
}
