import { assembleDossierJob } from './definitions/assemble-dossier';
import { giveUpReadingJob } from './definitions/give-up-reading';
import { payInvoiceJob } from './definitions/pay-invoice';
import { readDocumentJob } from './definitions/read-document';
import { renderDocumentsJob } from './definitions/render-documents';
import { sendMailJob } from './definitions/send-mail';
import { workPaymentEventJob } from './definitions/work-payment-event';
import type { Job } from './job';

/** What the worker runs: one job for each queue of `queues.ts`; a test compares the two. */
export const ALL_JOBS: readonly Job[] = [
  sendMailJob,
  renderDocumentsJob,
  assembleDossierJob,
  payInvoiceJob,
  workPaymentEventJob,
  readDocumentJob,
  giveUpReadingJob,
];
