import { eq } from 'drizzle-orm';

import { mailedLinks, users } from '@/db/schema/people';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';

/** What a mailed link is for. Mail scanners fetch every address in a mail: looking must not use it up. */
export async function readMailedLink(ctx: Ctx, { token }: { token: string }) {
  authorize(ctx, 'public.use');
  const [link] = await ctx.tx
    .select({
      purpose: mailedLinks.purpose,
      usedAt: mailedLinks.usedAt,
      expiresAt: mailedLinks.expiresAt,
      name: users.name,
      email: users.email,
    })
    .from(mailedLinks)
    .innerJoin(users, eq(users.id, mailedLinks.userId))
    .where(eq(mailedLinks.tokenHash, hashToken(token)));
  if (!link) return { state: 'unknown' as const, purpose: null, name: null, email: null };
  const { usedAt, expiresAt, ...whose } = link;
  if (usedAt !== null) return { ...whose, state: 'used' as const };
  return { ...whose, state: expiresAt <= ctx.now ? ('expired' as const) : ('open' as const) };
}
