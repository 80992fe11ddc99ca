import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { PageQuery } from '@/lib/api/shapes';

export const HIT_KINDS = [
  'Batch',
  'Order',
  'Part',
  'Lot',
  'Certificate',
  'Invoice',
  'Nonconformance',
] as const;
export type HitKind = (typeof HIT_KINDS)[number];

const Hit = z.object({ kind: z.enum(HIT_KINDS), number: z.string(), says: z.string(), href: z.string() });
export type Hit = z.output<typeof Hit>;

/** As much as a scanner types at once: the address in a code. */
const SearchText = z.string().trim().min(1).max(300);

export const searchNumbers = declare({
  id: 'searchNumbers',
  method: 'get',
  path: '/search',
  summary:
    'What has this number: part, lot, batch, order, certificate, invoice, nonconformance, or the code on a traveller or a label',
  side: 'shop',
  permission: 'search.use',
  input: z.object({ text: SearchText }),
  response: z.object({
    /** The first of each kind. */
    hits: z.array(Hit),
    /** Kinds of which there are more than these. */
    more: z.array(z.enum(HIT_KINDS)),
  }),
});

export const listNumbers = declare({
  id: 'listNumbers',
  method: 'get',
  path: '/search/{kind}',
  summary: 'Everything of one kind whose number begins so, in the order of the numbers',
  side: 'shop',
  permission: 'search.use',
  input: PageQuery.extend({ kind: z.enum(HIT_KINDS), text: SearchText }),
  response: z.object({ rows: z.array(Hit), next: z.string().nullable() }),
});
