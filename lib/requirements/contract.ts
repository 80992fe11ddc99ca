import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id } from '@/lib/api/shapes';
import { BatchRef, Seen } from '@/lib/batches/contract';
import { ToProve } from '@/lib/parts/to-prove';
import { PROCESSES, PRODUCT_FORMS } from '@/lib/trade/process';

const UNITS = z.enum(['inch', 'metric']).default('inch');
const typed = (longest: number) => z.string().trim().max(longest).default('');

export const proposeForStep = declare({
  id: 'proposeRequirementsForStep',
  method: 'get',
  path: '/requirements/proposed',
  summary: 'What the papers of a step should show, with limits from the tables and where each stands',
  side: 'shop',
  permission: 'part.read',
  input: z.object({
    alloy: typed(80),
    form: z.union([z.enum(PRODUCT_FORMS), z.literal('')]).default(''),
    clad: z.enum(['0', '1']).default('0'),
    /** As typed, with its unit: `0.040 in`. */
    thickness: typed(40),
    madeCondition: typed(24),
    endCondition: typed(24),
    process: z.enum(PROCESSES),
    specification: typed(80),
    specificationRevision: typed(24),
    classType: typed(120),
    conditionBefore: typed(24),
    targetCondition: typed(24),
    units: UNITS,
  }),
  response: z.object({ proposals: z.array(ToProve) }),
});
export type StepAsked = z.input<(typeof proposeForStep)['input']>;

export const proposeForBatch = declare({
  id: 'proposeRequirementsForBatch',
  method: 'get',
  path: '/batches/{batchId}/requirements/proposed',
  summary: 'What each line of a batch does not ask for yet and the tables would',
  side: 'shop',
  permission: 'batch.read',
  input: z.object({ batchId: Id, units: UNITS }),
  response: z.object({
    lines: z.array(z.object({ lineId: Id, lineNo: z.int(), proposals: z.array(ToProve) })),
  }),
});

export const addRequirements = declare({
  id: 'addRequirements',
  method: 'post',
  path: '/batches/{batchId}/requirements',
  summary: 'Ask more of lines; what they ask already stands',
  side: 'shop',
  permission: 'batch.build',
  input: Seen.extend({
    lines: z
      .array(z.object({ lineId: Id, requirements: z.array(ToProve).min(1).max(60) }))
      .min(1)
      .max(500),
  }),
  response: BatchRef,
});
