import { eq, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashPassword, isPassword } from '@/lib/auth/passwords';
import { AppError, notFound } from '@/lib/errors';

import type { changePassword as declaration } from './account-contract';
import { meAtTheDoor } from './my-account';
import { recordForPerson } from './record-for-person';
import { takeTry } from './throttle';

/** Who knows the password may choose another; a stolen open screen alone may not. Ends every session, this one too. */
export async function changePassword(ctx: Ctx, { current, password }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'self.manage');
  const me = meAtTheDoor(ctx);
  const [user] = await ctx.tx.select({ name: users.name, email: users.email, passwordHash: users.passwordHash }).from(users).where(eq(users.id, me)).for('update');
  if (!user) throw notFound('person');
  if (user.passwordHash === null) throw new AppError('bad_input', 'You have no password yet. Ask for a link to choose one; it comes by mail.');
  await takeTry(ctx.tx, 'sign_in', { email: user.email, address: ctx.address ?? 'local' });
  if (!(await isPassword(user.passwordHash, current))) {
    throw new AppError('bad_input', 'The password you have now is another one.', { fields: [{ field: 'current', message: 'This is not the password you have now.' }] });
  }
  refuseGuessable(password, user.email);
  await ctx.tx
    .update(users)
    .set({ passwordHash: await hashPassword(password), sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(eq(users.id, me));
  await recordForPerson(ctx, { id: me, name: user.name }, { action: 'person.change_password' });
  return { email: user.email };
}

/** The first thing a stranger tries. */
export function refuseGuessable(password: string, email: string): void {
  const plain = password.toLowerCase();
  const isGuessable = plain === email.toLowerCase() || new Set(plain).size < 5;
  if (!isGuessable) return;
  throw new AppError('bad_input', 'This password is too easy to guess.', { fields: [{ field: 'password', message: 'This is too easy to guess. Choose a few words that nobody would put together.' }] });
}
