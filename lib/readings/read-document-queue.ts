import { z } from 'zod';

import { ChartCorrections } from '@/lib/evidence/chart/corrections';
import { ChartRequirement } from '@/lib/evidence/chart/requirement';

/** What a person said about a chart; without it the batch's own figures are asked of it. */
export const ChartAsk = z.object({ requirement: ChartRequirement, corrections: ChartCorrections });
export type ChartAsk = z.output<typeof ChartAsk>;

/** A reading that failed with every try. */
export const giveUpReadingQueue = {
  name: 'give-up-reading',
  payload: z.object({ shopId: z.uuid(), readingId: z.uuid() }),
};

/** A file to be read by the machine. The pause of the queue is for storage that is away; a file is never read in vain twice. */
export const readDocumentQueue = {
  name: 'read-document',
  payload: z.object({ shopId: z.uuid(), readingId: z.uuid(), ask: ChartAsk.optional() }),
};
