import { eq, sql } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import type { Ctx } from '@/lib/auth/context';

import { stageOf, type BatchFacts } from './stage';

/**
 * Writes what is derived of a batch (stage, pieces, days) from its records and the ledger. The one writer of those
 * columns: every verb that changes a fact of a batch calls it last, in the same transaction, and a test derives every
 * batch anew and compares.
 */
export async function refreshStanding(ctx: Ctx, batchId: string): Promise<void> {
  const facts = await readFacts(ctx, batchId);
  const stage = stageOf(facts);
  await ctx.tx
    .update(batches)
    .set({
      stage,
      pieces: facts.pieces,
      piecesBack: facts.piecesBack,
      firstPromisedOn: facts.firstPromisedOn,
      promisedOn: facts.promisedOn,
      lastBackAt: facts.lastBackAt,
      openNonconformances: facts.openNonconformances,
      // Kept from the first time, so that the day of stocking does not move with a later look.
      stockedAt:
        stage === 'stocked'
          ? sql`coalesce(${batches.stockedAt}, ${ctx.now.toISOString()}::timestamptz)`
          : null,
    })
    .where(eq(batches.id, batchId));
}

interface Standing extends BatchFacts {
  pieces: number;
  firstPromisedOn: string | null;
  promisedOn: string | null;
  lastBackAt: Date | null;
}

/** Reads the facts of one batch in one statement. Exported for the test that compares what is stored with what is derived. */
export async function readFacts(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<Standing> {
  const { rows } = await ctx.tx.execute<FactsRow>(sql`
    with line as (
      select l.id, l.pieces, l.unit_price_minor,
        coalesce((select sum(b.pieces) from balances b where b.lot_id = l.lot_id and b.holder_id = l.id and b.place in ('transit_out', 'at_processor', 'transit_back')), 0)::int as away,
        coalesce((select sum(b.pieces) from balances b where b.lot_id = l.lot_id and b.holder_id = l.id and b.place = 'quarantine'), 0)::int as quarantine,
        coalesce((select sum(c.pieces) from coverage c where c.line_id = l.id), 0)::int
          + coalesce((select sum(d.pieces) from dispositions d join nonconformances n on n.id = d.nonconformance_id where n.line_id = l.id and d.disposition in ('use_as_is', 'concession')), 0)::int
          - coalesce((select sum(n.covered_pieces) from nonconformances n where n.line_id = l.id), 0)::int
          - coalesce((select sum(r.pieces) from releases r where r.line_id = l.id), 0)::int as proved,
        coalesce((select sum(r.good + r.damaged) from receipt_lines r where r.line_id = l.id), 0)::int as back
      from batch_lines l where l.batch_id = ${batchId}
    ), hold as (
      select coalesce(sum(b.pieces), 0)::int as pieces from nonconformances n join balances b on b.lot_id = n.lot_id and b.place = 'hold' and b.holder_id = n.id where n.batch_id = ${batchId}
    ), money as (
      select count(*)::int as invoices,
        coalesce(bool_and(i.approved_at is not null and coalesce((select sum(m.amount_minor) from money_entries m where m.invoice_id = i.id), 0) <= 0), false) as settled
      from invoices i where i.batch_id = ${batchId} and i.refused_at is null
    ), promise as (
      select (array_agg(p.promised_on::text order by p.made_at, p.id))[1] as first, (array_agg(p.promised_on::text order by p.made_at desc, p.id desc))[1] as latest
      from promises p where p.batch_id = ${batchId}
    )
    select (b.cancelled_at is not null) as cancelled, (b.dispatched_at is not null) as dispatched, (b.acknowledged_at is not null) as acknowledged,
      (select count(*)::int from nonconformances n where n.batch_id = b.id and n.closed_at is null) as open_nonconformances,
      coalesce((select sum(pieces)::int from line), 0) as pieces,
      coalesce((select sum(away)::int from line), 0) as pieces_away,
      coalesce((select sum(least(back, pieces))::int from line), 0) as pieces_back,
      coalesce((select sum(greatest(0, quarantine - greatest(0, proved)))::int from line), 0) as pieces_unproved,
      coalesce((select sum(quarantine)::int from line), 0) + (select pieces from hold) as pieces_in_care,
      (b.payment_waived_at is not null
        or (b.lot_minimum_minor + b.certification_fee_minor + coalesce((select sum(unit_price_minor * pieces) from line), 0) = 0 and (select invoices from money) = 0)
        or ((select invoices from money) > 0 and (select settled from money))) as paid,
      (select first from promise) as first_promised_on, (select latest from promise) as promised_on,
      (select max(r.received_at) from receipts r where r.batch_id = b.id) as last_back_at
    from batches b where b.id = ${batchId}`);
  const [row] = rows;
  if (!row) throw new Error(`no batch ${batchId} to stand anywhere`);
  return {
    cancelled: row.cancelled,
    dispatched: row.dispatched,
    acknowledged: row.acknowledged,
    openNonconformances: row.open_nonconformances,
    pieces: row.pieces,
    piecesAway: row.pieces_away,
    piecesBack: row.pieces_back,
    piecesUnproved: row.pieces_unproved,
    piecesInCare: row.pieces_in_care,
    paid: row.paid,
    firstPromisedOn: row.first_promised_on,
    promisedOn: row.promised_on,
    lastBackAt: row.last_back_at === null ? null : new Date(row.last_back_at),
  };
}

type FactsRow = {
  cancelled: boolean;
  dispatched: boolean;
  acknowledged: boolean;
  open_nonconformances: number;
  pieces: number;
  pieces_away: number;
  pieces_back: number;
  pieces_unproved: number;
  pieces_in_care: number;
  paid: boolean;
  first_promised_on: string | null;
  promised_on: string | null;
  last_back_at: string | null;
};
