import { eq, sql } from 'drizzle-orm';

import { users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import { meAtTheDoor } from './my-account';
import { recordForPerson } from './record-for-person';

/** Ends every session of the caller, on every device, with the next request each of them makes. */
export async function endMySessions(ctx: Ctx) {
  authorize(ctx, 'self.manage');
  const me = meAtTheDoor(ctx);
  await ctx.tx
    .update(users)
    .set({ sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(eq(users.id, me));
  await recordForPerson(ctx, { id: me, name: ctx.actor.name }, { action: 'person.end_sessions' });
  return { done: true as const };
}
