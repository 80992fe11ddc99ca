import { asc, eq } from 'drizzle-orm';
import { PDFDocument } from 'pdf-lib';

import { keepFile } from '@/db/seed/keep-file';
import { makeForm } from '@/db/seed/papers';
import type { Db } from '@/db/client';
import { batches, batchLines } from '@/db/schema/batches';
import { processors } from '@/db/schema/organisations';
import { readDocumentJob } from '@/lib/jobs/definitions/read-document';
import { inOwningShop } from '@/lib/files/in-owning-shop';
import type { PaperKind } from '@/lib/portal/contract';
import { sendPaper } from '@/lib/portal/send-paper';
import type { ToProve } from '@/lib/parts/to-prove';

import { runJobs } from '../services/run-jobs';
import { changeProcessor } from './invoices';
import { makeWorld, TODAY, type World } from './world';

/** A shop whose processor has a name as processors have. */
export async function makePaperWorld({ db, owner }: { db: Db; owner: Db }): Promise<World> {
  const world = await makeWorld(db, owner);
  await changeProcessor(owner, world, { name: 'Alder Ridge Heat Treating' });
  return world;
}

type Form = Parameters<typeof makeForm>[0];

/** What a certificate says otherwise than a good one would. */
export interface Stated {
  number?: string;
  order?: string;
  /** Accepted pieces of each line. */
  pieces?: readonly number[];
  statements?: readonly string[];
  signed?: boolean;
  /** Another batch that it is for as well, with all its pieces. */
  also?: string;
}

export const CONFORMS =
  'We certify that the parts listed above were processed and inspected to the order and the specification named.';

/** What AMS 2770 asks of 2024 sheet, as an order words it: a batch asks for it as a whole. */
export const HEAT_TREAT: readonly ToProve[] = [
  asked('Order number and revision', ''),
  asked('Solution temperature', '910 to 930', '°F'),
  asked('Soak', '35 or more', 'min'),
  asked('Quench delay', '10 or less', 's'),
  asked('Hardness', 'HRB 63 or more'),
  asked('Signature and date', ''),
];

/** What a good paper states about them. */
export const DONE_RIGHT = [
  'Solution temperature: 920 °F',
  'Soak: 40 min',
  'Quench delay: 7 s',
  'Hardness: HRB 70',
  CONFORMS,
];

export function asked(characteristic: string, limit: string, unit = ''): ToProve {
  return { characteristic, limit, unit, source: 'specification', sourceText: 'AMS 2770' };
}

/** The certificate of a batch as a processor prints it: for all its pieces unless it is said otherwise. */
export async function certificatePaper(world: World, batchId: string, stated: Stated = {}): Promise<Buffer> {
  const { batch, lines, processor } = await orderOf(world, batchId);
  const also = stated.also === undefined ? null : await orderOf(world, stated.also);
  return makeForm({
    ...headOf(processor),
    title: 'Certificate of conformance',
    facts: [
      ['Certificate no.', stated.number ?? '26-00417'],
      ['Date', '2026-06-17'],
      ['Purchase order', stated.order ?? batch.orderNumber],
      ['Traveller', batch.number],
      ['Process', 'Solution heat treat and age'],
      ['Specification', 'AMS 2770 rev R'],
      ...(also ? ([['Remark', `with ${also.batch.orderNumber}`]] as const) : []),
    ],
    columns: ['Part number', 'Rev', 'Description', 'Lot', 'Quantity'],
    lines: [...lines, ...(also?.lines ?? [])].map(({ frozen, pieces }, at) => ({
      cells: [
        frozen?.partNumber ?? '',
        frozen?.partRevision ?? '',
        frozen?.partName ?? '',
        frozen?.lotNumber ?? '',
        String(stated.pieces?.[at] ?? pieces),
      ],
    })),
    statements: stated.statements ?? DONE_RIGHT,
    signed: stated.signed === false ? null : { name: 'Ada Marsh', role: 'Quality', day: '2026-06-17' },
  });
}

/** Papers one after the other in one file, as a scanner makes it of a stack. */
export async function stackOf(papers: readonly Buffer[]): Promise<Buffer> {
  const stack = await PDFDocument.create();
  for (const paper of papers) {
    const from = await PDFDocument.load(paper);
    for (const page of await stack.copyPages(from, from.getPageIndices())) stack.addPage(page);
  }
  return Buffer.from(await stack.save());
}

/** An invoice of the batch for its first line. */
export async function invoicePaper(
  world: World,
  batchId: string,
  given: { number?: string; order?: string; freight?: string; total: string },
): Promise<Buffer> {
  const { batch, lines, processor } = await orderOf(world, batchId);
  return makeForm({
    ...headOf(processor),
    title: 'Invoice',
    facts: [
      ['Invoice', given.number ?? 'INV-8417'],
      ['Date', '2026-06-17'],
      ['Your order', given.order ?? batch.orderNumber],
      ['Terms', '30 days'],
      ['Currency', 'USD'],
    ],
    columns: ['Description', 'Quantity', 'Each', 'Amount'],
    lines: [
      ...lines.map(({ frozen, pieces, unitPriceMinor }) => ({
        cells: [
          `${frozen?.partNumber ?? ''} ${frozen?.partRevision ?? ''}`,
          String(pieces),
          (unitPriceMinor / 100).toFixed(2),
          ((pieces * unitPriceMinor) / 100).toFixed(2),
        ],
      })),
      ...(given.freight === undefined ? [] : [{ cells: ['Freight', '', '', given.freight] }]),
      { cells: ['Total', '', '', given.total] },
    ],
    statements: [],
    signed: null,
  });
}

const headOf = (name: string): Pick<Form, 'from' | 'at'> => ({
  from: { name, address: 'Works Road, Tamarack Junction' },
  at: TODAY,
});

const orderOf = (world: World, batchId: string) =>
  world.as(['lead'], async ({ tx }) => {
    const [found] = await tx
      .select({ batch: batches, processor: processors.name })
      .from(batches)
      .innerJoin(processors, eq(processors.id, batches.processorId))
      .where(eq(batches.id, batchId));
    if (!found) throw new Error('no such batch');
    const lines = await tx
      .select()
      .from(batchLines)
      .where(eq(batchLines.batchId, batchId))
      .orderBy(asc(batchLines.lineNo));
    return { ...found, lines };
  });

interface HandedIn {
  kind: PaperKind;
  name?: string;
  content: Buffer;
}

/** Stores a paper and hands it in as the batch's processor does, which has it wait for being read. */
export const handIn = (world: World, batchId: string, { kind, content, ...given }: HandedIn) =>
  world.asProcessor(async (ctx) => {
    const isChart = kind === 'chart';
    const { name = isChart ? 'furnace-2.csv' : `${kind}.pdf` } = given;
    const fileId = await inOwningShop(ctx, world.shopId, (inner) =>
      keepFile(inner, {
        purpose: kind,
        name,
        content,
        batchId,
        processorId: world.processorId,
        mediaType: isChart ? 'text/csv' : 'application/pdf',
      }),
    );
    return (await sendPaper(ctx, { batchId, kind, fileId })).id;
  });

/** Reads what waits, as the worker does. @throws what a file did to a job, which no file may. */
export async function readAll(base: { db: Db; owner: Db }): Promise<number> {
  const ran = await runJobs(base, readDocumentJob);
  for (const { error } of ran) if (error) throw error;
  return ran.length;
}
