import { and, eq, sql } from 'drizzle-orm';
import fc from 'fast-check';
import { expect, test } from 'vitest';

import { balances, movements } from '@/db/schema/lots';
import { NO_HOLDER, newId } from '@/lib/ids';
import { movePieces } from '@/lib/stock/move-pieces';
import { PLACES, type Place } from '@/lib/stock/places';

import { makeLot } from '../factories/lots';
import { makeWorld, type World } from '../factories/world';
import { openDatabase } from './open-database';

const base = openDatabase();

const places: readonly Place[] = PLACES.filter((place) => place !== 'making');

async function sumOver(
  world: World,
  lotId: string,
): Promise<{ stored: number; derived: number; lowest: number }> {
  return world.as(['lead'], async ({ tx }) => {
    const [stored] = await tx
      .select({
        sum: sql<number>`coalesce(sum(pieces), 0)::int`,
        low: sql<number>`coalesce(min(pieces), 0)::int`,
      })
      .from(balances)
      .where(eq(balances.lotId, lotId));
    const [made] = await tx
      .select({ sum: sql<number>`coalesce(sum(pieces), 0)::int` })
      .from(movements)
      .where(and(eq(movements.lotId, lotId), sql`from_place is null`));
    return { stored: stored?.sum ?? 0, derived: made?.sum ?? 0, lowest: stored?.low ?? 0 };
  });
}

/** Each balance by name, once as stored and once as the sum of the movements. */
async function bothLedgers(world: World, lotId: string) {
  return world.as(['lead'], async ({ tx }) => {
    const stored = await tx
      .select({ place: balances.place, holderId: balances.holderId, pieces: balances.pieces })
      .from(balances)
      .where(and(eq(balances.lotId, lotId), sql`pieces > 0`))
      .orderBy(balances.place, balances.holderId);
    const { rows } = await tx.execute(sql`
      select place, holder as "holderId", sum(pieces)::int as pieces from (
        select to_place as place, to_holder_id as holder, pieces from movements where lot_id = ${lotId}
        union all select from_place, from_holder_id, -pieces from movements where lot_id = ${lotId} and from_place is not null) m
      group by place, holder having sum(pieces) <> 0 order by place, holder`);
    return { stored, derived: rows };
  });
}

test('whatever is moved in whatever order, pieces made are pieces in all places, and no balance is below nothing', async () => {
  const world = await makeWorld(base.db, base.owner);
  const holders = [NO_HOLDER, newId(), newId()];
  const move = fc.record({
    from: fc.constantFrom(...PLACES),
    to: fc.constantFrom(...places),
    fromHolder: fc.constantFrom(...holders),
    toHolder: fc.constantFrom(...holders),
    pieces: fc.integer({ min: 1, max: 8 }),
  });
  await fc.assert(
    fc.asyncProperty(fc.array(move, { maxLength: 25 }), async (moves) => {
      const lot = await world.as(['lead'], (ctx) => makeLot(ctx, { pieces: 12 }));
      for (const one of moves) {
        const holderId = one.from === 'making' ? lot.stepId : one.fromHolder;
        // A refused move must leave no trace; each is its own transaction, as each request is.
        await world
          .as(['lead'], (ctx) =>
            movePieces(ctx, {
              lotId: lot.id,
              pieces: one.pieces,
              from: { place: one.from, holderId },
              to: { place: one.to, holderId: one.toHolder },
              reason: 'moved',
            }),
          )
          .catch(() => undefined);
      }
      const { stored, derived, lowest } = await sumOver(world, lot.id);
      expect(stored).toBe(12);
      expect(derived).toBe(12);
      expect(lowest).toBeGreaterThanOrEqual(0);
      const ledgers = await bothLedgers(world, lot.id);
      expect(ledgers.stored).toEqual(ledgers.derived);
    }),
    { numRuns: 20 },
  );
});

test('twenty takers at once on real connections share ten pieces, none twice', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lot = await world.as(['lead'], (ctx) => makeLot(ctx, { pieces: 10 }));
  const line = newId();
  const outcomes = await Promise.allSettled(
    Array.from({ length: 20 }, () =>
      world.as(['lead'], (ctx) =>
        movePieces(ctx, {
          lotId: lot.id,
          pieces: 1,
          from: { place: 'making', holderId: lot.stepId },
          to: { place: 'packed', holderId: line },
          reason: 'packed',
        }),
      ),
    ),
  );
  expect(outcomes.filter((outcome) => outcome.status === 'fulfilled')).toHaveLength(10);
  const ledgers = await bothLedgers(world, lot.id);
  expect(ledgers.stored).toEqual([{ place: 'packed', holderId: line, pieces: 10 }]);
  expect(ledgers.derived).toEqual(ledgers.stored);
});

test('a named piece is in one place, and cannot be moved from where it is not', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lot = await world.as(['lead'], (ctx) => makeLot(ctx, { serials: ['S-1', 'S-2', 'S-3'] }));
  const line = newId();
  const pack = (pieces: number) =>
    world.as(['lead'], (ctx) =>
      movePieces(ctx, {
        lotId: lot.id,
        pieces,
        from: { place: 'making', holderId: lot.stepId },
        to: { place: 'packed', holderId: line },
        reason: 'packed',
      }),
    );
  await pack(2);
  await expect(pack(2)).rejects.toMatchObject({ code: 'conflict' });
  await world.as(['lead'], async ({ tx }) => {
    const { rows } = await tx.execute(
      sql`select serial, place from pieces where lot_id = ${lot.id} order by serial`,
    );
    expect(rows).toEqual([
      { serial: 'S-1', place: 'packed' },
      { serial: 'S-2', place: 'packed' },
      { serial: 'S-3', place: 'making' },
    ]);
  });
});

test('the application can neither change a movement nor write a balance', async () => {
  const world = await makeWorld(base.db, base.owner);
  const lot = await world.as(['lead'], (ctx) => makeLot(ctx));
  await expect(
    world.as(['admin'], ({ tx }) =>
      tx.update(movements).set({ pieces: 99 }).where(eq(movements.lotId, lot.id)),
    ),
  ).rejects.toThrow();
  await expect(
    world.as(['admin'], ({ tx }) =>
      tx.update(balances).set({ pieces: 99 }).where(eq(balances.lotId, lot.id)),
    ),
  ).rejects.toThrow();
  await expect(
    base.owner.update(movements).set({ pieces: 99 }).where(eq(movements.lotId, lot.id)),
  ).rejects.toThrow();
});
