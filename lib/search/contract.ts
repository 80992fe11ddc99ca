import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';

export const HIT_KINDS = [
  'Batch',
  'Order',
  'Part',
  'Lot',
  'Certificate',
  'Invoice',
  'Nonconformance',
] as const;

export const searchNumbers = declare({
  id: 'searchNumbers',
  method: 'get',
  path: '/search',
  summary:
    'What has this number: part, lot, batch, order, certificate, invoice, nonconformance, or the code on a traveller or a label',
  side: 'shop',
  permission: 'search.use',
  input: z.object({ text: z.string().trim().min(1).max(300) }),
  response: z.object({
    hits: z.array(
      z.object({ kind: z.enum(HIT_KINDS), number: z.string(), says: z.string(), href: z.string() }),
    ),
  }),
});
