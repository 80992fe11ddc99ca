import { z } from 'zod';

/** Which table, in which edition, something was read from; `entry` where it is the shop's own. Kept with what was made of it. */
export const TableReferenceShape = z.object({
  table: z.string().max(60),
  edition: z.string().max(400),
  entry: z.uuid().exactOptional(),
});
