import { and, eq, ne } from 'drizzle-orm';

import { parts } from '@/db/schema/parts';
import type { Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';

import type { PartInput } from './contract';

/** What the database would refuse without words: a number and revision that are taken, a drawing that is not one. */
export async function checkPart(ctx: Ctx, input: PartInput, partId?: string): Promise<void> {
  const [same] = await ctx.tx
    .select({ id: parts.id, name: parts.name })
    .from(parts)
    .where(
      and(
        eq(parts.number, input.number),
        eq(parts.revision, input.revision),
        partId === undefined ? undefined : ne(parts.id, partId),
      ),
    );
  if (same) {
    const message = `${input.number} rev ${input.revision} is here already: ${same.name}. Open that one, or enter another revision.`;
    throw new AppError('conflict', message, {
      fields: [{ field: 'revision', message }],
      extra: { partId: same.id },
    });
  }
  if (input.drawingFileId !== null)
    await requireVerifiedFile(ctx, {
      fileId: input.drawingFileId,
      purpose: 'drawing',
      field: 'drawingFileId',
    });
}
