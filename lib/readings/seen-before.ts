import { and, eq, isNull, ne, or, sql } from 'drizzle-orm';

import { batches } from '@/db/schema/batches';
import { certificates } from '@/db/schema/evidence';
import { files } from '@/db/schema/files';
import { processors } from '@/db/schema/organisations';
import { readings } from '@/db/schema/readings';
import type { Ctx } from '@/lib/auth/context';
import type { SeenCertificate, StatedCertificate } from '@/lib/evidence/certificate/certificate';

import { KeptCertificates } from './kept-reading';
import { readBatchOrders, type BatchOrder } from './orders-of-batch';
import { ownPlace } from './own-place';
import { rowsOn } from './rows-on';

interface Looked {
  certificate: { id: string; batchId: string };
  sha256: string;
  stated: StatedCertificate;
  /** Which of the certificates of its file it is, from 0. */
  place: number;
  batch: BatchOrder;
}

const MOST = 50;

/**
 * Papers with the same number or the same bytes, and the other papers of this batch with their pieces. Another certificate
 * in the same file is another paper; and one that lists parts of two batches is for both.
 */
export async function seenBefore(ctx: Ctx, looked: Looked): Promise<SeenCertificate[]> {
  const rows = await papersAlike(ctx, looked);
  const orders = await readBatchOrders(ctx, [...new Set(rows.map(({ batchId }) => batchId))]);
  return rows.flatMap((row) => {
    const order = orders.find(({ batchId }) => batchId === row.batchId)?.order ?? null;
    const read = KeptCertificates.safeParse(row.content);
    const all = read.success ? read.data.certificates : [];
    const place = ownPlace(all, { place: row.place, order });
    const own = all[place];
    const isOther = row.sha256 === looked.sha256 && place !== looked.place && all.length > 1;
    if (!isOther && row.batchId !== looked.batch.batchId && order && isForBoth(looked, order)) return [];
    return [
      {
        processor: row.processor,
        certificate_number: row.number ?? own?.certificate_number ?? null,
        purchase_order: row.order,
        sha256: isOther ? null : row.sha256,
        // What was set aside accounts for no pieces.
        lines: row.setAsideAt === null ? (own?.lines ?? []) : [],
      },
    ];
  });
}

/** It lists parts of the other batch, and of this one some that are none of the other's. */
function isForBoth({ stated, batch }: Looked, other: BatchOrder['order']): boolean {
  const theirs = rowsOn(stated, other);
  return theirs.length > 0 && rowsOn(stated, batch.order).some((at) => !theirs.includes(at));
}

const papersAlike = (ctx: Ctx, { certificate, sha256, stated }: Looked) =>
  ctx.tx
    .select({
      batchId: certificates.batchId,
      place: certificates.place,
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
        ne(certificates.id, certificate.id),
        or(
          eq(certificates.batchId, certificate.batchId),
          stated.certificate_number === null ? undefined : bearsNumber(stated.certificate_number),
          eq(files.sha256, sha256),
        ),
      ),
    )
    .limit(MOST);

/** As entered by a person; until then as read, wherever in its file. */
const bearsNumber = (number: string) =>
  or(
    eq(certificates.number, number),
    and(
      isNull(certificates.number),
      sql`${readings.content} -> 'certificates' @> ${JSON.stringify([{ certificate_number: number }])}::jsonb`,
    ),
  );
