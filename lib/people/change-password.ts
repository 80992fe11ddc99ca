import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { users } from '@/db/schema/people';
import type { Outside } from '@/lib/api/endpoint';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashPassword } from '@/lib/auth/passwords';
import { AppError, notFound } from '@/lib/errors';

import type { changePassword as declaration } from './account-contract';
import { meAtTheDoor } from './my-account';
import { recordForPerson } from './record-for-person';
import { tryPasswordAgain } from './try-password-again';

/**
 * Who knows the password may choose another (`proveCurrentPassword` asks for it first); an open screen alone may not. Ends
 * every session, this one too.
 */
export async function changePassword(ctx: Ctx, { password }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'self.manage');
  const me = meAtTheDoor(ctx);
  const [user] = await ctx.tx
    .update(users)
    .set({ passwordHash: await hashPassword(password), sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(eq(users.id, me))
    .returning({ name: users.name, email: users.email });
  if (!user) throw notFound('person');
  refuseGuessable(password, user.email);
  await recordForPerson(ctx, { id: me, name: user.name }, { action: 'person.change_password' });
  return { email: user.email };
}

/** Before the transaction, so that a wrong try counts although everything else is rolled back. */
export async function proveCurrentPassword(
  outside: Outside,
  { current }: { current: string },
): Promise<void> {
  await tryPasswordAgain(outside, { password: current }).catch((error: unknown) => {
    if (!(error instanceof AppError) || error.code !== 'bad_input') throw error;
    throw new AppError('bad_input', 'The password you have now is another one.', {
      fields: [{ field: 'current', message: 'This is not the password you have now. Type it again.' }],
    });
  });
}

/** The first thing a stranger tries. */
export function refuseGuessable(password: string, email: string): void {
  const plain = password.toLowerCase();
  const isGuessable = plain === email.toLowerCase() || new Set(plain).size < 5;
  if (!isGuessable) return;
  throw new AppError('bad_input', 'This password is too easy to guess.', {
    fields: [
      {
        field: 'password',
        message: 'This is too easy to guess. Choose a few words that nobody would put together.',
      },
    ],
  });
}
