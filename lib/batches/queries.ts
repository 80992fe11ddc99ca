import { and, asc, desc, eq, lt } from 'drizzle-orm';
import type { z } from 'zod';

import { batches, batchDocuments } from '@/db/schema/batches';
import { processors, shopProcessors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import { toPage } from '@/lib/api/paging';
import { authorize } from '@/lib/auth/authorize';
import type { Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import { notFound } from '@/lib/errors';
import { daysLate } from '@/lib/tideline/lateness';
import { PaperContent } from '@/lib/travellers/content';
import { readPaperContents } from '@/lib/travellers/paper-content';

import { checkBatch } from './checks';
import type { listBatches as declaration } from './contract';
import { readCheckFacts, readOverrides } from './read-check-facts';
import { specificationWords } from './step-asked';

/** Newest first; ids are time-ordered, so the id is the key of the page. */
export async function listBatches(
  ctx: Ctx,
  { after, limit, stage, processorId }: z.output<(typeof declaration)['input']>,
) {
  authorize(ctx, 'batch.read');
  const rows = await ctx.tx
    .select({
      id: batches.id,
      number: batches.number,
      orderNumber: batches.orderNumber,
      stage: batches.stage,
      processorId: batches.processorId,
      processor: processors.name,
      process: batches.process,
      pieces: batches.pieces,
      piecesBack: batches.piecesBack,
      leavesOn: batches.leavesOn,
      dispatchedAt: batches.dispatchedAt,
      promisedOn: batches.promisedOn,
      firstPromisedOn: batches.firstPromisedOn,
      wantedBackOn: batches.wantedBackOn,
      lastBackAt: batches.lastBackAt,
      putAsideAt: batches.putAsideAt,
      zone: shops.zone,
      latenessBasis: shops.latenessBasis,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .where(
      and(
        after === undefined ? undefined : lt(batches.id, after),
        stage === undefined ? undefined : eq(batches.stage, stage),
        processorId === undefined ? undefined : eq(batches.processorId, processorId),
      ),
    )
    .orderBy(desc(batches.id))
    .limit(limit + 1);
  return toPage(
    rows.map((row) => ({ ...row, daysLate: lateOf(ctx, row) })),
    limit,
    (row) => row.id,
  );
}

export async function getBatch(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const [found] = await ctx.tx
    .select({
      batch: batches,
      processor: processors.name,
      contactEmail: shopProcessors.contactEmail,
      dispatcher: users.name,
      zone: shops.zone,
      latenessBasis: shops.latenessBasis,
    })
    .from(batches)
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .innerJoin(
      shopProcessors,
      and(eq(shopProcessors.shopId, batches.shopId), eq(shopProcessors.processorId, batches.processorId)),
    )
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .leftJoin(users, eq(users.id, batches.dispatchedBy))
    .where(eq(batches.id, batchId));
  if (!found) throw notFound('batch');
  const { batch, processor, contactEmail, dispatcher, zone, latenessBasis } = found;
  const { specification, specificationRevision, classType } = batch;
  return {
    ...batch,
    step: { specification, specificationRevision, classType },
    processor,
    contactEmail,
    zone,
    dispatchedBy: dispatcher,
    specification: specificationWords(batch),
    daysLate: lateOf(ctx, { ...batch, zone, latenessBasis }),
  };
}

interface Promised {
  stage: (typeof batches.$inferSelect)['stage'];
  promisedOn: string | null;
  firstPromisedOn: string | null;
  lastBackAt: Date | null;
  pieces: number;
  piecesBack: number;
  zone: string;
  latenessBasis: 'first_promise' | 'latest_promise';
}

const lateOf = (ctx: Ctx, { zone, latenessBasis, lastBackAt, ...batch }: Promised): number =>
  daysLate(
    { ...batch, lastBackOn: lastBackAt && calendarDay(lastBackAt, zone) },
    calendarDay(ctx.now, zone),
    latenessBasis,
  );

/** What the checks say now, each blocker with who let it pass. */
export async function getBatchChecks(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const { findings, met } = checkBatch(await readCheckFacts(ctx, batchId));
  const passed = await readOverrides(ctx, batchId);
  const people = new Map(
    (passed.length === 0 ? [] : await ctx.tx.select({ id: users.id, name: users.name }).from(users)).map(
      (person) => [person.id, person.name],
    ),
  );
  return {
    met: [...met],
    findings: findings.map(({ waysOut, ...finding }) => {
      const override = passed.find((one) => one.check === finding.code && one.subject === finding.subject);
      return {
        ...finding,
        waysOut: [...waysOut],
        passed: override
          ? {
              overrideId: override.id,
              reason: override.reason,
              by: people.get(override.by) ?? 'an admin',
              at: override.createdAt,
            }
          : null,
      };
    }),
  };
}

export async function listBatchDocuments(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const documents = await ctx.tx
    .select({
      id: batchDocuments.id,
      kind: batchDocuments.kind,
      documentVersion: batchDocuments.documentVersion,
      changes: batchDocuments.changes,
      statedAt: batchDocuments.statedAt,
      fileId: batchDocuments.fileId,
      sha256: batchDocuments.sha256,
    })
    .from(batchDocuments)
    .where(eq(batchDocuments.batchId, batchId))
    .orderBy(desc(batchDocuments.documentVersion), asc(batchDocuments.kind));
  return { documents };
}

const DRAFT = { documentVersion: 0, changes: [] };

/** What the traveller said last; before the batch left, what it would say now. Never the link, which is on the paper alone. */
export async function getTraveller(ctx: Ctx, { batchId }: { batchId: string }) {
  authorize(ctx, 'batch.read');
  const [last] = await ctx.tx
    .select({ content: batchDocuments.content })
    .from(batchDocuments)
    .where(and(eq(batchDocuments.batchId, batchId), eq(batchDocuments.kind, 'traveller')))
    .orderBy(desc(batchDocuments.documentVersion))
    .limit(1);
  const stated = last && PaperContent.parse(last.content);
  const traveller =
    stated?.kind === 'traveller'
      ? stated
      : (await readPaperContents(ctx, batchId, null, { traveller: DRAFT, order: DRAFT })).traveller;
  const { link: _link, ...says } = traveller;
  return says;
}
