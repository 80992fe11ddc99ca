import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { certificates, charts } from '@/db/schema/evidence';
import { invoices } from '@/db/schema/money';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { LINK_ENDS_AT } from '@/lib/auth/identify';
import { refreshStanding } from '@/lib/batches/refresh-standing';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';
import { newId } from '@/lib/ids';
import { requestReading } from '@/lib/readings/request-reading';
import type { LockedBatch } from '@/lib/receipts/lock-batch';

import type { PaperKind, sendPaper as declaration } from './contract';
import { onBatch } from './on-batch';

/** Hands in a file that was uploaded and verified for this batch: it becomes a certificate, a chart or an invoice. */
export async function sendPaper(
  ctx: Ctx,
  { batchId, kind, fileId }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'portal.answer');
  return onBatch(ctx, { batchId, nothing: 'Nothing more is added to it' }, async (inner, batch) => {
    const file = await requireVerifiedFile(inner, {
      fileId,
      purpose: kind,
      batchId,
      processorId: batch.processorId,
    });
    await refuseSecondTime(inner, kind, file);
    const id = newId();
    const paper = { id, shopId: shopOf(inner), batchId, fileId, sentBy: ctx.actor.name, createdAt: ctx.now };
    if (kind === 'certificate') await inner.tx.insert(certificates).values(paper);
    else if (kind === 'chart') await inner.tx.insert(charts).values(paper);
    else await inner.tx.insert(invoices).values({ ...paper, ...(await invoiceTerms(inner, batch)) });
    await recordAudit(inner, {
      action: `${kind}.send`,
      entity: kind,
      entityId: id,
      after: { batchId, file: file.name, sha256: file.sha256 },
    });
    await requestReading(inner, { fileId, kind });
    await refreshStanding(inner, batchId);
    return { id };
  });
}

async function refuseSecondTime(
  ctx: Ctx,
  kind: PaperKind,
  file: { id: string; name: string },
): Promise<void> {
  const table = { certificate: certificates, chart: charts, invoice: invoices }[kind];
  const [known] = await ctx.tx.select({ id: table.id }).from(table).where(eq(table.fileId, file.id));
  if (known)
    throw new AppError('conflict', `${file.name} is handed in already.`, { extra: { id: known.id } });
}

/** The office reads the rest off the invoice; until then it waits to be entered. */
async function invoiceTerms(ctx: Ctx, { id, number, processorId }: LockedBatch) {
  const [batch] = await ctx.tx
    .select({ currency: batches.currency, stage: batches.stage })
    .from(batches)
    .where(eq(batches.id, id));
  if (!batch) throw new Error('a locked batch is gone');
  if (LINK_ENDS_AT.includes(batch.stage))
    throw new AppError(
      'conflict',
      `${number} is settled. Write to the shop if something is still to be paid.`,
    );
  return { processorId, currency: batch.currency };
}
