import { sql } from 'drizzle-orm';
import type { z } from 'zod';

import { apiTokens } from '@/db/schema/people';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize, isAllowed } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { hashToken } from '@/lib/auth/identify';
import { newToken } from '@/lib/auth/new-token';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { createToken as declaration } from './token-contract';

const HINT_LENGTH = 9;

/** At most what its owner may do today; when the owner loses a role, the token loses it with the next request. */
export async function createToken(
  ctx: Ctx,
  { name, scopes, lastDay }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'token.manage');
  const userId = personOf(ctx.actor);
  if (userId === null) throw new AppError('not_allowed', 'Only a person may have tokens.');
  const beyond = scopes.filter((scope) => !isAllowed(ctx.actor, scope));
  if (beyond.length > 0)
    throw new AppError('bad_input', 'A token may do at most what you may do.', {
      fields: [{ field: 'scopes', message: `You may not do this yourself: ${beyond.join(', ')}.` }],
    });

  const token = newToken('lw_');
  const id = newId();
  await ctx.tx.insert(apiTokens).values({
    id,
    shopId: shopOf(ctx),
    userId,
    name,
    tokenHash: hashToken(token),
    hint: token.slice(0, HINT_LENGTH),
    scopes: [...new Set(scopes)],
    expiresAt:
      lastDay === null
        ? null
        : sql`((${lastDay}::date + 1)::timestamp at time zone (select zone from shops where id = ${shopOf(ctx)}))`,
    createdAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'token.create',
    entity: 'token',
    entityId: id,
    after: { name, scopes, lastDay },
  });
  // A web answer of its own: the answer to a repeat is otherwise kept in the database, and this one must not be.
  return Response.json({ id, token }, { headers: { 'cache-control': 'no-store' } });
}
