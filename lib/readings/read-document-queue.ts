import { z } from 'zod';

/** A file to be read by the machine. The pause of the queue is for storage that is away; a file is never read in vain twice. */
export const readDocumentQueue = {
  name: 'read-document',
  payload: z.object({ shopId: z.uuid(), readingId: z.uuid() }),
};
