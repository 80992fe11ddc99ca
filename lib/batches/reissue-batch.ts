import { and, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { decisions } from '@/db/schema/evidence';
import { invoices } from '@/db/schema/money';
import { shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { statePapers } from '@/lib/travellers/state-papers';

import { refOf, type Batch } from './change-building';
import type { reissueBatch as declaration } from './paper-contract';
import { refreshStanding } from './refresh-standing';
import { reissueChanges, type StatedTerms } from './reissue-changes';

type Input = z.output<(typeof declaration)['input']>;

/** Changes what may still change of a batch that has left, and states its papers anew: the old versions stay, the new ones say what is different. */
export async function reissueBatch(ctx: Ctx, { batchId, version, ...asked }: Input) {
  authorize(ctx, 'batch.dispatch');
  const batch = await takeSent(ctx, { batchId, version });
  const before = await readTerms(ctx, batch);
  const after = termsAsked(before, asked);
  const changes = reissueChanges(before, after);
  if (changes.length === 0)
    throw new AppError(
      'bad_input',
      'Nothing is different from the last version. Change something, or leave it as it is.',
    );
  await refuseSettled(ctx, batchId, before, after);

  await write(ctx, batchId, before, after);
  const documentVersion = await statePapers(ctx, batchId, { mail: 'reissue', changes });
  await recordAudit(ctx, {
    action: 'batch.reissue',
    entity: 'batch',
    entityId: batchId,
    after: { version: documentVersion, changes },
  });
  await refreshStanding(ctx, batchId);
  return { ...refOf(batch), documentVersion, changes };
}

async function takeSent(ctx: Ctx, { batchId, version }: Pick<Input, 'batchId' | 'version'>): Promise<Batch> {
  const [taken] = await ctx.tx
    .update(batches)
    .set({ version: sql`${batches.version} + 1` })
    .where(
      and(
        eq(batches.id, batchId),
        eq(batches.version, version),
        isNotNull(batches.dispatchedAt),
        isNull(batches.cancelledAt),
      ),
    )
    .returning();
  if (!taken) throw await whyNot(ctx, batchId);
  if (taken.stage === 'settled' || taken.stage === 'stocked')
    throw new AppError('conflict', `${taken.number} is ${taken.stage}. Its papers stay as they are.`);
  return taken;
}

async function whyNot(ctx: Ctx, batchId: string): Promise<AppError> {
  const [now] = await ctx.tx.select().from(batches).where(eq(batches.id, batchId));
  if (!now) return notFound('batch');
  if (now.cancelledAt !== null)
    return new AppError('conflict', `${now.number} was cancelled. Build a new batch.`);
  if (now.dispatchedAt === null)
    return new AppError('conflict', `${now.number} has not left yet. Change it where it is built.`);
  return changedMeanwhile('batch');
}

async function readTerms(ctx: Ctx, batch: Batch): Promise<StatedTerms> {
  const [shop] = await ctx.tx.select({ zone: shops.zone }).from(shops).where(eq(shops.id, batch.shopId));
  const lines = await ctx.tx
    .select({ id: batchLines.id, lineNo: batchLines.lineNo, unitPriceMinor: batchLines.unitPriceMinor })
    .from(batchLines)
    .where(eq(batchLines.batchId, batch.id))
    .orderBy(batchLines.lineNo);
  const asked = await ctx.tx
    .select({
      id: requirements.id,
      lineId: requirements.lineId,
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
    })
    .from(requirements)
    .where(eq(requirements.batchId, batch.id))
    .orderBy(requirements.seq);
  const { wantedBackOn, note, lotMinimumMinor, certificationFeeMinor } = batch;
  return {
    zone: shop?.zone ?? 'UTC',
    now: ctx.now,
    wantedBackOn,
    note,
    lotMinimumMinor,
    certificationFeeMinor,
    lines,
    requirements: asked,
  };
}

/** The terms as the person wants them; what was not named stays. */
function termsAsked(before: StatedTerms, asked: Omit<Input, 'batchId' | 'version'>): StatedTerms {
  const lines = before.lines.map((line) => ({
    ...line,
    unitPriceMinor: asked.prices.find((one) => one.lineId === line.id)?.unitPriceMinor ?? line.unitPriceMinor,
  }));
  const worded = before.requirements.map((one) => {
    const { limit, unit } = asked.requirements.find((other) => other.requirementId === one.id) ?? one;
    return { ...one, limit, unit };
  });
  return {
    ...before,
    wantedBackOn: asked.wantedBackOn === undefined ? before.wantedBackOn : asked.wantedBackOn,
    note: asked.note === undefined ? before.note : asked.note,
    lotMinimumMinor: asked.lotMinimumMinor ?? before.lotMinimumMinor,
    certificationFeeMinor: asked.certificationFeeMinor ?? before.certificationFeeMinor,
    lines,
    requirements: worded,
  };
}

/** What somebody has already decided on must not change under the decision. */
async function refuseSettled(
  ctx: Ctx,
  batchId: string,
  before: StatedTerms,
  after: StatedTerms,
): Promise<void> {
  const reworded = after.requirements.filter(
    (one, at) => one.limit !== before.requirements[at]?.limit || one.unit !== before.requirements[at]?.unit,
  );
  if (reworded.length > 0) {
    const [decided] = await ctx.tx
      .select({ id: decisions.requirementId })
      .from(decisions)
      .where(
        inArray(
          decisions.requirementId,
          reworded.map((one) => one.id),
        ),
      )
      .limit(1);
    const name = reworded.find((one) => one.id === decided?.id)?.characteristic;
    if (name !== undefined)
      throw new AppError(
        'conflict',
        `${name} was decided on a certificate already. What it asks stays as it is.`,
      );
  }
  if (!pricesDiffer(before, after)) return;
  const [approved] = await ctx.tx
    .select({ number: invoices.number })
    .from(invoices)
    .where(and(eq(invoices.batchId, batchId), isNotNull(invoices.approvedAt), isNull(invoices.refusedAt)))
    .limit(1);
  if (approved)
    throw new AppError(
      'conflict',
      `Invoice ${approved.number ?? ''} is approved at these prices. They stay as they are.`,
    );
}

const pricesDiffer = (before: StatedTerms, after: StatedTerms): boolean =>
  before.lotMinimumMinor !== after.lotMinimumMinor ||
  before.certificationFeeMinor !== after.certificationFeeMinor ||
  after.lines.some((line, at) => line.unitPriceMinor !== before.lines[at]?.unitPriceMinor);

async function write(ctx: Ctx, batchId: string, before: StatedTerms, after: StatedTerms): Promise<void> {
  const { wantedBackOn, note, lotMinimumMinor, certificationFeeMinor } = after;
  await ctx.tx
    .update(batches)
    .set({ wantedBackOn, note, lotMinimumMinor, certificationFeeMinor })
    .where(eq(batches.id, batchId));
  for (const [at, { id, unitPriceMinor }] of after.lines.entries()) {
    if (unitPriceMinor !== before.lines[at]?.unitPriceMinor)
      await ctx.tx.update(batchLines).set({ unitPriceMinor }).where(eq(batchLines.id, id));
  }
  for (const [at, { id, limit, unit }] of after.requirements.entries()) {
    const old = before.requirements[at];
    if (limit !== old?.limit || unit !== old.unit)
      // Typed over, it was not read from a table any more.
      await ctx.tx.update(requirements).set({ limit, unit, readFrom: null }).where(eq(requirements.id, id));
  }
}
