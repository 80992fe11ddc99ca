import { sql } from 'drizzle-orm';

import { counters } from '@/db/schema/organisations';
import { shopOf, type Ctx } from '@/lib/auth/context';

const PREFIXES = { batch: 'B-', lot: 'L-', nonconformance: 'NC-' } as const;

/** The shop's next number of a kind: `B-0419`. Taken in the transaction that uses it; never given twice. */
export async function nextNumber(ctx: Ctx, kind: keyof typeof PREFIXES): Promise<string> {
  return PREFIXES[kind] + String(await take(ctx, kind)).padStart(4, '0');
}

/** The next order number, with the shop's own prefix: `TS-1187`. */
export async function nextOrderNumber(ctx: Ctx, prefix: string): Promise<string> {
  return `${prefix}-${String(await take(ctx, 'order')).padStart(4, '0')}`;
}

async function take(ctx: Ctx, kind: string): Promise<number> {
  const [row] = await ctx.tx
    .insert(counters)
    .values({ shopId: shopOf(ctx), kind, next: 2 })
    .onConflictDoUpdate({
      target: [counters.shopId, counters.kind],
      set: { next: sql`${counters.next} + 1` },
    })
    .returning({ next: counters.next });
  if (!row) throw new Error('counter gave nothing');
  return row.next - 1;
}
