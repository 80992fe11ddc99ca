import { giveUpReading } from '@/lib/readings/give-up-reading';
import { giveUpReadingQueue } from '@/lib/readings/read-document-queue';

import { job } from '../job';

export const giveUpReadingJob = job({
  ...giveUpReadingQueue,
  retries: 4,
  retryDelayS: 5,
  run: giveUpReading,
});
