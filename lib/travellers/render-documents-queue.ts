import { z } from 'zod';

/** Papers of one batch that were stated in one transaction, to be made, kept and sent by the worker. */
export const renderDocumentsQueue = {
  name: 'render-documents',
  payload: z.object({
    shopId: z.uuid(),
    batchId: z.uuid(),
    documentIds: z.array(z.uuid()).min(1),
    /** Which mail they go with; `none` where they are only made, as for batches that were entered afterwards. */
    mail: z.enum(['dispatch', 'reissue', 'none']),
  }),
};
