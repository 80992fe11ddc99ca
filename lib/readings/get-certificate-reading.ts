import { and, asc, eq, isNull, ne, or, sql } from 'drizzle-orm';
import type { z } from 'zod';

import { batches } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { processors, shops } from '@/db/schema/organisations';
import { readingCorrections, readings } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import type { SeenCertificate } from '@/lib/evidence/certificate/certificate';

import { comparisonTablesOf } from '@/lib/reference/tables-of';

import type { CertificateReading } from './contract';
import { findReading } from './find-reading';
import { KeptCertificates, type KeptPage } from './kept-reading';
import { ofBatchFirst } from './of-batch-first';
import { readBatchOrder } from './orders-of-batch';
import { propose } from './propose';
import { withCorrections } from './with-corrections';

type Answer = z.input<typeof CertificateReading>;

const NOTHING = {
  state: null,
  fault: null,
  seconds: null,
  recognised: false,
  certificateNumber: null,
  certificateDate: null,
  facts: [],
  pages: [],
  proposals: [],
  lines: [],
  discrepancies: [],
  observations: [],
  corrections: [],
} satisfies Answer;

/** What the machine read on a certificate beside what its batch asks for. Compared anew at every look: nothing of it is kept. */
export async function getCertificateReading(
  ctx: Ctx,
  { certificateId }: { certificateId: string },
): Promise<Answer> {
  authorize(ctx, 'certificate.read');
  const { certificate, reading } = await findReading(ctx, certificateId);
  if (!reading) return NOTHING;
  const head = { ...NOTHING, state: reading.state, fault: reading.fault, seconds: reading.seconds };
  if (reading.state !== 'read') return head;
  const { file, certificates: read } = KeptCertificates.parse(reading.content);
  const batch = await readBatchOrder(ctx, certificate.batchId);
  const corrections = await correctionsOf(ctx, reading.id);
  const [own, ...others] = ofBatchFirst(read, batch?.order ?? null);
  const base = { ...head, recognised: file.recognised, corrections, pages: reading.pages as KeptPage[] };
  if (!own || !batch) return base;
  const stated = withCorrections(own, corrections);
  const proposed = propose(batch, {
    stated,
    file: { sha256: file.sha256, recognised: file.recognised, pages: hiddenPages(file.hidden) },
    others,
    seen: await seenBefore(ctx, certificate, stated.certificate_number),
    today: await todayOf(ctx),
    tables: await comparisonTablesOf(ctx),
  });
  return {
    ...base,
    certificateNumber: stated.certificate_number,
    certificateDate: stated.certificate_date,
    // As the machine read them; what a person put in their place stands among the corrections.
    facts: own.facts,
    ...proposed,
  };
}

const correctionsOf = (ctx: Ctx, readingId: string) =>
  ctx.tx
    .select({
      field: readingCorrections.field,
      read: readingCorrections.read,
      corrected: readingCorrections.corrected,
      correctedBy: readingCorrections.correctedBy,
      correctedAt: readingCorrections.correctedAt,
    })
    .from(readingCorrections)
    .where(eq(readingCorrections.readingId, readingId))
    .orderBy(asc(readingCorrections.id));

/** Papers with the same number or the same bytes, and the other papers of this batch with their pieces. */
async function seenBefore(
  ctx: Ctx,
  { id, batchId, fileId }: { id: string; batchId: string; fileId: string },
  number: string | null,
): Promise<SeenCertificate[]> {
  const [own] = await ctx.tx.select({ sha256: files.sha256 }).from(files).where(eq(files.id, fileId));
  const rows = await ctx.tx
    .select({
      number: certificates.number,
      setAsideAt: certificates.setAsideAt,
      sha256: files.sha256,
      order: batches.orderNumber,
      processor: processors.name,
      content: readings.content,
    })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .innerJoin(batches, eq(batches.id, certificates.batchId))
    .innerJoin(processors, eq(processors.id, batches.processorId))
    .leftJoin(readings, eq(readings.fileId, certificates.fileId))
    .where(
      and(
        ne(certificates.id, id),
        or(
          eq(certificates.batchId, batchId),
          number === null ? undefined : bearsNumber(number),
          own?.sha256 == null ? undefined : eq(files.sha256, own.sha256),
        ),
      ),
    )
    .limit(50);
  return rows.map((row) => {
    const read = KeptCertificates.safeParse(row.content);
    const [first] = read.success ? read.data.certificates : [];
    return {
      processor: row.processor,
      certificate_number: row.number ?? first?.certificate_number ?? null,
      purchase_order: row.order,
      sha256: row.sha256,
      // What was set aside accounts for no pieces.
      lines: row.setAsideAt === null ? (first?.lines ?? []) : [],
    };
  });
}

/** As entered by a person; until then as read. */
const bearsNumber = (number: string) =>
  or(
    eq(certificates.number, number),
    and(
      isNull(certificates.number),
      sql`${readings.content} #>> '{certificates,0,certificate_number}' = ${number}`,
    ),
  );

async function todayOf(ctx: Ctx): Promise<string> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return calendarDay(ctx.now, shop?.zone ?? 'UTC');
}

/** Where hidden words stand was not kept: that there are some is what counts. */
const hiddenPages = (hidden: readonly string[]) =>
  hidden.length === 0
    ? []
    : [
        {
          number: 1,
          width: 0,
          height: 0,
          turned: 0 as const,
          origin: 'text_layer' as const,
          words: [],
          marks: [],
          hidden: hidden.map((text) => ({ text, box: [0, 0, 0, 0] as const, why: 'invisible' as const })),
        },
      ];
