import { eq } from 'drizzle-orm';

import { atDoorOf, type Tx } from '@/db/client';
import { users } from '@/db/schema/people';
import type { Outside } from '@/lib/api/endpoint';
import { personOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import { giveBackTry, takeTry } from './throttle';
import { verifyPasswordAgain } from './verify-password-again';

/**
 * One try at one's own password, before the transaction that it opens the way to: a wrong one must count although
 * everything else is rolled back with it, and guessing here is guessing at the door.
 */
export async function tryPasswordAgain(outside: Outside, { password }: { password: string }): Promise<void> {
  await outside.inTenant((ctx) => atThrottle(ctx, (tx, trier) => takeTry(tx, 'sign_in', trier)));
  await outside.inTenant((ctx) => verifyPasswordAgain(ctx, password));
  await outside.inTenant((ctx) => atThrottle(ctx, (tx, trier) => giveBackTry(tx, 'sign_in', trier)));
}

async function atThrottle(
  ctx: Ctx,
  work: (tx: Tx, trier: { email: string; address: string }) => Promise<void>,
): Promise<void> {
  const personId = personOf(ctx.actor);
  if (personId === null) throw new AppError('not_allowed', 'Only a person signs, with their own password.');
  await atDoorOf(ctx.tx, ctx.tenant, async () => {
    const [user] = await ctx.tx.select({ email: users.email }).from(users).where(eq(users.id, personId));
    await work(ctx.tx, { email: user?.email ?? personId, address: ctx.address ?? 'local' });
  });
}
