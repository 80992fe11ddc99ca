import { z } from 'zod';

/** One thing that a document states, and where. */
export const Fact = z.object({
  /** As in the document's own shape; of a line or a cycle with its index, `lines[0].part_number`. */
  field: z.string(),
  value: z.union([z.string(), z.number(), z.boolean()]).nullable(),
  unit: z.string().optional(),
  /** The words as they stand on the page. */
  raw: z.string(),
  /** From 1. */
  page: z.int().min(1),
  /** Left, top, right, bottom in points from the upper left corner of the page turned upright. */
  box: z.tuple([z.number(), z.number(), z.number(), z.number()]),
  /** Calibrated: of the facts given 0.9, nine in ten are right. */
  confidence: z.number().min(0).max(1),
});
export type Fact = z.output<typeof Fact>;
