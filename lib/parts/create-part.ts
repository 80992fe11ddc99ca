import { and, eq, isNull } from 'drizzle-orm';

import { parts } from '@/db/schema/parts';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import { checkPart } from './check-part';
import type { PartInput } from './contract';
import { partColumns } from './part-columns';
import { saveRoute } from './save-route';
import { stepWords } from './step-words';

/** Adds the first revision of a part that the shop is to make. */
export async function createPart(ctx: Ctx, input: PartInput) {
  authorize(ctx, 'part.edit');
  await checkPart(ctx, input);
  const [current] = await ctx.tx
    .select({ id: parts.id, revision: parts.revision })
    .from(parts)
    .where(and(eq(parts.number, input.number), isNull(parts.supersededAt)));
  if (current) {
    const message = `${input.number} is here already, in rev ${current.revision}. Open it and revise it.`;
    throw new AppError('conflict', message, {
      fields: [{ field: 'number', message }],
      extra: { partId: current.id },
    });
  }
  const id = newId();
  await ctx.tx.insert(parts).values({ id, shopId: shopOf(ctx), ...partColumns(input), createdAt: ctx.now });
  await saveRoute(ctx, id, input.route);
  await recordAudit(ctx, {
    action: 'part.create',
    entity: 'part',
    entityId: id,
    after: { ...input, route: input.route.map(stepWords) },
  });
  return { id, version: 1 };
}
