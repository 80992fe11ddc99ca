import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Id, Moment, PageQuery, pageOf } from '@/lib/api/shapes';

const Fields = z.record(z.string(), z.unknown()).nullable();

export const AuditEntry = z.object({
  /** Its number in the shop's chain. */
  seq: z.int(),
  at: Moment,
  actorKind: z.string(),
  actorName: z.string(),
  address: z.string().nullable(),
  action: z.string(),
  entity: z.string(),
  entityId: z.string(),
  /** What the thing is called today, where it has a number or a name. */
  called: z.string().nullable(),
  before: Fields,
  after: Fields,
  hash: z.string(),
});
export type AuditEntry = z.output<typeof AuditEntry>;

export const listAudit = declare({
  id: 'listAudit',
  method: 'get',
  path: '/audit',
  summary: 'What happened, newest first; of one thing, one kind of thing, one person or some days',
  side: 'shop',
  permission: 'audit.read',
  input: PageQuery.extend({
    entity: z.string().max(60).optional(),
    entityId: Id.optional(),
    personId: Id.optional(),
    from: Day.optional(),
    to: Day.optional(),
  }),
  response: pageOf(AuditEntry),
});

export const listAuditFilters = declare({
  id: 'listAuditFilters',
  method: 'get',
  path: '/audit/filters',
  summary: 'Kinds of things and people to look for in the trail',
  side: 'shop',
  permission: 'audit.read',
  input: z.object({}),
  response: z.object({
    zone: z.string(),
    people: z.array(z.object({ id: Id, name: z.string() })),
    entities: z.array(z.string()),
  }),
});
