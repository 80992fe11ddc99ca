import { withTenant, type Db } from '@/db/client';
import { NOBODY } from '@/lib/auth/identify';
import type { Actor, Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';

import { TODAY } from '../../factories/world';

/** Runs work as `serve` does for what is done at the door: by nobody, or by a person about their own account. */
export const atTheDoor = <T>(
  db: Db,
  work: (ctx: Ctx) => Promise<T>,
  given: { actor?: Actor; now?: Date } = {},
): Promise<T> =>
  withTenant(db, { kind: 'door' }, (tx) =>
    work({
      tenant: { kind: 'door' },
      actor: given.actor ?? NOBODY.actor,
      tx,
      now: given.now ?? TODAY,
      requestId: newId(),
      address: '192.0.2.7',
    }),
  );

export const personActor = (userId: string): Actor => ({
  kind: 'person',
  userId,
  name: 'Test Person',
  roles: ['lead'],
});
