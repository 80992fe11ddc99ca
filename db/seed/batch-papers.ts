import { asc, eq } from 'drizzle-orm';

import { batches, batchLines, requirements } from '@/db/schema/batches';
import { shops } from '@/db/schema/organisations';
import type { Ctx } from '@/lib/auth/context';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import { amountText } from '@/lib/money';
import { PROCESS_WORDS } from '@/lib/trade/process';

import { keepFile } from './keep-file';
import { dayOf, type DemoProcessor } from './organisations';
import { makeForm } from './papers';
import { statedOn } from './stated-on';

interface Paper {
  name: string;
  content: Buffer;
  /** A PDF where it is not said. */
  mediaType?: string;
}

/** What a processor reads off the order when it writes its papers. */
async function readOrder(ctx: Ctx, batchId: string) {
  const [seen] = await ctx.tx.select({ shopId: batches.shopId }).from(batches).where(eq(batches.id, batchId));
  if (!seen) throw new Error('a batch of the story is gone');
  return inOwningShop(ctx, seen.shopId, async ({ tx }) => {
    const [batch] = await tx
      .select({ batch: batches, shop: shops.name })
      .from(batches)
      .innerJoin(shops, eq(shops.id, batches.shopId))
      .where(eq(batches.id, batchId));
    const lines = await tx
      .select()
      .from(batchLines)
      .where(eq(batchLines.batchId, batchId))
      .orderBy(asc(batchLines.lineNo));
    const asked = await tx
      .select()
      .from(requirements)
      .where(eq(requirements.batchId, batchId))
      .orderBy(asc(requirements.seq));
    if (!batch) throw new Error('a batch of the story is gone');
    return {
      ...batch.batch,
      shop: batch.shop,
      requirements: asked,
      lines: lines.map((line) => ({
        ...line,
        partNumber: line.frozen?.partNumber ?? '',
        partRevision: line.frozen?.partRevision ?? '',
        partName: line.frozen?.partName ?? '',
        lotNumber: line.frozen?.lotNumber ?? '',
      })),
    };
  });
}

/** The processor's certificate for all pieces of the batch, or for all but some of the last line. */
export async function certificateOf(
  ctx: Ctx,
  batchId: string,
  given: {
    processor: DemoProcessor;
    uncovered: number;
    missing: number;
    /** What it states otherwise than a good paper would, by characteristic. */
    stated: Readonly<Record<string, string>>;
  },
): Promise<Paper> {
  const batch = await readOrder(ctx, batchId);
  const number = certificateNumber(batch.number, ctx.now);
  const last = batch.lines.length - 1;
  const content = await makeForm({
    title: 'Certificate of conformance',
    from: { name: given.processor.name, address: 'Works Road, Tamarack Junction' },
    facts: [
      ['Certificate no.', number],
      ['Date', dayOf(ctx.now)],
      ['Purchase order', batch.orderNumber],
      ['Customer', batch.shop],
      ['Traveller', batch.number],
      ['Process', PROCESS_WORDS[batch.process]],
      ['Specification', [batch.specification, batch.specificationRevision].filter(Boolean).join(' rev ')],
      ['Class / type', batch.classType ?? ''],
    ],
    columns: ['Part number', 'Rev', 'Description', 'Lot', 'Quantity'],
    lines: batch.lines.map((line, at) => ({
      cells: [
        line.partNumber,
        line.partRevision,
        line.partName,
        line.lotNumber,
        String(line.pieces - (at === last ? given.uncovered + given.missing : 0)),
      ],
    })),
    statements: [
      ...new Set(batch.requirements.flatMap((one) => statedOn(one, given.stated) ?? [])),
      'We certify that the parts listed above were processed and inspected to the order and the specification named, and that the results are on file.',
    ],
    signed: { name: given.processor.contact, role: 'Quality', day: dayOf(ctx.now) },
    at: ctx.now,
  });
  return { name: `${number}.pdf`, content };
}

export const certificateNumber = (batchNumber: string, at: Date): string =>
  `${String(at.getUTCFullYear()).slice(2)}-${batchNumber.replace(/\D/g, '').padStart(5, '0')}`;
export const invoiceNumber = (batchNumber: string): string =>
  `INV-${8000 + Number(batchNumber.replace(/\D/g, ''))}`;

/** The processor's invoice: the order's lines, its minimum and its fee, and now and then something nobody agreed. */
export async function invoiceOf(
  ctx: Ctx,
  batchId: string,
  given: { processor: DemoProcessor; extra?: { description: string; amountMinor: number } | undefined },
): Promise<Paper> {
  const batch = await readOrder(ctx, batchId);
  const lines = invoiceLinesOf(batch.lines, batch, given.extra);
  const total = lines.reduce((sum, line) => sum + line.amountMinor, 0);
  const number = invoiceNumber(batch.number);
  const content = await makeForm({
    title: 'Invoice',
    from: { name: given.processor.name, address: 'Works Road, Tamarack Junction' },
    facts: [
      ['Invoice', number],
      ['Date', dayOf(ctx.now)],
      ['Your order', batch.orderNumber],
      ['Terms', '30 days'],
      ['Bill to', batch.shop],
      ['Currency', batch.currency],
    ],
    columns: ['Description', 'Quantity', 'Each', 'Amount'],
    lines: [
      ...lines.map((line) => ({
        cells: [
          line.description,
          line.pieces === null ? '' : String(line.pieces),
          line.unitPriceMinor === null ? '' : amountText(line.unitPriceMinor),
          amountText(line.amountMinor),
        ],
      })),
      { cells: ['Total', '', '', amountText(total)] },
    ],
    statements: ['Bank transfer to the account agreed with you.'],
    signed: null,
    at: ctx.now,
  });
  return { name: `${number}.pdf`, content };
}

interface PricedLine {
  id: string;
  partNumber: string;
  partRevision: string;
  pieces: number;
  unitPriceMinor: number;
}

export function invoiceLinesOf(
  lines: readonly PricedLine[],
  order: { lotMinimumMinor: number; certificationFeeMinor: number },
  extra?: { description: string; amountMinor: number },
) {
  const charge = (
    kind: 'lot_minimum' | 'certification' | 'other',
    description: string,
    amountMinor: number,
  ) => ({ kind, lineId: null, description, pieces: null, unitPriceMinor: null, amountMinor });
  const work = lines.map((line) => ({
    kind: 'pieces' as const,
    lineId: line.id,
    description: `${line.partNumber} ${line.partRevision}`,
    pieces: line.pieces,
    unitPriceMinor: line.unitPriceMinor,
    amountMinor: line.pieces * line.unitPriceMinor,
  }));
  const sum = work.reduce((total, line) => total + line.amountMinor, 0);
  return [
    ...work,
    ...(sum < order.lotMinimumMinor
      ? [charge('lot_minimum', 'to the lot minimum', order.lotMinimumMinor - sum)]
      : []),
    ...(order.certificationFeeMinor > 0
      ? [charge('certification', 'Certification', order.certificationFeeMinor)]
      : []),
    ...(extra ? [charge('other', extra.description, extra.amountMinor)] : []),
  ];
}

/** Keeps a paper of the processor as a verified upload of its batch. */
export async function keepPaper(
  ctx: Ctx,
  batchId: string,
  paper: Paper & { purpose: 'certificate' | 'invoice' | 'chart' },
): Promise<string> {
  const [batch] = await ctx.tx
    .select({ shopId: batches.shopId, processorId: batches.processorId })
    .from(batches)
    .where(eq(batches.id, batchId));
  if (!batch) throw new Error('a batch of the story is gone');
  return inOwningShop(ctx, batch.shopId, (inner) =>
    keepFile(inner, {
      ...paper,
      mediaType: paper.mediaType ?? 'application/pdf',
      batchId,
      processorId: batch.processorId,
    }),
  );
}
