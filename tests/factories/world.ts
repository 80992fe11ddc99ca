import { withTenant, type Db, type Tenant, type Tx } from '@/db/client';
import { processors, shopProcessors, shops } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import type { Role, ShopRole } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';

/** Noon of the day that every service test takes for today; nothing in the services asks a clock. */
export const TODAY = new Date('2026-06-17T12:00:00Z');

export interface World {
  db: Db;
  shopId: string;
  processorId: string;
  userId: string;
  /** Runs work in the shop as a person with the roles; commits. */
  as<T>(roles: readonly ShopRole[], work: (ctx: Ctx) => Promise<T>, now?: Date): Promise<T>;
  /** Runs work on the processor's side, as its person or (batchId given) as the link of that batch. */
  asProcessor<T>(work: (ctx: Ctx) => Promise<T>, batchId?: string, now?: Date): Promise<T>;
}

/**
 * A shop with one person and one processor, alone in the database's eyes: a fresh tenant per test.
 *
 * @param owner a connection as lotwright_owner, which row-level security does not bind.
 */
export async function makeWorld(db: Db, owner: Db): Promise<World> {
  const [shopId, processorId, userId, portalUserId] = [newId(), newId(), newId(), newId()];
  await owner.insert(shops).values({
    id: shopId,
    name: `Shop ${shopId.slice(-6)}`,
    zone: 'UTC',
    currency: 'USD',
    orderPrefix: 'TP',
    createdAt: TODAY,
  });
  await owner.insert(processors).values({
    id: processorId,
    name: `Processor ${processorId.slice(-6)}`,
    email: `desk-${processorId}@processor.test`,
    createdAt: TODAY,
  });
  await owner
    .insert(shopProcessors)
    .values({ shopId, processorId, contactEmail: `desk-${processorId}@processor.test`, createdAt: TODAY });
  await owner.insert(users).values([
    { id: userId, email: `person-${userId}@shop.test`, name: 'Test Person', createdAt: TODAY },
    {
      id: portalUserId,
      email: `person-${portalUserId}@processor.test`,
      name: 'Test Processor',
      createdAt: TODAY,
    },
  ]);
  await owner.insert(memberships).values([
    { userId, shopId, roles: ['lead', 'inspector', 'office', 'admin'], createdAt: TODAY },
    { userId: portalUserId, processorId, roles: ['processor'], createdAt: TODAY },
  ]);

  const within = <T>(tenant: Tenant, actor: Ctx['actor'], work: (ctx: Ctx) => Promise<T>, now: Date) =>
    withTenant(db, tenant, (tx: Tx) =>
      work({ tenant, actor, tx, now, requestId: newId(), address: '127.0.0.1' }),
    );

  return {
    db,
    shopId,
    processorId,
    userId,
    as: (roles, work, now = TODAY) =>
      within(
        { kind: 'shop', shopId, personId: userId },
        { kind: 'person', userId, name: 'Test Person', roles: roles as readonly Role[] },
        work,
        now,
      ),
    asProcessor: (work, batchId, now = TODAY) =>
      within(
        {
          kind: 'processor',
          processorId,
          batchId: batchId ?? null,
          personId: batchId === undefined ? portalUserId : null,
        },
        batchId === undefined
          ? { kind: 'person', userId: portalUserId, name: 'Test Processor', roles: ['processor'] }
          : { kind: 'link', linkId: newId(), name: 'Test Processor', roles: ['processor'] },
        work,
        now,
      ),
  };
}
