import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Moment } from '@/lib/api/shapes';
import { TravellerContent } from '@/lib/travellers/content';

import { BatchRef, Note, Price, Seen } from './contract';

export const listBatchDocuments = declare({
  id: 'listBatchDocuments',
  method: 'get',
  path: '/batches/{batchId}/documents',
  summary: 'Travellers and orders of a batch, every version, newest first',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: z.object({
    documents: z.array(
      z.object({
        id: Id,
        kind: z.enum(['traveller', 'purchase_order']),
        documentVersion: z.int(),
        changes: z.array(z.string()),
        statedAt: Moment,
        /** Null while the worker still makes it. */
        fileId: Id.nullable(),
        sha256: z.string().nullable(),
      }),
    ),
  }),
});
export type BatchDocument = z.output<(typeof listBatchDocuments)['response']>['documents'][number];

/** What a traveller says. The link its code opens stays on the paper. */
export const TravellerSays = TravellerContent.omit({ link: true });
export type TravellerSays = z.output<typeof TravellerSays>;

export const getTraveller = declare({
  id: 'getTraveller',
  method: 'get',
  path: '/batches/{batchId}/traveller',
  summary: 'What the traveller says: as last stated, or (version 0) as it would be stated now',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: TravellerSays,
});

export const reissueBatch = declare({
  id: 'reissueBatch',
  method: 'post',
  path: '/batches/{batchId}/reissue',
  summary:
    'Change day, note, prices or wording of a batch that has left; makes new versions of its papers that say what is different, and mails them',
  side: 'shop',
  permission: 'batch.dispatch',
  input: Seen.extend({
    wantedBackOn: Day.nullable().optional(),
    note: Note.nullable().optional(),
    lotMinimumMinor: Price.optional(),
    certificationFeeMinor: Price.optional(),
    prices: z
      .array(z.object({ lineId: Id, unitPriceMinor: Price }))
      .max(200)
      .default([]),
    requirements: z
      .array(
        z.object({ requirementId: Id, limit: z.string().trim().max(200), unit: z.string().trim().max(24) }),
      )
      .max(500)
      .default([]),
  }),
  response: BatchRef.extend({ documentVersion: z.int(), changes: z.array(z.string()) }),
});

export const cancelBatch = declare({
  id: 'cancelBatch',
  method: 'post',
  path: '/batches/{batchId}/cancel',
  summary:
    'Cancel a batch of which nothing came back: its pieces wait for the step again, its links end, the processor is told',
  side: 'shop',
  permission: 'batch.dispatch',
  input: Seen.extend({
    reason: z
      .string()
      .trim()
      .min(5, 'Say why, for the processor and for the record.')
      .max(1000, 'Keep it under 1000 letters.'),
  }),
  response: BatchRef,
});
