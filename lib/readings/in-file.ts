import { asc, eq } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import type { Ctx } from '@/lib/auth/context';
import type { StatedCertificate } from '@/lib/evidence/certificate/certificate';

import type { CertificateReading } from './contract';
import { readBatchOrders, readOpenOrdersOf, type BatchOrder } from './orders-of-batch';
import { ownPlace } from './own-place';
import { rowsOn } from './rows-on';
import { speaksOf } from './speaks-of';

interface Looked {
  sha256: string;
  isRecognised: boolean;
  /** All that the file holds, in the order of its pages. */
  read: readonly StatedCertificate[];
  /** Which of them the certificate is that is looked at. */
  place: number;
  batch: BatchOrder;
}

export interface InFile {
  certificates: CertificateReading['inFile'];
  /** Of the open orders that any of them may be for, and of those that some are for already. */
  orders: BatchOrder[];
  /** Places that stand for a batch already. */
  taken: number[];
}

/**
 * What else the file holds: every certificate in it, for which batches it was taken up, and which it speaks of besides.
 * Nothing where it holds one certificate for one batch, as nearly all do.
 */
export async function readInFile(ctx: Ctx, looked: Looked): Promise<InFile> {
  const { read, place, batch, sha256, isRecognised } = looked;
  const takenUp = await takenUpFrom(ctx, sha256);
  const own = read[place];
  const isAlone = read.length === 1 && takenUp.length === 1;
  if (isAlone && own && rowsOn(own, batch.order).length === own.lines.length)
    return { certificates: [], orders: [batch], taken: [place] };
  const open = await readOpenOrdersOf(ctx, batch.processorId);
  const known = new Set(open.map(({ batchId }) => batchId));
  const further = takenUp.map(({ batchId }) => batchId).filter((id) => !known.has(id));
  const orders = [...open, ...(await readBatchOrders(ctx, [...new Set(further)]))];
  const taken = takenUp.map((one) => {
    const order = orders.find(({ batchId }) => batchId === one.batchId)?.order ?? null;
    return { ...one, place: ownPlace(read, { place: one.place, order }) };
  });
  const all = read.map((stated, at) => {
    const here = taken.filter((one) => one.place === at);
    const fits = speaksOf(
      stated,
      orders.map(({ order }) => order),
      { isRecognised },
    );
    return {
      place: at,
      number: stated.certificate_number,
      order: stated.purchase_order,
      parts: [...new Set(stated.lines.flatMap(({ part_number }) => part_number ?? []))],
      isThis: at === place,
      taken: here.map(({ certificateId, batchId, batchNumber }) => ({ certificateId, batchId, batchNumber })),
      fits: fits.flatMap(({ order, isClear, reasons }) => {
        const to = open.find((one) => one.order === order);
        const isTaken = here.some(({ batchId }) => batchId === to?.batchId);
        return to && !isTaken
          ? [{ batchId: to.batchId, batchNumber: order.batch, isClear, reasons: [...reasons] }]
          : [];
      }),
    };
  });
  const tells =
    read.length > 1 ||
    all.some(({ taken: here, fits }) => here.length > 1 || fits.some(({ isClear }) => isClear));
  return { certificates: tells ? all : [], orders, taken: taken.map((one) => one.place) };
}

/** Certificates that rest on the same bytes, whether their file was handed in once or twice. */
const takenUpFrom = (ctx: Ctx, sha256: string) =>
  ctx.tx
    .select({
      certificateId: certificates.id,
      batchId: batches.id,
      batchNumber: batches.number,
      place: certificates.place,
    })
    .from(certificates)
    .innerJoin(files, eq(files.id, certificates.fileId))
    .innerJoin(batches, eq(batches.id, certificates.batchId))
    .where(eq(files.sha256, sha256))
    .orderBy(asc(certificates.id));
