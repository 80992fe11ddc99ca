import { desc, eq } from 'drizzle-orm';

import { apiTokens } from '@/db/schema/people';
import { authorize, isAllowed } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { TOKEN_SCOPES } from '@/lib/auth/permissions';

/** One's own tokens only: the database shows no others. */
export async function listTokens(ctx: Ctx) {
  authorize(ctx, 'token.manage');
  const tokens = await ctx.tx
    .select({
      id: apiTokens.id,
      name: apiTokens.name,
      hint: apiTokens.hint,
      scopes: apiTokens.scopes,
      expiresAt: apiTokens.expiresAt,
      lastUsedAt: apiTokens.lastUsedAt,
      revokedAt: apiTokens.revokedAt,
      createdAt: apiTokens.createdAt,
    })
    .from(apiTokens)
    .where(eq(apiTokens.shopId, shopOf(ctx)))
    .orderBy(desc(apiTokens.id));
  return { tokens, scopes: TOKEN_SCOPES.filter((scope) => isAllowed(ctx.actor, scope)) };
}
