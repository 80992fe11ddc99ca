import { z } from 'zod';

import { piecesField } from '@/components/ui/form-fields';

/** Some pieces of one spot: a number, or the names that are ticked. `to` is the assembly or the place they go to. */
export const SpotForm = z
  .object({
    isNamed: z.boolean(),
    pieces: z.union([z.string(), z.number()]),
    names: z.array(z.string()),
    to: z.string(),
  })
  .transform(({ isNamed, pieces, names, to }, issues) => {
    const read = isNamed ? { success: true as const, data: names.length } : piecesField().safeParse(pieces);
    if (!read.success) {
      issues.addIssue({
        code: 'custom',
        path: ['pieces'],
        message: read.error.issues[0]?.message ?? 'Enter a number.',
      });
      return z.NEVER;
    }
    if (read.data < 1)
      issues.addIssue({
        code: 'custom',
        path: ['pieces'],
        message: isNamed ? 'Tick at least one piece.' : 'Enter 1 or more.',
      });
    return { pieces: read.data, to, ...(isNamed ? { pieceIds: names } : {}) };
  });
export type SpotFormIn = z.input<typeof SpotForm>;
export type SpotFormOut = z.output<typeof SpotForm>;

/** The count as it is typed; null while it is no number. */
export function typedCount({
  isNamed,
  pieces,
  names,
}: Pick<SpotFormIn, 'isNamed' | 'pieces' | 'names'>): number | null {
  if (isNamed) return names.length;
  return /^\s*\d+\s*$/.test(String(pieces)) ? Number(pieces) : null;
}
