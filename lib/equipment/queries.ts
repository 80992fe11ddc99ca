import { and, asc, eq, isNull } from 'drizzle-orm';

import { equipment } from '@/db/schema/equipment';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { getProcessor } from '@/lib/processors/queries';

import type { Equipment } from './contract';

/** What is in use, by kind and name. */
export async function listEquipment(ctx: Ctx, { processorId }: { processorId: string }) {
  authorize(ctx, 'processor.read');
  await getProcessor(ctx, { processorId });
  return { equipment: await readEquipment(ctx, processorId) };
}

export async function readEquipment(ctx: Ctx, processorId: string): Promise<Equipment[]> {
  const rows = await ctx.tx
    .select()
    .from(equipment)
    .where(and(eq(equipment.processorId, processorId), isNull(equipment.retiredAt)))
    .orderBy(asc(equipment.kind), asc(equipment.name), asc(equipment.id));
  return rows.map((row) => ({
    id: row.id,
    kind: row.kind,
    name: row.name,
    length: { value: row.lengthMm, entered: row.lengthEntered },
    width: { value: row.widthMm, entered: row.widthEntered },
    height: { value: row.heightMm, entered: row.heightEntered },
    limit: known(row.limitG, row.limitEntered),
    temperatureMin: known(row.temperatureCMin, row.temperatureMinEntered),
    temperatureMax: known(row.temperatureCMax, row.temperatureMaxEntered),
    furnaceClass: row.furnaceClass,
    version: row.version,
  }));
}

const known = (value: number | null, entered: string | null) =>
  value === null || entered === null ? null : { value, entered };
