import { renderAndSend } from '@/lib/travellers/render-and-send';
import { renderDocumentsQueue } from '@/lib/travellers/render-documents-queue';

import { job } from '../job';

export const renderDocumentsJob = job({
  ...renderDocumentsQueue,
  retries: 8,
  retryDelayS: 2,
  run: renderAndSend,
});
