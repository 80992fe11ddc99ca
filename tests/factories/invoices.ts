import { eq } from 'drizzle-orm';

import type { Db } from '@/db/client';
import { processors, shops } from '@/db/schema/organisations';
import { memberships, users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { approveInvoice } from '@/lib/invoices/approve-invoice';
import type { InvoiceLineInput } from '@/lib/invoices/contract';
import { addInvoice, enterInvoice } from '@/lib/invoices/enter-invoice';
import { getInvoice } from '@/lib/invoices/queries';
import { newId } from '@/lib/ids';

import { makeDispatchedBatch } from './batches';
import { countInAll, givePassword, makeSignedCertificate } from './evidence';
import { makeLot } from './lots';
import { TODAY, type World } from './world';

export const ALL = ['lead', 'inspector', 'office', 'admin'] as const;

interface Given {
  pieces?: number;
  accepted?: number;
  unitPriceMinor?: number;
  lotMinimumMinor?: number;
}

/** A batch of one line, back and signed for. */
export async function makeProvedBatch(world: World, owner: Db, given: Given = {}) {
  const { pieces = 10, unitPriceMinor = 500 } = given;
  await givePassword(owner, world.userId);
  return world.as(ALL, async (ctx) => {
    const lot = await makeLot(ctx, { pieces });
    const batch = await makeDispatchedBatch(ctx, world.processorId, {
      lots: [lot],
      unitPriceMinor,
      ...(given.lotMinimumMinor === undefined ? {} : { lotMinimumMinor: given.lotMinimumMinor }),
    });
    await countInAll(ctx, batch.id, [{ good: pieces }]);
    await makeSignedCertificate(ctx, batch.id, [given.accepted ?? pieces]);
    return batch;
  });
}

/** An invoice of the batch, not entered yet, and its order's only line. */
export const takeUp = (world: World, batchId: string) =>
  world.as(['office'], async (ctx) => {
    const { id } = await addInvoice(ctx, { batchId, fileId: null });
    const { order } = await getInvoice(ctx, { invoiceId: id });
    return { invoiceId: id, lineId: order.lines[0]?.lineId ?? '' };
  });

export const pieceLine = (lineId: string, pieces: number, unitPriceMinor: number): InvoiceLineInput => ({
  kind: 'pieces',
  lineId,
  description: 'Rib clip',
  pieces,
  unitPriceMinor,
  amountMinor: pieces * unitPriceMinor,
});
export const charge = (kind: InvoiceLineInput['kind'], amountMinor: number): InvoiceLineInput => ({
  kind,
  lineId: null,
  description: kind,
  pieces: null,
  unitPriceMinor: null,
  amountMinor,
});

/** What the office types of an invoice with these lines. */
export function entering(
  invoiceId: string,
  lines: InvoiceLineInput[],
  given: { number?: string; version?: number; totalMinor?: number } = {},
) {
  const { number = `INV-${invoiceId.slice(-8)}`, version = 1 } = given;
  return {
    invoiceId,
    version,
    number,
    datedOn: '2026-06-16',
    dueOn: '2026-07-16',
    currency: 'USD' as const,
    totalMinor: given.totalMinor ?? lines.reduce((sum, line) => sum + line.amountMinor, 0),
    lines,
  };
}

/** A proved batch with an invoice that agrees, approved by the world's person. */
export async function makeApprovedInvoice(world: World, owner: Db, given: Given = {}) {
  const { pieces = 10, unitPriceMinor = 500 } = given;
  const batch = await makeProvedBatch(world, owner, given);
  const { invoiceId, lineId } = await takeUp(world, batch.id);
  const { version } = await world.as(['office'], async (ctx) => {
    await enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, pieces, unitPriceMinor)]));
    return approveInvoice(ctx, { invoiceId, version: 2 });
  });
  return { invoiceId, version, batch };
}

/** Another person of the same shop. */
export async function makeColleague(world: World, owner: Db) {
  const userId = newId();
  await owner
    .insert(users)
    .values({ id: userId, email: `person-${userId}@shop.test`, name: 'Second Person', createdAt: TODAY });
  await owner.insert(memberships).values({ userId, shopId: world.shopId, roles: [...ALL], createdAt: TODAY });
  return {
    userId,
    as: <T>(roles: Parameters<World['as']>[0], work: (ctx: Ctx) => Promise<T>) =>
      world.as(roles, (ctx) =>
        work({ ...ctx, actor: { kind: 'person', userId, name: 'Second Person', roles } }),
      ),
  };
}

export const changeShop = (owner: Db, { shopId }: World, set: Partial<typeof shops.$inferInsert>) =>
  owner.update(shops).set(set).where(eq(shops.id, shopId));
export const changeProcessor = (
  owner: Db,
  { processorId }: World,
  set: Partial<typeof processors.$inferInsert>,
) => owner.update(processors).set(set).where(eq(processors.id, processorId));
