import type { Tenant, Tx } from '@/db/client';

import type { Role } from './roles';

/** Who does it. Every caller of the product has a kind and a name in the audit trail. */
export type Actor =
  | { kind: 'person'; userId: string; name: string; roles: readonly Role[] }
  /** A program with a person's token: the person's roles, narrowed to the token's scopes. */
  | {
      kind: 'token';
      tokenId: string;
      userId: string;
      name: string;
      roles: readonly Role[];
      scopes: readonly string[];
    }
  /** Whoever opened the link in a dispatch mail: the processor, for that batch. */
  | { kind: 'link'; linkId: string; name: string; roles: readonly ['processor'] }
  | { kind: 'job'; name: string; roles: readonly [] }
  | { kind: 'nobody'; name: string; roles: readonly [] };

/**
 * What every verb and query works with. Made by `serve`, by the prefetch of a page and by the worker, nowhere else.
 */
export interface Ctx {
  tenant: Tenant;
  actor: Actor;
  tx: Tx;
  /** The time of the request; nothing below asks a clock. */
  now: Date;
  requestId: string;
  address: string | null;
}

/** The shop this context is opened for. Verbs of the shop's side call it where they need the id for new rows. */
export function shopOf(ctx: Ctx): string {
  if (ctx.tenant.kind !== 'shop') throw new Error('not in a shop');
  return ctx.tenant.shopId;
}

/** The signed-in person's id, or null for links and jobs. */
export const personOf = (actor: Actor): string | null =>
  actor.kind === 'person' || actor.kind === 'token' ? actor.userId : null;
