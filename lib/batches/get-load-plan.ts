import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { loadPlanOf } from './load-plan';
import { readCheckFacts } from './read-check-facts';

/** How the lines of a batch lie in the fewest furnace loads. */
export async function getLoadPlan(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const { tables, lines } = await readCheckFacts(ctx, batchId);
  return loadPlanOf(tables, lines);
}
