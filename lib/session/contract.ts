import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id } from '@/lib/api/shapes';
import { ROLES } from '@/lib/auth/roles';

/** Who looks at the screen and in whose name; what every page's frame needs. */
export const Me = z.object({
  name: z.string(),
  roles: z.array(z.enum(ROLES)),
  organisation: z.object({
    id: Id,
    kind: z.enum(['shop', 'processor']),
    name: z.string(),
    zone: z.string(),
    currency: z.string().nullable(),
  }),
  units: z.enum(['inch', 'metric']),
  singleKeys: z.boolean(),
  /** Set for a link: the one batch it reaches. */
  batchId: Id.nullable(),
});
export type Me = z.output<typeof Me>;

export const getMe = declare({
  id: 'getMe',
  method: 'get',
  path: '/session/me',
  summary: 'Who is signed in, for which organisation, with which roles',
  side: 'any',
  permission: 'self.manage',
  input: z.object({}),
  response: Me,
});
