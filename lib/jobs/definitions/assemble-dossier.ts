import { assembleDossier } from '@/lib/dossiers/assemble-dossier';
import { assembleDossierQueue } from '@/lib/dossiers/assemble-dossier-queue';

import { job } from '../job';

export const assembleDossierJob = job({
  ...assembleDossierQueue,
  retries: 6,
  concurrency: 1,
  run: assembleDossier,
});
