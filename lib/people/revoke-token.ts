import { and, eq, isNull } from 'drizzle-orm';

import { apiTokens } from '@/db/schema/people';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { notFound } from '@/lib/errors';

export async function revokeToken(ctx: Ctx, { tokenId }: { tokenId: string }) {
  authorize(ctx, 'token.manage');
  const [token] = await ctx.tx
    .update(apiTokens)
    .set({ revokedAt: ctx.now })
    .where(and(eq(apiTokens.id, tokenId), isNull(apiTokens.revokedAt)))
    .returning({ name: apiTokens.name });
  if (!token) throw notFound('token');
  await recordAudit(ctx, {
    action: 'token.revoke',
    entity: 'token',
    entityId: tokenId,
    before: { name: token.name },
  });
  return { done: true as const };
}
