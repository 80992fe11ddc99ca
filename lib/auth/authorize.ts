import { AppError } from '@/lib/errors';

import type { Actor, Ctx } from './context';
import { PERMISSIONS, type Permission } from './permissions';

/**
 * May this actor do this? First line of every verb and query. Whose rows it then sees is the database's question.
 * Jobs act for what a permitted person caused and pass.
 *
 * @throws AppError `not_signed_in` for nobody, `not_allowed` for the wrong role or a token without the scope.
 */
export function authorize(ctx: Pick<Ctx, 'actor'>, permission: Permission): void {
  if (isAllowed(ctx.actor, permission)) return;
  if (ctx.actor.kind === 'nobody') throw new AppError('not_signed_in', 'Sign in first.');
  throw new AppError('not_allowed', 'Your roles in this shop do not allow this. An admin can change them.');
}

export function isAllowed(actor: Actor, permission: Permission): boolean {
  if (actor.kind === 'job') return true;
  const allowed: readonly string[] | 'everyone' = PERMISSIONS[permission];
  if (allowed === 'everyone') return true;
  if (actor.kind === 'token' && !actor.scopes.includes(permission)) return false;
  return actor.roles.some((role) => allowed.includes(role));
}
