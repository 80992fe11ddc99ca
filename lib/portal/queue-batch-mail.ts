import type { MailGiven } from '@/emails/mail-props';
import { personOf, type Ctx } from '@/lib/auth/context';
import { queueMail } from '@/lib/mail/queue-mail';

import { batchForMail, type BatchForMail } from './batch-for-mail';
import { standingBatchUrl } from './standing-batch-url';

/** A paper that was made and goes along. */
interface Paper {
  fileId: string;
  name: string;
}

/** What a mail to the processor says beside what stands in the batch. Without `url` it carries the link that stands. */
export type BatchMail =
  | { template: 'dispatch'; version?: number; url?: string; papers?: readonly Paper[]; to?: string }
  | {
      template: 'dispatch-reissued';
      changes: readonly string[];
      version: number;
      url?: string;
      papers?: readonly Paper[];
      to?: string;
    }
  | { template: 'batch-cancelled'; reason: string; to?: string }
  | { template: 'batch-link'; url: string; to?: string };

/** Queues a mail about a batch to its processor, filled from the batch as it stands in this transaction. */
export async function queueBatchMail(ctx: Ctx, batchId: string, mail: BatchMail): Promise<void> {
  const batch = await batchForMail(ctx, batchId);
  const to = mail.to ?? batch.deskEmail;
  const ofBatch = ofBatchProps(ctx, batch);
  // The job that made the papers is nobody: answers go to whoever sent the batch.
  const replyTo =
    personOf(ctx.actor) === null && batch.dispatcherEmail !== null ? { replyTo: batch.dispatcherEmail } : {};
  if (mail.template === 'batch-cancelled') {
    return queueMail(ctx, {
      template: mail.template,
      to,
      ...replyTo,
      props: { ...ofBatch, reason: mail.reason },
    });
  }
  if (mail.template === 'batch-link') {
    const { stage, asked, specificationWords: specification, wantedBackOn } = batch;
    return queueMail(ctx, {
      template: mail.template,
      to,
      ...replyTo,
      props: { ...ofBatch, stage, asked, specification, wantedBackOn, url: mail.url },
    });
  }
  const papers = mail.papers ?? [];
  const url = mail.url ?? (await standingBatchUrl(ctx, { batchId, processorId: batch.processorId }));
  const props = {
    ...ofBatch,
    ...dispatchProps(batch),
    url,
    version: mail.version ?? 1,
    attached: papers.map((paper) => paper.name),
  };
  const attach = papers.map((paper) => paper.fileId);
  if (mail.template === 'dispatch')
    return queueMail(ctx, { template: mail.template, to, ...replyTo, attach, props });
  return queueMail(ctx, {
    template: mail.template,
    to,
    ...replyTo,
    attach,
    props: { ...props, changes: [...mail.changes] },
  });
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

function dispatchProps(
  batch: BatchForMail,
): Pick<MailGiven<'dispatch'>, 'asked' | 'specification' | 'wantedBackOn' | 'lines' | 'cautions' | 'note'> {
  const cautions = new Set(batch.lines.flatMap(({ frozen }) => frozen?.stepNote ?? []));
  return {
    asked: batch.asked,
    specification: batch.specificationWords,
    wantedBackOn: batch.wantedBackOn,
    lines: batch.lines.map(({ lineNo, loadNo, pieces, frozen }) => ({
      lineNo,
      part: frozen === null ? `line ${lineNo}` : `${frozen.partNumber} ${frozen.partRevision}`,
      description:
        frozen === null
          ? ''
          : [frozen.partName, frozen.material, frozen.thickness].filter(Boolean).join(', '),
      loadNo,
      pieces,
    })),
    cautions: [...cautions],
    note: batch.note,
  };
}
