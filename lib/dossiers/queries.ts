import { desc, eq } from 'drizzle-orm';

import { dossierLinks, dossiers } from '@/db/schema/dossiers';
import { recordAudit } from '@/lib/audit/record-audit';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { newId } from '@/lib/ids';
import { enqueue } from '@/lib/jobs/queue';

import { assembleDossierQueue } from './assemble-dossier-queue';
import type { DossierContent } from './content';
import { throughDossierLink } from './dossier-links';
import { readDossier } from './read-dossier';

const MOST_SHOWN = 10;

export async function getDossier(ctx: Ctx, { lotId }: { lotId: string }) {
  authorize(ctx, 'dossier.read');
  const links = await ctx.tx
    .select({
      id: dossierLinks.id,
      forWhom: dossierLinks.forWhom,
      expiresAt: dossierLinks.expiresAt,
      withdrawnAt: dossierLinks.withdrawnAt,
      createdBy: dossierLinks.createdBy,
      createdAt: dossierLinks.createdAt,
    })
    .from(dossierLinks)
    .where(eq(dossierLinks.lotId, lotId))
    .orderBy(desc(dossierLinks.id));
  return { evidence: withoutKeys(await readDossier(ctx, lotId)), links };
}

export async function listMadeDossiers(ctx: Ctx, { lotId }: { lotId: string }) {
  authorize(ctx, 'dossier.read');
  return { rows: await readMade(ctx, lotId) };
}

/** Asks the worker for document and archive. What they say is what stands when the worker reads it. */
export async function requestDossier(ctx: Ctx, { lotId }: { lotId: string }) {
  authorize(ctx, 'dossier.read');
  const { lot } = await readDossier(ctx, lotId);
  const id = newId();
  await ctx.tx
    .insert(dossiers)
    .values({ id, shopId: shopOf(ctx), lotId, statedAt: ctx.now, requestedBy: ctx.actor.name });
  await enqueue(ctx, assembleDossierQueue, { shopId: shopOf(ctx), dossierId: id });
  await recordAudit(ctx, {
    action: 'dossier.request',
    entity: 'lot',
    entityId: lotId,
    after: { lot: lot.number },
  });
  return { id };
}

export async function openDossierLink(ctx: Ctx, { token }: { token: string }) {
  authorize(ctx, 'public.use');
  return throughDossierLink(ctx, token, async (inner, { lotId, forWhom, expiresAt }) => {
    const made = await readMade(inner, lotId);
    return {
      forWhom,
      expiresAt,
      evidence: withoutKeys(await readDossier(inner, lotId)),
      made: made.find((one) => one.finished) ?? null,
    };
  });
}

async function readMade(ctx: Pick<Ctx, 'tx'>, lotId: string) {
  const rows = await ctx.tx
    .select({
      id: dossiers.id,
      statedAt: dossiers.statedAt,
      requestedBy: dossiers.requestedBy,
      finishedAt: dossiers.finishedAt,
      failure: dossiers.failure,
      documentFileId: dossiers.documentFileId,
      archiveFileId: dossiers.archiveFileId,
    })
    .from(dossiers)
    .where(eq(dossiers.lotId, lotId))
    .orderBy(desc(dossiers.id))
    .limit(MOST_SHOWN);
  return rows.map(({ finishedAt, ...row }) => ({ ...row, finished: finishedAt !== null }));
}

/** Where bytes lie in storage is nobody's business outside. */
const withoutKeys = (content: DossierContent) => ({
  ...content,
  files: content.files.map(({ storageKey: _, ...file }) => file),
});
