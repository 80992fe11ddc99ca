import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { assemblies, assemblyNeeds } from '@/db/schema/parts';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError, changedMeanwhile, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type * as contract from './contract';
import { readNeeds } from './readiness';

type Create = z.output<(typeof contract.createAssembly)['input']>;
type Update = z.output<(typeof contract.updateAssembly)['input']>;

export async function createAssembly(ctx: Ctx, { needs, ...fields }: Create) {
  authorize(ctx, 'assembly.edit');
  await refuseSameName(ctx, fields.name, null);
  const id = newId();
  await ctx.tx.insert(assemblies).values({ id, shopId: shopOf(ctx), ...fields, createdAt: ctx.now });
  await writeNeeds(ctx, id, needs);
  await recordAudit(ctx, {
    action: 'assembly.create',
    entity: 'assembly',
    entityId: id,
    after: { ...fields, needs },
  });
  return { id };
}

export async function updateAssembly(ctx: Ctx, { assemblyId, version, needs, ...fields }: Update) {
  authorize(ctx, 'assembly.edit');
  await refuseSameName(ctx, fields.name, assemblyId);
  const before = (await readNeeds(ctx)).filter((need) => need.assemblyId === assemblyId);
  const [was] = await ctx.tx
    .select({
      name: assemblies.name,
      neededOn: assemblies.neededOn,
      note: assemblies.note,
      closedAt: assemblies.closedAt,
    })
    .from(assemblies)
    .where(eq(assemblies.id, assemblyId));
  if (!was) throw notFound('assembly');
  if (was.closedAt !== null)
    throw new AppError('conflict', `${was.name} is closed. It waits for nothing more.`);
  const [changed] = await ctx.tx
    .update(assemblies)
    .set({ ...fields, version: version + 1 })
    .where(and(eq(assemblies.id, assemblyId), eq(assemblies.version, version)))
    .returning({ version: assemblies.version });
  if (!changed) throw changedMeanwhile('assembly');
  refuseLessThanFitted(before, needs);
  await writeNeeds(ctx, assemblyId, needs);
  await recordAudit(ctx, {
    action: 'assembly.update',
    entity: 'assembly',
    entityId: assemblyId,
    before: {
      name: was.name,
      neededOn: was.neededOn,
      note: was.note,
      needs: before.map(({ partNumber, pieces }) => ({ partNumber, pieces })),
    },
    after: { ...fields, needs },
  });
  return changed;
}

export async function closeAssembly(
  ctx: Ctx,
  { assemblyId, version }: { assemblyId: string; version: number },
) {
  authorize(ctx, 'assembly.edit');
  const [closed] = await ctx.tx
    .update(assemblies)
    .set({ closedAt: ctx.now, version: version + 1 })
    .where(and(eq(assemblies.id, assemblyId), eq(assemblies.version, version), isNull(assemblies.closedAt)))
    .returning({ name: assemblies.name });
  if (!closed) throw changedMeanwhile('assembly');
  await recordAudit(ctx, {
    action: 'assembly.close',
    entity: 'assembly',
    entityId: assemblyId,
    after: closed,
  });
  return { done: true as const };
}

async function writeNeeds(ctx: Ctx, assemblyId: string, needs: Create['needs']): Promise<void> {
  await ctx.tx.delete(assemblyNeeds).where(eq(assemblyNeeds.assemblyId, assemblyId));
  if (needs.length > 0)
    await ctx.tx
      .insert(assemblyNeeds)
      .values(needs.map((need) => ({ ...need, shopId: shopOf(ctx), assemblyId })));
}

async function refuseSameName(ctx: Ctx, name: string, exceptId: string | null): Promise<void> {
  const [other] = await ctx.tx
    .select({ id: assemblies.id })
    .from(assemblies)
    .where(eq(assemblies.name, name));
  if (other && other.id !== exceptId)
    throw new AppError('conflict', `There is an assembly called ${name} already.`, {
      fields: [{ field: 'name', message: 'There is an assembly of this name already.' }],
    });
}

/** Fitted pieces stay fitted; a need below them would say that they are not. */
function refuseLessThanFitted(before: Awaited<ReturnType<typeof readNeeds>>, needs: Create['needs']): void {
  for (const { partNumber, fitted } of before) {
    const at = needs.findIndex((need) => need.partNumber === partNumber);
    const left = needs[at]?.pieces ?? 0;
    if (left < fitted)
      throw new AppError('bad_input', `${fitted} of ${partNumber} are fitted already.`, {
        fields: [
          {
            field: at < 0 ? 'needs' : `needs.${at}.pieces`,
            message: `${fitted} of ${partNumber} are fitted already. Enter ${fitted} or more.`,
          },
        ],
      });
  }
}
