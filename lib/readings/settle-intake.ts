import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { intake } from '@/db/schema/readings';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError, notFound } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId } from '@/lib/ids';
import { lockSentBatch } from '@/lib/receipts/lock-batch';

import type { SetAsideIntake } from './intake-contract';
import { requestReading } from './request-reading';

/** Takes in a certificate whose batch is not known yet, and has it read. */
export async function addToIntake(ctx: Ctx, { fileId }: { fileId: string }) {
  authorize(ctx, 'certificate.add');
  const file = await requireVerifiedFile(ctx, { fileId, purpose: 'certificate', batchId: null });
  const [known] = await ctx.tx
    .select({ id: intake.id, settledAt: intake.settledAt })
    .from(intake)
    .where(eq(intake.fileId, fileId));
  if (known)
    throw new AppError(
      'conflict',
      known.settledAt === null
        ? `${file.name} is taken in already and waits for its batch.`
        : `${file.name} was taken in before.`,
    );
  const id = newId();
  await ctx.tx
    .insert(intake)
    .values({ id, shopId: shopOf(ctx), fileId, addedBy: ctx.actor.name, createdAt: ctx.now });
  await requestReading(ctx, { fileId, kind: 'certificate' });
  await recordAudit(ctx, {
    action: 'intake.add',
    entity: 'intake',
    entityId: id,
    after: { file: file.name, sha256: file.sha256 },
  });
  return { id };
}

/** A person says which batch the paper is of: from then on it is a certificate of that batch like any other. */
export async function assignIntake(ctx: Ctx, { intakeId, batchId }: { intakeId: string; batchId: string }) {
  authorize(ctx, 'certificate.add');
  const paper = await lockIntake(ctx, intakeId);
  const batch = await lockSentBatch(ctx, batchId, 'A certificate cannot be of it');
  const certificateId = newId();
  await ctx.tx.update(files).set({ batchId }).where(eq(files.id, paper.fileId));
  await ctx.tx.insert(certificates).values({
    id: certificateId,
    shopId: shopOf(ctx),
    batchId,
    fileId: paper.fileId,
    sentBy: paper.addedBy,
    createdAt: ctx.now,
  });
  await settle(ctx, intakeId, { batchId });
  await recordAudit(ctx, {
    action: 'certificate.add',
    entity: 'certificate',
    entityId: certificateId,
    after: { batchId, batch: batch.number, intakeId },
  });
  await refreshStanding(ctx, batchId);
  return { certificateId };
}

/** Of no batch of this shop: kept, with the reason, and out of the list. */
export async function setAsideIntake(ctx: Ctx, { intakeId, reason }: z.output<typeof SetAsideIntake>) {
  authorize(ctx, 'certificate.add');
  await lockIntake(ctx, intakeId);
  await settle(ctx, intakeId, { setAsideReason: reason });
  await recordAudit(ctx, {
    action: 'intake.set_aside',
    entity: 'intake',
    entityId: intakeId,
    after: { reason },
  });
  return { id: intakeId };
}

/** Locks a paper that still waits for its batch. */
export async function lockIntake(ctx: Ctx, intakeId: string) {
  const [paper] = await ctx.tx.select().from(intake).where(eq(intake.id, intakeId)).for('update');
  if (!paper) throw notFound('paper');
  if (paper.settledAt !== null)
    throw new AppError('conflict', `${paper.settledBy ?? 'Somebody'} has settled this paper already.`);
  return paper;
}

const settle = (
  ctx: Ctx,
  intakeId: string,
  where: { batchId: string } | { setAsideReason: string },
): Promise<unknown> =>
  ctx.tx
    .update(intake)
    .set({ ...where, settledBy: ctx.actor.name, settledAt: ctx.now })
    .where(and(eq(intake.id, intakeId), isNull(intake.settledAt)));
