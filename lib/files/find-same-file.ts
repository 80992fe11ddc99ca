import { and, eq, isNull, sql } from 'drizzle-orm';

import { files } from '@/db/schema/files';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { AppError } from '@/lib/errors';

import { purposeWords } from './kinds';
import type { FilePurpose, FileState } from './purpose';

interface SameAs {
  purpose: FilePurpose;
  sha256: string;
  batchId: string | null;
  processorId: string | null;
}

/**
 * The file with the very same bytes for the same purpose in the same batch, from the same side. What the shop has added
 * itself is none of a processor's business, so the two sides are compared apart.
 */
export async function findSameFile(
  ctx: Ctx,
  { purpose, sha256, batchId, processorId }: SameAs,
  state: FileState,
) {
  const [same] = await ctx.tx
    .select({ id: files.id, name: files.name, uploadedBy: files.uploadedBy })
    .from(files)
    .where(
      and(
        eq(files.sha256, sha256),
        eq(files.purpose, purpose),
        eq(files.state, state),
        batchId === null ? isNull(files.batchId) : eq(files.batchId, batchId),
        processorId === null ? isNull(files.processorId) : eq(files.processorId, processorId),
      ),
    )
    .orderBy(files.id)
    .limit(1);
  return same ?? null;
}

/** Two of the same, sent at the same moment, come one after the other; the second then finds the first. */
export async function oneAtATime(ctx: Ctx, { sha256 }: Pick<SameAs, 'sha256'>): Promise<void> {
  await ctx.tx.execute(
    sql`select pg_advisory_xact_lock(hashtextextended(${`file:${shopOf(ctx)}:${sha256}`}, 0))`,
  );
}

export function alreadyHere(
  name: string,
  same: { id: string; name: string; uploadedBy: string },
  purpose: FilePurpose,
): AppError {
  const asWhat = same.name === name ? '' : ` as ${same.name}`;
  const message = `${name} is already here${asWhat}, sent by ${same.uploadedBy}: the same ${purposeWords(purpose)} to the last byte. Use that one, or choose another file.`;
  return new AppError('conflict', message, {
    fields: [{ field: 'file', message }],
    extra: { fileId: same.id },
  });
}
