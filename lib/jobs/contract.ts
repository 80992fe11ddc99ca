import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id, Moment } from '@/lib/api/shapes';

export const FailedJob = z.object({
  id: Id,
  /** What did not happen, in words. */
  says: z.string(),
  /** The page of what it is about, where there is one. */
  about: z.string().nullable(),
  /** Given up: nothing tries again by itself. */
  isGivenUp: z.boolean(),
  attempts: z.int(),
  attemptsMeant: z.int(),
  error: z.string().nullable(),
  queuedAt: Moment,
  lastTriedAt: Moment.nullable(),
  nextAt: Moment.nullable(),
});
export type FailedJob = z.output<typeof FailedJob>;

export const listFailedJobs = declare({
  id: 'listFailedJobs',
  method: 'get',
  path: '/jobs/failed',
  summary:
    'Background work of the shop that did not succeed: what waits for its next try, and what was given up',
  side: 'shop',
  permission: 'jobs.manage',
  input: z.object({}),
  response: z.object({ jobs: z.array(FailedJob), zone: z.string() }),
});

export const retryJob = declare({
  id: 'retryJob',
  method: 'post',
  path: '/jobs/failed/{jobId}/retry',
  summary: 'Try it once more, now',
  side: 'shop',
  permission: 'jobs.manage',
  input: z.object({ jobId: Id }),
  response: Done,
});
