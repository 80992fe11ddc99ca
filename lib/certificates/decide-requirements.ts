import type { z } from 'zod';

import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';

import type { DecideRequirements } from './contract';
import { decideRequirement } from './decide-requirement';

/** What a certificate states once for several lines, written to each of them: each has its decision and its record. */
export async function decideRequirements(
  ctx: Ctx,
  { requirements, ...reading }: z.output<typeof DecideRequirements>,
) {
  authorize(ctx, 'certificate.prove');
  for (const requirement of requirements) await decideRequirement(ctx, { ...reading, ...requirement });
  return { decided: requirements.length };
}
