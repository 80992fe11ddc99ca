import { sql } from 'drizzle-orm';

import type { FrozenLine } from '@/lib/batches/frozen-line';
import type { Ctx } from '@/lib/auth/context';

/** One line of a batch, where its pieces are and what speaks for them. */
export interface LineStanding {
  lineId: string;
  lineNo: number;
  lotId: string;
  lotNumber: string;
  serialised: boolean;
  stepId: string;
  partNumber: string;
  partRevision: string;
  partName: string;
  /** As ordered. */
  pieces: number;
  transitOut: number;
  atProcessor: number;
  transitBack: number;
  inQuarantine: number;
  onHold: number;
  /** Named by signed certificates, ever. */
  covered: number;
  /** Of the pieces ever covered, those whose proof a hold took away again. */
  uncoveredAgain: number;
  /** Pieces in quarantine that a signature or an authority speaks for. */
  proved: number;
  released: number;
  /** Said to be missing and not yet decided. */
  shortOpen: number;
}

/** Reads all lines of a batch in one statement, in the order of the order. */
export async function readLineStanding(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<LineStanding[]> {
  const { rows } = await ctx.tx.execute<StandingRow>(sql`
    select l.id, l.line_no, l.lot_id, t.number as lot_number, t.serialised, l.step_id, l.frozen, a.number as part_number,
      a.revision as part_revision, a.name as part_name, l.pieces,
      place.transit_out, place.at_processor, place.transit_back, place.quarantine,
      coalesce((select sum(b.pieces) from nonconformances n join balances b on b.lot_id = n.lot_id and b.place = 'hold' and b.holder_id = n.id where n.line_id = l.id), 0)::int as on_hold,
      spoken.covered, spoken.taken, spoken.covered + spoken.accepted - spoken.taken - spoken.released as proved, spoken.released,
      coalesce((select sum(n.pieces - coalesce((select sum(d.pieces) from dispositions d where d.nonconformance_id = n.id), 0))
        from nonconformances n where n.line_id = l.id and n.kind = 'short' and n.closed_at is null), 0)::int as short_open
    from batch_lines l
    join lots t on t.id = l.lot_id
    join parts a on a.id = t.part_id
    cross join lateral (
      select coalesce(sum(b.pieces) filter (where b.place = 'transit_out'), 0)::int as transit_out,
        coalesce(sum(b.pieces) filter (where b.place = 'at_processor'), 0)::int as at_processor,
        coalesce(sum(b.pieces) filter (where b.place = 'transit_back'), 0)::int as transit_back,
        coalesce(sum(b.pieces) filter (where b.place = 'quarantine'), 0)::int as quarantine
      from balances b where b.lot_id = l.lot_id and b.holder_id = l.id) place
    cross join lateral (
      select coalesce((select sum(c.pieces) from coverage c where c.line_id = l.id), 0)::int as covered,
        coalesce((select sum(d.pieces) from dispositions d join nonconformances n on n.id = d.nonconformance_id where n.line_id = l.id and d.disposition in ('use_as_is', 'concession')), 0)::int as accepted,
        coalesce((select sum(n.covered_pieces) from nonconformances n where n.line_id = l.id), 0)::int as taken,
        coalesce((select sum(r.pieces) from releases r where r.line_id = l.id), 0)::int as released) spoken
    where l.batch_id = ${batchId}
    order by l.line_no`);
  return rows.map(toStanding);
}

type StandingRow = {
  id: string;
  line_no: number;
  lot_id: string;
  lot_number: string;
  serialised: boolean;
  step_id: string;
  frozen: FrozenLine | null;
  part_number: string;
  part_revision: string;
  part_name: string;
  pieces: number;
  transit_out: number;
  at_processor: number;
  transit_back: number;
  quarantine: number;
  on_hold: number;
  covered: number;
  taken: number;
  proved: number;
  released: number;
  short_open: number;
};

/** What was ordered is what stood on the traveller, whatever the part is called today. */
function toStanding(row: StandingRow): LineStanding {
  return {
    lineId: row.id,
    lineNo: row.line_no,
    lotId: row.lot_id,
    lotNumber: row.frozen?.lotNumber ?? row.lot_number,
    serialised: row.serialised,
    stepId: row.step_id,
    partNumber: row.frozen?.partNumber ?? row.part_number,
    partRevision: row.frozen?.partRevision ?? row.part_revision,
    partName: row.frozen?.partName ?? row.part_name,
    pieces: row.pieces,
    transitOut: row.transit_out,
    atProcessor: row.at_processor,
    transitBack: row.transit_back,
    inQuarantine: row.quarantine,
    onHold: row.on_hold,
    covered: row.covered,
    uncoveredAgain: row.taken,
    proved: row.proved,
    released: row.released,
    shortOpen: row.short_open,
  };
}
