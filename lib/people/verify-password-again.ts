import { verify } from '@node-rs/argon2';
import { and, eq } from 'drizzle-orm';

import { atDoorOf } from '@/db/client';
import { users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

/**
 * Is it really this person, just now? For what only a hand of one's own may do: a program with the person's token has
 * no password and is refused, whatever it sends.
 *
 * @throws AppError `bad_input` at the field `password`, `not_allowed` where the person has none.
 */
export async function verifyPasswordAgain(ctx: Ctx, password: string): Promise<{ id: string; name: string }> {
  const { actor } = ctx;
  if (actor.kind !== 'person')
    throw new AppError('not_allowed', 'Only a person signs, with their own password.');
  const hash = await atDoorOf(ctx.tx, ctx.tenant, async () => {
    const [user] = await ctx.tx
      .select({ passwordHash: users.passwordHash })
      .from(users)
      .where(and(eq(users.id, actor.userId), eq(users.active, true)));
    return user?.passwordHash ?? null;
  });
  if (hash === null)
    throw new AppError(
      'not_allowed',
      'You sign in by mailed link and have no password. Set one in your account, then sign.',
    );
  const right = await verify(hash, password).catch(() => false);
  if (!right)
    throw new AppError('bad_input', 'Not signed: this is not your password.', {
      fields: [{ field: 'password', message: 'This is not your password. Type it again.' }],
    });
  return { id: actor.userId, name: actor.name };
}
