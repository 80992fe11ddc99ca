import { and, eq, sql } from 'drizzle-orm';

import { lots } from '@/db/schema/lots';
import { parts, routeSteps } from '@/db/schema/parts';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';

import { checkPart } from './check-part';
import type { PartInput } from './contract';
import { partColumns } from './part-columns';
import { saveRoute } from './save-route';
import { stepWords } from './step-words';

type EditPartInput = PartInput & { partId: string; version: number };

/** Corrects a part. Lots bear its number and revision on paper, so with the first lot those two are fixed. */
export async function editPart(ctx: Ctx, { partId, version, ...input }: EditPartInput) {
  authorize(ctx, 'part.edit');
  const before = await readPart(ctx, partId);
  await checkPart(ctx, input, partId);
  await refuseRenaming(ctx, before.part, input);

  const [after] = await ctx.tx
    .update(parts)
    .set({ ...partColumns(input), version: sql`${parts.version} + 1` })
    .where(and(eq(parts.id, partId), eq(parts.version, version)))
    .returning();
  if (!after) throw changedMeanwhile('part');
  await saveRoute(ctx, partId, input.route);

  const now = await readPart(ctx, partId);
  await recordAudit(ctx, {
    action: 'part.edit',
    entity: 'part',
    entityId: partId,
    ...changes(
      { ...before.part, route: before.route.map(stepWords) },
      { ...now.part, route: now.route.map(stepWords) },
    ),
  });
  return { id: partId, version: after.version };
}

async function readPart(ctx: Ctx, partId: string) {
  const [part] = await ctx.tx.select().from(parts).where(eq(parts.id, partId));
  if (!part) throw notFound('part');
  const route = await ctx.tx
    .select()
    .from(routeSteps)
    .where(eq(routeSteps.partId, partId))
    .orderBy(routeSteps.seq);
  return { part, route };
}

async function refuseRenaming(ctx: Ctx, part: typeof parts.$inferSelect, input: PartInput): Promise<void> {
  if (
    part.number === input.number &&
    part.revision === input.revision &&
    part.serialised === input.serialised
  )
    return;
  const [lot] = await ctx.tx
    .select({ number: lots.number })
    .from(lots)
    .where(eq(lots.partId, part.id))
    .limit(1);
  if (!lot) return;
  if (part.serialised !== input.serialised)
    throw fixed(
      'serialised',
      `Lot ${lot.number} is made as it is. Revise the part to number its pieces differently.`,
    );
  throw fixed(
    part.number === input.number ? 'revision' : 'number',
    `Lot ${lot.number} bears ${part.number} rev ${part.revision}. Revise the part instead.`,
  );
}

const fixed = (field: string, message: string): AppError =>
  new AppError('conflict', message, { fields: [{ field, message }] });

/** Only what is different, so that the history can be read. */
function changes(before: Record<string, unknown>, after: Record<string, unknown>) {
  const changed = Object.keys(after).filter(
    (name) => name !== 'version' && JSON.stringify(before[name]) !== JSON.stringify(after[name]),
  );
  const pick = (from: Record<string, unknown>) =>
    Object.fromEntries(changed.map((name) => [name, from[name]]));
  return { before: pick(before), after: pick(after) };
}
