import { sql } from 'drizzle-orm';

import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';
import { limitWords } from '@/lib/parts/limit-words';

import type { DossierBatch, DossierContent, DossierFile } from './content';

type Row<T> = T & Record<string, unknown>;
const iso = (column: string) =>
  sql.raw(`to_char(${column} at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS"Z"')`);

/** Reads the whole chain of evidence of a lot: who made it of what, where it went, what was proved, who signed, where it is. */
export async function readDossier(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierContent> {
  const head = await readHead(ctx, lotId);
  return {
    ...head,
    route: await readRoute(ctx, lotId),
    whereabouts: await readWhereabouts(ctx, lotId),
    batches: await readBatches(ctx, lotId),
    movements: await readMovements(ctx, lotId),
    files: await readFiles(ctx, lotId),
    auditHead: await readAuditHead(ctx),
  };
}

async function readHead(
  ctx: Pick<Ctx, 'tx'>,
  lotId: string,
): Promise<Pick<DossierContent, 'shop' | 'lot' | 'part'>> {
  const { rows } = await ctx.tx.execute<Row<Pick<DossierContent, 'shop' | 'lot' | 'part'>>>(sql`
    select jsonb_build_object('name', s.name, 'address', s.address, 'zone', s.zone) as shop,
      jsonb_build_object('id', l.id, 'number', l.number, 'heat', l.heat, 'madeOn', ${iso('l.made_on')}, 'serialised', l.serialised,
        'made', (select coalesce(sum(m.pieces), 0)::int from movements m where m.lot_id = l.id and m.from_place is null),
        'serials', coalesce((select jsonb_agg(p.serial order by p.serial) from pieces p where p.lot_id = l.id), '[]')) as lot,
      jsonb_build_object('number', a.number, 'revision', a.revision, 'name', a.name, 'material', a.alloy || case when a.clad then ' clad ' else ' ' end || a.form,
        'thickness', a.thickness_entered, 'madeCondition', a.made_condition, 'endCondition', a.end_condition) as part
    from lots l join parts a on a.id = l.part_id join shops s on s.id = l.shop_id where l.id = ${lotId}`);
  const [row] = rows;
  if (!row) throw notFound('lot');
  return { shop: row.shop, lot: row.lot, part: row.part };
}

async function readRoute(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierContent['route']> {
  const { rows } = await ctx.tx.execute<Row<DossierContent['route'][number]>>(sql`
    select s.seq, s.process, concat_ws(' ', s.specification, s.specification_revision, s.class_type) as specification, s.target_condition as "targetCondition"
    from lots l join route_steps s on s.part_id = l.part_id where l.id = ${lotId} order by s.seq`);
  return rows;
}

/** What holds pieces in a place, by the name it is known under. */
const holderName = (place: string, holder: string) =>
  sql.raw(`case ${place}
    when 'making' then (select 'waits for step ' || s.seq from route_steps s where s.id = ${holder})
    when 'hold' then (select n.number from nonconformances n where n.id = ${holder})
    when 'stock' then (select k.name from locations k where k.id = ${holder})
    when 'fitted' then (select y.name from assemblies y where y.id = ${holder})
    when 'scrapped' then null when 'lost' then null
    else (select x.number || ' line ' || n.line_no from batch_lines n join batches x on x.id = n.batch_id where n.id = ${holder}) end`);

async function readWhereabouts(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierContent['whereabouts']> {
  const { rows } = await ctx.tx.execute<Row<DossierContent['whereabouts'][number]>>(sql`
    select b.place, coalesce(${holderName('b.place', 'b.holder_id')}, '') as holder, b.pieces from balances b where b.lot_id = ${lotId} and b.pieces > 0 order by b.place, 2`);
  return rows;
}

async function readMovements(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierContent['movements']> {
  const { rows } = await ctx.tx.execute<Row<DossierContent['movements'][number]>>(sql`
    select ${iso('m.moved_at')} as at, m.moved_by as by, m.pieces, coalesce(concat_ws(' ', m.from_place, ${holderName('m.from_place', 'm.from_holder_id')}), '') as "from",
      concat_ws(' ', m.to_place, ${holderName('m.to_place', 'm.to_holder_id')}) as "to", m.reason
    from movements m where m.lot_id = ${lotId} order by m.moved_at, m.id`);
  return rows;
}

type ReadBatch = Omit<DossierBatch, 'requirements'> & {
  requirements: (DossierBatch['requirements'][number] & { unit: string })[];
};

async function readBatches(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierBatch[]> {
  const { rows } = await ctx.tx.execute<Row<ReadBatch>>(sql`
    select b.id, b.number, b.order_number as "orderNumber", p.name as processor, p.address as "processorAddress",
      (select a.reference || ', ' || a.valid_from || ' to ' || a.valid_to from approvals a where a.processor_id = b.processor_id and b.process::text = any (a.processes)
        and a.valid_from <= b.dispatched_at::date and a.valid_to >= b.dispatched_at::date order by a.valid_to desc limit 1) as approval,
      b.process, concat_ws(' ', b.specification, b.specification_revision) as specification, b.class_type as "classType", l.line_no as "lineNo", l.pieces,
      l.frozen->>'conditionBefore' as "conditionBefore", l.frozen->>'targetCondition' as "targetCondition", ${iso('b.dispatched_at')} as "dispatchedAt",
      (select u.name from users u where u.id = b.dispatched_by) as "dispatchedBy",
      coalesce((select jsonb_agg(jsonb_build_object('check', o.check, 'reason', o.reason, 'by', (select u.name from users u where u.id = o.by)) order by o.id) from overrides o where o.batch_id = b.id), '[]') as overrides,
      coalesce((select jsonb_agg(jsonb_build_object('at', ${iso('r.received_at')}, 'by', r.received_by, 'good', x.good, 'damaged', x.damaged, 'short', x.short, 'over', x.over) order by r.received_at, r.id)
        from receipt_lines x join receipts r on r.id = x.receipt_id where x.line_id = l.id), '[]') as receipts,
      coalesce((select jsonb_agg(jsonb_build_object('characteristic', q.characteristic, 'limit', q.limit, 'unit', q.unit,
          'decisions', coalesce((select jsonb_agg(jsonb_build_object('certificate', coalesce(c.number, 'without number'), 'stated', d.stated, 'verdict', d.verdict, 'overrideReason', d.override_reason, 'by', d.decided_by) order by d.decided_at)
            from decisions d join certificates c on c.id = d.certificate_id where d.requirement_id = q.id), '[]')) order by q.seq, q.id)
        from requirements q where q.batch_id = b.id and (q.line_id is null or q.line_id = l.id)), '[]') as requirements,
      coalesce((select jsonb_agg(jsonb_build_object('certificate', coalesce(c.number, 'without number'), 'field', k.field, 'read', k.read, 'corrected', k.corrected, 'by', k.corrected_by, 'at', ${iso('k.corrected_at')}) order by k.id)
        from reading_corrections k join readings r on r.id = k.reading_id join certificates c on c.file_id = r.file_id where c.batch_id = b.id), '[]') as corrections,
      coalesce((select jsonb_agg(jsonb_build_object('id', h.id, 'fileId', f.id, 'fileName', f.name, 'requirement', r.content->'requirement', 'corrections', r.content->'corrections',
          'verdict', r.content#>'{judged,verdict}', 'soakMinutes', r.content#>'{judged,soak_minutes}', 'why', r.content#>'{judged,why}') order by h.id)
        from charts h join files f on f.id = h.file_id join readings r on r.file_id = f.id where h.batch_id = b.id and r.kind = 'chart' and r.state = 'read'), '[]') as charts,
      coalesce((select jsonb_agg(jsonb_build_object('certificate', coalesce(c.number, 'without number'), 'pieces', v.pieces, 'signer', g.signer_name, 'at', ${iso('g.signed_at')}, 'sentence', g.sentence, 'seal', g.seal, 'fileSha256', g.file_sha256) order by g.signed_at)
        from coverage v join signatures g on g.id = v.signature_id join certificates c on c.id = v.certificate_id where v.line_id = l.id), '[]') as signatures,
      coalesce((select jsonb_agg(jsonb_build_object('number', n.number, 'kind', n.kind, 'what', n.what, 'pieces', n.pieces,
          'dispositions', coalesce((select jsonb_agg(jsonb_build_object('disposition', d.disposition, 'pieces', d.pieces, 'reason', d.reason, 'authority', d.authority, 'by', d.decided_by, 'at', ${iso('d.decided_at')}) order by d.decided_at)
            from dispositions d where d.nonconformance_id = n.id), '[]')) order by n.number)
        from nonconformances n where n.line_id = l.id), '[]') as nonconformances,
      coalesce((select jsonb_agg(jsonb_build_object('at', ${iso('r.released_at')}, 'by', r.released_by, 'pieces', r.pieces, 'to', coalesce((select k.name from locations k where k.id = r.location_id), 'the next outside step')) order by r.released_at)
        from releases r where r.line_id = l.id), '[]') as releases
    from batch_lines l join batches b on b.id = l.batch_id join processors p on p.id = b.processor_id
    where l.lot_id = ${lotId} and b.dispatched_at is not null order by b.dispatched_at, b.id`);
  return rows.map((batch) => ({
    ...batch,
    requirements: batch.requirements.map(({ unit, ...one }) => ({
      ...one,
      limit: limitWords({ limit: one.limit, unit }),
    })),
  }));
}

/** Originals that speak for this lot: mill certificate, drawing, papers of its batches, photos of its receipts, concessions. */
async function readFiles(ctx: Pick<Ctx, 'tx'>, lotId: string): Promise<DossierFile[]> {
  const { rows } = await ctx.tx.execute<Row<DossierFile>>(sql`
    select distinct on (f.id) f.id, f.name, f.purpose, f.media_type as "mediaType", f.size::int, f.sha256, f.storage_key as "storageKey", b.number as "batchNumber"
    from files f left join batches b on b.id = f.batch_id
    where f.state = 'verified' and f.purpose not in ('invoice', 'purchase_order', 'dossier', 'archive') and (
      f.id in (select l.mill_certificate_file_id from lots l where l.id = ${lotId})
      or f.id in (select a.drawing_file_id from lots l join parts a on a.id = l.part_id where l.id = ${lotId})
      or f.batch_id in (select n.batch_id from batch_lines n where n.lot_id = ${lotId})
      or f.id in (select d.file_id from dispositions d join nonconformances n on n.id = d.nonconformance_id where n.lot_id = ${lotId}))
    order by f.id`);
  return rows;
}

async function readAuditHead(ctx: Pick<Ctx, 'tx'>): Promise<DossierContent['auditHead']> {
  const { rows } = await ctx.tx.execute<{ seq: number; hash: string }>(
    sql`select seq::int, hash from audit_entries order by seq desc limit 1`,
  );
  return rows[0] ?? null;
}
