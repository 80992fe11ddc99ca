import { and, asc, desc, eq, sql, type SQL } from 'drizzle-orm';
import type { z } from 'zod';

import { approvals, processors, shopProcessors, shops } from '@/db/schema/organisations';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import { AppError, notFound } from '@/lib/errors';
import type { Process } from '@/lib/trade/process';

import type {
  APPROVAL_STATES,
  getProcessor as getDeclaration,
  listProcessors as listDeclaration,
} from './contract';

/** By name; two of one name follow their ids, so the page's key is both. */
export async function listProcessors(
  ctx: Ctx,
  { after, limit, active }: z.output<(typeof listDeclaration)['input']>,
) {
  authorize(ctx, 'processor.read');
  const today = await todayOf(ctx);
  const holding = sql`from approvals a where a.processor_id = ${processors.id} and a.withdrawn_at is null and ${today}::date between a.valid_from and a.valid_to`;
  const rows = await ctx.tx
    .select({
      processorId: processors.id,
      name: processors.name,
      contactName: shopProcessors.contactName,
      contactEmail: shopProcessors.contactEmail,
      active: shopProcessors.active,
      processes: sql<
        Process[]
      >`coalesce((select array_agg(distinct p.word order by p.word) from (select unnest(a.processes) as word ${holding}) p), '{}')`,
      approvalEndsOn: sql<string | null>`(select min(a.valid_to)::text ${holding})`,
      openBatches: sql<number>`(select count(*)::int from batches b where b.processor_id = ${processors.id} and b.stage not in ('stocked', 'cancelled'))`,
      piecesOut: sql<number>`(select coalesce(sum(b.pieces - b.pieces_back), 0)::int from batches b where b.processor_id = ${processors.id} and b.stage in ('dispatched', 'at_processor', 'held'))`,
    })
    .from(shopProcessors)
    .innerJoin(processors, eq(processors.id, shopProcessors.processorId))
    .where(
      and(
        after === undefined ? undefined : beyond(after),
        active === undefined ? undefined : eq(shopProcessors.active, active === 'true'),
      ),
    )
    .orderBy(asc(sql`lower(${processors.name})`), asc(processors.id))
    .limit(limit + 1);
  return toPage(rows, limit, (row) => `${row.processorId}${row.name.toLowerCase()}`);
}

const ID_LENGTH = 36;

function beyond(after: string): SQL {
  const id = after.slice(0, ID_LENGTH);
  if (!/^[0-9a-f-]{36}$/.test(id))
    throw new AppError('bad_input', 'This is not a place in the list.', {
      fields: [{ field: 'after', message: 'Use what `next` said.' }],
    });
  return sql`(lower(${processors.name}), ${processors.id}) > (${after.slice(ID_LENGTH)}, ${id}::uuid)`;
}

export async function getProcessor(ctx: Ctx, { processorId }: z.output<(typeof getDeclaration)['input']>) {
  authorize(ctx, 'processor.read');
  const [found] = await ctx.tx
    .select({
      processorId: processors.id,
      name: processors.name,
      email: processors.email,
      phone: processors.phone,
      address: processors.address,
      zone: processors.zone,
      contactName: shopProcessors.contactName,
      contactEmail: shopProcessors.contactEmail,
      note: shopProcessors.note,
      active: shopProcessors.active,
      payoutsReady: processors.payoutsReady,
      version: shopProcessors.version,
    })
    .from(shopProcessors)
    .innerJoin(processors, eq(processors.id, shopProcessors.processorId))
    .where(eq(shopProcessors.processorId, processorId));
  if (!found) throw notFound('processor');
  const today = await todayOf(ctx);
  const all = await ctx.tx
    .select({
      id: approvals.id,
      reference: approvals.reference,
      processes: approvals.processes,
      specifications: approvals.specifications,
      validFrom: approvals.validFrom,
      validTo: approvals.validTo,
      withdrawnAt: approvals.withdrawnAt,
    })
    .from(approvals)
    .where(eq(approvals.processorId, processorId))
    .orderBy(desc(approvals.validTo), desc(approvals.id));
  return {
    ...found,
    today,
    approvals: all.map((approval) => ({
      ...approval,
      processes: approval.processes as Process[],
      state: stateOn(today, approval),
    })),
  };
}

/** How an approval stands on a day. */
export function stateOn(
  day: string,
  { validFrom, validTo, withdrawnAt }: { validFrom: string; validTo: string; withdrawnAt: Date | null },
): (typeof APPROVAL_STATES)[number] {
  if (withdrawnAt !== null) return 'withdrawn';
  if (day < validFrom) return 'begins_later';
  return day > validTo ? 'ended' : 'holds';
}

/** An approval begins and ends with the shop's day, not with the server's. */
export async function todayOf(ctx: Ctx): Promise<string> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return calendarDay(ctx.now, shop?.zone ?? 'UTC');
}
