import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id, Moment } from '@/lib/api/shapes';
import { SHOP_ROLES } from '@/lib/auth/roles';

import { Email, PersonName } from './account-contract';

const Roles = z
  .array(z.enum(SHOP_ROLES))
  .min(1, 'Choose at least one role.')
  .transform((roles) => SHOP_ROLES.filter((role) => roles.includes(role)));

export const TeamMember = z.object({
  personId: Id,
  name: z.string(),
  email: z.string(),
  roles: z.array(z.string()),
  active: z.boolean(),
  isMe: z.boolean(),
  version: z.int(),
  since: Moment,
});
export type TeamMember = z.output<typeof TeamMember>;

export const PendingInvitation = z.object({
  invitationId: Id,
  name: z.string(),
  email: z.string(),
  roles: z.array(z.string()),
  expiresAt: Moment,
  isExpired: z.boolean(),
});
export type PendingInvitation = z.output<typeof PendingInvitation>;

export const listPeople = declare({
  id: 'listPeople',
  method: 'get',
  path: '/people',
  summary: 'People of the shop and invitations that were not yet accepted',
  side: 'shop',
  permission: 'people.manage',
  input: z.object({}),
  response: z.object({ people: z.array(TeamMember), invitations: z.array(PendingInvitation) }),
});

export const invitePerson = declare({
  id: 'invitePerson',
  method: 'post',
  path: '/people/invitations',
  summary: 'Invite somebody to the shop by mail',
  side: 'shop',
  permission: 'people.manage',
  input: z.object({ email: Email, name: PersonName, roles: Roles }),
  response: z.object({ invitationId: Id }),
});

export const renewInvitation = declare({
  id: 'renewInvitation',
  method: 'post',
  path: '/people/invitations/{invitationId}/renew',
  summary: 'Mail an invitation once more; the link sent before ends',
  side: 'shop',
  permission: 'people.manage',
  input: z.object({ invitationId: Id }),
  response: Done,
});

export const withdrawInvitation = declare({
  id: 'withdrawInvitation',
  method: 'post',
  path: '/people/invitations/{invitationId}/withdraw',
  summary: 'Withdraw an invitation; its link ends',
  side: 'shop',
  permission: 'people.manage',
  input: z.object({ invitationId: Id }),
  response: Done,
});

export const changeRoles = declare({
  id: 'changeRoles',
  method: 'post',
  path: '/people/{personId}/roles',
  summary: 'Change what a person may do in the shop; takes effect with their next request',
  side: 'shop',
  permission: 'people.manage',
  input: z.object({ personId: Id, roles: Roles, version: z.int() }),
  response: z.object({ version: z.int() }),
});

export const setPersonActive = declare({
  id: 'setPersonActive',
  method: 'post',
  path: '/people/{personId}/active',
  summary: "Close or open a person's way into the shop; what they did stays",
  side: 'shop',
  permission: 'people.manage',
  input: z.object({ personId: Id, active: z.boolean(), version: z.int() }),
  response: z.object({ version: z.int() }),
});

export const Colleague = z.object({
  personId: Id,
  name: z.string(),
  email: z.string(),
  active: z.boolean(),
  isMe: z.boolean(),
});
export type Colleague = z.output<typeof Colleague>;

export const listColleagues = declare({
  id: 'listColleagues',
  method: 'get',
  path: '/portal/people',
  summary: 'People of the processor; each sees the batches of all its customers',
  side: 'portal',
  permission: 'portal.account',
  input: z.object({}),
  response: z.object({ people: z.array(Colleague) }),
});

export const inviteColleague = declare({
  id: 'inviteColleague',
  method: 'post',
  path: '/portal/people/invitations',
  summary: 'Invite a colleague to the processor’s side by mail',
  side: 'portal',
  permission: 'portal.account',
  input: z.object({ email: Email, name: PersonName }),
  response: Done,
});

export const setColleagueActive = declare({
  id: 'setColleagueActive',
  method: 'post',
  path: '/portal/people/{personId}/active',
  summary: 'Close or open a colleague’s way to the processor’s side',
  side: 'portal',
  permission: 'portal.account',
  input: z.object({ personId: Id, active: z.boolean() }),
  response: Done,
});
