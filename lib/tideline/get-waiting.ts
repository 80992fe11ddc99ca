import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { readTideline } from './get-tideline';
import { countWaiting, whatWaits } from './what-waits';

/** How much waits for the reader: the list under the tideline, counted by the section it leads to. */
export async function getWaiting(ctx: Ctx) {
  authorize(ctx, 'batch.read');
  return countWaiting(whatWaits(await readTideline(ctx), ctx.actor.roles));
}
