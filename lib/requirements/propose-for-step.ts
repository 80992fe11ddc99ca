import type { z } from 'zod';

import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import type { CheckedPart, CheckedStep } from '@/lib/batches/check';
import { typedSizes } from '@/lib/parts/computed-mass';
import { tablesOf } from '@/lib/reference/tables-of';

import type { proposeForStep as declaration } from './contract';
import { proposeRequirements } from './propose-requirements';

/** What a step that is being typed should have proved. */
export async function proposeForStep(ctx: Ctx, asked: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'part.read');
  const orNull = (text: string) => (text === '' ? null : text);
  const step: CheckedStep = {
    id: '',
    process: asked.process,
    specification: asked.specification,
    specificationRevision: orNull(asked.specificationRevision),
    classType: orNull(asked.classType),
    conditionBefore: orNull(asked.conditionBefore),
    targetCondition: orNull(asked.targetCondition),
    ordering: {},
  };
  const { alloy, form, madeCondition, endCondition, thickness, units } = asked;
  const part: CheckedPart = {
    ...{ id: '', alloy, form, clad: asked.clad === '1', madeCondition, endCondition },
    ...typedSizes({ length: '', width: '', height: '', thickness }),
    ...{ thickness: orNull(thickness), massG: null, areaMm2: null, sizeWords: null, route: [step] },
  };
  const line = { id: '', stepId: '', part, step, ordering: {}, pieces: null, units, load: null };
  return { proposals: proposeRequirements(await tablesOf(ctx), line) };
}
