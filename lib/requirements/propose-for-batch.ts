import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { requirements } from '@/db/schema/batches';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { loadsAsSet } from '@/lib/batches/loads-as-set';
import { readCheckFacts } from '@/lib/batches/read-check-facts';

import type { proposeForBatch as declaration } from './contract';
import { proposeRequirements } from './propose-requirements';
import { notAskedYet } from './same-characteristic';

/** What the lines of a batch do not ask for yet: by the furnace load they lie in, or would lie in by the plan. */
export async function proposeForBatch(ctx: Ctx, { batchId, units }: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'batch.read');
  const { tables, lines } = await readCheckFacts(ctx, batchId);
  const asked = await ctx.tx
    .select({ lineId: requirements.lineId, characteristic: requirements.characteristic })
    .from(requirements)
    .where(eq(requirements.batchId, batchId));
  const loads = loadsAsSet(tables, lines);
  return {
    lines: lines.map((line) => {
      const load = loads.find((one) => one.lines.includes(line)) ?? null;
      const proposals = proposeRequirements(tables, { ...line, ordering: line.step.ordering, units, load });
      const there = asked.filter(({ lineId }) => lineId === null || lineId === line.id);
      return { lineId: line.id, lineNo: line.lineNo, proposals: notAskedYet(proposals, there) };
    }),
  };
}
