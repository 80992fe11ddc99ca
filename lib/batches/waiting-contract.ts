import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';
import { PROCESSES } from '@/lib/trade/process';

import { Computed } from './contract';

const Step = z.object({
  process: z.enum(PROCESSES),
  specification: z.string(),
  specificationRevision: z.string().nullable(),
  classType: z.string().nullable(),
});

export const WaitingStep = Step.extend({ lots: z.int(), pieces: z.int(), since: Moment });
export type WaitingStep = z.output<typeof WaitingStep>;

export const listWaitingSteps = declare({
  id: 'listWaitingSteps',
  method: 'get',
  path: '/batches/waiting-steps',
  summary: 'Steps that pieces wait for, most pieces first',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({}),
  response: z.object({ steps: z.array(WaitingStep) }),
});

export const WaitingLot = z.object({
  lotId: Id,
  stepId: Id,
  lotNumber: z.string(),
  partId: Id,
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  partSuperseded: z.boolean(),
  material: z.string(),
  thickness: z.string().nullable(),
  conditionBefore: z.string().nullable(),
  targetCondition: z.string().nullable(),
  pieces: z.int(),
  serialised: z.boolean(),
  massG: z.number().nullable(),
  computed: Computed.nullable(),
  madeOn: Moment,
  /** Beside a batch: the furnace load of its plan that the lot could join. Null where none is planned or asked for. */
  load: z.object({ number: z.int().nullable(), says: z.string() }).nullable(),
});
export type WaitingLot = z.output<typeof WaitingLot>;

/** Left out of a query, a part of the step means that the step has none. */
const AskedStep = z.object({
  process: z.enum(PROCESSES),
  specification: z.string().min(1).max(120),
  specificationRevision: z.string().max(40).optional(),
  classType: z.string().max(120).optional(),
});
export type AskedStep = z.output<typeof AskedStep>;

export const listWaitingLots = declare({
  id: 'listWaitingLots',
  method: 'get',
  path: '/batches/waiting-lots',
  summary: 'Lots whose pieces wait for one step, oldest first; without those that a batch already has',
  side: 'shop',
  permission: 'batch.read',
  input: PageQuery.extend(AskedStep.shape).extend({ besideBatchId: Id.optional() }),
  response: pageOf(WaitingLot),
});

export const StepProcessor = z.object({
  processorId: Id,
  name: z.string(),
  /** Approved for the step today; others say why not. */
  approved: z.boolean(),
  says: z.string(),
  approvalEndsOn: z.string().nullable(),
});
export type StepProcessor = z.output<typeof StepProcessor>;

export const listStepProcessors = declare({
  id: 'listStepProcessors',
  method: 'get',
  path: '/batches/step-processors',
  summary: 'Processors for a step: the approved first, the others with the reason why not',
  side: 'shop',
  permission: 'batch.read',
  input: AskedStep.pick({ process: true, specification: true }),
  response: z.object({ processors: z.array(StepProcessor) }),
});
