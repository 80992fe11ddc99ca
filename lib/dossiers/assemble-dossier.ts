import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';

import { dossiers } from '@/db/schema/dossiers';
import { recordAudit } from '@/lib/audit/record-audit';
import { AppError } from '@/lib/errors';
import { storeMadeFile } from '@/lib/files/store-made-file';
import type { JobTools } from '@/lib/jobs/job';
import { getObject } from '@/lib/storage/object-store';

import type { assembleDossierQueue } from './assemble-dossier-queue';
import type { DossierFile } from './content';
import { drawCharts } from './draw-charts';
import { ChangedOriginal, makeArchive } from './make-archive';
import { readDossier } from './read-dossier';
import { renderDossier } from './render-dossier';

type Payload = z.output<typeof assembleDossierQueue.payload>;

/**
 * Makes the document and the archive of a dossier that was asked for. Run again, it finds what it made before. A try
 * that fails says so on the dossier, because somebody sits before the screen and waits for it.
 */
export async function assembleDossier(tools: JobTools, payload: Payload): Promise<void> {
  try {
    await make(tools, payload);
  } catch (error) {
    await tools.inShop(payload.shopId, (ctx) =>
      ctx.tx
        .update(dossiers)
        .set({ failure: failureWords(error) })
        .where(and(eq(dossiers.id, payload.dossierId), isNull(dossiers.finishedAt))),
    );
    throw error;
  }
}

/** Only what a person can do something about; the rest is in the log and on the page of failed work. */
function failureWords(error: unknown): string {
  if (error instanceof ChangedOriginal) return error.message;
  return error instanceof AppError ? error.message : 'The document or an original could not be read or kept.';
}

async function make(tools: JobTools, { shopId, dossierId }: Payload): Promise<void> {
  const asked = await tools.inShop(shopId, async (ctx) => {
    const [dossier] = await ctx.tx
      .select()
      .from(dossiers)
      .where(and(eq(dossiers.id, dossierId), isNull(dossiers.finishedAt)));
    return dossier ? { dossier, content: await readDossier(ctx, dossier.lotId) } : null;
  });
  if (!asked) return;
  const { dossier, content } = asked;
  const name = `${content.lot.number} ${content.part.number} rev ${content.part.revision}`;
  const open = async (file: DossierFile) => (await getObject(file.storageKey)).body;
  const pictures = await drawCharts(content, open);
  const document = await renderDossier(content, { statedAt: dossier.statedAt, pictures });
  const archive = await makeArchive({ content, document, statedAt: dossier.statedAt, open });
  const stored = { shopId, batchId: null };
  const pdf = await storeMadeFile(tools, {
    ...stored,
    purpose: 'dossier',
    name: `${name} dossier.pdf`,
    mediaType: 'application/pdf',
    content: document,
  });
  const zip = await storeMadeFile(tools, {
    ...stored,
    purpose: 'archive',
    name: `${name} dossier.zip`,
    mediaType: 'application/zip',
    content: archive,
  });
  await tools.inShop(shopId, async (ctx) => {
    const [finished] = await ctx.tx
      .update(dossiers)
      .set({ documentFileId: pdf.fileId, archiveFileId: zip.fileId, finishedAt: ctx.now, failure: null })
      .where(and(eq(dossiers.id, dossierId), isNull(dossiers.finishedAt)))
      .returning({ id: dossiers.id });
    if (finished)
      await recordAudit(ctx, {
        action: 'dossier.make',
        entity: 'lot',
        entityId: dossier.lotId,
        after: { documentSha256: pdf.sha256, archiveSha256: zip.sha256 },
      });
  });
}
