import { z } from 'zod';

import { TableReferenceShape } from '@/lib/reference/table-reference';

import { limitWords } from './limit-words';

/** Where a requirement comes from. */
export const REQUIREMENT_SOURCES = ['drawing', 'specification', 'shop'] as const;

/** One thing that must be proved: a characteristic, its limit in words or figures, and where it comes from. */
export const ToProve = z.object({
  characteristic: z.string().trim().min(1, 'Name what must be proved.').max(120),
  /** As written on the order: `30 to 35`, `15 or less`, `of this load`. */
  limit: z.string().trim().max(200).default(''),
  unit: z.string().trim().max(24).default(''),
  source: z.enum(REQUIREMENT_SOURCES).default('specification'),
  sourceText: z.string().trim().max(200).default(''),
  /** The table and edition that proposed it, with the limit it gave; none where a person wrote it. */
  readFrom: TableReferenceShape.extend({ gave: z.string().max(250) }).nullish(),
});
export type ToProve = z.infer<typeof ToProve>;

/** As it is kept: a limit that was typed over was not read from the table any more. */
export const asRead = (one: ToProve): ToProve => ({
  ...one,
  readFrom: one.readFrom?.gave === limitWords(one) ? one.readFrom : null,
});
