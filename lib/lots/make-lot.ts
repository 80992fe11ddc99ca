import { and, eq, sql } from 'drizzle-orm';

import { lots, pieces as namedPieces } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { nextNumber } from '@/lib/organisations/next-number';
import { movePieces } from '@/lib/stock/move-pieces';

interface NewLot {
  part: { id: string; number: string; revision: string; serialised: boolean; firstStepId: string | null };
  /** Empty: the shop's next number. */
  number: string;
  heat: string;
  madeOn: Date;
  pieces: number;
  serials: readonly string[];
  millCertificateFileId: string | null;
  note: string | null;
}

/** Writes a lot that was checked before, and brings its pieces into being at the first step of the route. */
export async function makeLot(ctx: Ctx, { part, serials, ...lot }: NewLot) {
  if (part.firstStepId === null) throw new AppError('conflict', noRoute(part));
  const id = newId();
  const shopId = shopOf(ctx);
  const number = lot.number === '' ? await freeNumber(ctx) : lot.number;
  await ctx.tx.insert(lots).values({
    id,
    shopId,
    number,
    partId: part.id,
    heat: lot.heat,
    madeOn: lot.madeOn,
    serialised: part.serialised,
    millCertificateFileId: lot.millCertificateFileId,
    note: lot.note,
    createdAt: ctx.now,
  });
  const named = serials.map((serial) => ({ id: newId(), shopId, lotId: id, serial }));
  if (named.length > 0) await ctx.tx.insert(namedPieces).values(named);
  await movePieces(ctx, {
    lotId: id,
    pieces: lot.pieces,
    from: null,
    to: { place: 'making', holderId: part.firstStepId },
    reason: 'made',
    ...(named.length > 0 ? { pieceIds: named.map((piece) => piece.id) } : {}),
  });
  const after = {
    number,
    part: `${part.number} rev ${part.revision}`,
    heat: lot.heat,
    pieces: lot.pieces,
    ...(serials.length > 0 ? { serials } : {}),
    millCertificateFileId: lot.millCertificateFileId,
  };
  await recordAudit(ctx, { action: 'lot.create', entity: 'lot', entityId: id, after });
  return { id, number, version: 1 };
}

export const noRoute = (part: { number: string; revision: string }): string =>
  `${part.number} rev ${part.revision} has no step on its route, so nothing would wait anywhere. Add its first step, then the lot.`;

/** Numbers that came in by hand or by import are left out. */
async function freeNumber(ctx: Ctx): Promise<string> {
  for (;;) {
    const number = await nextNumber(ctx, 'lot');
    if (!(await isTaken(ctx, number))) return number;
  }
}

export async function isTaken(ctx: Ctx, number: string): Promise<boolean> {
  const [taken] = await ctx.tx
    .select({ one: sql`1` })
    .from(lots)
    .where(and(eq(lots.shopId, shopOf(ctx)), eq(lots.number, number)));
  return taken !== undefined;
}
