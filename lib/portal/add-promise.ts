import { desc, eq } from 'drizzle-orm';

import { promises } from '@/db/schema/batches';
import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { addDays, calendarDay, dayWords } from '@/lib/day-words';
import { AppError } from '@/lib/errors';

const FARTHEST_DAYS = 730;

/** Writes down a promised day, in the shop's rows. The day it already is, said again, changes nothing. */
export async function addPromise(
  ctx: Ctx,
  batchId: string,
  { promisedOn, note }: { promisedOn: string; note: string },
): Promise<void> {
  await refuseStrangeDay(ctx, promisedOn);
  const [last] = await ctx.tx
    .select({ promisedOn: promises.promisedOn })
    .from(promises)
    .where(eq(promises.batchId, batchId))
    .orderBy(desc(promises.madeAt), desc(promises.id))
    .limit(1);
  if (last?.promisedOn === promisedOn && note === '') return;
  await ctx.tx.insert(promises).values({
    shopId: shopOf(ctx),
    batchId,
    promisedOn,
    note: note || null,
    madeBy: ctx.actor.name,
    madeAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'batch.promise',
    entity: 'batch',
    entityId: batchId,
    before: { promisedOn: last?.promisedOn ?? null },
    after: { promisedOn, note },
  });
}

async function refuseStrangeDay(ctx: Ctx, day: string): Promise<void> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  const clock = { zone: shop?.zone ?? 'UTC', now: ctx.now };
  const today = calendarDay(ctx.now, clock.zone);
  const refuse = (message: string) =>
    new AppError('bad_input', message, { fields: [{ field: 'promisedOn', message }] });
  if (day < today) throw refuse(`${dayWords(day, clock)} is past. Choose today or a later day.`);
  if (day > addDays(today, FARTHEST_DAYS))
    throw refuse(`${dayWords(day, clock)} is more than two years away. Choose a day before that.`);
}
