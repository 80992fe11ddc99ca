import { eq, sql } from 'drizzle-orm';

import { shops } from '@/db/schema/organisations';
import { readReadiness } from '@/lib/assemblies/readiness';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { contentsWords } from '@/lib/parts/contents-words';

import type { TidelineBatch, TidelineLane } from './contract';

/** Days a batch stays on the tideline after its pieces went to stock. */
const STAYS_DAYS = 3;

export async function getTideline(ctx: Ctx) {
  authorize(ctx, 'batch.read');
  return {
    ...(await readTideline(ctx)),
    now: ctx.now,
    assemblies: await readReadiness(ctx),
    started: await readStarted(ctx),
  };
}

/** The batches not yet in stock and whom they are with. */
export async function readTideline(ctx: Ctx) {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone, latenessBasis: shops.latenessBasis })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw notFound('shop');
  const batches = await readBatches(ctx, shop.zone);
  const lanes = await readLanes(ctx, [...new Set(batches.map((batch) => batch.processorId))]);
  return {
    today: new Intl.DateTimeFormat('sv-SE', { timeZone: shop.zone }).format(ctx.now),
    ...shop,
    lanes,
    batches,
  };
}

/** One statement: every batch with what its tag, its string and its line in the list need. */
async function readBatches(ctx: Ctx, zone: string): Promise<TidelineBatch[]> {
  const day = (column: string) =>
    sql.raw(`(${column} at time zone '${zone.replaceAll("'", "''")}')::date::text`);
  const { rows } = await ctx.tx.execute<Omit<TidelineBatch, 'contents'> & { names: string[] }>(sql`
    select b.id, b.number, b.stage, b.processor_id as "processorId", b.pieces, b.pieces_back as "piecesBack",
      coalesce(line.names, '{}') as names, b.leaves_on::text as "leavesOn", ${day('b.dispatched_at')} as "dispatchedOn",
      b.acknowledged_at is not null as acknowledged, b.wanted_back_on::text as "wantedBackOn", b.promised_on::text as "promisedOn",
      b.first_promised_on::text as "firstPromisedOn", coalesce(promise.broken, '{}') as "brokenPromises",
      ${day('b.last_back_at')} as "lastBackOn", coalesce(receipt.days, '{}') as "receiptsOn",
      ${day('held.opened_at')} as "heldSince", held.said as nonconformance, question.said as "openQuestion",
      coalesce(paper.count, 0)::int as "certificatesToProve", paper.first as "firstCertificateId",
      invoice.said as invoice, need.said as assembly
    from batches b
    left join lateral (
      select array_agg(part.name) as names from (select a.number, min(a.name) as name
        from batch_lines l join lots o on o.id = l.lot_id join parts a on a.id = o.part_id where l.batch_id = b.id group by a.number) part
    ) line on true
    left join lateral (
      select array_agg(p.promised_on::text order by p.made_at) as broken from promises p where p.batch_id = b.id and p.promised_on <> b.promised_on
    ) promise on true
    left join lateral (select array_agg(distinct ${day('r.received_at')}) as days from receipts r where r.batch_id = b.id) receipt on true
    left join lateral (
      select n.opened_at, jsonb_build_object('id', n.id, 'number', n.number, 'what', n.what) as said
      from nonconformances n where n.batch_id = b.id and n.closed_at is null order by n.opened_at limit 1
    ) held on b.open_nonconformances > 0
    left join lateral (
      select jsonb_build_object('body', m.body, 'askedAt', to_char(m.created_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"')) as said
      from messages m where m.batch_id = b.id and m.side = 'processor' and m.kind in ('question', 'trouble')
        and not exists (select 1 from messages x where x.batch_id = b.id and x.side = 'shop' and x.id > m.id)
      order by m.id desc limit 1
    ) question on true
    left join lateral (
      select count(*) as count, (array_agg(c.id order by c.id))[1] as first from certificates c
      where c.batch_id = b.id and c.set_aside_at is null and not exists (select 1 from signatures s where s.certificate_id = c.id)
    ) paper on true
    left join lateral (
      select jsonb_build_object('id', i.id, 'number', i.number, 'entered', i.entered_at is not null, 'approved', i.approved_at is not null) as said
      from invoices i where i.batch_id = b.id and i.refused_at is null order by i.id desc limit 1
    ) invoice on true
    left join lateral (
      select jsonb_build_object('id', (array_agg(s.id order by s.needed_on, s.id))[1], 'name', (array_agg(s.name order by s.needed_on, s.id))[1],
        'neededOn', min(s.needed_on)::text, 'more', count(*) - 1) as said
      from (select distinct y.id, y.name, y.needed_on from batch_lines l join lots o on o.id = l.lot_id join parts a on a.id = o.part_id
        join assembly_needs n on n.part_number = a.number and n.shop_id = b.shop_id join assemblies y on y.id = n.assembly_id and y.closed_at is null
        where l.batch_id = b.id) s having count(*) > 0
    ) need on true
    where b.put_aside_at is null and b.cancelled_at is null
      and (b.stocked_at is null or b.stocked_at > ${ctx.now.toISOString()}::timestamptz - make_interval(days => ${STAYS_DAYS}))
    order by coalesce(b.dispatched_at, b.created_at), b.id`);
  return rows.map(({ names, ...batch }) => ({ ...batch, contents: contentsWords(batch.pieces, names) }));
}

async function readLanes(ctx: Ctx, processorIds: readonly string[]): Promise<TidelineLane[]> {
  if (processorIds.length === 0) return [];
  const ids = sql.join(
    processorIds.map((id) => sql`${id}::uuid`),
    sql`, `,
  );
  const { rows } = await ctx.tx.execute<TidelineLane & Record<string, unknown>>(sql`
    select p.id as "processorId", p.name, coalesce(a.processes, '{}') as processes, a.valid_to as "approvedTo"
    from processors p
    left join lateral (
      select (select array_agg(distinct word) from approvals x, unnest(x.processes) word where x.processor_id = p.id and x.withdrawn_at is null) as processes,
        max(valid_to)::text as valid_to
      from approvals where processor_id = p.id and withdrawn_at is null
    ) a on true
    where p.id in (${ids}) order by p.name`);
  return rows;
}

async function readStarted(ctx: Ctx) {
  const { rows } = await ctx.tx.execute<{
    parts: number;
    lots: number;
    processors: number;
    batches: number;
  }>(sql`
    select (select count(*)::int from (select 1 from parts limit 1) x) as parts, (select count(*)::int from (select 1 from lots limit 1) x) as lots,
      (select count(*)::int from (select 1 from shop_processors limit 1) x) as processors, (select count(*)::int from (select 1 from batches limit 1) x) as batches`);
  return rows[0] ?? { parts: 0, lots: 0, processors: 0, batches: 0 };
}
