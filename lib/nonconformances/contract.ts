import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment, PageQuery, pageOf, Pieces } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';

import { DISPOSITIONS } from './disposition';
import { NONCONFORMANCE_KINDS, RAISED_KINDS } from './kind';

const Words = (name: string, most: number) =>
  z.string().trim().max(most, `${name}: write ${most} characters or less.`);

export const NonconformanceRow = z.object({
  id: Id,
  number: z.string(),
  kind: z.enum(NONCONFORMANCE_KINDS),
  what: z.string(),
  pieces: z.int(),
  decided: z.int(),
  batchId: Id,
  batchNumber: z.string(),
  stage: z.enum(STAGES),
  processor: z.string(),
  lineNo: z.int(),
  partNumber: z.string(),
  partName: z.string(),
  lotNumber: z.string(),
  openedBy: z.string(),
  openedAt: Moment,
  closedAt: Moment.nullable(),
});
export type NonconformanceRow = z.output<typeof NonconformanceRow>;

export const listNonconformances = declare({
  id: 'listNonconformances',
  method: 'get',
  path: '/nonconformances',
  summary: 'Nonconformances, open ones first, then newest first',
  side: 'shop',
  permission: 'nonconformance.read',
  input: PageQuery.extend({ batchId: Id.optional() }),
  response: pageOf(NonconformanceRow),
});

export const DispositionRow = z.object({
  id: Id,
  disposition: z.enum(DISPOSITIONS),
  pieces: z.int(),
  reason: z.string(),
  authority: z.string().nullable(),
  file: z.object({ id: Id, name: z.string() }).nullable(),
  decidedBy: z.string(),
  decidedAt: Moment,
});
export type DispositionRow = z.output<typeof DispositionRow>;

export const NonconformanceDetail = NonconformanceRow.extend({
  version: z.int(),
  orderNumber: z.string(),
  lineId: Id,
  partRevision: z.string(),
  linePieces: z.int(),
  serialised: z.boolean(),
  /** Pieces that the ledger has on hold for it now. */
  onHold: z.int(),
  /** Pieces of the line that are still away: what a short count can be written off from. */
  away: z.int(),
  coveredPieces: z.int(),
  requirement: z
    .object({
      characteristic: z.string(),
      limit: z.string(),
      unit: z.string(),
      stated: z.string().nullable(),
    })
    .nullable(),
  certificate: z.object({ id: Id, number: z.string().nullable() }).nullable(),
  /** How often pieces of this lot were already sent through this step again. */
  reprocessedBefore: z.int(),
  /** Where the lot is serialised: the pieces a disposition can name. */
  heldPieces: z.array(z.object({ id: Id, serial: z.string() })),
  dispositions: z.array(DispositionRow),
});
export type NonconformanceDetail = z.output<typeof NonconformanceDetail>;

export const getNonconformance = declare({
  id: 'getNonconformance',
  method: 'get',
  path: '/nonconformances/{nonconformanceId}',
  summary: 'One nonconformance with what was decided about its pieces',
  side: 'shop',
  permission: 'nonconformance.read',
  input: z.object({ nonconformanceId: Id }),
  response: NonconformanceDetail,
});

/** What may be raised on: the lines of a batch with pieces in quarantine. */
export const RaisableLine = z.object({
  lineId: Id,
  lineNo: z.int(),
  partNumber: z.string(),
  partRevision: z.string(),
  lotNumber: z.string(),
  serialised: z.boolean(),
  inQuarantine: z.int(),
  pieces: z.array(z.object({ id: Id, serial: z.string() })),
});
export type RaisableLine = z.output<typeof RaisableLine>;

export const getRaisable = declare({
  id: 'getRaisable',
  method: 'get',
  path: '/nonconformances/batches/{batchId}',
  summary: 'Lines of a batch with pieces in quarantine, which a nonconformance can hold',
  side: 'shop',
  permission: 'nonconformance.read',
  input: z.object({ batchId: Id }),
  response: z.object({ lines: z.array(RaisableLine) }),
});

export const RaiseNonconformance = z.object({
  batchId: Id,
  lineId: Id,
  kind: z.enum(RAISED_KINDS),
  pieces: Pieces,
  what: Words('What is wrong', 500).min(1, 'Say what is wrong.'),
  requirementId: Id.nullable().default(null),
  certificateId: Id.nullable().default(null),
  /** The named pieces, where the lot is serialised. */
  pieceIds: z.array(Id).max(10_000).default([]),
});

export const raiseNonconformance = declare({
  id: 'raiseNonconformance',
  method: 'post',
  path: '/nonconformances',
  summary: 'Put pieces in quarantine on hold, and say why',
  side: 'shop',
  permission: 'nonconformance.raise',
  input: RaiseNonconformance,
  response: z.object({ id: Id, number: z.string() }),
});

export const DisposeNonconformance = z.object({
  nonconformanceId: Id,
  version: z.int(),
  disposition: z.enum(DISPOSITIONS),
  pieces: Pieces,
  reason: Words('Reason', 500).min(1, 'Say why.'),
  authority: Words('Authority', 200).default(''),
  fileId: Id.nullable().default(null),
  pieceIds: z.array(Id).max(10_000).default([]),
});

export const disposeNonconformance = declare({
  id: 'disposeNonconformance',
  method: 'post',
  path: '/nonconformances/{nonconformanceId}/dispositions',
  summary: 'Decide about pieces of a nonconformance: use as is, reprocess, return, scrap, concession',
  side: 'shop',
  permission: 'nonconformance.disposition',
  input: DisposeNonconformance,
  response: z.object({ id: Id, left: z.int(), closed: z.boolean() }),
});
