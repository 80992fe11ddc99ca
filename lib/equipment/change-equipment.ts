import { and, eq, isNull, ne } from 'drizzle-orm';
import type { z } from 'zod';

import { equipment } from '@/db/schema/equipment';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { getProcessor } from '@/lib/processors/queries';

import type {
  addEquipment as addDeclaration,
  changeEquipment as changeDeclaration,
  retireEquipment as retireDeclaration,
} from './contract';
import { equipmentColumns } from './equipment-columns';

export async function addEquipment(
  ctx: Ctx,
  { processorId, ...given }: z.output<(typeof addDeclaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  await getProcessor(ctx, { processorId });
  await refuseNameTwice(ctx, processorId, given.name);
  const equipmentId = newId();
  await ctx.tx.insert(equipment).values({
    id: equipmentId,
    shopId: shopOf(ctx),
    processorId,
    ...equipmentColumns(given),
    createdAt: ctx.now,
  });
  await recordAudit(ctx, {
    action: 'processor.add_equipment',
    entity: 'processor',
    entityId: processorId,
    after: given,
  });
  return { equipmentId };
}

export async function changeEquipment(
  ctx: Ctx,
  { processorId, equipmentId, version, ...given }: z.output<(typeof changeDeclaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  const before = await readOne(ctx, processorId, equipmentId);
  await refuseNameTwice(ctx, processorId, given.name, equipmentId);
  const [changed] = await ctx.tx
    .update(equipment)
    .set({ ...equipmentColumns(given), version: version + 1 })
    .where(and(eq(equipment.id, equipmentId), eq(equipment.version, version), isNull(equipment.retiredAt)))
    .returning({ version: equipment.version });
  if (!changed) throw changedMeanwhile('equipment');
  await recordAudit(ctx, {
    action: 'processor.change_equipment',
    entity: 'processor',
    entityId: processorId,
    before,
    after: given,
  });
  return { version: changed.version };
}

/** Out of use; batches that went there keep what was checked then. */
export async function retireEquipment(
  ctx: Ctx,
  { processorId, equipmentId }: z.output<(typeof retireDeclaration)['input']>,
) {
  authorize(ctx, 'processor.edit');
  const before = await readOne(ctx, processorId, equipmentId);
  await ctx.tx.update(equipment).set({ retiredAt: ctx.now }).where(eq(equipment.id, equipmentId));
  await recordAudit(ctx, {
    action: 'processor.retire_equipment',
    entity: 'processor',
    entityId: processorId,
    before: { name: before.name },
  });
  return { done: true as const };
}

/** As it was typed. */
async function readOne(ctx: Ctx, processorId: string, equipmentId: string) {
  const [row] = await ctx.tx
    .select()
    .from(equipment)
    .where(
      and(eq(equipment.id, equipmentId), eq(equipment.processorId, processorId), isNull(equipment.retiredAt)),
    );
  if (!row) throw notFound('equipment');
  return {
    kind: row.kind,
    name: row.name,
    length: row.lengthEntered,
    width: row.widthEntered,
    height: row.heightEntered,
    limit: row.limitEntered ?? '',
    temperatureMin: row.temperatureMinEntered ?? '',
    temperatureMax: row.temperatureMaxEntered ?? '',
    furnaceClass: row.furnaceClass,
  };
}

async function refuseNameTwice(ctx: Ctx, processorId: string, name: string, except?: string): Promise<void> {
  const [there] = await ctx.tx
    .select({ id: equipment.id })
    .from(equipment)
    .where(
      and(
        eq(equipment.processorId, processorId),
        eq(equipment.name, name),
        isNull(equipment.retiredAt),
        except === undefined ? undefined : ne(equipment.id, except),
      ),
    );
  if (!there) return;
  const message = `${name} is here already. Change it there, or enter another name.`;
  throw new AppError('conflict', message, { fields: [{ field: 'name', message }] });
}
