import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { mailedLinks, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { hashPassword } from '@/lib/auth/passwords';
import { AppError } from '@/lib/errors';

import type { resetPassword as declaration } from './account-contract';
import { refuseGuessable } from './change-password';
import { recordForPerson } from './record-for-person';

/** Uses up a reset link. Every session ends and every other mailed link of the person stops working. */
export async function resetPassword(ctx: Ctx, { token, password }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'public.use');
  const [link] = await ctx.tx
    .update(mailedLinks)
    .set({ usedAt: ctx.now })
    .where(
      and(
        eq(mailedLinks.tokenHash, hashToken(token)),
        eq(mailedLinks.purpose, 'reset'),
        isNull(mailedLinks.usedAt),
        gt(mailedLinks.expiresAt, ctx.now),
      ),
    )
    .returning({ userId: mailedLinks.userId });
  if (!link) throw new AppError('gone', 'This link was used, or its time is over. Ask for another one.');
  const passwordHash = await hashPassword(password);
  const [user] = await ctx.tx
    .update(users)
    .set({ passwordHash, sessionVersion: sql`${users.sessionVersion} + 1` })
    .where(and(eq(users.id, link.userId), eq(users.active, true)))
    .returning({ id: users.id, name: users.name, email: users.email });
  if (!user) throw new AppError('gone', 'This account is closed. Ask an admin of your shop.');
  refuseGuessable(password, user.email);
  await ctx.tx
    .update(mailedLinks)
    .set({ usedAt: ctx.now })
    .where(and(eq(mailedLinks.userId, user.id), isNull(mailedLinks.usedAt)));
  await recordForPerson(ctx, user, { action: 'person.reset_password' });
  return { email: user.email };
}
