import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Done, Id } from '@/lib/api/shapes';

/** Long beats odd: length is what makes a password hard to guess. */
export const NewPassword = z
  .string()
  .min(12, 'Use 12 characters or more.')
  .max(200, 'Use 200 characters or less.');

export const PersonName = z.string().trim().min(1, 'Enter a name.').max(120, 'Use 120 characters or less.');
export const Email = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email('Enter an e-mail address, as name@shop.example.').max(254));
const Token = z.string().min(20).max(200);

export const Account = z.object({
  name: z.string(),
  email: z.string(),
  units: z.enum(['inch', 'metric']),
  singleKeys: z.boolean(),
  hasPassword: z.boolean(),
  organisations: z.array(
    z.object({
      membershipId: Id,
      id: Id,
      kind: z.enum(['shop', 'processor']),
      name: z.string(),
      roles: z.array(z.string()),
    }),
  ),
});
export type Account = z.output<typeof Account>;

/*
 * One's own account is kept at the door, beside every organisation: side `public` opens the transaction there, and
 * the permission asks for a person who is signed in.
 */

export const getAccount = declare({
  id: 'getAccount',
  method: 'get',
  path: '/session/account',
  summary: 'My name, choices and organisations',
  side: 'public',
  permission: 'self.manage',
  input: z.object({}),
  response: Account,
});

export const updateAccount = declare({
  id: 'updateAccount',
  method: 'patch',
  path: '/session/account',
  summary: 'Change my name, units and single keys',
  side: 'public',
  permission: 'self.manage',
  input: z.object({
    name: PersonName.optional(),
    units: z.enum(['inch', 'metric']).optional(),
    singleKeys: z.boolean().optional(),
  }),
  response: Done,
});

export const changePassword = declare({
  id: 'changePassword',
  method: 'post',
  path: '/session/password',
  summary: 'Choose another password; every session of mine ends',
  side: 'public',
  permission: 'self.manage',
  input: z.object({ current: z.string().max(200).default(''), password: NewPassword }),
  response: z.object({ email: z.string() }),
});

export const endMySessions = declare({
  id: 'endMySessions',
  method: 'post',
  path: '/session/end-everywhere',
  summary: 'Sign out on every device',
  side: 'public',
  permission: 'self.manage',
  input: z.object({}),
  response: Done,
});

const Mailed = z.object({ email: Email, next: z.string().max(500).optional() });

export const requestSignInLink = declare({
  id: 'requestSignInLink',
  method: 'post',
  path: '/session/links',
  summary: 'Mail a link that signs in once; the answer is the same whether there is such an account or not',
  side: 'public',
  permission: 'public.use',
  input: Mailed,
  response: Done,
});

export const requestReset = declare({
  id: 'requestReset',
  method: 'post',
  path: '/session/resets',
  summary:
    'Mail a link to choose another password; the answer is the same whether there is such an account or not',
  side: 'public',
  permission: 'public.use',
  input: Mailed.pick({ email: true }),
  response: Done,
});

export const readMailedLink = declare({
  id: 'readMailedLink',
  method: 'get',
  path: '/session/links/{token}',
  summary: 'What a mailed link is for; reading does not use it up',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token }),
  response: z.object({
    state: z.enum(['open', 'used', 'expired', 'unknown']),
    purpose: z.enum(['sign_in', 'reset']).nullable(),
    name: z.string().nullable(),
    email: z.string().nullable(),
  }),
});

export const resetPassword = declare({
  id: 'resetPassword',
  method: 'post',
  path: '/session/resets/{token}',
  summary: 'Choose another password with a mailed link, once; every session of the person ends',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token, password: NewPassword }),
  response: z.object({ email: z.string() }),
});

export const readInvitation = declare({
  id: 'readInvitation',
  method: 'get',
  path: '/session/invitations/{token}',
  summary: 'Who invites whom to what; reading does not use it up',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token }),
  response: z.object({
    state: z.enum(['open', 'accepted', 'expired', 'withdrawn', 'unknown']),
    organisation: z.string().nullable(),
    name: z.string().nullable(),
    email: z.string().nullable(),
    roles: z.array(z.string()),
    /** The e-mail has an account already: accepting only adds the organisation to it. */
    hasAccount: z.boolean(),
  }),
});

export const acceptInvitation = declare({
  id: 'acceptInvitation',
  method: 'post',
  path: '/session/invitations/{token}',
  summary:
    'Accept an invitation, once: set a name and a password, or add the organisation to the account there is',
  side: 'public',
  permission: 'public.use',
  input: z.object({ token: Token, name: PersonName.optional(), password: NewPassword.optional() }),
  response: z.object({ email: z.string(), hadAccount: z.boolean() }),
});
