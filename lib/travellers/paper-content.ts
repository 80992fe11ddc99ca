import { and, asc, desc, eq, inArray } from 'drizzle-orm';

import { batchDocuments, batches, batchLines, requirements } from '@/db/schema/batches';
import { processors, shopProcessors, shops } from '@/db/schema/organisations';
import { users } from '@/db/schema/people';
import type { Ctx } from '@/lib/auth/context';
import { readLinesAsTheyAre } from '@/lib/batches/freeze-lines';
import { readCheckFacts, readOverrides } from '@/lib/batches/read-check-facts';
import { specificationWords } from '@/lib/batches/step-asked';
import { env } from '@/lib/env';
import { notFound } from '@/lib/errors';
import { referenceTo, type TableReference } from '@/lib/trade/table';
import { CAUTIONS } from '@/lib/trade/tables/cautions';

import { cautionsOf } from './cautions';
import { paperOf, TravellerContent, type OrderContent, type Paper } from './content';
import { loadsForPaper, samplesForPaper, tablesForPaper } from './loads-for-paper';
import { orderStatesOf } from './order-states';
import { OVERRIDDEN_WORDS } from './overridden-words';

export interface Version {
  documentVersion: number;
  changes: readonly string[];
}

/** Both papers of a batch as they would be stated now. Without a link (a draft) there is no code to scan. */
export async function readPaperContents(
  ctx: Ctx,
  batchId: string,
  link: string | null,
  versions: { traveller: Version; order: Version },
): Promise<{ traveller: TravellerContent; order: OrderContent }> {
  const head = await readHead(ctx, batchId);
  const lines = await readContentLines(ctx, batchId);
  const asked = await readRequirements(ctx, batchId);
  const loads = await readLoads(ctx, batchId, paperOf(head.batch.currency));
  const { batch, shop, processor, contactName } = head;
  const stated = {
    paper: paperOf(batch.currency),
    number: batch.number,
    orderNumber: batch.orderNumber,
    zone: shop.zone,
    statedAt: ctx.now.toISOString(),
    statedBy: ctx.actor.name,
    dispatchedAt: batch.dispatchedAt?.toISOString() ?? null,
    wantedBackOn: batch.wantedBackOn,
    shop: { name: shop.name, address: shop.address, phone: shop.phone },
    processor: {
      name: processor.name,
      address: contactName ? [`for ${contactName}`, ...processor.address] : processor.address,
      phone: processor.phone,
    },
    process: batch.process,
    specification: specificationWords(batch),
    note: batch.note,
    orderStates: orderStatesOf(lines),
    requirements: asked,
  };
  return {
    traveller: {
      kind: 'traveller',
      ...stated,
      ...copied(versions.traveller),
      lines: lines.map(({ unitPriceMinor: _, ordering: __, ...line }) => line),
      cautions: cautionsOf(
        batch.process,
        lines.map(({ material }) => material),
      ),
      ...loads,
      tables: await readTables(ctx, batchId, loads.tables ?? []),
      overrides: await readPassed(ctx, batchId),
      link: link === null ? null : { base: `${env.APP_URL}/b/`, linkId: link },
    },
    order: {
      kind: 'purchase_order',
      ...stated,
      ...copied(versions.order),
      currency: batch.currency,
      lotMinimumMinor: batch.lotMinimumMinor,
      certificationFeeMinor: batch.certificationFeeMinor,
      lines: lines.map(
        ({
          lineNo,
          pieces,
          partNumber,
          partRevision,
          partName,
          lotNumber,
          conditionBefore,
          targetCondition,
          unitPriceMinor,
        }) => ({
          lineNo,
          pieces,
          partNumber,
          partRevision,
          partName,
          lotNumber,
          conditionBefore,
          targetCondition,
          unitPriceMinor,
        }),
      ),
    },
  };
}

/**
 * Loads and samples; once they were stated on a traveller they stay so, whatever is changed in a part afterwards, as
 * the lines do.
 */
async function readLoads(
  ctx: Ctx,
  batchId: string,
  paper: Paper,
): Promise<Pick<TravellerContent, 'furnaceLoads' | 'samples' | 'tables'>> {
  const [last] = await ctx.tx
    .select({ content: batchDocuments.content })
    .from(batchDocuments)
    .where(and(eq(batchDocuments.batchId, batchId), eq(batchDocuments.kind, 'traveller')))
    .orderBy(desc(batchDocuments.documentVersion))
    .limit(1);
  if (last) {
    const { furnaceLoads, samples, tables = [] } = TravellerContent.parse(last.content);
    return {
      tables,
      ...(furnaceLoads === undefined ? {} : { furnaceLoads }),
      ...(samples ? { samples } : {}),
    };
  }
  const { tables, lines } = await readCheckFacts(ctx, batchId);
  return {
    furnaceLoads: loadsForPaper(tables, lines, paper),
    samples: samplesForPaper(tables, lines),
    tables: tablesForPaper(tables, lines),
  };
}

/** Each table and edition once: what cautions, loads and samples were read from, and what requirements and overrides record. */
async function readTables(
  ctx: Ctx,
  batchId: string,
  ofLoads: readonly TableReference[],
): Promise<TableReference[]> {
  const asked = await ctx.tx
    .select({ readFrom: requirements.readFrom })
    .from(requirements)
    .where(eq(requirements.batchId, batchId))
    .orderBy(asc(requirements.seq), asc(requirements.id));
  const passed = await readOverrides(ctx, batchId);
  const all = [referenceTo(CAUTIONS), ...ofLoads, ...asked, ...passed].flatMap((one) =>
    'table' in one ? one : (one.readFrom ?? []),
  );
  const once = new Map(
    all.map(({ table, edition, entry }) => [
      [table, edition, entry].join('\n'),
      { table, edition, ...(entry !== undefined && { entry }) },
    ]),
  );
  return [...once.values()];
}

const copied = ({ documentVersion, changes }: Version) => ({ documentVersion, changes: [...changes] });

async function readHead(ctx: Ctx, batchId: string) {
  const [head] = await ctx.tx
    .select({
      batch: batches,
      shop: shops,
      processor: { name: processors.name, address: processors.address, phone: processors.phone },
      contactName: shopProcessors.contactName,
    })
    .from(batches)
    .innerJoin(shops, eq(shops.id, batches.shopId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .leftJoin(shopProcessors, eq(shopProcessors.processorId, batches.processorId))
    .where(eq(batches.id, batchId));
  if (!head) throw notFound('batch');
  return head;
}

/** What was frozen at dispatch; before it, what the line says now. */
async function readContentLines(ctx: Ctx, batchId: string) {
  const lines = await readLinesAsTheyAre(ctx, batchId);
  return lines.map(({ line, now }) => ({
    ...(line.frozen ?? now),
    lineNo: line.lineNo,
    pieces: line.pieces,
    loadNo: line.loadNo,
    unitPriceMinor: line.unitPriceMinor,
  }));
}

/** The same requirement of several lines is said once, with the lines it holds for. */
async function readRequirements(ctx: Ctx, batchId: string): Promise<TravellerContent['requirements']> {
  const rows = await ctx.tx
    .select({
      lineNo: batchLines.lineNo,
      characteristic: requirements.characteristic,
      limit: requirements.limit,
      unit: requirements.unit,
      source: requirements.source,
      sourceText: requirements.sourceText,
    })
    .from(requirements)
    .leftJoin(batchLines, eq(batchLines.id, requirements.lineId))
    .where(eq(requirements.batchId, batchId))
    .orderBy(asc(batchLines.lineNo), asc(requirements.seq));
  const said = new Map<string, TravellerContent['requirements'][number]>();
  for (const { lineNo, characteristic, limit, unit, source, sourceText } of rows) {
    const key = [lineNo === null ? 'all' : 'line', characteristic, limit, unit, source, sourceText].join(
      '\n',
    );
    const one = said.get(key) ?? { lines: [], characteristic, limit, unit, source: sourceText || source };
    if (lineNo !== null) one.lines.push(lineNo);
    said.set(key, one);
  }
  return [...said.values()];
}

async function readPassed(ctx: Ctx, batchId: string): Promise<TravellerContent['overrides']> {
  const passed = await readOverrides(ctx, batchId);
  if (passed.length === 0) return [];
  const people = await ctx.tx
    .select({ id: users.id, name: users.name })
    .from(users)
    .where(
      inArray(
        users.id,
        passed.map((one) => one.by),
      ),
    );
  const lineNos = new Map(
    (
      await ctx.tx
        .select({ id: batchLines.id, lineNo: batchLines.lineNo })
        .from(batchLines)
        .where(eq(batchLines.batchId, batchId))
    ).map((line) => [line.id, line.lineNo]),
  );
  return passed.map((one) => {
    const lineNo = lineNos.get(one.subject);
    const what = OVERRIDDEN_WORDS[one.check] ?? one.check;
    return {
      what: lineNo === undefined ? what : `line ${lineNo}: ${what}`,
      reason: one.reason,
      by: people.find((person) => person.id === one.by)?.name ?? 'an admin',
      at: one.createdAt.toISOString(),
    };
  });
}
