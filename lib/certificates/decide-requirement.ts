import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { requirements } from '@/db/schema/batches';
import { coverage, decisions, signatures } from '@/db/schema/evidence';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';

import type { DecideRequirement } from './prove-contract';
import { lockCertificate, refuseSetAside } from './lock-certificate';
import { isSealed } from './sealed-requirements';

type Input = z.output<typeof DecideRequirement>;

/** Writes what the inspector reads on the certificate about one requirement, in place of what was decided before. */
export async function decideRequirement(ctx: Ctx, input: Input) {
  authorize(ctx, 'certificate.prove');
  const locked = await lockCertificate(ctx, input.certificateId);
  refuseSetAside(locked);
  const [requirement] = await ctx.tx
    .select({ id: requirements.id, lineId: requirements.lineId, characteristic: requirements.characteristic })
    .from(requirements)
    .where(and(eq(requirements.id, input.requirementId), eq(requirements.batchId, locked.batch.id)));
  if (!requirement) throw notFound('requirement');
  if (isSealed(requirement, await signedLinesOf(ctx, input.certificateId)))
    throw new AppError(
      'conflict',
      `${requirement.characteristic} is sealed by a signature on this certificate. It stays as it was signed.`,
    );

  const before = await existing(ctx, input);
  if ((before?.version ?? null) !== input.version) throw changedMeanwhile('decision');
  const values = {
    stated: input.stated,
    verdict: input.verdict,
    // There is nothing to accept against where it meets.
    overrideReason: input.verdict === 'meets' ? null : input.overrideReason,
    note: input.note || null,
    decidedBy: ctx.actor.name,
    decidedAt: ctx.now,
    version: (before?.version ?? 0) + 1,
  };
  if (before) await ctx.tx.update(decisions).set(values).where(eq(decisions.id, before.id));
  else
    await ctx.tx.insert(decisions).values({
      ...values,
      shopId: shopOf(ctx),
      certificateId: input.certificateId,
      requirementId: input.requirementId,
    });
  await recordAudit(ctx, {
    action: values.overrideReason === null ? 'certificate.decide' : 'certificate.override',
    entity: 'certificate',
    entityId: input.certificateId,
    ...(before
      ? {
          before: {
            requirement: requirement.characteristic,
            stated: before.stated,
            verdict: before.verdict,
            overrideReason: before.overrideReason,
          },
        }
      : {}),
    after: {
      requirement: requirement.characteristic,
      stated: values.stated,
      verdict: values.verdict,
      overrideReason: values.overrideReason,
    },
  });
  return { version: values.version };
}

async function existing(ctx: Ctx, { certificateId, requirementId }: Input) {
  const [row] = await ctx.tx
    .select()
    .from(decisions)
    .where(and(eq(decisions.certificateId, certificateId), eq(decisions.requirementId, requirementId)));
  return row;
}

/** The signatures on a certificate, each with the lines it covers. */
export async function signedLinesOf(
  ctx: Pick<Ctx, 'tx'>,
  certificateId: string,
): Promise<{ signatureId: string; lineIds: string[] }[]> {
  const rows = await ctx.tx
    .select({ signatureId: signatures.id, lineId: coverage.lineId })
    .from(signatures)
    .innerJoin(coverage, eq(coverage.signatureId, signatures.id))
    .where(eq(signatures.certificateId, certificateId));
  const ids = [...new Set(rows.map((row) => row.signatureId))];
  return ids.map((signatureId) => ({
    signatureId,
    lineIds: rows.filter((row) => row.signatureId === signatureId).map((row) => row.lineId),
  }));
}
