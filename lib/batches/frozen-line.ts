import { z } from 'zod';

import { OrderingAnswers } from '@/lib/parts/ordering-answers';

/** What a line said when it was dispatched. Later changes to part, route or lot do not reach it. */
export const FrozenLine = z.object({
  lotNumber: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  material: z.string(),
  thickness: z.string().nullable(),
  heat: z.string(),
  conditionBefore: z.string().nullable(),
  targetCondition: z.string().nullable(),
  stepNote: z.string().nullable(),
  serials: z.array(z.string()),
  /** What the order states for its step; lines frozen before this was asked have none. */
  ordering: OrderingAnswers.optional(),
});
export type FrozenLine = z.infer<typeof FrozenLine>;
