import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';

/** One batch as the tideline draws it. Days are the shop's calendar days. */
export const TidelineBatch = z.object({
  id: Id,
  number: z.string(),
  stage: z.enum(STAGES),
  processorId: Id,
  pieces: z.int(),
  piecesBack: z.int(),
  /** What is in it: `41 chine angles` or `60 pieces of 5 parts`. */
  contents: z.string(),
  leavesOn: z.string().nullable(),
  dispatchedOn: z.string().nullable(),
  acknowledged: z.boolean(),
  wantedBackOn: z.string().nullable(),
  promisedOn: z.string().nullable(),
  firstPromisedOn: z.string().nullable(),
  /** Promises that were replaced or passed, oldest first. */
  brokenPromises: z.array(z.string()),
  lastBackOn: z.string().nullable(),
  receiptsOn: z.array(z.string()),
  heldSince: z.string().nullable(),
  nonconformance: z.object({ id: Id, number: z.string(), what: z.string() }).nullable(),
  /** The last question of the processor that nobody answered. */
  openQuestion: z.object({ body: z.string(), askedAt: Moment }).nullable(),
  certificatesToProve: z.int(),
  firstCertificateId: Id.nullable(),
  invoice: z
    .object({ id: Id, number: z.string().nullable(), entered: z.boolean(), approved: z.boolean() })
    .nullable(),
  /** The earliest open assembly that needs a part of it, and how many more there are. */
  assembly: z.object({ id: Id, name: z.string(), neededOn: z.string().nullable(), more: z.int() }).nullable(),
});
export type TidelineBatch = z.output<typeof TidelineBatch>;

export const TidelineLane = z.object({
  processorId: Id,
  name: z.string(),
  processes: z.array(z.string()),
  approvedTo: z.string().nullable(),
});
export type TidelineLane = z.output<typeof TidelineLane>;

/** How far one assembly is. */
export const AssemblyWait = z.object({
  id: Id,
  name: z.string(),
  neededOn: z.string().nullable(),
  needed: z.int(),
  /** Fitted already, or in stock and counted for this assembly alone. */
  ready: z.int(),
  batches: z.array(
    z.object({
      id: Id,
      number: z.string(),
      stage: z.enum(STAGES),
      pieces: z.int(),
      promisedOn: z.string().nullable(),
    }),
  ),
});
export type AssemblyWait = z.output<typeof AssemblyWait>;

export const Tideline = z.object({
  /** The shop's day and zone: what "today" is on this screen. */
  today: z.string(),
  now: Moment,
  zone: z.string(),
  latenessBasis: z.enum(['first_promise', 'latest_promise']),
  lanes: z.array(TidelineLane),
  batches: z.array(TidelineBatch),
  assemblies: z.array(AssemblyWait),
  /** Whether the shop has anything yet; the first day looks different. */
  started: z.object({ parts: z.int(), lots: z.int(), processors: z.int(), batches: z.int() }),
});
export type Tideline = z.output<typeof Tideline>;

export const getTideline = declare({
  id: 'getTideline',
  method: 'get',
  path: '/tideline',
  summary: 'Every batch not yet in stock, by processor, and what each assembly waits for',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({}),
  response: Tideline,
});

const Count = z.int().nonnegative();
export const WaitingCounts = z.object({
  total: Count,
  sections: z.object({ batches: Count, certificates: Count, invoices: Count }),
});
export type WaitingCounts = z.output<typeof WaitingCounts>;

export const getWaiting = declare({
  id: 'getWaiting',
  method: 'get',
  path: '/tideline/waiting',
  summary: 'How much waits for me, in all and by section',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({}),
  response: WaitingCounts,
});
