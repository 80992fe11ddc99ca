import { eq } from 'drizzle-orm';
import type { z } from 'zod';

import { atDoorOf } from '@/db/client';
import { processors, shopProcessors } from '@/db/schema/organisations';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';

import type { addProcessor as declaration } from './contract';

/**
 * One processor serves many shops and exists once, by its own e-mail. A shop that adds a known one is linked to it and
 * sees what the processor itself keeps (its name, address, telephone); that others know it is not told. What the shop
 * typed for those does not overwrite them.
 */
export async function addProcessor(ctx: Ctx, given: z.output<(typeof declaration)['input']>) {
  authorize(ctx, 'processor.edit');
  const processorId = await atDoorOf(ctx.tx, ctx.tenant, () => findOrMake(ctx, given));
  const contactEmail = given.contactEmail ?? given.email;
  const [linked] = await ctx.tx
    .insert(shopProcessors)
    .values({
      shopId: shopOf(ctx),
      processorId,
      contactName: given.contactName,
      contactEmail,
      note: given.note,
      createdAt: ctx.now,
    })
    .onConflictDoNothing()
    .returning({ processorId: shopProcessors.processorId });
  if (!linked)
    throw new AppError('conflict', 'This processor is on your list already.', {
      fields: [{ field: 'email', message: 'A processor with this e-mail is on your list already.' }],
    });
  await recordAudit(ctx, {
    action: 'processor.add',
    entity: 'processor',
    entityId: processorId,
    after: {
      name: given.name,
      email: given.email,
      contactName: given.contactName,
      contactEmail,
      note: given.note,
    },
  });
  return { processorId };
}

async function findOrMake(
  ctx: Ctx,
  { name, email, phone }: z.output<(typeof declaration)['input']>,
): Promise<string> {
  const id = newId();
  await ctx.tx
    .insert(processors)
    .values({ id, name, email, phone, createdAt: ctx.now })
    .onConflictDoNothing({ target: processors.email });
  const [known] = await ctx.tx
    .select({ id: processors.id })
    .from(processors)
    .where(eq(processors.email, email));
  if (!known) throw new Error('a processor was neither found nor made');
  return known.id;
}
