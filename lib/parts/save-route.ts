import { eq, inArray, sql } from 'drizzle-orm';

import { routeSteps } from '@/db/schema/parts';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { StepInput } from './contract';
import { answersKept } from './ordering-answers';
import { orNull } from './part-columns';
import { asRead } from './to-prove';
import { PROCESS_WORDS } from '@/lib/trade/process';

/**
 * Makes the route of a part exactly these steps in this order. Steps keep their identity, because pieces wait for them
 * and lines of batches name them; one that was ever waited for cannot be taken out.
 */
export async function saveRoute(ctx: Ctx, partId: string, wanted: readonly StepInput[]): Promise<void> {
  const present = await ctx.tx
    .select({ id: routeSteps.id, seq: routeSteps.seq, process: routeSteps.process })
    .from(routeSteps)
    .where(eq(routeSteps.partId, partId))
    .orderBy(routeSteps.seq);
  refuseUnknown(
    wanted,
    present.map(({ id }) => id),
  );

  const gone = present.filter(({ id }) => wanted.every((step) => step.id !== id));
  const used = await usedSteps(
    ctx,
    gone.map(({ id }) => id),
  );
  const kept = gone.find(({ id }) => used.has(id));
  if (kept) {
    const message = `Step ${kept.seq}, ${PROCESS_WORDS[kept.process]}, stays: lots have waited for it. Revise the part to leave it out.`;
    throw new AppError('conflict', message, { fields: [{ field: 'route', message }] });
  }
  if (gone.length > 0)
    await ctx.tx.delete(routeSteps).where(
      inArray(
        routeSteps.id,
        gone.map(({ id }) => id),
      ),
    );

  // Out of the way first, since two steps may not have one place even for a moment.
  await ctx.tx
    .update(routeSteps)
    .set({ seq: sql`-${routeSteps.seq}` })
    .where(eq(routeSteps.partId, partId));
  for (const [at, step] of wanted.entries()) {
    const columns = stepColumns(step, at + 1);
    if (step.id === undefined)
      await ctx.tx.insert(routeSteps).values({ id: newId(), shopId: shopOf(ctx), partId, ...columns });
    else await ctx.tx.update(routeSteps).set(columns).where(eq(routeSteps.id, step.id));
  }
}

function refuseUnknown(wanted: readonly StepInput[], present: readonly string[]): void {
  const named = wanted.flatMap(({ id }) => id ?? []);
  if (named.some((id) => !present.includes(id)) || new Set(named).size < named.length) {
    throw new AppError(
      'conflict',
      'The route was changed meanwhile. Look at what it is now, then save again.',
    );
  }
}

async function usedSteps(ctx: Ctx, stepIds: readonly string[]): Promise<Set<string>> {
  if (stepIds.length === 0) return new Set();
  const { rows } = await ctx.tx.execute<{ id: string }>(sql`
    select s.id from route_steps s
    where s.id in ${[...stepIds]} and (
      exists (select from batch_lines l where l.step_id = s.id)
      or exists (select from movements m join lots o on o.id = m.lot_id where o.part_id = s.part_id and s.id in (m.to_holder_id, m.from_holder_id)))`);
  return new Set(rows.map(({ id }) => id));
}

const stepColumns = (step: StepInput, seq: number) => ({
  seq,
  process: step.process,
  specification: step.specification,
  specificationRevision: orNull(step.specificationRevision),
  classType: orNull(step.classType),
  conditionBefore: orNull(step.conditionBefore),
  targetCondition: orNull(step.targetCondition),
  toProve: step.toProve.map(asRead),
  ordering: answersKept(step.ordering),
  note: orNull(step.note),
});
