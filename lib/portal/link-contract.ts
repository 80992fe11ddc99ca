import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id, Moment } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { PROCESSES } from '@/lib/trade/process';

/** How it stands with a link: it opens, the shop has taken it back, its batch is over, or we never made it. */
export const LINK_STATES = ['open', 'withdrawn', 'settled', 'cancelled', 'unknown'] as const;
export type LinkState = (typeof LINK_STATES)[number];

/** What a link is for, told before anybody is signed in. */
export const LinkFace = z.object({
  state: z.enum(LINK_STATES),
  /** Null for an unknown link, and nothing but the names for one that has ended. */
  batch: z
    .object({
      id: Id,
      number: z.string(),
      orderNumber: z.string(),
      shop: z.string(),
      shopPhone: z.string().nullable(),
      zone: z.string(),
      processorId: Id,
      processor: z.string(),
      stage: z.enum(STAGES),
      process: z.enum(PROCESSES),
      specification: z.string(),
      pieces: z.int(),
      wantedBackOn: z.string().nullable(),
    })
    .nullable(),
});
export type LinkFace = z.output<typeof LinkFace>;

export const readBatchLink = declare({
  id: 'readBatchLink',
  method: 'get',
  path: '/batch-links/{token}',
  summary: 'What a mailed link is for. Reading it opens nothing and uses nothing up',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: z.string().min(1).max(200) }),
  response: LinkFace,
});

export const BatchLinkRow = z.object({
  id: Id,
  createdAt: Moment,
  firstOpenedAt: Moment.nullable(),
  withdrawnAt: Moment.nullable(),
});

export const listBatchLinks = declare({
  id: 'listBatchLinks',
  method: 'get',
  path: '/batches/{batchId}/link',
  summary: 'Links to a batch, newest first, and where the next one would be sent',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: z.object({
    links: z.array(BatchLinkRow),
    deskEmail: z.string(),
    zone: z.string(),
    ended: z.boolean(),
  }),
});

export const sendBatchLink = declare({
  id: 'sendBatchLink',
  method: 'post',
  path: '/batches/{batchId}/link',
  summary: 'Mail a new link to the processor; those that stand go on working',
  side: 'shop',
  permission: 'batch.dispatch',
  input: z.object({
    batchId: Id,
    /** Somebody else there than the desk we write to. */
    to: z.email('Enter an address, like desk@processor.com.').optional(),
  }),
  response: z.object({ sentTo: z.string() }),
});

export const withdrawBatchLinks = declare({
  id: 'withdrawBatchLinks',
  method: 'post',
  path: '/batches/{batchId}/link/withdraw',
  summary: 'End every link to a batch at once, with all sessions that they opened',
  side: 'shop',
  permission: 'batch.dispatch',
  input: z.object({ batchId: Id }),
  response: Done,
});
