import { and, eq, isNull, sql } from 'drizzle-orm';

import { parts } from '@/db/schema/parts';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';

import { checkPart } from './check-part';
import type { PartInput } from './contract';
import { partColumns } from './part-columns';
import { saveRoute } from './save-route';
import { stepWords } from './step-words';

/** Adds the next revision. The one before is superseded; lots made from it stay with it. */
export async function revisePart(ctx: Ctx, { partId, ...given }: PartInput & { partId: string }) {
  authorize(ctx, 'part.edit');
  const [old] = await ctx.tx
    .select({ number: parts.number, revision: parts.revision })
    .from(parts)
    .where(eq(parts.id, partId));
  if (!old) throw notFound('part');
  const input = { ...given, number: old.number };
  await checkPart(ctx, input);

  // The condition is in the statement, so two people who revise at once cannot both win.
  const [superseded] = await ctx.tx
    .update(parts)
    .set({ supersededAt: ctx.now, version: sql`${parts.version} + 1` })
    .where(and(eq(parts.id, partId), isNull(parts.supersededAt)))
    .returning({ id: parts.id });
  if (!superseded)
    throw new AppError(
      'conflict',
      `${old.number} rev ${old.revision} is superseded already. Open the newest revision and revise that.`,
    );

  const id = newId();
  await ctx.tx.insert(parts).values({ id, shopId: shopOf(ctx), ...partColumns(input), createdAt: ctx.now });
  // New steps of its own: the old ones have lots waiting for them.
  await saveRoute(
    ctx,
    id,
    input.route.map((step) => ({ ...step, id: undefined })),
  );
  await recordAudit(ctx, {
    action: 'part.supersede',
    entity: 'part',
    entityId: partId,
    after: { supersededBy: input.revision },
  });
  await recordAudit(ctx, {
    action: 'part.revise',
    entity: 'part',
    entityId: id,
    before: { revision: old.revision },
    after: { ...input, route: input.route.map(stepWords) },
  });
  return { id, version: 1 };
}
