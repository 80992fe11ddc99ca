import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { PROCESSES } from '@/lib/parts/process';

import { STAGES } from './stage';

export const BatchRow = z.object({
  id: Id,
  number: z.string(),
  orderNumber: z.string(),
  stage: z.enum(STAGES),
  processorId: Id,
  processor: z.string(),
  process: z.enum(PROCESSES),
  pieces: z.int(),
  piecesBack: z.int(),
  leavesOn: z.string().nullable(),
  dispatchedAt: Moment.nullable(),
  promisedOn: z.string().nullable(),
  wantedBackOn: z.string().nullable(),
  lastBackAt: Moment.nullable(),
});
export type BatchRow = z.output<typeof BatchRow>;

export const listBatches = declare({
  id: 'listBatches',
  method: 'get',
  path: '/batches',
  summary: 'Batches, newest first',
  side: 'shop',
  permission: 'batch.read',
  input: PageQuery.extend({ stage: z.enum(STAGES).optional(), processorId: Id.optional() }),
  response: pageOf(BatchRow),
});
