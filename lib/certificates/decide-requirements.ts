import type { z } from 'zod';

import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import type { DecideRequirements } from './prove-contract';
import { decideRequirement } from './decide-requirement';

/** Several of one verdict: each has its decision and its record, and its own statement where one is given. */
export async function decideRequirements(
  ctx: Ctx,
  { requirements, ...reading }: z.output<typeof DecideRequirements>,
) {
  authorize(ctx, 'certificate.prove');
  for (const { stated, ...requirement } of requirements)
    await decideRequirement(ctx, { ...reading, ...requirement, stated: stated ?? reading.stated });
  return { decided: requirements.length };
}
