import { asc, eq } from 'drizzle-orm';
import type { z } from 'zod';

import { shops } from '@/db/schema/organisations';
import { readingCorrections } from '@/db/schema/readings';
import { authorize } from '@/lib/auth/authorize';
import { shopOf, type Ctx } from '@/lib/auth/context';
import { calendarDay } from '@/lib/day-words';
import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';
import type { Page } from '@/lib/evidence/page';
import { comparisonTablesOf } from '@/lib/reference/tables-of';

import { asOfBatch } from './as-of-batch';
import type { CertificateReading } from './contract';
import { findReading } from './find-reading';
import { readInFile } from './in-file';
import { KeptCertificates, type KeptPage } from './kept-reading';
import { readBatchOrder } from './orders-of-batch';
import { ownPlace } from './own-place';
import { propose } from './propose';
import { seenBefore } from './seen-before';
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
  inFile: [],
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
  const pages = reading.pages as KeptPage[];
  const batch = await readBatchOrder(ctx, certificate.batchId);
  const corrections = await correctionsOf(ctx, reading.id);
  const base = { ...head, recognised: file.recognised, corrections, pages };
  const place = ownPlace(read, { place: certificate.place, order: batch?.order ?? null });
  const own = read[place];
  if (!own || !batch) return base;
  const { sha256, recognised: isRecognised } = file;
  const inFile = await readInFile(ctx, { sha256, isRecognised, read, place, batch });
  const others = inFile.orders.filter(({ batchId }) => batchId !== batch.batchId).map(({ order }) => order);
  const corrected = withCorrections(own, corrections);
  const stated = asOfBatch(corrected, { order: batch.order, others, words: wordsOf(own, pages) });
  const proposed = propose(batch, {
    stated,
    file: {
      sha256,
      recognised: isRecognised,
      pages: pages.map((page, at) => seenPage(page, at === 0 ? file.hidden : [])),
    },
    // Those that are taken up stand among what was seen, with their pieces.
    others: read.filter((_, at) => at !== place && !inFile.taken.includes(at)),
    orders: others,
    seen: await seenBefore(ctx, { certificate, sha256, stated: corrected, place, batch }),
    today: await todayOf(ctx),
    tables: await comparisonTablesOf(ctx),
  });
  return {
    ...base,
    certificateNumber: stated.certificate_number,
    certificateDate: stated.certificate_date,
    // As the machine read them; what a person put in their place stands among the corrections.
    facts: own.facts,
    inFile: inFile.certificates,
    ...proposed,
    proposals: proposed.proposals.map((one) => onThePage(one, own)),
    lines: proposed.lines.map((one) => onThePage(one, own)),
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

async function todayOf(ctx: Ctx): Promise<string> {
  const [shop] = await ctx.tx
    .select({ zone: shops.zone })
    .from(shops)
    .where(eq(shops.id, shopOf(ctx)));
  return calendarDay(ctx.now, shop?.zone ?? 'UTC');
}

/** Without what only a person knows: it stands nowhere that could be pointed at. */
const onThePage = <Rests extends { facts: number[] }>(rests: Rests, { facts }: StatedCertificate): Rests => ({
  ...rests,
  facts: rests.facts.filter((at) => at < facts.length),
});

/** The words of the pages that this certificate stands on. */
function wordsOf({ facts }: StatedCertificate, pages: readonly KeptPage[]): string[] {
  const own = new Set(facts.map(({ page }) => page));
  return pages.flatMap(({ number, words }) => (own.has(number) ? words.map(([text]) => text) : []));
}

/** A page as it is compared; where hidden words stand was not kept: that there are some is what counts. */
const seenPage = ({ number, width, height, words }: KeptPage, hidden: readonly string[]): Page => ({
  number,
  width,
  height,
  turned: 0,
  origin: 'text_layer',
  words: words.map(([text, ...box]) => ({ text, box, confidence: 1 })),
  marks: [],
  hidden: hidden.map((text) => ({ text, box: [0, 0, 0, 0], why: 'invisible' })),
});
