import { readDocument } from '@/lib/readings/read-document';
import { readDocumentQueue } from '@/lib/readings/read-document-queue';

import { job } from '../job';

export const readDocumentJob = job({ ...readDocumentQueue, retries: 4, retryDelayS: 5, run: readDocument });
