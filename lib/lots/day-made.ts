import { eq } from 'drizzle-orm';

import { shops } from '@/db/schema/organisations';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';

/**
 * The day pieces were made, as the ledger's clock keeps it: noon UTC of the shop's calendar day, to be read back in UTC.
 * Empty is today, where the shop is.
 */
export async function dayMade(ctx: Ctx, day: string): Promise<Date> {
  return day === '' ? noonOf(await todayInShop(ctx)) : noonOf(day);
}

export const noonOf = (day: string): Date => new Date(`${day}T12:00:00Z`);

async function todayInShop(ctx: Ctx): Promise<string> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return calendarDay(ctx.now, shop?.zone ?? 'UTC');
}
