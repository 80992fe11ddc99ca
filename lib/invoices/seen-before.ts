import { sql } from 'drizzle-orm';

import type { Ctx } from '@/lib/auth/context';

import type { StoredInvoice } from './read-invoice';

type Seen = {
  id: string;
  number: string | null;
  batchNumber: string;
  why: 'same_number' | 'same_order' | 'same_total' | 'same_file';
};

/** Days in which the same total from the same processor is worth a second look. */
const SAME_TOTAL_DAYS = 90;

/**
 * Other invoices that may be this one again. The same number is refused when it is entered; here it shows a refused
 * copy. The rest are reasons to look, not refusals.
 */
export async function seenBefore(ctx: Pick<Ctx, 'tx'>, invoice: StoredInvoice): Promise<Seen[]> {
  const others = (why: Seen['why'], condition: ReturnType<typeof sql>) => sql`
    select i.id, i.number, b.number as "batchNumber", ${why}::text as why from invoices i join batches b on b.id = i.batch_id where i.id <> ${invoice.id} and ${condition}`;
  const found = [
    others('same_order', sql`i.batch_id = ${invoice.batchId} and i.refused_at is null`),
    ...(invoice.numberKey === null
      ? []
      : [
          others(
            'same_number',
            sql`i.processor_id = ${invoice.processorId} and i.number_key = ${invoice.numberKey}`,
          ),
        ]),
    ...(invoice.totalMinor === null
      ? []
      : [
          others(
            'same_total',
            sql`i.processor_id = ${invoice.processorId} and i.total_minor = ${invoice.totalMinor} and i.refused_at is null and i.created_at > ${invoice.createdAt.toISOString()}::timestamptz - make_interval(days => ${SAME_TOTAL_DAYS}) and i.created_at < ${invoice.createdAt.toISOString()}::timestamptz + make_interval(days => ${SAME_TOTAL_DAYS})`,
          ),
        ]),
    ...(invoice.fileId === null
      ? []
      : [
          others(
            'same_file',
            sql`exists (select 1 from files mine join files theirs on theirs.sha256 = mine.sha256 where mine.id = ${invoice.fileId} and theirs.id = i.file_id)`,
          ),
        ]),
  ];
  const { rows } = await ctx.tx.execute<Seen>(sql.join(found, sql` union all `));
  return rows;
}
