import type { z } from 'zod';

import { overrides } from '@/db/schema/batches';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { personOf, shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import { changeBuilding, refOf } from './change-building';
import type { overrideCheck as declaration } from './check-contract';
import { checkBatch } from './checks';
import { canOverride } from './finding';
import { readCheckFacts } from './read-check-facts';
import { refreshStanding } from './refresh-standing';

/** Lets a blocker of a batch pass, for exactly what it names; the reason prints on the traveller. */
export async function overrideCheck(
  ctx: Ctx,
  { batchId, version, check, subject, reason }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.override');
  const batch = await changeBuilding(ctx, { batchId, version });
  const by = personOf(ctx.actor);
  if (by === null) throw new AppError('not_allowed', 'Only a person can let a blocker pass.');
  const { findings } = checkBatch(await readCheckFacts(ctx, batchId));
  const finding = findings.find((one) => one.code === check && one.subject === subject);
  if (!finding) throw new AppError('conflict', 'This no longer stops the batch. Look again.');
  if (!canOverride(finding)) throw new AppError('conflict', `${finding.sentence} This cannot be let pass.`);

  const [added] = await ctx.tx
    .insert(overrides)
    .values({
      ...{ id: newId(), shopId: shopOf(ctx), batchId, check, subject, reason, by, createdAt: ctx.now },
      readFrom: finding.readFrom ?? null,
    })
    .onConflictDoNothing()
    .returning({ id: overrides.id });
  if (!added) throw new AppError('conflict', 'This was let pass already.');
  await recordAudit(ctx, {
    action: 'batch.override',
    entity: 'batch',
    entityId: batchId,
    after: { check, subject, what: finding.sentence, reason, readFrom: finding.readFrom ?? [] },
  });
  await refreshStanding(ctx, batchId);
  return refOf(batch);
}
