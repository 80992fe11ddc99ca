import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Done, Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { MessageBody, NewMessage, Thread } from '@/lib/messages/contract';
import { REQUIREMENT_SOURCES } from '@/lib/parts/to-prove';

export const PAPER_KINDS = ['certificate', 'chart', 'invoice'] as const;
export type PaperKind = (typeof PAPER_KINDS)[number];

const Count = z
  .int('Enter a whole number of pieces.')
  .min(0, 'Enter 0 or more.')
  .max(1_000_000, 'Enter 1,000,000 or less.');

/** How many of a line; where its pieces are named, which. */
export const LineCount = z.object({
  lineId: Id,
  pieces: Count,
  serials: z.array(z.string().max(120)).max(10_000).optional(),
});
export type LineCount = z.output<typeof LineCount>;

export const PortalLine = z.object({
  id: Id,
  lineNo: z.int(),
  part: z.string(),
  name: z.string(),
  material: z.string(),
  lotNumber: z.string(),
  conditionBefore: z.string().nullable(),
  targetCondition: z.string().nullable(),
  note: z.string().nullable(),
  loadNo: z.int().nullable(),
  serials: z.array(z.string()),
  pieces: z.int(),
  /** Not yet acknowledged, at the processor, shipped back: where the pieces are as both sides have said. */
  onTheWay: z.int(),
  here: z.int(),
  onTheWayBack: z.int(),
});
export type PortalLine = z.output<typeof PortalLine>;

export const PortalPaper = z.object({
  id: Id,
  kind: z.enum(PAPER_KINDS),
  file: z.object({ id: Id, name: z.string(), size: z.int(), mediaType: z.string() }).nullable(),
  number: z.string().nullable(),
  sentBy: z.string(),
  sentAt: Moment,
  state: z.enum(['waiting', 'accepted', 'set_aside', 'refused', 'approved', 'paid', 'kept']),
  /** For how many pieces a certificate was accepted. */
  acceptedPieces: z.int().nullable(),
  /** Why it was set aside or refused. */
  reason: z.string().nullable(),
});
export type PortalPaper = z.output<typeof PortalPaper>;

export const PortalBatch = z.object({
  id: Id,
  number: z.string(),
  orderNumber: z.string(),
  stage: z.enum(STAGES),
  shop: z.object({ id: Id, name: z.string(), phone: z.string().nullable(), zone: z.string() }),
  /** Who sent it: whom to ask for on the telephone. */
  contactName: z.string().nullable(),
  processor: z.string(),
  asked: z.string(),
  specification: z.string(),
  note: z.string().nullable(),
  dispatchedAt: Moment,
  cancelledAt: Moment.nullable(),
  wantedBackOn: z.string().nullable(),
  acknowledgedAt: Moment.nullable(),
  acknowledgedPieces: z.int().nullable(),
  promisedOn: z.string().nullable(),
  markedDoneAt: Moment.nullable(),
  shippedAt: Moment.nullable(),
  shippedNote: z.string().nullable(),
  pieces: z.int(),
  piecesBack: z.int(),
  lastBackAt: Moment.nullable(),
  lines: z.array(PortalLine),
  requirements: z.array(
    z.object({
      id: Id,
      lineNo: z.int().nullable(),
      characteristic: z.string(),
      limit: z.string(),
      unit: z.string(),
      source: z.enum(REQUIREMENT_SOURCES),
      sourceText: z.string(),
    }),
  ),
  /** Newest version of each first. */
  documents: z.array(
    z.object({
      id: Id,
      kind: z.enum(['traveller', 'purchase_order']),
      documentVersion: z.int(),
      statedAt: Moment,
      changes: z.array(z.string()),
      fileId: Id.nullable(),
    }),
  ),
  promises: z.array(
    z.object({ promisedOn: z.string(), note: z.string().nullable(), madeBy: z.string(), madeAt: Moment }),
  ),
  papers: z.array(PortalPaper),
});
export type PortalBatch = z.output<typeof PortalBatch>;

const side = 'portal' as const;
const OfBatch = z.object({ batchId: Id });
const answer = { side, permission: 'portal.answer', method: 'post' } as const;

export const getPortalBatch = declare({
  id: 'getPortalBatch',
  method: 'get',
  path: '/portal/batches/{batchId}',
  summary: 'One batch as its processor sees it',
  side,
  permission: 'portal.read',
  input: OfBatch,
  response: PortalBatch,
});

export const PortalRow = z.object({
  id: Id,
  number: z.string(),
  stage: z.enum(STAGES),
  shopId: Id,
  shop: z.string(),
  pieces: z.int(),
  piecesBack: z.int(),
  /** Part names of the lines, each once. */
  parts: z.array(z.string()),
  materials: z.array(z.string()),
  thicknesses: z.array(z.string()),
  asked: z.string(),
  dispatchedAt: Moment,
  acknowledgedAt: Moment.nullable(),
  wantedBackOn: z.string().nullable(),
  promisedOn: z.string().nullable(),
  markedDoneAt: Moment.nullable(),
  shippedAt: Moment.nullable(),
  lastBackAt: Moment.nullable(),
  certificates: z.int(),
  invoices: z.int(),
  /** The shop asked and was not answered. */
  asksMe: z.boolean(),
  /** The shop answered last. */
  answered: z.boolean(),
});
export type PortalRow = z.output<typeof PortalRow>;

export const listPortalBatches = declare({
  id: 'listPortalBatches',
  method: 'get',
  path: '/portal/batches',
  summary: 'The work of a processor for all its shops; open by default, newest first',
  side,
  permission: 'portal.read',
  // A work list is read whole; hardly any processor has more than one page of it.
  input: PageQuery.extend({
    limit: z.coerce.number().int().min(1).max(200).default(200),
    shopId: Id.optional(),
    show: z.enum(['open', 'finished']).default('open'),
  }),
  response: pageOf(PortalRow).extend({ zone: z.string(), processor: z.string() }),
});

export const acknowledgeBatch = declare({
  ...answer,
  id: 'acknowledgeBatch',
  path: '/portal/batches/{batchId}/acknowledge',
  summary: 'Say how many pieces have come, and when they will be done',
  input: OfBatch.extend({
    /** Left out: all that are on the way. Lines that are left out count as none. */
    counts: z.array(LineCount).max(500).optional(),
    promisedOn: Day.nullable().default(null),
    note: z.string().trim().max(500, 'Write 500 characters or less.').default(''),
  }),
  response: z.object({ acknowledgedPieces: z.int(), missing: z.int() }),
});

export const promiseDay = declare({
  ...answer,
  id: 'promiseDay',
  path: '/portal/batches/{batchId}/promises',
  summary: 'Promise a day, or a new one',
  input: OfBatch.extend({
    promisedOn: Day,
    note: z.string().trim().max(500, 'Write 500 characters or less.').default(''),
  }),
  response: Done,
});

export const markDone = declare({
  ...answer,
  id: 'markDone',
  path: '/portal/batches/{batchId}/done',
  summary: 'Say that the work is done, or take that back',
  input: OfBatch.extend({ done: z.boolean().default(true) }),
  response: Done,
});

export const shipBatch = declare({
  ...answer,
  id: 'shipBatch',
  path: '/portal/batches/{batchId}/shipped',
  summary: 'Say that pieces are on their way back',
  input: OfBatch.extend({
    /** Left out: all that are here. */
    counts: z.array(LineCount).max(500).optional(),
    note: z.string().trim().max(300, 'Write 300 characters or less.').default(''),
  }),
  response: z.object({ shipped: z.int() }),
});

export const reportTrouble = declare({
  ...answer,
  id: 'reportTrouble',
  path: '/portal/batches/{batchId}/trouble',
  summary: 'Report that something is wrong; the shop is told at once',
  input: OfBatch.extend({ body: MessageBody, lineId: Id.nullable().default(null) }),
  response: z.object({ id: Id }),
});

export const listPortalMessages = declare({
  id: 'listPortalMessages',
  method: 'get',
  path: '/portal/batches/{batchId}/messages',
  summary: 'What shop and processor have said about a batch',
  side,
  permission: 'portal.read',
  input: OfBatch,
  response: Thread,
});

export const writeToShop = declare({
  ...answer,
  id: 'writeToShop',
  path: '/portal/batches/{batchId}/messages',
  summary: 'Ask the shop, answer it, or leave a note; it goes out as a mail too',
  input: NewMessage,
  response: z.object({ id: Id }),
});

export const sendPaper = declare({
  ...answer,
  id: 'sendPaper',
  path: '/portal/batches/{batchId}/papers',
  summary: 'Hand in an uploaded certificate, chart or invoice',
  input: OfBatch.extend({ kind: z.enum(PAPER_KINDS), fileId: Id }),
  response: z.object({ id: Id }),
});
