import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';

import { TableReferenceShape } from '@/lib/reference/table-reference';

import { CHECK_LEVELS, WAYS_OUT } from './finding';
import { BatchRef, Seen } from './contract';

const Finding = z.object({
  code: z.string(),
  level: z.enum(CHECK_LEVELS),
  subject: z.string(),
  sentence: z.string(),
  rest: z.string(),
  source: z.string().optional(),
  /** The tables and editions it was found by. */
  readFrom: z.array(TableReferenceShape).optional(),
  waysOut: z.array(
    z.object({ way: z.enum(WAYS_OUT), says: z.string(), lineId: Id.optional(), partId: Id.optional() }),
  ),
  /** Who let it pass, and why; null where nobody did. */
  passed: z.object({ overrideId: Id, reason: z.string(), by: z.string(), at: Moment }).nullable(),
});

export const getBatchChecks = declare({
  id: 'getBatchChecks',
  method: 'get',
  path: '/batches/{batchId}/checks',
  summary: 'What stops a batch from leaving, what warns, what is good to know, and what is met',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: z.object({ findings: z.array(Finding), met: z.array(z.string()) }),
});
export type BatchFinding = z.output<typeof Finding>;

/** Short reasons say nothing to whoever asks in five years. */
const Reason = z
  .string()
  .trim()
  .min(20, 'Say why in 20 letters or more; it prints on the traveller.')
  .max(1000, 'Keep it under 1000 letters.');

export const overrideCheck = declare({
  id: 'overrideCheck',
  method: 'post',
  path: '/batches/{batchId}/overrides',
  summary: 'Let a blocker pass, with a reason that stays on the record and prints on the traveller',
  side: 'shop',
  permission: 'batch.override',
  input: Seen.extend({ check: z.string().min(1).max(60), subject: z.string().max(60), reason: Reason }),
  response: BatchRef,
});

export const withdrawOverride = declare({
  id: 'withdrawOverride',
  method: 'delete',
  path: '/batches/{batchId}/overrides/{overrideId}',
  summary: 'Take an override back while the batch is still here',
  side: 'shop',
  permission: 'batch.override',
  input: Seen.extend({ overrideId: Id }),
  response: BatchRef,
});
