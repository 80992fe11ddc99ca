import { sql } from 'drizzle-orm';

import type { Ctx } from '@/lib/auth/context';
import { readFacts } from '@/lib/batches/refresh-standing';
import type { Process } from '@/lib/trade/process';
import { readLineStanding, type LineStanding } from '@/lib/receipts/line-standing';

import { releaseGate, type GateVerdict } from './gate';

export interface GateLine extends GateVerdict {
  line: LineStanding;
  nextStep: NextStep | null;
  /** Batches whose money is open, so that these pieces may not go to stock. */
  unpaid: Numbered[];
}

interface NextStep {
  id: string;
  seq: number;
  process: Process;
}

interface Numbered {
  id: string;
  number: string;
}

/** What the gate says of each line of a batch just now. */
export async function readGate(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<GateLine[]> {
  const lines = await readLineStanding(ctx, batchId);
  const next = await readNextSteps(ctx, batchId);
  const unpaid = await readUnpaidBatches(ctx, batchId);
  return lines.map((line) => {
    const nextStep = next.get(line.lineId) ?? null;
    const unpaidBatches = unpaid.get(line.lineId) ?? [];
    const numbers = unpaidBatches.map((one) => one.number);
    const verdict = releaseGate({
      away: line.transitOut + line.atProcessor + line.transitBack,
      inQuarantine: line.inQuarantine,
      onHold: line.onHold,
      proved: line.proved,
      hasNextStep: nextStep !== null,
      paid: unpaidBatches.length === 0,
      unpaidBatches: numbers,
    });
    return { ...verdict, line, nextStep, unpaid: unpaidBatches };
  });
}

/** The outside step that follows the line's step on its part's route, where there is one. */
async function readNextSteps(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<Map<string, NextStep>> {
  const { rows } = await ctx.tx.execute<{ line_id: string } & NextStep & Record<string, unknown>>(sql`
    select l.id as line_id, n.id, n.seq, n.process from batch_lines l join route_steps s on s.id = l.step_id
    join lateral (select * from route_steps x where x.part_id = s.part_id and x.seq > s.seq order by x.seq limit 1) n on true
    where l.batch_id = ${batchId}`);
  return new Map(rows.map(({ line_id, id, seq, process }) => [line_id, { id, seq, process }]));
}

/** Batches whose money is open: this one, and those that took the line's lot through the steps before. */
async function readUnpaidBatches(ctx: Pick<Ctx, 'tx'>, batchId: string): Promise<Map<string, Numbered[]>> {
  const { rows } = await ctx.tx.execute<{ line_id: string; batch_id: string; number: string }>(sql`
    select l.id as line_id, b.id as batch_id, b.number from batch_lines l join route_steps s on s.id = l.step_id
    join batch_lines o on o.lot_id = l.lot_id join route_steps t on t.id = o.step_id and (t.seq < s.seq or o.batch_id = l.batch_id)
    join batches b on b.id = o.batch_id and b.dispatched_at is not null and b.cancelled_at is null
    where l.batch_id = ${batchId} group by l.id, b.id order by b.id`);
  const paid = new Map<string, boolean>();
  for (const id of new Set(rows.map((row) => row.batch_id))) paid.set(id, (await readFacts(ctx, id)).paid);
  const unpaid = new Map<string, Numbered[]>();
  for (const row of rows) {
    if (paid.get(row.batch_id)) continue;
    unpaid.set(row.line_id, [...(unpaid.get(row.line_id) ?? []), { id: row.batch_id, number: row.number }]);
  }
  return unpaid;
}
