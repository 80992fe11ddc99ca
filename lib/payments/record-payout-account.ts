import { asc, eq } from 'drizzle-orm';

import { processors, shopProcessors } from '@/db/schema/organisations';
import type { JobTools } from '@/lib/jobs/job';
import { recordInShop } from '@/lib/people/record-for-person';

import { canReceive } from './settings';

/** Writes down whether a processor can be paid, and tells it in the trail of each shop that works with it. */
export async function recordPayoutAccount(tools: JobTools, account: string): Promise<void> {
  const payoutsReady = await canReceive(account);
  await tools.atDoor(async (ctx) => {
    const [processor] = await ctx.tx
      .select({ id: processors.id, before: processors.payoutsReady })
      .from(processors)
      .where(eq(processors.stripeAccountId, account))
      .for('update');
    if (!processor || processor.before === payoutsReady) return;
    await ctx.tx.update(processors).set({ payoutsReady }).where(eq(processors.id, processor.id));
    // One order for everybody: each entry locks its shop's chain until the end.
    const shops = await ctx.tx
      .select({ shopId: shopProcessors.shopId })
      .from(shopProcessors)
      .where(eq(shopProcessors.processorId, processor.id))
      .orderBy(asc(shopProcessors.shopId));
    for (const { shopId } of shops) {
      await recordInShop(
        ctx,
        shopId,
        {
          action: 'processor.payouts',
          entity: 'processor',
          entityId: processor.id,
          before: { canBePaid: !payoutsReady },
          after: { canBePaid: payoutsReady },
        },
        ctx.actor,
      );
    }
  });
}
