import { and, eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { shopProcessors, shops } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { nextNumber, nextOrderNumber } from '@/lib/organisations/next-number';

import { refOf } from './change-building';
import type { CreateBatchInput } from './contract';
import { packLine, readWaitingStep } from './pack-line';
import { refreshStanding } from './refresh-standing';

/** Opens a batch for one processor. Its first lot says which step it is; every other line must wait for the same. */
export async function createBatch(ctx: Ctx, { processorId, lines, ...terms }: CreateBatchInput) {
  authorize(ctx, 'batch.build');
  await requireOwnProcessor(ctx, processorId);
  const [first] = lines;
  if (!first)
    throw new AppError('bad_input', 'Add at least one lot.', {
      fields: [{ field: 'lines', message: 'Add at least one lot.' }],
    });
  const step = await readWaitingStep(ctx, first, 'lines.0.lotId');
  const [shop] = await ctx.tx
    .select({ currency: shops.currency, orderPrefix: shops.orderPrefix })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  if (!shop) throw new Error('no shop to build in');

  const [batch] = await ctx.tx
    .insert(batches)
    .values({
      id: newId(),
      shopId: shopOf(ctx),
      number: await nextNumber(ctx, 'batch'),
      orderNumber: await nextOrderNumber(ctx, shop.orderPrefix),
      processorId,
      process: step.process,
      specification: step.specification,
      specificationRevision: step.specificationRevision,
      classType: step.classType,
      currency: shop.currency,
      leavesOn: terms.leavesOn ?? null,
      wantedBackOn: terms.wantedBackOn ?? null,
      note: terms.note ?? null,
      lotMinimumMinor: terms.lotMinimumMinor ?? 0,
      certificationFeeMinor: terms.certificationFeeMinor ?? 0,
      createdAt: ctx.now,
    })
    .returning();
  if (!batch) throw new Error('a batch was not kept');

  const packed: string[] = [];
  for (const [at, line] of lines.entries()) {
    const waiting = at === 0 ? step : await readWaitingStep(ctx, line, `lines.${at}.lotId`);
    await packLine(ctx, batch, line, { lineNo: at + 1, step: waiting, prefix: `lines.${at}.` });
    packed.push(`${waiting.lotNumber}, ${line.pieces} pc`);
  }
  await recordAudit(ctx, {
    action: 'batch.create',
    entity: 'batch',
    entityId: batch.id,
    after: { number: batch.number, orderNumber: batch.orderNumber, processorId, lines: packed },
  });
  await refreshStanding(ctx, batch.id);
  return refOf(batch);
}

/** @throws AppError naming the field, for a processor that this shop does not work with (any more). */
export async function requireOwnProcessor(ctx: Ctx, processorId: string): Promise<void> {
  const [own] = await ctx.tx
    .select({ active: shopProcessors.active })
    .from(shopProcessors)
    .where(and(eq(shopProcessors.shopId, shopOf(ctx)), eq(shopProcessors.processorId, processorId)));
  if (own?.active) return;
  const message = own
    ? 'You no longer work with this processor. Choose another.'
    : 'Choose one of your processors.';
  throw new AppError('bad_input', message, { fields: [{ field: 'processorId', message }] });
}
