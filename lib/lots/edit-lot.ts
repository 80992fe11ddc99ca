import { and, eq, sql } from 'drizzle-orm';

import { lots } from '@/db/schema/lots';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { changedMeanwhile, notFound } from '@/lib/errors';
import { requireVerifiedFile } from '@/lib/files/require-verified-file';

interface EditLotInput {
  lotId: string;
  version: number;
  heat: string;
  note: string;
  millCertificateFileId: string | null;
}

/** Corrects what is written of a lot. Its pieces only move by movements; a mill certificate that is replaced is kept. */
export async function editLot(ctx: Ctx, { lotId, version, heat, note, millCertificateFileId }: EditLotInput) {
  authorize(ctx, 'lot.create');
  const [before] = await ctx.tx
    .select({ heat: lots.heat, note: lots.note, millCertificateFileId: lots.millCertificateFileId })
    .from(lots)
    .where(eq(lots.id, lotId));
  if (!before) throw notFound('lot');
  if (millCertificateFileId !== null)
    await requireVerifiedFile(ctx, {
      fileId: millCertificateFileId,
      purpose: 'mill_certificate',
      field: 'millCertificateFileId',
    });
  const after = { heat, note: note === '' ? null : note, millCertificateFileId };
  const [lot] = await ctx.tx
    .update(lots)
    .set({ ...after, version: sql`${lots.version} + 1` })
    .where(and(eq(lots.id, lotId), eq(lots.version, version)))
    .returning({ id: lots.id, number: lots.number, version: lots.version });
  if (!lot) throw changedMeanwhile('lot');
  await recordAudit(ctx, { action: 'lot.edit', entity: 'lot', entityId: lotId, before, after });
  return lot;
}
