import type { MailGiven } from '@/emails/mail-props';
import type { Ctx } from '@/lib/auth/context';
import { queueMail } from '@/lib/mail/queue-mail';

import { batchForMail, type BatchForMail } from './batch-for-mail';
import { makeBatchLink } from './make-batch-link';

/** What a mail to the processor says beside what stands in the batch. Without `url` a link is made for it. */
export type BatchMail =
  | { template: 'dispatch'; url?: string; version?: number; to?: string }
  | { template: 'dispatch-reissued'; changes: readonly string[]; version: number; url?: string; to?: string }
  | { template: 'batch-cancelled'; reason: string; to?: string }
  | { template: 'batch-link'; url?: string; to?: string };

/** Queues a mail about a batch to its processor, filled from the batch as it stands in this transaction. */
export async function queueBatchMail(ctx: Ctx, batchId: string, mail: BatchMail): Promise<void> {
  const batch = await batchForMail(ctx, batchId);
  const to = mail.to ?? batch.deskEmail;
  const ofBatch = ofBatchProps(ctx, batch);
  if (mail.template === 'batch-cancelled') {
    return queueMail(ctx, { template: mail.template, to, props: { ...ofBatch, reason: mail.reason } });
  }
  const url = mail.url ?? (await makeBatchLink(ctx, { batchId, processorId: batch.processorId })).url;
  if (mail.template === 'batch-link') {
    const { stage, asked, specificationWords: specification, wantedBackOn } = batch;
    return queueMail(ctx, { template: mail.template, to, props: { ...ofBatch, stage, asked, specification, wantedBackOn, url } });
  }
  const props = { ...ofBatch, ...dispatchProps(batch), url, version: mail.version ?? 1 };
  if (mail.template === 'dispatch') return queueMail(ctx, { template: mail.template, to, props });
  return queueMail(ctx, { template: mail.template, to, props: { ...props, changes: [...mail.changes] } });
}

/** What every mail about a batch says. */
export function ofBatchProps(ctx: Pick<Ctx, 'now'>, batch: BatchForMail) {
  return {
    zone: batch.zone,
    statedAt: ctx.now,
    shop: batch.shop,
    processor: batch.processor,
    batchNumber: batch.number,
    orderNumber: batch.orderNumber,
    pieces: batch.pieces,
    contact: batch.contact,
  };
}

function dispatchProps(batch: BatchForMail): Pick<MailGiven<'dispatch'>, 'asked' | 'specification' | 'wantedBackOn' | 'lines' | 'cautions' | 'note'> {
  const cautions = new Set(batch.lines.flatMap(({ frozen }) => frozen?.stepNote ?? []));
  return {
    asked: batch.asked,
    specification: batch.specificationWords,
    wantedBackOn: batch.wantedBackOn,
    lines: batch.lines.map(({ lineNo, loadNo, pieces, frozen }) => ({
      lineNo,
      part: frozen === null ? `line ${lineNo}` : `${frozen.partNumber} ${frozen.partRevision}`,
      description: frozen === null ? '' : [frozen.partName, frozen.material, frozen.thickness].filter(Boolean).join(', '),
      loadNo,
      pieces,
    })),
    cautions: [...cautions],
    note: batch.note,
  };
}
