import { assembleDossierJob } from './definitions/assemble-dossier';
import { renderDocumentsJob } from './definitions/render-documents';
import { sendMailJob } from './definitions/send-mail';
import type { Job } from './job';

/** What the worker runs: one job for each queue of `queues.ts`; a test compares the two. */
export const ALL_JOBS: readonly Job[] = [sendMailJob, renderDocumentsJob, assembleDossierJob];
