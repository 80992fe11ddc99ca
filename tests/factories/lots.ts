import { lots, pieces as namedPieces } from '@/db/schema/lots';
import { parts, routeSteps } from '@/db/schema/parts';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import type { Process } from '@/lib/trade/process';
import { movePieces } from '@/lib/stock/move-pieces';

/** A part with a route of the given steps. */
export async function makePart(
  ctx: Ctx,
  given: { processes?: readonly Process[]; serialised?: boolean; number?: string } = {},
) {
  const id = newId();
  const number = given.number ?? `P-${id.slice(-8)}`;
  await ctx.tx.insert(parts).values({
    id,
    shopId: shopOf(ctx),
    number,
    revision: 'A',
    name: 'Rib clip',
    alloy: '2024',
    form: 'sheet',
    clad: true,
    thicknessMm: 1.016,
    thicknessEntered: '0.040 in',
    madeCondition: 'O',
    endCondition: 'T42',
    serialised: given.serialised ?? false,
    createdAt: ctx.now,
  });
  const steps = (given.processes ?? ['solution_heat_treat_and_age']).map((process, at) => ({
    id: newId(),
    shopId: shopOf(ctx),
    partId: id,
    seq: at + 1,
    process,
    specification: 'AMS 2770',
    specificationRevision: 'R',
    conditionBefore: 'O',
    targetCondition: 'T42',
  }));
  if (steps.length > 0) await ctx.tx.insert(routeSteps).values(steps);
  return { id, number, stepIds: steps.map((step) => step.id) };
}

interface GivenLot {
  part?: Awaited<ReturnType<typeof makePart>>;
  pieces?: number;
  serials?: readonly string[];
}

/** A lot with all its pieces waiting for the first step of the part's route. */
export async function makeLot(ctx: Ctx, given: GivenLot = {}) {
  const part = given.part ?? (await makePart(ctx, { serialised: given.serials !== undefined }));
  const id = newId();
  const count = given.serials?.length ?? given.pieces ?? 10;
  const [stepId = ''] = part.stepIds;
  await ctx.tx.insert(lots).values({
    id,
    shopId: shopOf(ctx),
    number: `L-${id.slice(-8)}`,
    partId: part.id,
    heat: 'H-1',
    madeOn: ctx.now,
    serialised: given.serials !== undefined,
    createdAt: ctx.now,
  });
  const named = (given.serials ?? []).map((serial) => ({
    id: newId(),
    shopId: shopOf(ctx),
    lotId: id,
    serial,
  }));
  if (named.length > 0) await ctx.tx.insert(namedPieces).values(named);
  await movePieces(ctx, {
    lotId: id,
    pieces: count,
    from: null,
    to: { place: 'making', holderId: stepId },
    reason: 'made',
    ...(named.length > 0 ? { pieceIds: named.map((piece) => piece.id) } : {}),
  });
  return { id, part, stepId, pieces: count };
}

/** A lot of which all pieces lie in a place of the stores, as after the gate. */
export async function makeStock(ctx: Ctx, { locationId, ...given }: GivenLot & { locationId: string }) {
  const lot = await makeLot(ctx, given);
  await movePieces(ctx, {
    lotId: lot.id,
    pieces: lot.pieces,
    from: { place: 'making', holderId: lot.stepId },
    to: { place: 'stock', holderId: locationId },
    reason: 'released',
  });
  return lot;
}
