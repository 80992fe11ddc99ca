import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Day, Done, Id, Moment } from '@/lib/api/shapes';
import { TOKEN_SCOPES, type Permission } from '@/lib/auth/permissions';

export const ApiToken = z.object({
  id: Id,
  name: z.string(),
  /** Its first characters. */
  hint: z.string(),
  scopes: z.array(z.string()),
  expiresAt: Moment.nullable(),
  lastUsedAt: Moment.nullable(),
  revokedAt: Moment.nullable(),
  createdAt: Moment,
});
export type ApiToken = z.output<typeof ApiToken>;

export const listTokens = declare({
  id: 'listTokens',
  method: 'get',
  path: '/tokens',
  summary: 'My tokens for programs, and what a token of mine may carry',
  side: 'shop',
  permission: 'token.manage',
  input: z.object({}),
  response: z.object({ tokens: z.array(ApiToken), scopes: z.array(z.string()) }),
});

export const createToken = declare({
  id: 'createToken',
  method: 'post',
  path: '/tokens',
  summary: 'Make a token; it is shown in this answer and never again',
  side: 'shop',
  permission: 'token.manage',
  input: z.object({
    name: z
      .string()
      .trim()
      .min(1, 'Enter a name that says which program uses it.')
      .max(80, 'Use 80 characters or less.'),
    scopes: z
      .array(z.enum(TOKEN_SCOPES as [Permission, ...Permission[]]))
      .min(1, 'Choose at least one thing it may do.'),
    /** Its last day, in the shop's zone; left out: until it is revoked. */
    lastDay: Day.nullable().default(null),
  }),
  response: z.object({ id: Id, token: z.string() }),
});

export const revokeToken = declare({
  id: 'revokeToken',
  method: 'post',
  path: '/tokens/{tokenId}/revoke',
  summary: 'End a token at once',
  side: 'shop',
  permission: 'token.manage',
  input: z.object({ tokenId: Id }),
  response: Done,
});
