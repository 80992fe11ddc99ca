import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Moment, PageQuery, Pieces, pageOf } from '@/lib/api/shapes';
import { PROCESSES } from '@/lib/trade/process';
import { ToProve } from '@/lib/parts/to-prove';

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
  putAsideAt: Moment.nullable(),
  /** Days past the promise that counts in this shop, while anything is away. */
  daysLate: z.int(),
});
export type BatchRow = z.output<typeof BatchRow>;

/** What every write tells: which batch, and the version to send with the next change. */
export const BatchRef = z.object({ id: Id, number: z.string(), version: z.int() });

/** The version of the batch that the person saw; an older one is refused, so that nobody's change is lost. */
export const Seen = z.object({ batchId: Id, version: z.int().min(1) });

/** More loads than that are no batch for one order. */
export const MOST_LOADS = 99;

export const Price = z
  .int('Enter an amount.')
  .min(0, 'Enter 0 or more.')
  .max(100_000_000, 'Enter 1,000,000.00 or less.');
export const Note = z.string().trim().max(2000, 'Keep it under 2000 letters.');

export const NewLine = z.object({
  lotId: Id,
  /** The step of its route that the pieces wait for. */
  stepId: Id,
  pieces: Pieces,
  unitPriceMinor: Price.default(0),
  /** The named pieces of a serialised lot; without them the first by serial are taken. */
  pieceIds: z.array(Id).max(1000).optional(),
});
export type NewLine = z.output<typeof NewLine>;

/** What the lead may set of a batch beside its lines. */
const Terms = z.object({
  leavesOn: Day.nullable(),
  wantedBackOn: Day.nullable(),
  note: Note.nullable(),
  lotMinimumMinor: Price,
  certificationFeeMinor: Price,
});

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

export const Batch = z.object({
  id: Id,
  number: z.string(),
  orderNumber: z.string(),
  version: z.int(),
  stage: z.enum(STAGES),
  processorId: Id,
  processor: z.string(),
  contactEmail: z.string(),
  process: z.enum(PROCESSES),
  /** With revision and class, in words; its parts stand in `step`. */
  specification: z.string(),
  step: z.object({
    specification: z.string(),
    specificationRevision: z.string().nullable(),
    classType: z.string().nullable(),
  }),
  note: z.string().nullable(),
  leavesOn: z.string().nullable(),
  wantedBackOn: z.string().nullable(),
  currency: z.string(),
  lotMinimumMinor: z.int(),
  certificationFeeMinor: z.int(),
  pieces: z.int(),
  piecesBack: z.int(),
  putAsideAt: Moment.nullable(),
  dispatchedAt: Moment.nullable(),
  dispatchedBy: z.string().nullable(),
  acknowledgedAt: Moment.nullable(),
  acknowledgedPieces: z.int().nullable(),
  markedDoneAt: Moment.nullable(),
  shippedAt: Moment.nullable(),
  shippedNote: z.string().nullable(),
  promisedOn: z.string().nullable(),
  firstPromisedOn: z.string().nullable(),
  lastBackAt: Moment.nullable(),
  cancelledAt: Moment.nullable(),
  cancelReason: z.string().nullable(),
  paymentWaivedAt: Moment.nullable(),
  paymentWaivedReason: z.string().nullable(),
  /** Days past the promise that counts in this shop, while anything is away. */
  daysLate: z.int(),
  zone: z.string(),
});
export type Batch = z.output<typeof Batch>;

export const getBatch = declare({
  id: 'getBatch',
  method: 'get',
  path: '/batches/{batchId}',
  summary: 'One batch: where to, which step, days, terms and where it stands',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: Batch,
});

/** Of one piece, in g and mm². */
export const Computed = z.object({ massG: z.number(), areaMm2: z.number() });

export const BatchLine = z.object({
  id: Id,
  lineNo: z.int(),
  lotId: Id,
  stepId: Id,
  partId: Id,
  lotNumber: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  material: z.string(),
  thickness: z.string().nullable(),
  heat: z.string(),
  conditionBefore: z.string().nullable(),
  targetCondition: z.string().nullable(),
  serials: z.array(z.string()),
  pieces: z.int(),
  /** Pieces of the lot that wait for the same step and could still join. */
  waiting: z.int(),
  unitPriceMinor: z.int(),
  loadNo: z.int().nullable(),
  /** Of one piece, in g and mm²; null where the part does not say. */
  massG: z.number().nullable(),
  areaMm2: z.number().nullable(),
  /** The most that one piece can have by its sizes, stock form and density; null where they say no plain shape. */
  computed: Computed.nullable(),
});
export type BatchLine = z.output<typeof BatchLine>;

export const Requirement = ToProve.extend({ id: Id, lineId: Id.nullable() });
export type Requirement = z.output<typeof Requirement>;

export const getBatchLines = declare({
  id: 'getBatchLines',
  method: 'get',
  path: '/batches/{batchId}/lines',
  summary: 'Lines of a batch and what must be proved; as frozen once it has left',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id }),
  response: z.object({ lines: z.array(BatchLine), requirements: z.array(Requirement) }),
});

export const createBatch = declare({
  id: 'createBatch',
  method: 'post',
  path: '/batches',
  summary: 'Build a batch for one processor from lots that wait for the same step',
  side: 'shop',
  permission: 'batch.build',
  input: z
    .object({ processorId: Id, lines: z.array(NewLine).min(1, 'Add at least one lot.').max(200) })
    .extend(Terms.partial().shape),
  response: BatchRef,
});
export type CreateBatchInput = z.output<(typeof createBatch)['input']>;

/** Furnace or tank load, counted from 1. */
export const LoadNo = z.int().min(1).max(MOST_LOADS);

export const addLine = declare({
  id: 'addBatchLine',
  method: 'post',
  path: '/batches/{batchId}/lines',
  summary: 'Put pieces of a lot on the batch; reserves them',
  side: 'shop',
  permission: 'batch.build',
  input: NewLine.extend({ batchId: Id }),
  response: BatchRef.extend({ lineId: Id }),
});

export const changeLine = declare({
  id: 'changeBatchLine',
  method: 'patch',
  path: '/batches/{batchId}/lines/{lineId}',
  summary: 'Change pieces, price or load of a line',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({
    lineId: Id,
    pieces: Pieces.optional(),
    unitPriceMinor: Price.optional(),
    loadNo: LoadNo.nullable().optional(),
  }),
  response: BatchRef,
});

export const removeLine = declare({
  id: 'removeBatchLine',
  method: 'delete',
  path: '/batches/{batchId}/lines/{lineId}',
  summary: 'Take a line out; its pieces wait for the step again',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({ lineId: Id }),
  response: BatchRef,
});

export const updateBatch = declare({
  id: 'updateBatch',
  method: 'patch',
  path: '/batches/{batchId}',
  summary: 'Change processor, days, prices or note of a batch that is being built',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({ processorId: Id.optional() }).extend(Terms.partial().shape),
  response: BatchRef,
});

export const setRequirements = declare({
  id: 'setRequirements',
  method: 'put',
  path: '/batches/{batchId}/requirements',
  summary: 'Say what must be proved for one line, or (line null) for the whole batch',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({ lineId: Id.nullable(), requirements: z.array(ToProve).max(60) }),
  response: BatchRef,
});

export const putBatchAside = declare({
  id: 'putBatchAside',
  method: 'post',
  path: '/batches/{batchId}/aside',
  summary: 'Put a batch aside, or take it up again',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({ aside: z.boolean() }),
  response: BatchRef,
});

export const dispatchBatch = declare({
  id: 'dispatchBatch',
  method: 'post',
  path: '/batches/{batchId}/dispatch',
  summary: 'Send the batch: freeze it, make its papers, move the pieces, write to the processor',
  side: 'shop',
  permission: 'batch.dispatch',
  input: Seen,
  response: BatchRef,
});
